import { and, eq, isNotNull } from 'drizzle-orm';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { addDays, dayOf, formatDay } from '@/core/day-time';
import { closeDatabase, reader, useDatabase, write } from '@/db/client';
import { drawResults, drawRuns, draws, memberships, sits, stands, users } from '@/db/schema';
import { bookSit } from '@/features/bookings/book-sit';
import { newRequestKey } from '@/lib/request-key';
import { findScope } from '@/server/scope';
import { DESKTOP, keepPicture, launchBrowser, newVisitor, PHONE, type Visitor } from '../helpers/browser';
import { DRAW_PASSWORD, DRAW_PEOPLE, DRAW_SLUG, type DrawPerson, makeDrawClub } from '../helpers/draw-club';
import { lookAtPage } from '../helpers/look-at-page';
import { type ServedApp, serveApp } from '../helpers/serve-app';
import { signIn } from '../helpers/sign-in';

const CLUB = `/clubs/${DRAW_SLUG}`;
const ZONE = 'America/New_York';
const TODAY = dayOf(Date.now(), ZONE);
const [FIRST, SECOND] = [addDays(TODAY, 5), addDays(TODAY, 6)];

let app: ServedApp;
let browser: Browser;
const who = {} as Record<DrawPerson, Visitor>;
let drawUrl = '';
let drawId = '';

/** Looks in every light and width, then puts the window back as it was. */
async function looksRight({ page }: Visitor, name: string, size = PHONE): Promise<void> {
  expect(await lookAtPage(page, size === PHONE), name).toEqual([]);
  await page.setViewportSize(size);
  for (const light of ['day', 'dark', 'dim']) {
    await page.evaluate((of) => {
      document.documentElement.dataset.light = of;
    }, light);
    await keepPicture(page, `${name}-${size.width}-${light}`);
  }
  await page.evaluate(() => {
    document.documentElement.dataset.light = 'day';
  });
}

const openDraw = async ({ page }: Visitor) => {
  await page.goto(drawUrl);
  await page.getByRole('heading', { level: 1 }).waitFor();
};

async function press(page: Page, name: string | RegExp, confirm: string): Promise<void> {
  await page.getByRole('button', { name }).first().click();
  await page.getByRole('alertdialog').getByRole('button', { name: confirm }).click();
}

const moveClosing = (closesAt: number) => write((tx) => tx.update(draws).set({ closesAt }).where(eq(draws.id, drawId)));

const runsMade = async () => (await reader().select().from(drawRuns).where(eq(drawRuns.outcome, 'made'))).length;

/** The page shows the end of the work by itself. */
async function makeDraw(label: 'Make the draw' | 'Make it again'): Promise<void> {
  const { page } = who.admin;
  const before = await runsMade();
  await openDraw(who.admin);
  await press(page, label, label);
  await expect.poll(runsMade, { timeout: 60_000 }).toBe(before + 1);
  await page.getByRole('button', { name: 'Make it again' }).waitFor();
}

/** Who was given what in a window, by the names of the members. */
async function givenIn(slot: number): Promise<Map<string, { standId: string; standName: string }>> {
  const rows = await reader()
    .select({ name: users.name, standId: stands.id, standName: stands.name })
    .from(drawResults)
    .innerJoin(memberships, eq(memberships.id, drawResults.memberId))
    .innerJoin(users, eq(users.id, memberships.userId))
    .innerJoin(stands, eq(stands.id, drawResults.standId))
    .where(and(eq(drawResults.drawId, drawId), eq(drawResults.slot, slot), isNotNull(drawResults.standId)));
  return new Map(rows.map(({ name, ...rest }) => [name, rest]));
}

const bookedCount = async () => (await reader().select().from(sits).where(eq(sits.status, 'booked'))).length;
const part = (page: Page, slotName: string) => page.getByRole('region', { name: `Given for ${slotName}` });
const windowName = (day: string, window: string) => `${formatDay(day)}, ${window}`;

beforeAll(async () => {
  app = await serveApp();
  await useDatabase(app.databaseUrl);
  await makeDrawClub(Date.now());
  browser = await launchBrowser();
  for (const key of Object.keys(DRAW_PEOPLE) as DrawPerson[]) {
    who[key] = await newVisitor(browser, app.url, key === 'ada' || key === 'cal' ? PHONE : DESKTOP);
    await signIn(who[key].page, DRAW_PEOPLE[key].email, DRAW_PASSWORD);
  }
});

afterAll(async () => {
  await browser?.close();
  await closeDatabase();
  await app?.stop();
});

describe('a draw for a busy weekend', () => {
  it('is opened for three windows; what cannot be is refused beside its field and nothing typed is lost', async () => {
    const { page } = who.admin;
    await page.goto(`${CLUB}/draws`);
    await page.getByText('No draw yet').waitFor();
    await page.getByRole('link', { name: 'Open a draw' }).click();
    await page.locator('form[data-ready]').waitFor();
    await page.getByLabel('Day', { exact: true }).fill(FIRST);
    await page.getByRole('button', { name: 'Add another window' }).click();
    await page.getByRole('button', { name: 'Add another window' }).click();
    await page.getByLabel('Window 3', { exact: true }).selectOption('evening');
    await page.getByLabel('Entries close on').fill(addDays(TODAY, -1));
    await page.getByLabel('Note').fill('Opening weekend.');
    await page.getByRole('button', { name: 'Open the draw' }).click();
    await page.getByText('This window is in the draw already.').first().waitFor();
    await page.getByLabel('Day of window 3').fill(SECOND);
    await page.getByLabel('Window 3', { exact: true }).selectOption('morning');
    await page.getByRole('button', { name: 'Open the draw' }).click();
    await page.getByText('Entries close after now.').first().waitFor();
    expect(await page.getByLabel('Note').inputValue()).toBe('Opening weekend.');
    await looksRight(who.admin, 'draw-open-form', DESKTOP);
    await page.getByLabel('Entries close on').fill(addDays(TODAY, 4));
    await page.getByRole('button', { name: 'Open the draw' }).click();
    await page.waitForURL(/\/draws\/drw_/);
    drawUrl = new URL(page.url()).pathname;
    drawId = drawUrl.split('/').at(-1) ?? '';
    await page.getByRole('heading', { level: 1, name: /, morning and evening; / }).waitFor();
    expect(await page.getByRole('button', { name: 'Make the draw' }).count()).toBe(0);
  });

  it('takes three members: one ranks, one leaves it to the score, one brings a guest', async () => {
    const ada = who.ada.page;
    await openDraw(who.ada);
    await ada.locator('form[data-ready]').waitFor();
    await ada.getByLabel('First choice').selectOption('Creek');
    await ada.getByLabel('Second choice').selectOption('Creek');
    await ada.getByRole('button', { name: 'Enter the draw' }).click();
    await ada.getByText('This stand is chosen twice.').first().waitFor();
    await ada.getByLabel('Second choice').selectOption('Hollow');
    await ada.getByRole('button', { name: 'Enter the draw' }).click();
    await ada.getByText('You are in the draw').first().waitFor();
    await ada.getByRole('button', { name: 'Change my wishes' }).waitFor();
    await looksRight(who.ada, 'draw-entry');

    const ben = who.ben.page;
    await openDraw(who.ben);
    await ben.locator('form[data-ready]').waitFor();
    await ben.getByRole('button', { name: 'Enter the draw' }).click();
    await ben.getByText('You are in the draw').first().waitFor();
    await looksRight(who.ben, 'draw-entry', DESKTOP);

    const cal = who.cal.page;
    await openDraw(who.cal);
    await cal.locator('form[data-ready]').waitFor();
    await cal.getByLabel(windowName(SECOND, 'morning')).uncheck();
    await cal.getByLabel('First choice').selectOption('Creek');
    await cal.getByLabel('Second choice').selectOption('Ridge');
    await cal.getByRole('button', { name: 'Add a guest' }).click();
    await cal.getByLabel('Name of guest 1').fill('Gus Fielding');
    await cal.getByRole('button', { name: 'Enter the draw' }).click();
    await cal.getByText('You are in the draw').first().waitFor();
    await cal.getByText('Entered: Ada Birch, Ben Alder, Cal Rowan.').waitFor();
  });

  it('takes nobody after it closes, and says so', async () => {
    await moveClosing(Date.now() - 60_000);
    const { page } = who.ben;
    await page.getByLabel('First choice').selectOption('Hollow');
    await page.getByRole('button', { name: 'Change my wishes' }).click();
    await page
      .getByText(/^Entries closed at/)
      .first()
      .waitFor();
  });

  it('shows work under way, since when and how good it is so far, stops it, and says when a process was lost', async () => {
    const { page } = who.admin;
    const clubId = (await reader().select().from(draws).where(eq(draws.id, drawId)))[0]?.clubId ?? '';
    const run = { drawId, clubId, startedBy: 'somebody', startedAt: Date.now(), leaseUntil: Date.now() + 600_000 };
    await write((tx) => tx.insert(drawRuns).values({ ...run, id: 'drn_at_work', value: 2000, bound: 2062 }));
    await openDraw(who.admin);
    await page.getByText(/^Since .* The best answer so far is at most 3\.1 % from the best there can be\.$/).waitFor();
    expect(await page.getByRole('button', { name: 'Make the draw' }).count()).toBe(0);
    await write((tx) => tx.update(drawRuns).set({ bound: 2010 }));
    await page.getByText(/at most 0\.5 % from the best/).waitFor();
    await looksRight(who.admin, 'draw-at-work', DESKTOP);
    await press(page, 'Stop it', 'Stop it');
    await page.getByRole('button', { name: 'Make the draw' }).waitFor();
    const lost = { ...run, id: 'drn_lost', startedAt: Date.now() + 1, leaseUntil: Date.now() - 1 };
    await write((tx) => tx.insert(drawRuns).values(lost));
    await openDraw(who.admin);
    await page.getByText('The work ended before it was done. Make the draw again.').waitFor();
    expect(await bookedCount()).toBe(0);
  });

  it('is made apart from the page and explained; members see nothing yet', async () => {
    await makeDraw('Make the draw');
    const { page } = who.admin;
    expect([...(await givenIn(0)).keys()].sort()).toEqual(['Ada Birch', 'Ben Alder', 'Cal Rowan']);
    expect((await givenIn(0)).get('Cal Rowan')?.standName).toBe('Ridge');
    await page.getByText('Proved to be the best answer under every rule.').waitFor();
    const morning = part(page, windowName(FIRST, 'morning'));
    await morning.getByText('with Gus Fielding').waitFor();
    await morning.getByText('Creek has 1 seat, and this sit needs 2.').first().waitFor();
    expect(await morning.getByText(/^0 points, so 1 entry: number \d of 3 in line, given/).count()).toBe(3);
    await looksRight(who.admin, 'draw-made', DESKTOP);
    await openDraw(who.ada);
    expect(await who.ada.page.getByText('Given for').count()).toBe(0);
    expect(await bookedCount()).toBe(0);
  });

  it('is not published when somebody booked a stand meanwhile, and loses nothing by it', async () => {
    const [user] = await reader().select().from(users).where(eq(users.email, DRAW_PEOPLE.admin.email));
    const scope = await findScope(DRAW_SLUG, user?.id ?? '');
    if (!scope) throw new Error('The admin cannot enter the club.');
    const evening = (await givenIn(1)).get('Cal Rowan');
    const sit = { standId: evening?.standId ?? '', day: FIRST, windows: 'evening' as const, weapon: 'bow' as const };
    const blank = { approachId: null, guests: [], note: '', memberId: null, requestKey: newRequestKey() };
    await bookSit(scope, { ...sit, ...blank }, Date.now());
    const { page } = who.admin;
    await press(page, 'Publish', 'Publish');
    await page.getByText(/Nothing was booked: Cal Rowan cannot have Ridge any more/).waitFor();
    await page.getByRole('button', { name: 'Keep as it is' }).click();
    expect(await bookedCount()).toBe(1);
    await makeDraw('Make it again');
    await openDraw(who.admin);
    expect((await givenIn(1)).has('Cal Rowan')).toBe(false);
    await page
      .getByText(/^Ridge is taken/)
      .or(page.getByText(/Ridge, is against a rule/))
      .first()
      .waitFor();
  });

  it('is published as bookings, with the guest on the sit', async () => {
    const { page } = who.admin;
    await press(page, 'Publish', 'Publish');
    await page.getByText('Published', { exact: true }).first().waitFor();
    const given = await Promise.all([0, 1, 2].map(givenIn));
    expect(await bookedCount()).toBe(1 + given.reduce((sum, slot) => sum + slot.size, 0));
    const own = who.cal.page;
    await own.goto(`${CLUB}/my-sits`);
    await own.getByText('Ridge').first().waitFor();
    await own.getByText('Gus Fielding').first().waitFor();
    await page.goto(`${CLUB}/sit?day=${FIRST}&window=morning`);
    await page
      .getByText(/Ada Birch/)
      .first()
      .waitFor();
    await openDraw(who.cal);
    await looksRight(who.cal, 'draw-published');
  });

  it('lets two members swap a window, and one give a stand back', async () => {
    const before = await givenIn(0);
    const [adas, bens] = [before.get('Ada Birch')?.standName ?? '', before.get('Ben Alder')?.standName ?? ''];
    const { page: ada } = who.ada;
    const { page: ben } = who.ben;
    const slot = windowName(FIRST, 'morning');
    await openDraw(who.ada);
    await part(ada, slot).getByRole('button', { name: 'Offer a swap to Ben Alder' }).click();
    await ada.getByRole('alertdialog').getByRole('button', { name: 'Offer a swap' }).click();
    await part(ada, slot).getByText('Swap offered').waitFor();
    await openDraw(who.ben);
    await part(ben, slot).getByRole('button', { name: 'Take the swap with Ada Birch' }).click();
    await looksAtDialog(ben);
    await ben.getByRole('alertdialog').getByRole('button', { name: 'Take the swap' }).click();
    await ben.getByText(`You have ${adas}`).first().waitFor();
    const after = await givenIn(0);
    expect([after.get('Ada Birch')?.standName, after.get('Ben Alder')?.standName]).toEqual([bens, adas]);
    await openDraw(who.ada);
    const count = await bookedCount();
    await part(ada, slot).getByRole('button', { name: 'Give it back' }).click();
    await ada.getByRole('alertdialog').getByRole('button', { name: 'Give it back' }).click();
    await part(ada, slot).getByText('Given up since').waitFor();
    expect(await bookedCount()).toBe(count - 1);
    await looksRight(who.ada, 'draw-swapped');
    await openDraw(who.ben);
    await looksRight(who.ben, 'draw-swapped', DESKTOP);
  });

  it('threw no error on the way', () => {
    for (const { troubles } of Object.values(who)) expect(troubles).toEqual([]);
  });
});

async function looksAtDialog(page: Page): Promise<void> {
  await page
    .getByRole('alertdialog')
    .getByText(/Both sits change hands at once/)
    .waitFor();
  await keepPicture(page, 'draw-take-swap');
}
