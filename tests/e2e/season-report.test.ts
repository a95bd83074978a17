import Papa from 'papaparse';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { axeFindings, DESKTOP, keepPicture, launchBrowser, newVisitor, PHONE, type Visitor } from '../helpers/browser';
import { type ServedApp, serveApp } from '../helpers/serve-app';
import { signInDemo } from '../helpers/sign-in';

const CLUB = '/clubs/tansy-fork';
const PARTS = [
  'Sits and pressure by stand',
  'Rests kept',
  'Stands left alone',
  'Who had the good sits',
  'Bumps and clean sits',
  'Deer an hour',
  'Harvest against quota',
  'Work hours',
];

let app: ServedApp;
let browser: Browser;
let member: Visitor;
let officer: Visitor;

beforeAll(async () => {
  app = await serveApp({ seed: true });
  browser = await launchBrowser();
  member = await newVisitor(browser, app.url, PHONE);
  officer = await newVisitor(browser, app.url, DESKTOP);
  await signInDemo(member.page, 'odalys');
  await signInDemo(officer.page, 'nora');
});

afterAll(async () => {
  await browser?.close();
  await app?.stop();
});

const looksRight = async (page: Page, name: string) => {
  expect(await axeFindings(page)).toEqual([]);
  const wide = await page.evaluate(() => document.documentElement.scrollWidth > document.documentElement.clientWidth);
  expect(wide, `${name} is wider than the window`).toBe(false);
  await keepPicture(page, name);
};
const part = (page: Page, name: string) => page.getByRole('region', { name, exact: true });
/** The sits that the headline counts. */
const sitsSaid = async (page: Page) => {
  const text = await part(page, 'The season in short')
    .getByText(/^\d+ sits? on/)
    .textContent();
  return Number(/^\d+/.exec(text ?? '')?.[0]);
};

async function download(page: Page, link: string) {
  const [file] = await Promise.all([
    page.waitForEvent('download'),
    page.getByRole('link', { name: link, exact: true }).click(),
  ]);
  const chunks: Buffer[] = [];
  for await (const chunk of await file.createReadStream()) chunks.push(Buffer.from(chunk));
  const text = Buffer.concat(chunks)
    .toString('utf8')
    .replace(/^\ufeff/, '');
  const { data, errors } = Papa.parse<string[]>(text, { skipEmptyLines: true });
  expect(errors).toEqual([]);
  return { name: file.suggestedFilename(), rows: data };
}

describe('the season report, on a phone', () => {
  it('is where Season leads, with all its parts and no other member’s line', async () => {
    const { page } = member;
    await page.goto(`${CLUB}/season`);
    await page.getByRole('heading', { name: /^Season report 20\d\d-\d\d$/, level: 1 }).waitFor();
    for (const name of PARTS) await part(page, name).waitFor();
    const own = part(page, 'Who had the good sits');
    expect(await own.getByRole('rowheader').allInnerTexts()).toEqual(['Odalys Fenwick']);
    await own.getByText('You see your own line').waitFor();
    await looksRight(page, 'season-report-phone');
  });

  it('is of another season when one is chosen, and keeps it in the address', async () => {
    const { page } = member;
    const whole = await sitsSaid(page);
    await page.getByLabel('Season', { exact: true }).selectOption('firearms');
    await page.getByRole('button', { name: 'Show' }).click();
    await page.waitForURL(/season=firearms/);
    await page.getByRole('heading', { name: /Firearms/, level: 1 }).waitFor();
    const firearms = await sitsSaid(page);
    expect(firearms).toBeGreaterThan(0);
    expect(firearms).toBeLessThan(whole);
    await page.reload();
    expect(await sitsSaid(page)).toBe(firearms);
  });

  it('says what to do where nobody sat', async () => {
    const { page } = member;
    await page.goto(`${CLUB}/season?season=2015`);
    await page.getByText('No sit has ended in these days').waitFor();
    await looksRight(page, 'season-report-empty-phone');
  });
});

describe('the same at a desk, for an officer', () => {
  it('shows every member, and the sits of each week as a table', async () => {
    const { page } = officer;
    await page.goto(`${CLUB}/season`);
    const good = part(page, 'Who had the good sits');
    await good
      .getByText(/Gini 0\.\d\d/)
      .first()
      .waitFor();
    expect(await good.getByRole('rowheader').count()).toBeGreaterThan(5);
    await page.getByRole('img', { name: /sits by week and pressure by day/ }).waitFor();
    await page.getByText('Sits week by week, as a table').click();
    const weeks = page.getByRole('table', { name: /Sits of each stand by week/ });
    await weeks.waitFor();
    const numbers = (await weeks.getByRole('cell').allInnerTexts()).map(Number);
    expect(numbers.reduce((a, b) => a + b, 0)).toBe(await sitsSaid(page));
    await looksRight(page, 'season-report-desk');
  });

  it('gives each part as a file that says the same', async () => {
    const { page } = officer;
    const use = await download(page, 'Sits as CSV');
    expect(use.name).toMatch(/^report-use-tansy-fork-.*\.csv$/);
    expect(use.rows.slice(1).reduce((sum, row) => sum + Number(row[1]), 0)).toBe(await sitsSaid(page));
    for (const name of ['Pressure', ...PARTS.slice(1)]) {
      const { rows } = await download(page, `${name} as CSV`);
      expect(rows.length, name).toBeGreaterThan(1);
    }
  });

  it('prints what is on record and nothing to press', async () => {
    const { page } = officer;
    await page.emulateMedia({ media: 'print' });
    await part(page, 'Rests kept').waitFor();
    for (const name of ['Print or save as PDF', 'Show']) {
      expect(await page.getByRole('button', { name }).isVisible(), name).toBe(false);
    }
    expect(await page.getByRole('link', { name: /as CSV$/ }).count()).toBe(0);
    expect(await page.getByRole('link', { name: 'Skip to the page' }).count()).toBe(0);
    const ink = await page.evaluate(() => getComputedStyle(document.body).color);
    expect(ink).toBe('rgb(0, 0, 0)');
    await keepPicture(page, 'season-report-print');
    await page.emulateMedia({ media: null });
  });

  it('met no trouble in any browser', () => {
    expect([...member.troubles, ...officer.troubles]).toEqual([]);
  });
});
