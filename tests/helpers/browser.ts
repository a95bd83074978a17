import { mkdirSync, readFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import { join } from 'node:path';
import { type Browser, type BrowserContext, chromium, type Page } from 'playwright-core';

export const PHONE = { width: 390, height: 844 };
export const DESKTOP = { width: 1280, height: 800 };

export function launchBrowser(): Promise<Browser> {
  return chromium.launch({
    executablePath: '/usr/bin/chromium',
    headless: true,
    args: [
      '--no-sandbox',
      '--disable-gpu',
      '--disable-quic',
      '--no-first-run',
      '--disable-background-networking',
      '--disable-component-update',
      '--disable-sync',
    ],
  });
}

export interface Visitor {
  context: BrowserContext;
  page: Page;
  /** Errors the pages have thrown or printed, and requests that left the machine. */
  troubles: string[];
}

/** Everybody who is looking now, for what is said of a test that fails. */
const visitors: Visitor[] = [];

/** Where everybody is, what the pages said aloud and what troubled them: a failure elsewhere can be read from this. */
export async function whereVisitorsAre(): Promise<string[]> {
  const open = visitors.filter(({ page }) => !page.isClosed());
  return Promise.all(
    open.map(async ({ page, troubles }) => {
      const said = await page.locator('[role=alert], [role=status]').allTextContents();
      return [page.url(), ...said, ...troubles].filter(Boolean).join('\n    ');
    }),
  );
}

/** A browser of its own for one person, with touch at phone size. */
export async function newVisitor(browser: Browser, baseURL: string, size = PHONE): Promise<Visitor> {
  const touch = size.width < 600;
  const context = await browser.newContext({ baseURL, viewport: size, hasTouch: touch, isMobile: touch });
  const page = await context.newPage();
  const troubles: string[] = [];
  page.on('pageerror', (error) => troubles.push(`page error: ${error.message}`));
  page.on('console', (message) => {
    if (message.type() === 'error') troubles.push(`console: ${message.text()} at ${page.url()}`);
  });
  page.on('request', (request) => {
    const { protocol, hostname } = new URL(request.url());
    if (protocol.startsWith('http') && hostname !== '127.0.0.1') troubles.push(`left the machine: ${request.url()}`);
  });
  const visitor = { context, page, troubles };
  visitors.push(visitor);
  return visitor;
}

/** Serious and critical findings of axe on the page as it stands, in words. */
export async function axeFindings(page: Page): Promise<string[]> {
  return (await allAxeFindings(page))
    .filter(({ impact }) => impact === 'serious' || impact === 'critical')
    .map(({ text }) => text);
}

interface AxeViolation {
  id: string;
  help: string;
  impact?: string | null;
  nodes: { target: unknown[]; failureSummary?: string }[];
}

/** axe itself, of the version its Playwright package brings. */
const axeScript = () => {
  const near = createRequire(createRequire(import.meta.url).resolve('@axe-core/playwright'));
  return readFileSync(near.resolve('axe-core/axe.min.js'), 'utf8');
};
let axe: string | undefined;

/** Puts axe into the page once; it stays until the page is left. */
async function bringAxe(page: Page): Promise<void> {
  if (await page.evaluate(() => 'axe' in window)) return;
  axe ??= axeScript();
  await page.evaluate(axe);
}

/** All findings of axe, of whatever weight; `rules` looks at those alone. Our pages have no frames to look into. */
export async function allAxeFindings(page: Page, rules?: string[]): Promise<{ impact: string; text: string }[]> {
  await page.waitForFunction(() => document.title !== '');
  await bringAxe(page);
  const violations = await page.evaluate(async (only): Promise<AxeViolation[]> => {
    const { axe } = window as unknown as { axe: { run: (on: Document, how: object) => Promise<{ violations: [] }> } };
    const how = only ? { runOnly: { type: 'rule', values: only }, resultTypes: ['violations'] } : {};
    return (await axe.run(document, how)).violations;
  }, rules);
  return violations.map((v) => ({
    impact: v.impact ?? 'unknown',
    text: `${v.id}: ${v.help}: ${v.nodes.map((n) => `${n.target.join(' ')} (${n.failureSummary})`).join(', ')}`,
  }));
}

/** Kept when SCREENSHOTS names a folder. */
export async function keepPicture(page: Page, name: string): Promise<void> {
  const folder = process.env.SCREENSHOTS;
  if (!folder) return;
  mkdirSync(folder, { recursive: true });
  await page.screenshot({ path: join(folder, `${name}.png`), fullPage: true });
}
