import { createClient } from '@libsql/client';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { DEMO_PASSWORD } from '@/features/demo/people';
import { axeFindings, DESKTOP, keepPicture, launchBrowser, newVisitor, PHONE, type Visitor } from '../helpers/browser';
import { type ServedApp, serveApp } from '../helpers/serve-app';
import { signIn } from '../helpers/sign-in';

const CLUB = '/clubs/tansy-fork';

let app: ServedApp;
let browser: Browser;
let member: Visitor;
let officer: Visitor;

/** A member of the demo with a sit that has ended and no log yet. */
async function whoOwesLog(): Promise<string> {
  const database = createClient({ url: app.databaseUrl });
  const { rows } = await database.execute(
    `select users.email from sits join memberships on memberships.id = sits.member_id join users on users.id = memberships.user_id
     where sits.status = 'booked' and sits.end_at < unixepoch() * 1000 and memberships.role = 'member'
     and sits.id not in (select sit_id from sit_logs) order by sits.end_at desc limit 1`,
  );
  database.close();
  return String(rows[0]?.email);
}

const waiting = (page: Page) => page.getByRole('region', { name: 'Waiting for a log' }).getByRole('listitem');
const more = (page: Page, label: string) => page.getByRole('button', { name: `One more: ${label}`, exact: true });
const looksRight = async (page: Page, name: string) => {
  expect(await axeFindings(page)).toEqual([]);
  const wide = await page.evaluate(() => document.documentElement.scrollWidth > document.documentElement.clientWidth);
  expect(wide, `${name} is wider than the window`).toBe(false);
  await keepPicture(page, name);
};

beforeAll(async () => {
  app = await serveApp({ seed: true });
  browser = await launchBrowser();
  member = await newVisitor(browser, app.url, PHONE);
  officer = await newVisitor(browser, app.url, DESKTOP);
  await signIn(member.page, await whoOwesLog(), DEMO_PASSWORD);
  await signIn(officer.page, 'abel@example.org', DEMO_PASSWORD);
});

afterAll(async () => {
  await browser?.close();
  await app?.stop();
});

describe('the log of a sit, on a phone', () => {
  let left = 0;

  it('waits on the Log screen, one press from its form', async () => {
    const { page } = member;
    await page.goto(`${CLUB}/sit`);
    await page.getByRole('navigation', { name: 'Pages' }).last().getByRole('link', { name: 'Log' }).click();
    await page.getByRole('heading', { name: 'Log', level: 1 }).waitFor();
    left = await waiting(page).count();
    expect(left).toBeGreaterThan(0);
    await looksRight(page, 'log-phone');
  });

  it('takes five presses: open, three deer, save', async () => {
    const { page } = member;
    await waiting(page).first().getByRole('link', { name: 'Write log' }).click();
    await page.locator('form[data-ready]').waitFor();
    expect(await page.getByLabel('From', { exact: true }).inputValue()).toMatch(/^\d\d:\d\d$/);
    const knob = await more(page, 'Does').boundingBox();
    expect(Math.min(knob?.width ?? 0, knob?.height ?? 0)).toBeGreaterThanOrEqual(44);
    await looksRight(page, 'log-form-phone');
    await more(page, 'Antlered bucks').click();
    await more(page, 'Does').click();
    await more(page, 'Does').click();
    const save = page.getByRole('button', { name: 'Save log' });
    // The button is in sight without scrolling.
    expect((await save.boundingBox())?.y ?? PHONE.height).toBeLessThan(PHONE.height - 40);
    await save.click();
    await page.waitForURL(new RegExp(`${CLUB}/log$`));
    await expect.poll(() => waiting(page).count()).toBe(left - 1);
    await page.getByRole('cell', { name: '1 buck, 2 does' }).first().waitFor();
  });

  it('says how long to wait after a hit, keeps what the log said before, and leads to the harvest sheet', async () => {
    const { page } = member;
    const row = page.getByRole('row').filter({ hasText: '1 buck, 2 does' }).first();
    await row.getByRole('link', { name: /log of/ }).click();
    await page.locator('form[data-ready]').waitFor();
    await more(page, 'From the seat').click();
    await page.getByLabel('Where they were bumped').fill('Behind the seat');
    await page.getByRole('radio', { name: 'Hit a deer' }).check();
    await page.getByRole('button', { name: 'Save log' }).click();
    await page.getByText('Give the time of the shot.').first().waitFor();
    expect(await page.getByLabel('Where they were bumped').inputValue()).toBe('Behind the seat');
    await page.getByLabel('Time of the shot').fill(await page.getByLabel('From', { exact: true }).inputValue());
    await page.getByRole('radio', { name: 'Not sure' }).check();
    await page.getByText(/Follow from .* at the earliest, better/).waitFor();
    await page.getByRole('radio', { name: 'Heart or lungs' }).check();
    await page.getByText(/^Follow from \d+:\d\d [AP]M$/).waitFor();
    await page.getByRole('radio', { name: 'Recovered' }).check();
    await looksRight(page, 'log-form-hit-phone');
    await page.getByRole('button', { name: 'Save log' }).click();
    await page.waitForURL(/\/season\/harvest\/new\?sit=/);
  });

  it('writes the sheet from the sit and says which quota is met', async () => {
    const { page } = member;
    await page.locator('form[data-ready]').waitFor();
    await page.getByRole('radio', { name: 'Antlered buck' }).check();
    await page.getByLabel('Dressed weight').fill('128');
    await page.getByLabel('Points, left').fill('4');
    await page.getByLabel('Points, right').fill('4');
    expect(await page.getByLabel('Stand', { exact: true }).inputValue()).toMatch(/^std_/);
    await looksRight(page, 'harvest-form-phone');
    await page.getByRole('button', { name: 'Save sheet' }).click();
    await page.waitForURL(/\/season\/harvest$/);
    await page
      .getByText(/Your limit of 1 antlered deer this season is met/)
      .first()
      .waitFor();
    await page.getByRole('cell', { name: '128 lb' }).first().waitFor();
    await looksRight(page, 'harvest-phone');
    await page.goto(`${CLUB}/sit`);
    await page
      .getByText(/Your limit of 1 antlered deer this season is met/)
      .first()
      .waitFor();
  });

  it('shows the sit among the season’s figures', async () => {
    const { page } = member;
    await page.goto(`${CLUB}/season/sightings`);
    await page.getByRole('heading', { name: 'By stand' }).waitFor();
    await page.getByText('Behind the seat').first().waitFor();
    await looksRight(page, 'sightings-phone');
  });
});

describe('the same at a desk, for an officer', () => {
  it('lists who has written a log', async () => {
    const { page } = officer;
    await page.goto(`${CLUB}/log`);
    await page.getByRole('region', { name: "The club's logs" }).getByText('Written').first().waitFor();
    await looksRight(page, 'log-desk');
  });

  it('writes down a visit and takes it out', async () => {
    const { page } = officer;
    await page.goto(`${CLUB}/log/visits/new`);
    await page.locator('form[data-ready]').waitFor();
    await page.getByLabel('What', { exact: true }).selectOption('work');
    await page.getByLabel('Where', { exact: true }).selectOption({ index: 1 });
    await page.getByLabel('Notes').fill('Felted the floor');
    await looksRight(page, 'visit-form-desk');
    await page.getByRole('button', { name: 'Save visit' }).click();
    await page.waitForURL(new RegExp(`${CLUB}/log$`));
    const row = page.getByRole('row').filter({ hasText: 'Felted the floor' });
    await row.getByRole('button', { name: /^Take out/ }).click();
    await page.getByRole('button', { name: 'Take it out' }).click();
    await expect.poll(() => row.count()).toBe(0);
  });

  it('shows tables, charts and files of the season, and the harvest', async () => {
    const { page } = officer;
    await page.goto(`${CLUB}/season/sightings`);
    await page.getByRole('img', { name: /Deer an hour by stand/ }).waitFor();
    await looksRight(page, 'sightings-desk');
    const file = await page.request.get(`/api${CLUB}/sightings?what=tables`);
    expect(file.headers()['content-type']).toContain('text/csv');
    expect(await file.text()).toContain('deer/h');
    await page.goto(`${CLUB}/season/harvest`);
    await page.getByRole('heading', { name: 'By sex and age' }).waitFor();
    await looksRight(page, 'harvest-desk');
    await page.goto(`${CLUB}/club/rules`);
    await page.getByRole('heading', { name: 'Harvest' }).waitFor();
  });

  it('met no trouble in any browser', () => {
    expect([...member.troubles, ...officer.troubles]).toEqual([]);
  });
});
