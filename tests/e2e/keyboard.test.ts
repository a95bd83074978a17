import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { DESKTOP, keepPicture, launchBrowser, newVisitor, type Visitor } from '../helpers/browser';
import { type ServedApp, serveApp } from '../helpers/serve-app';
import { signInDemo } from '../helpers/sign-in';

let app: ServedApp;
let browser: Browser;
let visitor: Visitor;

beforeAll(async () => {
  app = await serveApp({ seed: true });
  browser = await launchBrowser();
  visitor = await newVisitor(browser, app.url, DESKTOP);
  await signInDemo(visitor.page, 'rufus');
});

afterAll(async () => {
  await browser?.close();
  await app?.stop();
});

/** What has the focus, as a screen reader would name it. */
function focused(page: Page): Promise<string> {
  return page.evaluate(() => {
    const one = document.activeElement;
    if (!(one instanceof HTMLElement)) return '';
    const label = one instanceof HTMLInputElement ? (one.labels?.[0]?.textContent ?? '') : '';
    return (one.getAttribute('aria-label') ?? (label || one.textContent) ?? '').replace(/\s+/g, ' ').trim();
  });
}

/** Presses Tab until the focus stands on what is wanted, at most so many times. */
async function tabTo(page: Page, wanted: RegExp, most = 80): Promise<void> {
  for (let presses = 0; presses < most; presses++) {
    if (wanted.test(await focused(page))) return;
    await page.keyboard.press('Tab');
  }
  throw new Error(`Tab never came to ${wanted}; it stands on "${await focused(page)}"`);
}

/** The Sit screen of a window ten days ahead, which nobody of the demo has booked full. */
async function openFarWindow(page: Page): Promise<void> {
  await page.goto('/clubs/tansy-fork/sit');
  for (let step = 0; step < 12; step++) {
    const free = page.getByRole('button', { name: /^Book / });
    if (step > 3 && (await free.count()) > 0) return;
    const before = page.url();
    await page.getByRole('main').press(']');
    await page.waitForURL((url) => url.href !== before);
    await page.getByRole('heading', { level: 1 }).waitFor();
  }
  throw new Error('No window of the demo has a stand to book.');
}

describe('the main job by keyboard alone', () => {
  it('skips to the page by the first stop of Tab', async () => {
    const { page } = visitor;
    await page.goto('/clubs/tansy-fork/sit');
    await page.keyboard.press('Tab');
    expect(await focused(page)).toBe('Skip to the page');
    await page.keyboard.press('Enter');
    await page.waitForFunction(() => document.activeElement?.id === 'main');
  });

  it('lists its keys at ?, and goes places by them', async () => {
    const { page } = visitor;
    await page.keyboard.press('?');
    const keys = page.getByRole('dialog', { name: 'Keys' });
    await keys.waitFor();
    expect(await keys.getByText('Go to Board').count()).toBe(1);
    await keepPicture(page, 'keys');
    await page.keyboard.press('Escape');
    await keys.waitFor({ state: 'hidden' });
    await page.keyboard.press('g');
    await page.keyboard.press('b');
    await page.waitForURL(/\/board$/);
  });

  it('leaves the keys alone where somebody types, and where they are turned off', async () => {
    const { page } = visitor;
    await page.goto('/clubs/tansy-fork/stands');
    const find = page.getByLabel(/Find a stand/);
    await find.focus();
    await page.keyboard.type('gb?');
    expect(await find.inputValue()).toBe('gb?');
    expect(page.url()).toMatch(/\/stands$/);
    await page.getByRole('button', { name: 'Keys' }).click();
    await page.getByRole('checkbox', { name: 'Use these keys' }).uncheck();
    await page.keyboard.press('Escape');
    await page.getByRole('dialog').waitFor({ state: 'hidden' });
    await page.locator('body').press('?');
    await page.getByRole('button', { name: 'Keys' }).press('Enter');
    const box = page.getByRole('checkbox', { name: 'Use these keys' });
    expect(await page.getByRole('dialog').count()).toBe(1);
    await box.check();
    await page.keyboard.press('Escape');
  });

  it('opens a row, books the stand and cancels the sit', async () => {
    const { page } = visitor;
    await openFarWindow(page);
    await page.keyboard.press('j');
    const row = page.locator('[data-row]').first();
    const name =
      (await row.textContent())
        ?.replace(/^\d+\. /, '')
        .replace(/[▴▾]/g, '')
        .trim() ?? '';
    expect(await focused(page)).toContain(name);
    await page.keyboard.press('Enter');
    expect(await row.getAttribute('aria-expanded')).toBe('true');
    await page.getByRole('heading', { name: 'Why this score' }).first().waitFor();
    await keepPicture(page, 'keyboard-open-row');
    await page.keyboard.press('Enter');
    expect(await row.getAttribute('aria-expanded')).toBe('false');

    await tabTo(page, new RegExp(`^Book ${name}`), 5);
    await page.keyboard.press('Enter');
    const dialog = page.getByRole('dialog', { name: `Book ${name}` });
    await dialog.waitFor();
    await dialog.locator('form[data-ready]').waitFor();
    await tabTo(page, /^Book this sit$/, 40);
    await page.keyboard.press('Enter');
    await dialog.waitFor({ state: 'hidden' });
    await page.getByText(`You sit at ${name}`).waitFor();

    await tabTo(page, /^Change or cancel it$/);
    await page.keyboard.press('Enter');
    await page.waitForURL(/\/my-sits$/);
    await page.getByRole('heading', { level: 1, name: 'My sits' }).waitFor();
    const cancels = page.getByRole('button', { name: new RegExp(`^Cancel ${name}, `) });
    const held = await cancels.count();
    await tabTo(page, new RegExp(`^Cancel ${name}, `));
    await page.keyboard.press('Enter');
    const sure = page.getByRole('dialog', { name: 'Cancel this sit' });
    await sure.waitFor();
    await tabTo(page, /^Cancel the sit$/, 12);
    await page.keyboard.press('Enter');
    await sure.waitFor({ state: 'hidden' });
    await cancels.nth(held - 1).waitFor({ state: 'detached' });
    expect(await cancels.count()).toBe(held - 1);
    expect(visitor.troubles).toEqual([]);
  });
});
