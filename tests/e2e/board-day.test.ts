import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { closeDatabase, useDatabase, write } from '@/db/client';
import { outings } from '@/db/schema';
import { axeFindings, DESKTOP, keepPicture, launchBrowser, newVisitor, PHONE, type Visitor } from '../helpers/browser';
import { DAY_PASSWORD, DAY_PEOPLE, DAY_SLUG, makeDayClub } from '../helpers/day-club';
import { type ServedApp, serveApp } from '../helpers/serve-app';
import { signIn } from '../helpers/sign-in';

const CLUB = `/clubs/${DAY_SLUG}`;

let app: ServedApp;
let browser: Browser;
let member: Visitor;
let officer: Visitor;
let landowner: Visitor;
let home: Visitor;

/** Opens the newest kept mail of a subject and gives its first link; waits until the mail job has run. */
async function linkInMail(page: Page, subject: RegExp): Promise<string> {
  const row = page.getByRole('row').getByRole('link', { name: subject });
  for (let tries = 0; tries < 200; tries++) {
    await page.goto('/dev/mail');
    if ((await row.count()) > 0) break;
    await page.waitForTimeout(500);
  }
  await row.first().click();
  await page.getByRole('heading', { name: 'Plain text' }).waitFor();
  return (await page.locator('a[href*="/contact/"], a[href*="/overdue/"]').first().getAttribute('href')) ?? '';
}

const looksRight = async (page: Page, name: string) => {
  expect(await axeFindings(page), name).toEqual([]);
  const wide = await page.evaluate(() => document.documentElement.scrollWidth > document.documentElement.clientWidth);
  expect(wide, `${name} is wider than the window`).toBe(false);
  await keepPicture(page, name);
};

const row = (page: Page, name: string) => page.getByRole('row').filter({ hasText: name });
const dialog = (page: Page) => page.getByRole('dialog');

beforeAll(async () => {
  app = await serveApp();
  await useDatabase(app.databaseUrl);
  await makeDayClub(Date.now());
  browser = await launchBrowser();
  member = await newVisitor(browser, app.url, PHONE);
  officer = await newVisitor(browser, app.url, DESKTOP);
  landowner = await newVisitor(browser, app.url, DESKTOP);
  home = await newVisitor(browser, app.url, PHONE);
  await signIn(member.page, DAY_PEOPLE.member.email, DAY_PASSWORD);
  await signIn(officer.page, DAY_PEOPLE.officer.email, DAY_PASSWORD);
  await signIn(landowner.page, DAY_PEOPLE.landowner.email, DAY_PASSWORD);
});

afterAll(async () => {
  await browser?.close();
  await closeDatabase();
  await app?.stop();
});

describe("a member's day, on a phone", () => {
  it('names a safety contact, who agrees from the mail without an account', async () => {
    const { page } = member;
    await page.goto('/account');
    const form = page.locator('section').filter({ has: page.getByRole('heading', { name: 'Safety contact' }) });
    await form.locator('form[data-ready]').waitFor();
    await form.getByLabel('Their name').fill('May Roe');
    await form.getByLabel('Their e-mail address').fill('may@example.org');
    await form.getByRole('button', { name: 'Ask them' }).click();
    await form.getByText('Asked, no answer yet').waitFor();
    await looksRight(page, 'account-contact');
    await home.page.goto(await linkInMail(home.page, /asks you to be their safety contact/));
    await home.page.getByRole('heading', { name: 'Ann Roe asks you' }).waitFor();
    await looksRight(home.page, 'contact-ask');
    await home.page.getByRole('button', { name: 'Yes, tell me' }).click();
    await home.page.getByText('You are the safety contact of Ann Roe.').waitFor();
  });

  it('books from the list, and stands late on the board', async () => {
    const { page } = member;
    await page.goto(`${CLUB}/board`);
    await page.getByText('Nobody is signed in').waitFor();
    await looksRight(page, 'board-empty');
    await page.goto(`${CLUB}/sit?window=morning`);
    await page.getByRole('button', { name: 'Book Oak Ladder' }).click();
    await dialog(page).getByRole('button', { name: 'Book this sit' }).click();
    await page.getByText('Sit booked').first().waitFor();
    await page.goto(`${CLUB}/board`);
    await row(page, 'Oak Ladder').getByText('Late: not signed in').waitFor();
    await looksRight(page, 'board-late');
  });

  it('signs in with two taps: everything is filled in', async () => {
    const { page } = member;
    await row(page, 'Oak Ladder').getByRole('button', { name: 'Sign in' }).click();
    await dialog(page).locator('form[data-ready]').waitFor();
    expect(await dialog(page).getByLabel('Way in').inputValue()).not.toBe('');
    expect(await dialog(page).getByLabel('Back by').inputValue()).toMatch(/^11:\d[05]$/);
    await dialog(page).getByText('Do not tell May Roe this time').waitFor();
    await looksRight(page, 'sign-in');
    await dialog(page).getByLabel('Vehicle').fill('grey truck');
    await dialog(page).getByRole('button', { name: 'Sign in' }).click();
    const mine = page.getByRole('region', { name: 'On the ground now' });
    await mine.getByText(/^Back by 11:\d[05] AM$/).waitFor();
    await mine.getByText(/grey truck/).waitFor();
    await looksRight(page, 'board-in');
  });

  it('tracks a deer: the time moves and the first stays', async () => {
    const { page } = member;
    await page.getByRole('button', { name: /^Back later/ }).click();
    await dialog(page).locator('form[data-ready]').waitFor();
    await dialog(page).getByText('Two hours').click();
    await looksRight(page, 'back-later');
    await dialog(page).getByRole('button', { name: 'Move the time' }).click();
    await page.getByText(/Back by 1:\d[05] PM \(first said 11:\d[05] AM; tracking a deer\)/).waitFor();
  });

  it('gives a link to somebody at home, which opens one page without an account', async () => {
    const { page } = member;
    await page.getByRole('button', { name: /^Link for home/ }).click();
    await dialog(page).getByRole('button', { name: 'Make a link' }).click();
    const url = await dialog(page).getByLabel('Link for somebody at home').inputValue();
    await looksRight(page, 'link-for-home');
    await page.keyboard.press('Escape');
    await home.page.goto(url);
    await home.page.getByRole('heading', { name: 'Ann Roe' }).waitFor();
    for (const words of ['Oak Ladder path', 'North gate', 'grey truck', 'tracking a deer']) {
      await home.page.getByText(words).first().waitFor();
    }
    expect(await home.page.content()).not.toMatch(/34\.1\d/);
    await looksRight(home.page, 'shared-sit');
  });

  it('is seen overdue by others as it happens, and the contact is mailed', async () => {
    await officer.page.goto(`${CLUB}/board`);
    await row(officer.page, 'Oak Ladder').getByText('In', { exact: true }).waitFor();
    await landowner.page.goto(`${CLUB}/board`);
    await row(landowner.page, 'Oak Ladder').waitFor();
    await write((tx) => tx.update(outings).set({ backBy: Date.now() - 3 * 3_600_000 }));
    await officer.page.getByText('Ann Roe is overdue').waitFor({ timeout: 60_000 });
    await landowner.page.getByText('Ann Roe is overdue').waitFor({ timeout: 60_000 });
    await looksRight(officer.page, 'board-overdue');
    expect(await landowner.page.getByRole('button', { name: /Sign|Back later|Cancel|Walk up/ }).count()).toBe(0);
    await looksRight(landowner.page, 'board-landowner');
    await home.page.goto(await linkInMail(home.page, /^Overdue: Ann Roe, Day Club/));
    await home.page.getByText('What to do').waitFor();
    await looksRight(home.page, 'overdue-page');
  });

  it('signs out with two taps, and everybody hears of it', async () => {
    const { page } = member;
    await page.goto(`${CLUB}/board`);
    await page.getByRole('button', { name: /^Sign out/ }).click();
    await page.getByRole('alertdialog').getByRole('button', { name: 'Sign out' }).click();
    await row(page, 'Oak Ladder')
      .getByText(/^Out, /)
      .waitFor();
    await looksRight(page, 'board-out');
    await home.page.reload();
    await home.page.getByText('Nothing more is to be done.').waitFor();
    await officer.page.getByText('Ann Roe is overdue').waitFor({ state: 'detached', timeout: 60_000 });
  });

  it('another walks up at the gate and is signed in at once', async () => {
    const { page } = officer;
    await page.getByRole('button', { name: 'Walk up' }).click();
    await dialog(page).locator('form[data-ready]').waitFor();
    await dialog(page).getByLabel('Stand').selectOption({ label: 'Elm Box' });
    await looksRight(page, 'walk-up');
    await dialog(page).getByRole('button', { name: 'Take it and sign in' }).click();
    await row(page, 'Elm Box').getByText('In', { exact: true }).waitFor();
  });

  it('no page threw, printed an error or asked another machine', () => {
    for (const { troubles } of [member, officer, landowner, home]) expect(troubles).toEqual([]);
    expect(app.output()).not.toMatch(/unexpected error/);
  });
});
