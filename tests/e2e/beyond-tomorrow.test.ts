import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { axeFindings, DESKTOP, keepPicture, launchBrowser, newVisitor, PHONE } from '../helpers/browser';
import { type ServedApp, serveApp } from '../helpers/serve-app';
import { signInDemo } from '../helpers/sign-in';

let app: ServedApp;
let browser: Browser;

beforeAll(async () => {
  app = await serveApp({ seed: true });
  browser = await launchBrowser();
}, 180_000);

afterAll(async () => {
  await browser?.close();
  await app?.stop();
});

const SEASON = '/clubs/tansy-fork/season';

/** Presses the button of the dialog that is open. */
const confirm = (page: Page, name: string) =>
  page.getByRole('alertdialog').or(page.getByRole('dialog')).getByRole('button', { name, exact: true }).click();

async function isFine(page: Page, name: string): Promise<void> {
  const over = await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth);
  expect(over).toBeLessThanOrEqual(0);
  expect(await axeFindings(page)).toEqual([]);
  await keepPicture(page, name);
}

describe.each([
  ['desktop', DESKTOP],
  ['phone', PHONE],
] as const)('beyond the next sit, on a %s', (size, viewport) => {
  it('finds faults of the ground, leaves one and makes a chore of another; tries a stand; learns from the log', async () => {
    const { page, context, troubles } = await newVisitor(browser, app.url, viewport);
    await signInDemo(page, 'nora');

    await page.goto(`${SEASON}/setup`);
    const open = page.locator('ol > li');
    await open.first().waitFor();
    const count = await open.count();
    expect(count).toBeGreaterThan(4);
    await isFine(page, `setup-${size}`);
    await page.getByRole('button', { name: 'Show them on the map' }).click();
    await page.getByRole('figure').or(page.locator('.leaflet-container')).first().waitFor();
    await open.first().locator('summary').click();
    await page
      .getByRole('button', { name: /^Leave it/ })
      .first()
      .click();
    await confirm(page, 'Leave it');
    await page.getByText('Say why it can stay as it is.').first().waitFor();
    await page.getByLabel('Why it can stay').fill('It dries up by September.');
    await confirm(page, 'Leave it');
    await expect.poll(() => open.count(), { timeout: 20_000 }).toBe(count - 1);
    await page
      .getByText(/left it, .*: It dries up by September/)
      .first()
      .waitFor();
    await open.first().locator('summary').click();
    await page
      .getByRole('button', { name: /^Make a chore/ })
      .first()
      .click();
    await confirm(page, 'Make the chore');
    await expect.poll(() => open.count(), { timeout: 20_000 }).toBe(count - 2);

    await page.goto(`${SEASON}/coverage?trial=W-NW&window=morning`);
    await page.getByText('The trial alone covers').waitFor();
    await isFine(page, `coverage-${size}`);
    await page.getByRole('button', { name: 'Place it on the map' }).click();
    const map = page.locator('.leaflet-container');
    await map.waitFor();
    await map.click({ position: { x: 150, y: 150 } });
    await page.getByText('Where it stands, its seat would be').waitFor();
    expect(page.url()).toMatch(/lat=4\d\.\d+&lon=-7\d\.\d+/);

    await page.goto(`${SEASON}/movement`);
    await page.getByRole('heading', { name: 'Bench Trail' }).waitFor();
    await isFine(page, `movement-${size}`);

    await page.goto(`${SEASON}/learning`);
    await isFine(page, `learning-${size}`);
    await page
      .getByRole('button', { name: /^Apply/ })
      .first()
      .click();
    await confirm(page, 'Apply');
    await page.getByRole('heading', { name: 'Applied and undone' }).waitFor();
    await page.getByRole('button', { name: /^Undo/ }).first().click();
    await confirm(page, 'Undo it');
    await page
      .getByText(/Ended by Nora/)
      .first()
      .waitFor();
    expect(troubles).toEqual([]);
    await context.close();
  }, 120_000);
});
