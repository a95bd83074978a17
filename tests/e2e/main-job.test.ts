import ICAL from 'ical.js';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { axeFindings, DESKTOP, keepPicture, launchBrowser, newVisitor, PHONE, type Visitor } from '../helpers/browser';
import { type ServedApp, serveApp } from '../helpers/serve-app';

const PASSWORD = 'a long walk by the creek';
const people = {
  admin: { name: 'Wilma Hask', email: 'wilma@example.org' },
  first: { name: 'Otis Brandt', email: 'otis@example.org' },
  second: { name: 'Greta Lunn', email: 'greta@example.org' },
};

let app: ServedApp;
let browser: Browser;
let admin: Visitor;
let first: Visitor;
let second: Visitor;

beforeAll(async () => {
  app = await serveApp();
  browser = await launchBrowser();
  admin = await newVisitor(browser, app.url, DESKTOP);
  first = await newVisitor(browser, app.url, PHONE);
  second = await newVisitor(browser, app.url, PHONE);
});

afterAll(async () => {
  await browser?.close();
  await app?.stop();
});

/** The newest kept mail to an address, opened; waits until the mail job has run. */
async function openMail(page: Page, subject: RegExp, to: string): Promise<void> {
  const row = page.getByRole('row').filter({ hasText: to }).getByRole('link', { name: subject });
  for (let tries = 0; tries < 60; tries++) {
    await page.goto('/dev/mail');
    if ((await row.count()) > 0) break;
    await page.waitForTimeout(500);
  }
  await row.first().click();
  await page.getByRole('heading', { name: 'Plain text' }).waitFor();
}

async function followMailLink(page: Page, subject: RegExp, to: string): Promise<void> {
  await openMail(page, subject, to);
  await page.locator('a[href^="http"]').filter({ hasText: '/' }).first().click();
}

async function joinFromMail({ page }: Visitor, person: { name: string; email: string }): Promise<void> {
  await followMailLink(page, /invite|invitation|join/i, person.email);
  await page.locator('form[data-ready]').first().waitFor();
  await page.getByLabel('Your name').fill(person.name);
  await page.getByLabel('Password').fill(PASSWORD);
  await page.getByRole('button', { name: /Make an account and join/ }).click();
  await page.waitForURL(/\/clubs\/quiet-hollow/);
}

const openSit = (page: Page) => page.goto('/clubs/quiet-hollow/sit');

async function feedEvents(url: string) {
  const response = await fetch(url);
  expect(response.status).toBe(200);
  const calendar = new ICAL.Component(ICAL.parse(await response.text()));
  return calendar.getAllSubcomponents('vevent').map((event) => ({
    uid: event.getFirstPropertyValue('uid'),
    summary: String(event.getFirstPropertyValue('summary')),
    status: event.getFirstPropertyValue('status'),
    sequence: Number(event.getFirstPropertyValue('sequence')),
    start: new ICAL.Event(event).startDate.toUnixTime() * 1000,
  }));
}

describe('from sign-up to a booked sit in the calendar', () => {
  it('a new user makes an account and confirms it from the mail', async () => {
    const { page } = admin;
    await page.goto('/');
    await page.getByRole('link', { name: 'Make an account' }).first().click();
    await page.getByLabel('Your name').fill(people.admin.name);
    await page.getByLabel('E-mail').fill(people.admin.email);
    await page.getByLabel('Password').fill(PASSWORD);
    await page.getByRole('button', { name: 'Make the account' }).click();
    await page.getByText('We wrote to').waitFor();
    await followMailLink(page, /confirm/i, people.admin.email);
    await page.getByLabel('Password').fill(PASSWORD);
    await page.getByRole('button', { name: 'Confirm and sign in' }).click();
    await page.waitForURL(/\/clubs/);
    expect(await axeFindings(page)).toEqual([]);
  });

  it('starts a club at a place, whose zone is proposed', async () => {
    const { page } = admin;
    await page.goto('/clubs/new');
    await page.getByLabel('Name of the club').fill('Quiet Hollow');
    await page.getByLabel('Latitude').fill('41.2');
    await page.getByLabel('Longitude').fill('-77.3');
    await page.getByLabel('Longitude').blur();
    await expect.poll(() => page.getByLabel('Time zone').inputValue()).toBe('America/New_York');
    expect(await axeFindings(page)).toEqual([]);
    await page.getByRole('button', { name: 'Start the club' }).click();
    await page.waitForURL(/\/clubs\/quiet-hollow/);
    await openSit(page);
    await page.getByRole('link', { name: /add/i }).first().waitFor();
    await keepPicture(page, 'empty-club');
  });

  it('adds two stands with good winds, and a wrong entry is named beside its field with nothing lost', async () => {
    const { page } = admin;
    const fill = async (name: string, latitude: string, winds: string) => {
      await page.goto('/clubs/quiet-hollow/stands/new');
      await page.getByLabel('Name', { exact: true }).fill(name);
      await page.getByLabel('Kind').selectOption('ladder');
      await page.getByLabel('Latitude').fill(latitude);
      await page.getByLabel('Longitude').fill('-77.301');
      await page.getByLabel(/height/i).fill('15');
      await page.getByRole('textbox', { name: /^Bow/i }).fill('30');
      await page.getByLabel('Good winds, morning and evening').fill(winds);
      await page.getByRole('button', { name: 'Save stand' }).click();
    };
    await fill('Beech Ladder', '41.201', 'NW to sideways');
    await page
      .getByText(/sideways/i)
      .first()
      .waitFor();
    expect(await page.getByLabel('Name', { exact: true }).inputValue()).toBe('Beech Ladder');
    expect(await axeFindings(page)).toEqual([]);
    await page.getByLabel('Good winds, morning and evening').fill('any');
    await page.getByRole('button', { name: 'Save stand' }).click();
    await page.getByRole('heading', { name: 'Beech Ladder' }).waitFor();
    await fill('Spring Ladder', '41.206', 'NW-N');
    await page.getByRole('heading', { name: 'Spring Ladder' }).waitFor();
    expect(await axeFindings(page)).toEqual([]);
    await keepPicture(page, 'stand');
  });

  it('invites two members, who join from the mail on their phones', async () => {
    const { page } = admin;
    for (const person of [people.first, people.second]) {
      await page.goto('/clubs/quiet-hollow/club/members/invite');
      await page.getByLabel('Name', { exact: true }).fill(person.name);
      await page.getByLabel('E-mail').fill(person.email);
      await page.getByRole('button', { name: 'Send the invitation' }).click();
      await page.waitForURL(/\/club\/members$/);
      await page.getByText(person.email).first().waitFor();
    }
    await joinFromMail(first, people.first);
    await joinFromMail(second, people.second);
  });

  it('one member books from the ranked list while the other has the same list open', async () => {
    await openSit(first.page);
    await openSit(second.page);
    const rows = (page: Page) => page.getByRole('button', { name: /^Book/ });
    await expect.poll(() => rows(first.page).count()).toBe(2);
    expect(await axeFindings(first.page)).toEqual([]);
    await keepPicture(first.page, 'list-phone');
    await rows(second.page).first().click();
    const other = second.page.getByRole('dialog');
    await other.getByRole('heading', { name: /^Book / }).waitFor();
    const standName = ((await other.getByRole('heading', { name: /^Book / }).textContent()) ?? '').replace('Book ', '');

    await first.page.getByRole('button', { name: `Book ${standName}` }).click();
    await first.page.getByRole('dialog').getByRole('button', { name: /^Book/ }).last().click();
    await first.page.getByText('Sit booked').first().waitFor();

    await other.getByRole('button', { name: /^Book/ }).last().click();
    await other
      .getByText(new RegExp(`${standName} is taken .*${people.first.name}`))
      .first()
      .waitFor();
    await keepPicture(second.page, 'refused');
    await second.page.keyboard.press('Escape');
    await expect.poll(() => rows(second.page).count()).toBeLessThan(2);
  });

  it('the sit stands in the feed, and cancelling shows it as cancelled', async () => {
    const { page } = first;
    await page.goto('/clubs/quiet-hollow/calendar');
    await page
      .getByRole('button', { name: /make|address/i })
      .first()
      .click();
    const address = page.getByLabel('Address for your calendar').first();
    await address.waitFor();
    const url = await address.inputValue();
    expect(await axeFindings(page)).toEqual([]);
    const [booked, ...more] = await feedEvents(url);
    expect(more).toEqual([]);
    expect(booked).toMatchObject({ status: 'CONFIRMED' });
    expect(booked?.summary).toMatch(/Ladder/);
    expect(booked?.start).toBeGreaterThan(Date.now() - 86_400_000);

    await page.goto('/clubs/quiet-hollow/my-sits');
    await page
      .getByRole('button', { name: /^Cancel/ })
      .first()
      .click();
    await page.getByRole('dialog').getByRole('button', { name: 'Cancel the sit' }).click();
    await page.getByText('Sit cancelled').first().waitFor();
    const [cancelled] = await feedEvents(url);
    expect(cancelled).toMatchObject({ uid: booked?.uid, status: 'CANCELLED' });
    expect(cancelled?.sequence).toBeGreaterThan(booked?.sequence ?? 0);
  });

  it('the mails of the booking carry their calendar entry', async () => {
    await openMail(admin.page, /booked/i, people.first.email);
    await admin.page.getByText('METHOD:REQUEST').waitFor();
    await openMail(admin.page, /cancelled/i, people.first.email);
    await admin.page.getByText('METHOD:CANCEL').waitFor();
  });

  it('no page threw, printed an error or asked another machine', () => {
    for (const { troubles } of [admin, first, second]) expect(troubles).toEqual([]);
    expect(app.output()).not.toMatch(/unexpected error/);
  });
});
