import { eq } from 'drizzle-orm';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { closeDatabase, reader, useDatabase, write } from '@/db/client';
import { outings, stands, visits } from '@/db/schema';
import { axeFindings, DESKTOP, keepPicture, launchBrowser, newVisitor, PHONE, type Visitor } from '../helpers/browser';
import { DAY_PASSWORD, DAY_PEOPLE, DAY_SLUG, makeDayClub } from '../helpers/day-club';
import { type ServedApp, serveApp } from '../helpers/serve-app';
import { signIn } from '../helpers/sign-in';

const CLUB = `/clubs/${DAY_SLUG}`;

let app: ServedApp;
let browser: Browser;
let member: Visitor;
let officer: Visitor;

/** Addresses of the pages kept in this browser. */
const keptPages = (page: Page) =>
  page.evaluate(async () => {
    const names = (await caches.keys()).filter((name) => name.startsWith('windrest-pages-'));
    const lists = await Promise.all(names.map(async (name) => (await caches.open(name)).keys()));
    return lists.flat().map((request) => new URL(request.url).pathname);
  });

/** Waits until the worker has kept ahead all that is read in the woods: the pages of stands come last. */
async function kept(page: Page): Promise<void> {
  await page.waitForFunction(() => navigator.serviceWorker.controller !== null);
  await expect
    .poll(async () => (await keptPages(page)).filter((path) => path.includes('/stands/std_')).length, {
      timeout: 120_000,
      interval: 500,
    })
    .toBe(2);
}

const row = (page: Page, name: string) => page.getByRole('row').filter({ hasText: name });
const dialog = (page: Page) => page.getByRole('dialog');
const noSignal = (page: Page) =>
  page.getByText(/^No signal, as of \w+ \d+ \w+, 9:\d\d AM$/).and(page.locator(':visible'));
const waiting = (page: Page) => page.getByText('Waiting to be sent');

beforeAll(async () => {
  app = await serveApp();
  await useDatabase(app.databaseUrl);
  await makeDayClub(Date.now());
  browser = await launchBrowser();
  member = await newVisitor(browser, app.url, PHONE);
  officer = await newVisitor(browser, app.url, DESKTOP);
  await signIn(member.page, DAY_PEOPLE.member.email, DAY_PASSWORD);
  await signIn(officer.page, DAY_PEOPLE.officer.email, DAY_PASSWORD);
});

afterAll(async () => {
  await browser?.close();
  await closeDatabase();
  await app?.stop();
});

describe('a day with no signal in the woods', () => {
  it('books at home, and keeps the pages on the phone', async () => {
    const { page } = member;
    await page.goto(`${CLUB}/sit?window=morning`);
    await page.getByRole('button', { name: 'Book Oak Ladder' }).click();
    await dialog(page).getByRole('button', { name: 'Book this sit' }).click();
    await page.getByText('Sit booked').first().waitFor();
    await kept(page);
    // Looked at once more after booking, as one does.
    for (const path of ['board', 'my-sits', 'sit']) await page.goto(`${CLUB}/${path}`);
    expect(await keptPages(page)).toEqual(
      expect.arrayContaining(
        ['sit', 'board', 'my-sits', 'stands', 'log', 'log/visits/new', 'board/gate-sheet'].map(
          (path) => `${CLUB}/${path}`,
        ),
      ),
    );
  });

  it('reads list, sits, board, gate sheet and stands without signal, each with its time', async () => {
    const { context, page } = member;
    await context.setOffline(true);
    await page.goto('/');
    await page.waitForURL(`**${CLUB}/sit`);
    await page.getByText('Oak Ladder').first().waitFor();
    await noSignal(page).waitFor();
    expect(await axeFindings(page)).toEqual([]);
    await keepPicture(page, 'offline-sit');
    await page
      .getByRole('button', { name: /Oak Ladder/ })
      .first()
      .click();
    await page.getByRole('heading', { name: 'Why this score' }).waitFor();
    await page.getByRole('heading', { name: 'Way in' }).waitFor();
    expect(await axeFindings(page)).toEqual([]);
    await keepPicture(page, 'offline-opened');
    await page.goto(`${CLUB}/my-sits`);
    await page.getByText('Oak Ladder').first().waitFor();
    await page.goto(`${CLUB}/board/gate-sheet`);
    await page.getByText('Oak Ladder').first().waitFor();
    await page.goto(`${CLUB}/stands`);
    await page.getByRole('link', { name: 'Elm Box' }).first().click();
    await page.getByRole('heading', { name: 'Elm Box' }).waitFor();
    await noSignal(page).waitFor();
    await page.goto(`${CLUB}/club/members`);
    await page.getByRole('heading', { name: 'No signal' }).waitFor();
    await page.getByRole('link', { name: 'Board' }).click();
    await row(page, 'Oak Ladder').waitFor();
  });

  it('keeps signing in and out until there is a signal, over a closed page too', async () => {
    const { page } = member;
    await row(page, 'Oak Ladder').getByRole('button', { name: 'Sign in' }).click();
    await dialog(page).locator('form[data-ready]').waitFor();
    await dialog(page).getByRole('button', { name: 'Sign in' }).click();
    await waiting(page).waitFor();
    await row(page, 'Oak Ladder').getByText('Signed in here, not sent yet').waitFor();
    expect(await axeFindings(page)).toEqual([]);
    await keepPicture(page, 'offline-waiting');
    await page.reload();
    await waiting(page).waitFor();
    await row(page, 'Oak Ladder').getByRole('button', { name: 'Sign out' }).click();
    await page.getByRole('alertdialog').getByRole('button', { name: 'Sign out' }).click();
    await page.getByText('Sign out from Oak Ladder', { exact: true }).waitFor();
    await row(page, 'Oak Ladder').getByText('Signed out here, not sent yet').waitFor();
    await officer.page.goto(`${CLUB}/board`);
    await row(officer.page, 'Oak Ladder').getByText('Late: not signed in').waitFor();
  });

  it('writes down a visit to a stand that is taken away meanwhile', async () => {
    const { page } = member;
    await page.goto(`${CLUB}/log/visits/new`);
    await page.locator('form[data-ready]').waitFor();
    await page.getByLabel('Where', { exact: true }).selectOption({ label: 'Elm Box' });
    await page.getByRole('button', { name: 'Save visit' }).click();
    await page.waitForURL(`**${CLUB}/log`);
    await page.getByText(/^Camera check, /).waitFor();
    await write((tx) => tx.update(stands).set({ removedAt: Date.now() }).where(eq(stands.name, 'Elm Box')));
  });

  it('sends all once when the signal is back, and says in plain words what was not taken', async () => {
    const { context, page } = member;
    await context.setOffline(false);
    await waiting(page).waitFor({ state: 'detached' });
    await page.getByText('Sent, and not taken').waitFor();
    await page.getByText('This place is no longer there. Choose another.').waitFor();
    await keepPicture(page, 'offline-refused');
    await page.getByRole('button', { name: /^Take off this list/ }).click();
    await page.getByText('Sent, and not taken').waitFor({ state: 'detached' });
    const rows = await reader().select().from(outings);
    expect(rows).toHaveLength(1);
    expect(rows[0]?.signedOutAt).toBeGreaterThan(rows[0]?.signedInAt ?? Number.POSITIVE_INFINITY);
    expect(await reader().select().from(visits)).toEqual([]);
    await page.goto(`${CLUB}/board`);
    await row(page, 'Oak Ladder')
      .getByText(/^Out, 9:\d\d AM$/)
      .waitFor();
    expect(await page.getByText(/as of .* 9:\d\d AM/).count()).toBe(0);
  });

  it('leaves nothing on the phone after signing out', async () => {
    const { context, page } = member;
    expect((await keptPages(page)).length).toBeGreaterThan(0);
    await page.goto('/account');
    await page.getByRole('button', { name: 'Sign out', exact: true }).click();
    await page.waitForURL('**/sign-in');
    await page.locator('form[data-ready]').waitFor();
    expect(await keptPages(page)).toEqual([]);
    expect(await page.evaluate(() => sessionStorage.length)).toBe(0);
    await context.setOffline(true);
    await page.goto(`${CLUB}/board`);
    await page.getByRole('heading', { name: 'No signal' }).waitFor();
    expect(await page.content()).not.toMatch(/Ann Roe|Oak Ladder/);
  });
});
