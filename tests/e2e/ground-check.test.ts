import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { allAxeFindings, DESKTOP, keepPicture, launchBrowser, newVisitor, PHONE } from '../helpers/browser';
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

async function isFine(page: Page, name: string): Promise<void> {
  const over = await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth);
  expect(over).toBeLessThanOrEqual(0);
  expect(await allAxeFindings(page)).toEqual([]);
  await keepPicture(page, name);
}

/** Drags the middle of something by so many pixels. */
async function drag(page: Page, locator: ReturnType<Page['locator']>, x: number, y: number): Promise<void> {
  await locator.scrollIntoViewIfNeeded();
  const box = await locator.boundingBox();
  if (!box) throw new Error('There is nothing to drag.');
  const [fromX, fromY] = [box.x + box.width / 2, box.y + box.height / 2];
  await page.mouse.move(fromX, fromY);
  await page.mouse.down();
  await page.mouse.move(fromX + x / 2, fromY + y / 2, { steps: 4 });
  await page.mouse.move(fromX + x, fromY + y, { steps: 4 });
  await page.mouse.up();
}

describe.each([
  ['desktop', DESKTOP],
  ['phone', PHONE],
] as const)('the ground looked over, on a %s', (size, viewport) => {
  async function visit(who: string) {
    const visitor = await newVisitor(browser, app.url, viewport);
    await signInDemo(visitor.page, who);
    return visitor;
  }

  it('lists findings by stand, a dozen or so, opened one by one and asked for by address', async () => {
    const { page, context, troubles } = await visit('abel');
    await page.goto(`${SEASON}/setup`);
    const rows = page.locator('ol > li');
    await rows.first().waitFor();
    const all = await rows.count();
    expect(all).toBeGreaterThan(4);
    expect(all).toBeLessThanOrEqual(16);
    expect(await page.getByText('What could be done').filter({ visible: true }).count()).toBe(0);
    await rows.first().locator('summary').click();
    await rows.first().getByText('What could be done').waitFor();
    await rows.first().getByText('Evidence: practice.').waitFor();
    await rows.first().getByText('State law and the landowner decide.').waitFor();
    await rows
      .first()
      .getByText(/Cutting and trimming: .*Source: Lease/)
      .waitFor();
    await isFine(page, `setup-open-${size}`);
    await page.getByLabel('What', { exact: true }).selectOption({ label: 'Seat in the sun' });
    await page.getByRole('button', { name: 'Show', exact: true }).click();
    await page.waitForURL(/what=seat_sun/);
    await expect.poll(() => rows.count()).toBeLessThan(all);
    expect(new Set(await rows.locator('summary').getByText('Seat in the sun').allTextContents()).size).toBe(1);
    expect(troubles).toEqual([]);
    await context.close();
  });

  it('lets a steward set a distance, sends a wrong one back to its field, and puts all back', async () => {
    const { page, context, troubles } = await visit('abel');
    await page.goto(`${SEASON}/setup`);
    await page.getByRole('link', { name: 'Distances and shares' }).click();
    const field = page.getByLabel(/Low sun in the eyes troubles from/);
    await page.locator('form[data-ready]').waitFor();
    await isFine(page, `setup-settings-${size}`);
    await field.fill('900');
    await page.getByRole('button', { name: 'Save' }).click();
    await page.getByText('type a number from 5 to 240 minutes').first().waitFor();
    await field.fill('240');
    // Leaving the field takes its error away, and with it the button's place.
    await field.press('Tab');
    await page.getByRole('button', { name: 'Save' }).click();
    await page.waitForURL(/season\/setup$/);
    await page.getByText('one distance or share is the club’s own').waitFor();
    expect(await page.locator('summary').getByText('Seat in the sun').count()).toBe(0);
    await page.goto(`${SEASON}/setup/settings`);
    await page.locator('form[data-ready]').waitFor();
    expect(await field.inputValue()).toBe('240');
    await page.getByRole('button', { name: 'All as they came' }).click();
    await page.getByRole('button', { name: 'Save' }).click();
    await page.waitForURL(/season\/setup$/);
    await page.getByText('at the distances that come with Windrest').waitFor();
    expect(troubles).toEqual([]);
    await context.close();
  });

  it('takes a rule for work from an admin, and shows it beside the findings', async () => {
    const { page, context, troubles } = await visit('nora');
    await page.goto('/clubs/tansy-fork/club/rules/edit#work');
    await page.locator('form[data-ready]').waitFor();
    const water = page.getByRole('group', { name: 'Water holes' });
    await water.getByLabel(/The rule/).fill(`No new holes on a ${size}.`);
    await water.getByLabel(/Source/).fill('Lease, paragraph 9');
    await water.getByLabel(/Stated on/).fill('');
    await page.getByRole('button', { name: 'Save the rules' }).click();
    await page.getByText('Choose the day on which it was stated.').first().waitFor();
    await water.getByLabel(/Stated on/).fill('2026-08-01');
    await page.getByRole('button', { name: 'Save the rules' }).click();
    await page.waitForURL(/club\/rules$/);
    await page.getByText(`No new holes on a ${size}.`).waitFor();
    await page.goto(`${SEASON}/setup?what=off_shot`);
    const seep = page.locator('ol > li').filter({ hasText: 'Bench Seep' });
    await seep.locator('summary').click();
    await seep.getByText(`Water holes: No new holes on a ${size}. Source: Lease, paragraph 9`).waitFor();
    expect(troubles).toEqual([]);
    await context.close();
  });

  it('draws the deer’s way on the map and turns it for the evening', async () => {
    const { page, context, troubles } = await visit('odalys');
    await page.goto(`${SEASON}/movement`);
    const arrows = page.locator('.m-leg-arrow');
    await arrows.first().waitFor({ state: 'attached' });
    const before = await arrows.first().getAttribute('transform');
    expect(await page.locator('.m-gap').count()).toBeGreaterThan(0);
    expect(await page.locator('.m-reach').count()).toBeGreaterThan(0);
    const numbers = await page.locator('.m-leg-number').allTextContents();
    expect(await page.locator('tbody th > span').allTextContents()).toEqual(numbers);
    await isFine(page, `movement-${size}`);
    await page.getByLabel(/In the evening/).check();
    await expect.poll(() => arrows.first().getAttribute('transform')).not.toBe(before);
    expect(troubles).toEqual([]);
    await context.close();
  });

  it('tries a stand by keys, by hand, by typing and on the map, and tells its gain at once', async () => {
    const { page, context, troubles } = await visit('odalys');
    await page.goto(`${SEASON}/coverage`);
    const said = page.getByRole('status').filter({ hasText: /trial|Give it a wind/ });
    await said.getByText('Give it a wind').waitFor();
    await page.getByRole('button', { name: 'Add an arc' }).click();
    await said.getByText(/The trial alone covers \d.* that no stand covers now/).waitFor();
    const typed = page.getByLabel('Its good winds');
    const first = await typed.inputValue();

    const end = page.getByRole('slider', { name: 'Arc 1, to' });
    const at = Number(await end.getAttribute('aria-valuenow'));
    await end.focus();
    await page.keyboard.press('ArrowRight');
    expect(Number(await end.getAttribute('aria-valuenow'))).toBe((at + 5) % 360);
    await expect.poll(() => typed.inputValue()).not.toBe(first);
    const turned = await typed.inputValue();
    await drag(page, end, 0, 60);
    await expect.poll(() => typed.inputValue()).not.toBe(turned);

    await typed.fill('100-120');
    await expect.poll(() => end.getAttribute('aria-valuenow')).toBe('120');
    expect(page.url()).toContain('trial=100-120');
    await page.getByRole('button', { name: 'Place it on the map' }).click();
    const map = page.locator('.leaflet-container');
    await map.waitFor();
    await map.click({ position: { x: 170, y: 150 } });
    await said.getByText('Where it stands, its seat would be').waitFor();
    const seat = page.getByRole('button', { name: /^Trial seat/ });
    const north = Number(await page.getByLabel(/Latitude/).inputValue());
    await drag(page, seat, 0, -40);
    await expect.poll(async () => Number(await page.getByLabel(/Latitude/).inputValue())).toBeGreaterThan(north);
    const dragged = Number(await page.getByLabel(/Latitude/).inputValue());
    await seat.focus();
    await page.keyboard.press('ArrowDown');
    await expect.poll(async () => Number(await page.getByLabel(/Latitude/).inputValue())).toBeLessThan(dragged);
    await drag(page, page.locator('.m-handle').first(), 30, 30);
    await expect.poll(() => typed.inputValue()).not.toBe('100-120');
    await isFine(page, `coverage-${size}`);

    const address = page.url();
    await expect.poll(() => said.locator('[aria-busy=true]').count()).toBe(0);
    const text = await said.textContent();
    await page.goto(address);
    await said.getByText('Where it stands').waitFor();
    expect(await said.textContent()).toBe(text);
    await page.getByRole('button', { name: 'Take it away' }).click();
    await said.getByText('Give it a wind').waitFor();
    expect(troubles).toEqual([]);
    await context.close();
  });
});
