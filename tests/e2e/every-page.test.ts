import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { launchBrowser, newVisitor, type Visitor } from '../helpers/browser';
import { fillerOf, leadsNowhere, listPages } from '../helpers/list-pages';
import { lookAtPage } from '../helpers/look-at-page';
import { type ServedApp, serveApp } from '../helpers/serve-app';
import { signInDemo } from '../helpers/sign-in-demo';

/** Who looks at which pages of the demo club. The club's admin may open every one of it. */
const PEOPLE = [
  { who: 'admin', key: 'nora', sees: (page: string) => /^\/(clubs|account)/.test(page) },
  { who: 'member', key: 'odalys', sees: inClub },
  { who: 'guest', key: 'perry', sees: inClub },
  { who: 'landowner', key: 'edith', sees: inClub },
  { who: 'somebody signed out', key: null, sees: (page: string) => !/^\/(clubs|account)/.test(page) },
];

/** Shows the same parts once in each light, so their names stand there three times. */
const ALL_PARTS = '/dev/ui';

function inClub(page: string): boolean {
  return page.startsWith('/clubs/[club]');
}

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

describe.each(PEOPLE)('as $who', ({ key, sees }) => {
  let visitor: Visitor;
  let addressOf: (page: string) => string | null;

  beforeAll(async () => {
    visitor = await newVisitor(browser, app.url, { width: 1280, height: 800 });
    await visitor.page.emulateMedia({ reducedMotion: 'reduce' });
    if (key) await signInDemo(visitor.page, key);
    addressOf = await fillerOf(app.databaseUrl, `${key ?? 'nobody'}@example.org`);
  });

  afterAll(() => visitor?.context.close());

  it.each(listPages().filter(sees))('%s has no fault that axe knows, and keeps within its width', async (page) => {
    const address = addressOf(page);
    const mayMiss = key !== 'nora';
    if (!address) return expect(mayMiss, `the demo has nothing for ${page}`).toBe(true);
    const answer = await visitor.page.goto(address);
    const status = answer?.status() ?? 0;
    if (status === 404) return expect(mayMiss || leadsNowhere(page), `${page} is not found`).toBe(true);
    expect(status).toBe(200);
    const found = await lookAtPage(visitor.page, inClub(page) && mayMiss);
    expect(found.filter((text) => page !== ALL_PARTS || !text.includes('landmark-unique'))).toEqual([]);
  });
});
