import type { Browser, Locator, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { keepPicture, launchBrowser, newVisitor, PHONE, type Visitor } from '../helpers/browser';
import { type ServedApp, serveApp } from '../helpers/serve-app';
import { signInDemo } from '../helpers/sign-in';

/** WCAG 2.5.5: a target that a thumb in a glove can hit, in CSS pixels. */
const THUMB = 44;

let app: ServedApp;
let browser: Browser;
let visitor: Visitor;

beforeAll(async () => {
  app = await serveApp({ seed: true });
  browser = await launchBrowser();
  visitor = await newVisitor(browser, app.url, PHONE);
  await signInDemo(visitor.page, 'ione');
});

afterAll(async () => {
  await browser?.close();
  await app?.stop();
});

/** Taps what is wanted, once it is large enough for a thumb. */
async function thumb(target: Locator): Promise<void> {
  await target.scrollIntoViewIfNeeded();
  const box = await target.boundingBox();
  expect(Math.round(box?.height ?? 0), await target.textContent().then(String)).toBeGreaterThanOrEqual(THUMB);
  await target.tap();
}

/** From window to window by the links at the head, until a stand is free to book. */
async function openFreeWindow(page: Page): Promise<void> {
  await page.goto('/clubs/tansy-fork/sit');
  for (let step = 0; step < 12; step++) {
    if (step > 3 && (await page.getByRole('button', { name: /^Book / }).count()) > 0) return;
    const before = page.url();
    await thumb(page.getByRole('navigation', { name: 'Windows' }).locator('a[rel=next]'));
    await page.waitForURL((url) => url.href !== before);
    await page.getByRole('heading', { level: 1 }).waitFor();
  }
  throw new Error('No window of the demo has a stand to book.');
}

describe('the main job by touch alone', () => {
  it('opens a row, books the stand and cancels the sit', async () => {
    const { page } = visitor;
    await openFreeWindow(page);
    await thumb(page.locator('li:has([data-row])').first());
    await page.getByRole('heading', { name: 'Why this score' }).first().waitFor();
    await keepPicture(page, 'touch-open-row');

    const book = page.getByRole('button', { name: /^Book / }).first();
    const name = (await book.textContent())?.replace(/^Book /, '') ?? '';
    await thumb(book);
    const dialog = page.getByRole('dialog', { name: `Book ${name}` });
    await dialog.locator('form[data-ready]').waitFor();
    await keepPicture(page, 'touch-book');
    await thumb(dialog.getByRole('button', { name: 'Book this sit' }));
    await dialog.waitFor({ state: 'hidden' });
    await page.getByText(`You sit at ${name}`).waitFor();

    await thumb(page.getByRole('link', { name: 'Change or cancel it' }));
    await page.waitForURL(/\/my-sits$/);
    const cancels = page.getByRole('button', { name: new RegExp(`^Cancel ${name}, `) });
    await cancels.first().waitFor();
    const held = await cancels.count();
    await thumb(cancels.first());
    const sure = page.getByRole('dialog', { name: 'Cancel this sit' });
    await thumb(sure.getByRole('button', { name: 'Cancel the sit' }));
    await sure.waitFor({ state: 'hidden' });
    await cancels.nth(held - 1).waitFor({ state: 'detached' });
    expect(visitor.troubles).toEqual([]);
  });

  it('goes from screen to screen by the bar at the bottom', async () => {
    const { page } = visitor;
    for (const [place, heading] of [
      ['Week', 'Week'],
      ['Board', 'Board'],
      ['Log', 'Log'],
    ]) {
      await thumb(page.getByRole('link', { name: place, exact: true }).last());
      await page.getByRole('heading', { level: 1, name: heading }).waitFor();
    }
  });
});
