import { eq } from 'drizzle-orm';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { closeDatabase, useDatabase as openDatabase, write } from '@/db/client';
import { clubs, stands } from '@/db/schema';
import { newId } from '@/lib/ids';
import { DESKTOP, launchBrowser, newVisitor, type Visitor } from '../helpers/browser';
import { DAY_PASSWORD, DAY_PEOPLE, DAY_SLUG, makeDayClub } from '../helpers/day-club';
import { type ServedApp, serveApp } from '../helpers/serve-app';
import { signIn } from '../helpers/sign-in';

/** The club of the test has two of its own. */
const MORE = 138;
const ALL = MORE + 2;
const WEEK = `/clubs/${DAY_SLUG}/week`;

let app: ServedApp;
let browser: Browser;
let visitor: Visitor;

async function addStands(): Promise<void> {
  await write(async (tx) => {
    const [club] = await tx.select().from(clubs).where(eq(clubs.slug, DAY_SLUG));
    const [like] = await tx.select().from(stands).limit(1);
    if (!club || !like) throw new Error('The club of the test is not there.');
    for (let n = 1; n <= MORE; n++) {
      const at = { lat: club.lat + 0.0005 * n, lon: club.lon - 0.0005 * (n % 12) };
      await tx
        .insert(stands)
        .values({ ...like, ...at, id: newId('stand'), name: `Seat ${String(n).padStart(3, '0')}` });
    }
  });
}

const rows = (page: Page) => page.locator('.week-table tbody tr');

beforeAll(async () => {
  app = await serveApp();
  await openDatabase(app.databaseUrl);
  await makeDayClub(Date.now());
  await addStands();
  browser = await launchBrowser();
  visitor = await newVisitor(browser, app.url, DESKTOP);
  await signIn(visitor.page, DAY_PEOPLE.officer.email, DAY_PASSWORD);
});

afterAll(async () => {
  await browser?.close();
  await closeDatabase();
  await app?.stop();
});

it('draws the stands of a big club a part at a time as they are scrolled to', async () => {
  const { page } = visitor;
  await page.goto(WEEK);
  const first = await rows(page).count();
  expect(first).toBeGreaterThan(20);
  expect(first).toBeLessThan(ALL);
  await rows(page).last().scrollIntoViewIfNeeded();
  await expect.poll(() => rows(page).count()).toBeGreaterThan(first);
});

it('says how many there are before all are drawn, and draws them at a press of the keyboard', async () => {
  const { page } = visitor;
  await page.goto(WEEK);
  const table = page.getByRole('table');
  // Two rows of headings stand over them.
  expect(await table.getAttribute('aria-rowcount')).toBe(String(ALL + 2));
  const all = page.getByRole('button', { name: `Show all ${ALL} stands` });
  await all.focus();
  await page.keyboard.press('Enter');
  await expect.poll(() => rows(page).count()).toBe(ALL);
  expect(await all.count()).toBe(0);
  expect(await table.getByRole('rowheader', { name: `Seat ${MORE}` }).count()).toBe(1);
});

it('is whole for the printer at once', async () => {
  const { page } = visitor;
  await page.goto(WEEK);
  await page.getByRole('combobox', { name: 'Show' }).selectOption('open');
  await page.getByRole('combobox', { name: 'Show' }).selectOption('all');
  expect(await rows(page).count()).toBeLessThan(ALL);
  const printed = await page.evaluate(() => {
    window.dispatchEvent(new Event('beforeprint'));
    return document.querySelectorAll('.week-table tbody tr').length;
  });
  expect(printed).toBe(ALL);
});

it('leaves no trouble in the console', () => {
  expect(visitor.troubles).toEqual([]);
});
