import { eq } from 'drizzle-orm';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { addDays, dayOf } from '@/core/day-time';
import { closeDatabase, reader, useDatabase } from '@/db/client';
import { memberships, outbox, sits, stands, users } from '@/db/schema';
import { DEMO_SLUG } from '@/features/demo/build-demo';
import { DEMO_PLACE } from '@/features/demo/demo-place';
import { axeFindings, DESKTOP, keepPicture, launchBrowser, newVisitor, PHONE, type Visitor } from '../helpers/browser';
import { type ServedApp, serveApp } from '../helpers/serve-app';
import { signInDemo } from '../helpers/sign-in';

const CLUB = `/clubs/${DEMO_SLUG}`;
const today = dayOf(Date.now(), DEMO_PLACE.zone);

let app: ServedApp;
let browser: Browser;
let member: Visitor;
let steward: Visitor;

const looksRight = async (page: Page, name: string) => {
  expect(await axeFindings(page), name).toEqual([]);
  const wide = await page.evaluate(() => document.documentElement.scrollWidth > document.documentElement.clientWidth);
  expect(wide, `${name} is wider than the window`).toBe(false);
  await keepPicture(page, name);
};

/** Pages of a PDF: each has one page object (ISO 32000-1, 7.7.3.3). */
const pagesOf = (pdf: Buffer) => (pdf.toString('latin1').match(/\/Type\s*\/Page(?!s)/g) ?? []).length;

/** A booked sit that has not begun, with its stand and its member. */
async function comingSit() {
  const rows = await reader()
    .select({
      id: sits.id,
      startAt: sits.startAt,
      day: sits.day,
      standId: sits.standId,
      stand: stands,
      name: users.name,
      email: users.email,
    })
    .from(sits)
    .innerJoin(stands, eq(stands.id, sits.standId))
    .innerJoin(memberships, eq(memberships.id, sits.memberId))
    .innerJoin(users, eq(users.id, memberships.userId))
    .where(eq(sits.status, 'booked'));
  const row = rows
    .filter(({ startAt, day }) => startAt > Date.now() && day > addDays(today, 1))
    .sort((a, b) => a.startAt - b.startAt)[0];
  if (!row) throw new Error('The demo has no sit to come.');
  return row;
}

beforeAll(async () => {
  app = await serveApp({ seed: true });
  await useDatabase(app.databaseUrl);
  browser = await launchBrowser();
  member = await newVisitor(browser, app.url, PHONE);
  steward = await newVisitor(browser, app.url, DESKTOP);
  await signInDemo(member.page, 'odalys');
  await signInDemo(steward.page, 'abel');
});

afterAll(async () => {
  await browser?.close();
  await closeDatabase();
  await app?.stop();
});

describe('the gate sheet', () => {
  it('fits a phone, and prints on one or two sheets of paper without the frame of the screen', async () => {
    const { page } = member;
    const { day } = await comingSit();
    await page.goto(`${CLUB}/board`);
    await page.getByRole('link', { name: 'Gate sheet' }).click();
    await page.getByRole('heading', { name: 'Gate sheet' }).waitFor();
    await page.goto(`${CLUB}/board/gate-sheet?day=${day}`);
    await page.getByRole('heading', { name: 'Who is where' }).waitFor();
    await looksRight(page, 'gate-sheet-phone');
    await steward.page.goto(`${CLUB}/board/gate-sheet?day=${day}`);
    await looksRight(steward.page, 'gate-sheet-desk');
    await steward.page.emulateMedia({ media: 'print' });
    await expect.poll(() => steward.page.getByRole('button', { name: 'Print or save as PDF' }).isVisible()).toBe(false);
    expect(await steward.page.getByRole('navigation').first().isVisible()).toBe(false);
    expect(await steward.page.getByText('no rescue service').isVisible()).toBe(true);
    // As wide as the paper, without the rail's column.
    expect((await steward.page.getByRole('article').boundingBox())?.width).toBeGreaterThan(900);
    for (const format of ['Letter', 'A4']) {
      const margin = { top: '12mm', bottom: '12mm', left: '12mm', right: '12mm' };
      const pdf = await steward.page.pdf({ format, margin });
      expect(pagesOf(pdf), format).toBeGreaterThanOrEqual(1);
      expect(pagesOf(pdf), format).toBeLessThanOrEqual(2);
    }
    await keepPicture(steward.page, 'gate-sheet-print');
    await steward.page.emulateMedia({ media: null });
  });
});

describe('chores', () => {
  it('are taken and done on a phone', async () => {
    const { page } = member;
    await page.goto(`${CLUB}/chores`);
    await page.getByRole('heading', { name: 'To do' }).waitFor();
    await looksRight(page, 'chores-phone');
    await page.getByRole('button', { name: /Take it.*Paint names/ }).click();
    await page.getByText('It is yours', { exact: true }).waitFor();
    await page.getByRole('button', { name: /Mark done.*Paint names/ }).click();
    const dialog = page.getByRole('dialog');
    await dialog.locator('form[data-ready]').waitFor();
    await dialog.getByRole('button', { name: 'Mark done' }).click();
    await dialog.getByText('Hours is needed.').first().waitFor();
    await dialog.getByLabel('Hours').fill('1.5');
    await looksRight(page, 'chore-done-phone');
    await dialog.getByRole('button', { name: 'Mark done' }).click();
    await dialog.waitFor({ state: 'detached' });
    await page.getByText(/Paint names on the parking signs.*1\.5 h/).waitFor();
  });

  it('show a steward everything at a desk', async () => {
    const { page } = steward;
    for (const [path, name] of [
      ['chores', 'chores-desk'],
      ['chores/new', 'chore-new-desk'],
      ['chores/work-days/new', 'work-day-new-desk'],
    ]) {
      await page.goto(`${CLUB}/${path}`);
      await looksRight(page, name ?? '');
    }
  });
});

describe('an inspection', () => {
  it('that finds something unsafe closes the stand and mails whoever is booked there', async () => {
    const { page } = steward;
    const sit = await comingSit();
    await page.goto(`${CLUB}/chores/stands/${sit.standId}`);
    await page.getByRole('link', { name: 'Inspect it now' }).first().click();
    await page.locator('form[data-ready]').waitFor();
    await looksRight(page, 'inspect-desk');
    await page.setViewportSize(PHONE);
    await looksRight(page, 'inspect-phone');
    await page.setViewportSize(DESKTOP);
    for (const good of await page.getByRole('radio', { name: 'Good' }).all()) await good.check();
    await page.getByRole('group', { name: 'Seat' }).getByRole('radio', { name: 'Unsafe' }).check();
    await page.getByRole('radio', { name: /^Pass/ }).check();
    await page.getByRole('button', { name: 'Save inspection' }).click();
    await page.getByText('Something is marked unsafe: the result must be closed.').first().waitFor();
    await page.getByRole('radio', { name: /^Closed/ }).check();
    await page.getByRole('textbox', { name: 'Notes' }).fill('Seat bolt sheared');
    await page.getByRole('button', { name: 'Save inspection' }).click();
    await page.getByText('Closed by an inspection').waitFor();
    await looksRight(page, 'inspected-desk');
    const mails = await reader().select().from(outbox).where(eq(outbox.kind, 'stand.closed'));
    expect(mails.map(({ toEmail }) => toEmail)).toContain(sit.email);
    await member.page.goto(`${CLUB}/board/gate-sheet?day=${sit.day}`);
    await member.page.getByText(`${sit.stand.name}: Inspection: Seat bolt sheared (until opened again)`).waitFor();
  });
});

describe('notices', () => {
  it('are chosen on a phone and kept', async () => {
    const { page } = member;
    await page.goto(`${CLUB}/notices`);
    await page.locator('form[data-ready]').waitFor();
    await looksRight(page, 'notices-phone');
    await page.getByRole('checkbox', { name: /letter each Thursday/ }).check();
    await page.getByLabel('Nothing after').fill('22:15');
    await page.getByRole('button', { name: 'Save' }).click();
    await page.getByText('Your choice is kept', { exact: true }).waitFor();
    await page.reload();
    await page.locator('form[data-ready]').waitFor();
    expect(await page.getByRole('checkbox', { name: /letter each Thursday/ }).isChecked()).toBe(true);
    expect(await page.getByLabel('Nothing after').inputValue()).toBe('22:15');
  });

  it('lead to a page on which a sit is moved', async () => {
    const { page } = steward;
    const own = (
      await reader()
        .select({ id: sits.id, startAt: sits.startAt, status: sits.status, email: users.email })
        .from(sits)
        .innerJoin(memberships, eq(memberships.id, sits.memberId))
        .innerJoin(users, eq(users.id, memberships.userId))
    ).find(({ email, startAt, status }) => email === 'abel@example.org' && startAt > Date.now() && status === 'booked');
    await page.goto(`${CLUB}/notices/swap/${own?.id ?? 'none'}`);
    await page.getByRole('heading', { name: /Your sit at/ }).waitFor();
    await looksRight(page, 'swap-desk');
    await member.page.goto(`${CLUB}/notices/swap/${own?.id ?? 'none'}`);
    await member.page.getByRole('heading', { name: 'Not your sit' }).waitFor();
    await looksRight(member.page, 'swap-not-mine-phone');
  });
});

it('left the machine with nothing and printed no error', () => {
  expect([...member.troubles, ...steward.troubles]).toEqual([]);
});
