import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { addDays, dayOf, formatDay } from '@/core/day-time';
import {
  allAxeFindings,
  DESKTOP,
  keepPicture,
  launchBrowser,
  newVisitor,
  PHONE,
  type Visitor,
} from '../helpers/browser';
import { type ServedApp, serveApp } from '../helpers/serve-app';
import { signInDemo } from '../helpers/sign-in';

const SIT = '/clubs/tansy-fork/sit';
/** A day further ahead than the next window, by the demo club's clock. */
const DAY = addDays(dayOf(Date.now(), 'America/New_York'), 9);
const AHEAD = formatDay(DAY);

let app: ServedApp;
let browser: Browser;
let desk: Visitor;
let phone: Visitor;

beforeAll(async () => {
  app = await serveApp({ seed: true });
  browser = await launchBrowser();
  desk = await newVisitor(browser, app.url, DESKTOP);
  phone = await newVisitor(browser, app.url, PHONE);
  await signInDemo(desk.page, 'nora');
  await signInDemo(phone.page, 'odalys');
});

afterAll(async () => {
  await browser?.close();
  await app?.stop();
});

/** The signed-in admin in a browser of other settings. */
async function likeDesk(options: Parameters<Browser['newContext']>[0]): Promise<Page> {
  const storageState = await desk.context.storageState();
  const context = await browser.newContext({ baseURL: app.url, viewport: DESKTOP, ...options, storageState });
  return context.newPage();
}

/** A window ahead in which the person may book, and the first stand they may; the page then shows it. */
async function freeStand(page: Page): Promise<{ address: string; stand: string }> {
  await page.goto(SIT);
  for (let step = 0; step < 12; step++) {
    const free = page.getByRole('button', { name: /^Book / });
    if (step > 1 && (await free.count()) > 0) {
      return { address: page.url(), stand: ((await free.first().textContent()) ?? '').replace(/^Book /, '') };
    }
    const next = await page.locator('a[rel="next"]').getAttribute('href');
    await page.goto(next ?? SIT);
  }
  throw new Error('No window of the demo has a stand to book.');
}

describe('the Sit screen', () => {
  it('has the ranked list in its first answer, and turns to another window, without any script', async () => {
    const page = await likeDesk({ javaScriptEnabled: false });
    await page.goto(`${SIT}?day=${DAY}&window=morning`);
    const known = page.getByRole('main').getByRole('heading', { level: 3 });
    expect(await known.count()).toBeGreaterThan(10);
    expect(await page.getByRole('heading', { level: 1 }).textContent()).toBe(`${AHEAD}, morning`);
    await page.getByLabel('Window', { exact: true }).selectOption('evening');
    await page.getByRole('button', { name: 'Show' }).click();
    await page.getByRole('heading', { level: 1, name: `${AHEAD}, evening` }).waitFor();
    await page.context().close();
  });

  it('sets two stands side by side', async () => {
    const { page } = desk;
    await page.goto(SIT);
    const first = page.locator('[data-row]').first();
    await first.click();
    const choice = page.getByLabel('Compare with');
    const other = await choice.locator('option').nth(1).textContent();
    await choice.selectOption({ index: 1 });
    const dialog = page.getByRole('dialog', { name: 'Side by side' });
    await dialog.getByRole('columnheader', { name: other ?? '' }).waitFor();
    for (const line of ['Sit score', 'Quiet', 'Way in', 'Speaks against it']) {
      expect(await dialog.getByRole('rowheader', { name: line, exact: true }).count(), line).toBe(1);
    }
    expect(await allAxeFindings(page)).toEqual([]);
    await keepPicture(page, 'compare');
    await page.keyboard.press('Escape');
    await dialog.waitFor({ state: 'hidden' });
  });

  it('shares a sit by a link that opens it for another member, and for nobody outside', async () => {
    const { page } = desk;
    await page.getByRole('button', { name: 'Share this sit' }).click();
    const link = await page.getByLabel('Link to this sit').inputValue();
    const stand = (await page.locator('[data-row][aria-expanded="true"]').textContent()) ?? '';
    await phone.page.goto(link);
    const open = phone.page.locator('[data-row][aria-expanded="true"]');
    await open.waitFor();
    expect((await open.textContent())?.replace(/^\d+\. /, '')).toBe(stand.replace(/^\d+\. /, ''));
    await phone.page.getByRole('heading', { name: 'Why this score' }).waitFor();
    await keepPicture(phone.page, 'shared-sit');
    const outside = await browser.newContext({ baseURL: app.url });
    const stranger = await outside.newPage();
    await stranger.goto(link);
    expect(new URL(stranger.url()).pathname).toBe('/sign-in');
    await outside.close();
  });

  it('remembers the weapon, and the way back to the window that was looked at', async () => {
    const { page } = desk;
    await page.goto(`${SIT}?day=${DAY}&window=morning`);
    await page.getByRole('heading', { level: 1, name: `${AHEAD}, morning` }).waitFor();
    await page.getByLabel('Weapon', { exact: true }).selectOption('bow');
    await page.waitForURL(/weapon=bow/);
    await page.goto(SIT);
    expect(await page.getByLabel('Weapon', { exact: true }).inputValue()).toBe('bow');
    await page.getByRole('link', { name: `Back to ${AHEAD}, morning` }).click();
    await page.waitForURL(new RegExp(`day=${DAY}`));
    await page.getByLabel('Weapon', { exact: true }).selectOption('');
    await page.waitForURL((url) => !url.search.includes('weapon'));
    await page.goto(SIT);
    expect(await page.getByLabel('Weapon', { exact: true }).inputValue()).toBe('');
  });

  it('shows what has changed when it is come back to, and says when it cannot look', async () => {
    const { address, stand } = await freeStand(phone.page);
    const page = await likeDesk({});
    await page.clock.install();
    await page.goto(address);
    const row = page.locator('[data-row]').filter({ hasText: stand });
    await row.waitFor();
    const comeBack = async () => {
      await page.clock.fastForward('01:00');
      await page.evaluate(() => document.dispatchEvent(new Event('visibilitychange')));
    };
    const old = page.getByText('This list may be old');
    await page.context().setOffline(true);
    // Again and again, since nothing tells from outside when the page's script has come.
    const tried = async () => {
      await comeBack();
      return old.count();
    };
    await expect.poll(tried, { timeout: 30_000, interval: 500 }).toBe(1);
    await page.context().setOffline(false);
    await page.getByRole('button', { name: 'Try again' }).click();
    await old.waitFor({ state: 'detached' });
    expect(await row.count()).toBe(1);
    await phone.page.getByRole('button', { name: `Book ${stand}`, exact: true }).click();
    await phone.page.getByRole('dialog').getByRole('button', { name: 'Book this sit' }).click();
    await phone.page.getByText('Sit booked').first().waitFor();
    await comeBack();
    await row.waitFor({ state: 'detached' });
    await page.getByRole('region', { name: 'Not open' }).getByText(stand, { exact: true }).waitFor();
    await page.context().close();
  });

  it('names the zone to a reader whose clock differs, and to no other', async () => {
    const note = 'Times are by the club';
    const far = await likeDesk({ timezoneId: 'Europe/Berlin' });
    await far.goto(SIT);
    await far.getByText(note).waitFor();
    await far.context().close();
    const near = await likeDesk({ timezoneId: 'America/New_York' });
    await near.goto(SIT);
    await near.locator('html[data-light="day"], html[data-light="dark"]').waitFor();
    expect(await near.getByText(note).count()).toBe(0);
    await near.context().close();
  });
});

describe('the Week screen', () => {
  it('prints whole, on sheets laid on their side', async () => {
    const { page } = desk;
    await page.setViewportSize({ width: 1056, height: 816 });
    await page.goto('/clubs/tansy-fork/week');
    await page.emulateMedia({ media: 'print' });
    const widths = await page.evaluate(() => [
      document.documentElement.scrollWidth,
      document.querySelector('.week-table')?.scrollWidth ?? 0,
    ]);
    expect(Math.max(...widths)).toBeLessThanOrEqual(1056);
    await keepPicture(page, 'week-print');
    const pdf = (await page.pdf({ preferCSSPageSize: true })).toString('latin1');
    const sheets = [...pdf.matchAll(/\/MediaBox\s*\[0 0 ([\d.]+) ([\d.]+)\]/g)];
    expect(sheets.some(([, width, height]) => Number(width) > Number(height))).toBe(true);
    await page.emulateMedia({ media: 'screen' });
    await page.setViewportSize(DESKTOP);
  });
});

it('leaves no trouble in any console and asks nothing of the outside', () => {
  expect([...desk.troubles, ...phone.troubles]).toEqual([]);
});
