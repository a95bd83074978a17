import type { Browser, BrowserContext, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { DESKTOP, launchBrowser, newVisitor } from '../helpers/browser';
import { fillerOf, leadsNowhere, listPages } from '../helpers/list-pages';
import { makeLiveLinks } from '../helpers/live-links';
import { lookAtPage } from '../helpers/look-at-page';
import { type ServedApp, serveApp } from '../helpers/serve-app';
import { signInDemo } from '../helpers/sign-in';

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
/** Tabs that look at once: as many as a small machine has cores. */
const TABS = 2;

function inClub(page: string): boolean {
  return page.startsWith('/clubs/[club]');
}

let app: ServedApp;
let browser: Browser;
let live: Record<string, string>;

/** Tabs of one person, lent to one look at a time. */
class Tabs {
  private readonly free: Page[] = [];
  private readonly waiting: ((page: Page) => void)[] = [];
  private constructor(private readonly context: BrowserContext) {}

  static async open(key: string | null): Promise<Tabs> {
    const { context, page } = await newVisitor(browser, app.url, DESKTOP);
    const tabs = new Tabs(context);
    if (key) await signInDemo(page, key);
    tabs.free.push(page);
    while (tabs.free.length < TABS) tabs.free.push(await context.newPage());
    for (const one of tabs.free) await one.emulateMedia({ reducedMotion: 'reduce' });
    return tabs;
  }

  async lend<T>(use: (page: Page) => Promise<T>): Promise<T> {
    const page = this.free.pop() ?? (await new Promise<Page>((lent) => this.waiting.push(lent)));
    try {
      return await use(page);
    } finally {
      const next = this.waiting.shift();
      if (next) next(page);
      else this.free.push(page);
    }
  }

  close = () => this.context.close();
}

beforeAll(async () => {
  app = await serveApp({ seed: true });
  live = await makeLiveLinks(app.databaseUrl, Date.now());
  browser = await launchBrowser();
});

afterAll(async () => {
  await browser?.close();
  await app?.stop();
});

describe.each(PEOPLE)('as $who', ({ key, sees }) => {
  let tabs: Tabs;
  let addressOf: (page: string) => string | null;

  beforeAll(async () => {
    tabs = await Tabs.open(key);
    addressOf = await fillerOf(app.databaseUrl, `${key ?? 'nobody'}@example.org`);
  });

  afterAll(() => tabs?.close());

  it.concurrent.each(listPages().filter(sees))(
    '%s has no fault that axe knows, and keeps within its width',
    async (page) => {
      const address = addressOf(page);
      const mayMiss = key !== 'nora';
      if (!address) return expect(mayMiss, `the demo has nothing for ${page}`).toBe(true);
      await tabs.lend(async (tab) => {
        const answer = await tab.goto(address);
        const status = answer?.status() ?? 0;
        if (status === 404) return expect(mayMiss || leadsNowhere(page), `${page} is not found`).toBe(true);
        expect(status).toBe(200);
        const found = await lookAtPage(tab, inClub(page) && mayMiss);
        expect(found.filter((text) => page !== ALL_PARTS || !text.includes('landmark-unique'))).toEqual([]);
      });
    },
  );
});

describe('a link that was mailed and still works', () => {
  let tabs: Tabs;
  beforeAll(async () => {
    tabs = await Tabs.open(null);
  });
  afterAll(() => tabs?.close());

  const pages = listPages().filter((page) => page.endsWith('/[token]'));

  it.concurrent.each(pages)('%s says something else than of a dead one, without a fault', async (page) => {
    await tabs.lend(async (tab) => {
      const words = () => tab.getByRole('main').textContent();
      const address = live[page];
      if (!address) throw new Error(`makeLiveLinks knows no link for ${page}`);
      await tab.goto(page.replace('[token]', 'none'));
      const dead = await words();
      expect((await tab.goto(address))?.status()).toBe(200);
      expect(await words()).not.toBe(dead);
      expect(await lookAtPage(tab, false)).toEqual([]);
    });
  });
});
