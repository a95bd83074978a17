import { createServer, type Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { axeFindings, DESKTOP, keepPicture, launchBrowser, newVisitor, PHONE, type Visitor } from '../helpers/browser';
import { drawLine, drawPoint, type Ground, openGround, saveGround } from '../helpers/draw-ground';
import { type ServedApp, serveApp } from '../helpers/serve-app';
import { signIn } from '../helpers/sign-in';
import { makeAccount, startClub } from '../helpers/start-club';

const person = { name: 'Wilma Hask', email: 'wilma@example.org', password: 'a long walk by the creek' };

/** One grey pixel, the same for every tile. */
const TILE = Buffer.from(
  'iVBORw0KGgoAAAANSUhEUgAAAAEAAAABCAYAAAAfFcSJAAAADUlEQVR42mNkYPhfDwAChwGA60e6kgAAAABJRU5ErkJggg==',
  'base64',
);

let app: ServedApp;
let browser: Browser;
let tiles: Server;
let asked = 0;
let desktop: Visitor;
let phone: Visitor;

beforeAll(async () => {
  tiles = createServer((_, answer) => {
    asked += 1;
    answer.writeHead(200, { 'Content-Type': 'image/png' }).end(TILE);
  });
  await new Promise<void>((ready) => tiles.listen(0, '127.0.0.1', ready));
  const { port } = tiles.address() as AddressInfo;
  app = await serveApp({
    env: { IMAGERY_URL: `http://127.0.0.1:${port}/{z}/{x}/{y}.png`, IMAGERY_ATTRIBUTION: 'Made-up tiles' },
  });
  browser = await launchBrowser();
  desktop = await newVisitor(browser, app.url, DESKTOP);
  phone = await newVisitor(browser, app.url, PHONE);
});

afterAll(async () => {
  await browser?.close();
  await app?.stop();
  tiles?.close();
});

/** Everything a new steward does on the first evening. */
async function drawTheGround(visitor: Visitor, club: string, touch: boolean): Promise<Ground> {
  const ground = await openGround(visitor, club, touch);
  const { page } = ground;
  await page.getByText('Nothing is drawn yet.').waitFor();
  const round = await drawLine(ground, 'item:boundary', [
    [0.3, 0.12],
    [0.9, 0.2],
    [0.9, 0.9],
    [0.1, 0.9],
  ]);
  expect(round).toMatch(/acres, .* round/);
  await drawPoint(ground, 'parking', [0.2, 0.8], 'Creek Gate');
  await drawPoint(ground, 'stand:ladder', [0.5, 0.3], 'Beech Ladder');
  await page.getByLabel('Good winds', { exact: true }).fill('NW-N');
  await drawPoint(ground, 'stand:box_blind', [0.75, 0.5], 'Corner Box');
  await page.getByRole('button', { name: 'Set winds by hand on the map' }).click();
  expect(await page.getByLabel('Good winds', { exact: true }).inputValue()).toBe('270-0');
  await page.getByLabel('Add', { exact: true }).selectOption('stand:hang_on');
  await page.getByRole('button', { name: 'Where I stand' }).click();
  await page.getByText('You stand within 9 yd of the mark').waitFor();
  await page.getByRole('button', { name: 'Add the hang-on here' }).click();
  await ground.name.fill('Spring Hang-On');
  await page.getByLabel('Good winds', { exact: true }).fill('S-SW');
  const long = await drawLine(
    ground,
    'approach',
    [
      [0.2, 0.8],
      [0.3, 0.5],
      [0.5, 0.3],
    ],
    'Along the ditch',
  );
  expect(long).toMatch(/yd|mi/);
  await drawLine(
    ground,
    'approach',
    [
      [0.75, 0.5],
      [0.6, 0.75],
      [0.2, 0.8],
    ],
    'Field edge',
  );
  expect(await ground.list('Stands').count()).toBe(3);
  expect(await ground.list('Approaches').allTextContents()).toEqual([
    expect.stringMatching(/Along the ditch.*to Beech Ladder, from Creek Gate/),
    expect.stringMatching(/Field edge.*to Corner Box, from Creek Gate/),
  ]);
  return ground;
}

describe('a new steward draws the ground', () => {
  it('makes an account and two clubs', async () => {
    const { page } = desktop;
    await makeAccount(page, person);
    await startClub(page, 'Desk Hollow');
    await startClub(page, 'Thumb Hollow');
    for (const { context } of [desktop, phone]) {
      await context.grantPermissions(['geolocation']);
      await context.setGeolocation({ latitude: 41.2002, longitude: -77.3003, accuracy: 8 });
    }
  });

  it('with a mouse: three stands, two approaches, winds typed and turned by hand', async () => {
    const ground = await drawTheGround(desktop, 'desk-hollow', false);
    const { page } = ground;
    await ground.list('Stands').filter({ hasText: 'Corner Box' }).click();
    const handle = page.locator('.m-handle').first();
    const box = await handle.boundingBox();
    if (!box) throw new Error('No handle to drag.');
    const stand = await page.locator('.m-mark-stand.m-selected').boundingBox();
    if (!stand) throw new Error('No stand is chosen.');
    await page.mouse.move(box.x + box.width / 2, box.y + box.height / 2);
    await page.mouse.down();
    await page.mouse.move(stand.x + stand.width / 2, stand.y + stand.height / 2 + 60, { steps: 8 });
    await page.mouse.up();
    await expect.poll(() => page.getByLabel('Good winds', { exact: true }).inputValue()).toMatch(/^1(79|80|81)-0$/);
    await saveGround(ground);
    expect(await axeFindings(page)).toEqual([]);
    await keepPicture(page, 'map-desktop');
  });

  it('with a thumb: the same on a phone', async () => {
    const { page } = phone;
    await signIn(page, person.email, person.password);
    const ground = await drawTheGround(phone, 'thumb-hollow', true);
    await saveGround(ground);
    expect(await axeFindings(page)).toEqual([]);
    await keepPicture(page, 'map-phone');
    await page.goto('/clubs/thumb-hollow/stands');
    for (const name of ['Beech Ladder', 'Corner Box', 'Spring Hang-On'])
      await page.getByRole('link', { name }).first().waitFor();
  });

  it('takes steps back and forth, splits, moves, and keeps the drawing over a reload', async () => {
    const ground = await openGround(desktop, 'desk-hollow', false);
    const { page } = ground;
    await drawLine(
      ground,
      'item:wood',
      [
        [0.3, 0.3],
        [0.6, 0.3],
        [0.6, 0.6],
        [0.3, 0.6],
      ],
      'North Wood',
    );
    const size = () => page.locator('[data-size]').textContent();
    await page.getByRole('button', { name: 'Reshape or move' }).click();
    await page.getByRole('button', { name: 'Done' }).waitFor();
    await ground.map.evaluate((element) => element.scrollIntoView({ block: 'center' }));
    const before = await size();
    await ground.drag([0.6, 0.6], [0.7, 0.7]);
    await expect.poll(size).not.toBe(before);
    await page.getByRole('button', { name: 'Take out this corner' }).click();
    await page.getByRole('button', { name: 'Done' }).click();
    await page.getByRole('button', { name: 'Undo' }).click();
    await page.getByRole('button', { name: 'Undo' }).click();
    await ground.list('Land').filter({ hasText: 'North Wood' }).click();
    await page.getByRole('button', { name: 'Split' }).click();
    await ground.map.evaluate((element) => element.scrollIntoView({ block: 'center' }));
    await ground.tap(0.45, 0.2);
    await ground.tap(0.45, 0.7);
    await page.getByRole('button', { name: 'Finish' }).click();
    await expect.poll(() => ground.list('Land').filter({ hasText: 'North Wood' }).count()).toBe(2);
    await page.getByRole('button', { name: 'Undo' }).click();
    await expect.poll(() => ground.list('Land').filter({ hasText: 'North Wood' }).count()).toBe(1);
    await page.getByRole('button', { name: 'Redo' }).click();
    await expect.poll(() => ground.list('Land').filter({ hasText: 'North Wood' }).count()).toBe(2);
    await page.reload();
    await page.getByText('What you drew here before has been brought back.').waitFor();
    await expect.poll(() => ground.list('Land').filter({ hasText: 'North Wood' }).count()).toBe(2);
    await saveGround(ground);
    await ground.list('Land').filter({ hasText: 'Boundary' }).click();
    await page.getByRole('button', { name: 'Remove' }).click();
    expect(await ground.list('Land').filter({ hasText: 'Boundary' }).count()).toBe(0);
    await page.getByRole('button', { name: 'Undo' }).click();
    expect(await ground.list('Land').filter({ hasText: 'Boundary' }).count()).toBe(1);
  });

  it('does it all by keyboard and numbers: a place typed, a bearing between two named places', async () => {
    const ground = await openGround(desktop, 'desk-hollow', false);
    const { page } = ground;
    await page.getByLabel('Add', { exact: true }).selectOption('item:camera');
    await page.getByText('Or type where it is').press('Enter');
    await page.getByLabel('Place', { exact: true }).fill('41.2011, -77.3');
    await page.getByRole('button', { name: 'Add it there' }).press('Enter');
    await ground.name.fill('Ford camera');
    await saveGround(ground);
    await page.getByRole('button', { name: 'Measure' }).press('Enter');
    await page.getByLabel('From', { exact: true }).selectOption({ label: 'Spring Hang-On' });
    await page.getByLabel('To', { exact: true }).selectOption({ label: 'Ford camera' });
    // 0.0009 degrees of latitude and 0.0003 of longitude at 41.2 N: 100 m north, 25 m east.
    await page.getByText(/11[23] yd toward NNE, 14° true, 2[4-6]° by compass/).waitFor();
  });

  it('keeps both when two people change one stand', async () => {
    const here = await openGround(desktop, 'desk-hollow', false);
    const page = await desktop.context.newPage();
    const there = await openGround({ ...desktop, page }, 'desk-hollow', false);
    for (const [ground, name] of [
      [there, 'Beech Corner'],
      [here, 'Big Beech'],
    ] as const) {
      await ground.list('Stands').filter({ hasText: 'Beech' }).click();
      await ground.name.fill(name);
    }
    await saveGround(there);
    await here.page.getByRole('button', { name: 'Save one change' }).click();
    await here.page.getByText('Wilma Hask changed stand Beech Corner').waitFor();
    expect(await axeFindings(here.page)).toEqual([]);
    await keepPicture(here.page, 'map-conflict');
    await here.page.getByRole('button', { name: 'Go on and save' }).click();
    await here.page.getByText('One change is saved').first().waitFor();
    await expect
      .poll(() => here.list('Stands').filter({ hasText: 'Beech' }).allTextContents())
      .toEqual([expect.stringContaining('Beech Corner'), expect.stringContaining('Big Beech (drawn beside)')]);
    await page.close();
  });

  it('lays a moment over the map, hour by hour', async () => {
    const ground = await openGround(desktop, 'desk-hollow', false);
    const { page } = ground;
    await page.getByRole('tab', { name: 'For a moment' }).click();
    await page.getByLabel('Stand', { exact: true }).selectOption({ label: 'Corner Box' });
    await page.locator('.m-band').first().waitFor({ state: 'attached' });
    expect(await page.locator('.m-stretch').count()).toBeGreaterThan(3);
    const slider = page.getByRole('slider');
    const first = await slider.getAttribute('aria-valuetext');
    await slider.press('ArrowRight');
    await expect.poll(() => slider.getAttribute('aria-valuetext')).not.toBe(first);
    await page.getByText('to be winded in this half hour').waitFor();
    expect(await axeFindings(page)).toEqual([]);
    await keepPicture(page, 'map-moment');
  });
});

describe('what the map asks of the machine', () => {
  it('asks for photographs only when they are wanted, and says whose they are', async () => {
    const ground = await openGround(desktop, 'desk-hollow', false);
    expect(asked).toBe(0);
    await ground.page.getByLabel('Photographs from above').check();
    await expect.poll(() => asked).toBeGreaterThan(0);
    await ground.page.getByText('Made-up tiles').waitFor();
    expect([...desktop.troubles, ...phone.troubles]).toEqual([]);
  });

  it('keeps its code off the Sit page until a map is opened', async () => {
    const { page } = phone;
    const loaded: string[] = [];
    page.on('response', async (response) => {
      if (!response.url().includes('/_next/') || !response.url().endsWith('.js')) return;
      const body = await response.text().catch(() => '');
      if (body.includes('leaflet-container')) loaded.push(response.url());
    });
    await page.goto('/clubs/thumb-hollow/sit', { waitUntil: 'networkidle' });
    await page
      .getByRole('button', { name: /Beech Ladder/ })
      .first()
      .click();
    const open = page.getByRole('button', { name: 'Show the map of the walk' });
    await open.waitFor();
    expect(loaded).toEqual([]);
    await open.click();
    await page.getByRole('application', { name: 'Map of the way to Beech Ladder' }).waitFor();
    await expect.poll(() => loaded.length).toBeGreaterThan(0);
    await page.getByRole('figure').getByText('Along the ditch').waitFor();
    expect(await axeFindings(page)).toEqual([]);
    await keepPicture(page, 'sit-walk-map');
    expect(phone.troubles).toEqual([]);
  });
});
