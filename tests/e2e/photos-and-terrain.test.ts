import type { Browser } from 'playwright-core';
import sharp from 'sharp';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { axeFindings, DESKTOP, keepPicture, launchBrowser, newVisitor, PHONE } from '../helpers/browser';
import { type ServedApp, serveApp } from '../helpers/serve-app';
import { signInDemo } from '../helpers/sign-in';

let app: ServedApp;
let browser: Browser;

beforeAll(async () => {
  app = await serveApp({ seed: true });
  browser = await launchBrowser();
});

afterAll(async () => {
  await browser?.close();
  await app?.stop();
});

async function photo(name: string, background: string) {
  const buffer = await sharp({ create: { width: 1200, height: 900, channels: 3, background } })
    .jpeg()
    .toBuffer();
  return { name, mimeType: 'image/jpeg', buffer };
}

it.each([
  ['phone', PHONE, 0],
  ['desktop', DESKTOP, 1],
] as const)(
  'a steward at %s size adds photos, and takes slope and drain off the terrain',
  async (size, viewport, nth) => {
    const { page, troubles, context } = await newVisitor(browser, app.url, viewport);
    await signInDemo(page, 'abel');
    await page.goto('/clubs/tansy-fork/stands');
    await page.locator('a[href^="/clubs/tansy-fork/stands/std_"]').nth(nth).click();
    await page.getByRole('heading', { name: 'Photos' }).waitFor();
    await page
      .getByLabel('Add photos')
      .setInputFiles([
        await photo('one.jpg', '#446633'),
        { name: 'not-one.jpg', mimeType: 'image/jpeg', buffer: Buffer.from('<html>') },
        await photo('two.jpg', '#664433'),
      ]);
    await page.getByRole('button', { name: 'Send' }).click();
    await page.getByText('2 photos are added').first().waitFor();
    await page.getByText('not-one.jpg: This is no photo that can be read').waitFor();
    // The browser itself reports the one that was refused.
    expect(troubles.splice(0).filter((text) => !text.includes('400'))).toEqual([]);
    const thumbs = page.getByRole('button', { name: /^Open Photo \d by/ });
    await expect.poll(() => thumbs.count()).toBe(2);
    expect(await axeFindings(page)).toEqual([]);
    await keepPicture(page, `photos-${size}`);
    await thumbs.first().click();
    await page.getByLabel('What it shows').fill('The way up');
    await page.getByRole('button', { name: 'Save' }).click();
    await page.getByRole('dialog', { name: 'The way up' }).waitFor();
    await keepPicture(page, `photo-open-${size}`);
    await page.getByRole('button', { name: 'Remove', exact: true }).click();
    await page.getByRole('button', { name: 'Remove the photo' }).click();
    await expect.poll(() => page.getByRole('button', { name: /^Open / }).count()).toBe(1);

    await page.getByRole('link', { name: 'Edit', exact: true }).click();
    await page.getByRole('button', { name: 'Read slope and drain off the terrain' }).click();
    await page.getByText('made-up hills').waitFor();
    expect(await axeFindings(page)).toEqual([]);
    await keepPicture(page, `slope-${size}`);
    await page.getByRole('button', { name: 'Take these' }).click();
    expect(await page.getByRole('textbox', { name: /^Slope/ }).inputValue()).toMatch(/^\d+$/);

    await page.goto('/clubs/tansy-fork/ground');
    await page.getByLabel('Contours').check();
    await page.getByText(/A contour every \d+ ft/).waitFor();
    await page.locator('.m-contour').first().waitFor({ state: 'attached' });
    await keepPicture(page, `contours-${size}`);
    expect(troubles).toEqual([]);
    await context.close();
  },
);
