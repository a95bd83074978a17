import { spawnSync } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join, resolve } from 'node:path';
import { gzipSync } from 'node:zlib';
import type { BrowserContext } from 'playwright-core';
import { z } from 'zod';
import { launchBrowser, newVisitor, PHONE } from '../tests/helpers/browser';
import { serveApp } from '../tests/helpers/serve-app';
import { signInDemo } from '../tests/helpers/sign-in';

/** Weight, Lighthouse and load of the built app on the demo club. Prints tables; asserts nothing. Build first. */
const root = resolve(import.meta.dirname, '..');
const CLUB = '/clubs/tansy-fork';
const PAGES = [
  { name: 'Sign-in', path: '/sign-in', signedIn: false },
  { name: 'Sit', path: `${CLUB}/sit`, signedIn: true },
  { name: 'Week', path: `${CLUB}/week`, signedIn: true },
  { name: 'Board', path: `${CLUB}/board`, signedIn: true },
];
const CATEGORIES = ['performance', 'accessibility', 'best-practices'] as const;
/** Odd, for a middle. */
const LOOKS = 5;
const CHROME = ['--headless', '--no-sandbox', '--disable-gpu', '--disable-background-networking', '--disable-sync'];

const folder = mkdtempSync(join(tmpdir(), 'windrest-bench-'));

function runNode(script: string, args: string[]): string {
  const env = { ...process.env, CHROME_PATH: '/usr/bin/chromium' };
  const done = spawnSync(process.execPath, [join(root, script), ...args], {
    encoding: 'utf8',
    env,
    maxBuffer: 2 ** 27,
  });
  if (done.status !== 0) throw new Error(`${script} failed:\n${done.stderr.slice(-2000)}`);
  return done.stdout;
}

const report = z.object({
  categories: z.record(z.string(), z.object({ score: z.number().nullable() })),
  audits: z.record(z.string(), z.object({ displayValue: z.string().optional() })),
});

interface Looked {
  performance: number;
  cells: string[];
}

function lookOnce(url: string, cookie: string | null): Looked {
  const out = join(folder, 'report.json');
  runNode('node_modules/lighthouse/cli/index.js', [
    url,
    '--quiet',
    '--output=json',
    `--output-path=${out}`,
    `--only-categories=${CATEGORIES.join(',')}`,
    `--chrome-flags=${CHROME.join(' ')}`,
    ...(cookie ? [`--extra-headers=${JSON.stringify({ Cookie: cookie })}`] : []),
  ]);
  const { categories, audits } = report.parse(JSON.parse(readFileSync(out, 'utf8')));
  const [performance = 0, ...others] = CATEGORIES.map((name) => Math.round(100 * (categories[name]?.score ?? 0)));
  const shown = (audit: string) => audits[audit]?.displayValue ?? '?';
  return {
    performance,
    cells: [...others.map(String), shown('largest-contentful-paint'), shown('total-blocking-time')],
  };
}

/** The middle of several looks by performance, and how far apart they are: one alone tells of the machine's mood. */
function lighthouse(url: string, cookie: string | null): string[] {
  const looks = Array.from({ length: LOOKS }, () => lookOnce(url, cookie)).sort(
    (a, b) => a.performance - b.performance,
  );
  const [low, middle, high] = [looks[0], looks[Math.floor(LOOKS / 2)], looks.at(-1)];
  return [`${middle?.performance} (${low?.performance} to ${high?.performance})`, ...(middle?.cells ?? [])];
}

/** Bytes of script that a page names at first, gzipped; those for browsers without modules are never fetched by others. */
async function scriptWeight(context: BrowserContext, url: string): Promise<number> {
  const html = await (await context.request.get(url)).text();
  const tags = [...html.matchAll(/<script[^>]*\ssrc="([^"]+)"[^>]*>/g)].filter(([tag]) => !/nomodule/i.test(tag));
  let bytes = 0;
  for (const src of new Set(tags.map(([, src]) => src ?? ''))) {
    const body = await (await context.request.get(new URL(src, url).href)).body();
    bytes += gzipSync(body, { level: 9 }).length;
  }
  return bytes;
}

/** All script that the page has fetched once it is at rest, gzipped; the worker, which keeps pages ahead, is left out. */
async function scriptAtRest(context: BrowserContext, url: string): Promise<number> {
  const fresh = await browser.newContext({
    storageState: await context.storageState(),
    serviceWorkers: 'block',
    viewport: PHONE,
  });
  const page = await fresh.newPage();
  const sizes: Promise<number>[] = [];
  page.on('response', (answer) => {
    if (new URL(answer.url()).pathname.endsWith('.js')) {
      sizes.push(answer.body().then((body) => gzipSync(body, { level: 9 }).length));
    }
  });
  await page.goto(url, { waitUntil: 'networkidle' });
  const bytes = (await Promise.all(sizes)).reduce((sum, size) => sum + size, 0);
  await fresh.close();
  return bytes;
}

const load = z.object({
  requests: z.object({ average: z.number() }),
  latency: z.object({ p50: z.number(), p99: z.number() }),
  throughput: z.object({ average: z.number() }),
  non2xx: z.number(),
});

function cannon(url: string, cookie: string): z.output<typeof load> {
  const args = ['--json', '--connections', '50', '--duration', '10', '--headers', `cookie=${cookie}`, url];
  return load.parse(JSON.parse(runNode('node_modules/autocannon/autocannon.js', args)));
}

function printTable(head: string[], rows: string[][]): void {
  const widths = head.map((title, i) => Math.max(title.length, ...rows.map((row) => row[i]?.length ?? 0)));
  for (const row of [head, ...rows]) console.log(row.map((cell, i) => cell.padEnd(widths[i] ?? 0)).join('  '));
  console.log();
}

const app = await serveApp({ seed: true });
const browser = await launchBrowser();
try {
  const { page, context } = await newVisitor(browser, app.url, PHONE);
  const stranger = await browser.newContext();
  await signInDemo(page, 'odalys');
  const cookie = (await context.cookies()).map(({ name, value }) => `${name}=${value}`).join('; ');

  const rows: string[][] = [];
  for (const { name, path, signedIn } of PAGES) {
    const url = `${app.url}${path}`;
    const who = signedIn ? context : stranger;
    const kB = (bytes: number) => `${(bytes / 1000).toFixed(1)} kB`;
    const weights = [await scriptWeight(who, url), await scriptAtRest(who, url)].map(kB);
    rows.push([name, ...weights, ...lighthouse(url, signedIn ? cookie : null)]);
  }
  printTable(
    [
      'Phone',
      'Script at first',
      'At rest',
      'Performance',
      'Accessibility',
      'Best practices',
      'Largest paint',
      'Blocked',
    ],
    rows,
  );

  const bareUrl = `${app.url}/dev/bare-sits/tansy-fork`;
  const listUrl = `${app.url}/api${CLUB}/sits`;
  await context.request.get(listUrl);
  await context.request.get(listUrl);
  const [bare, list] = [cannon(bareUrl, cookie), cannon(listUrl, cookie)];
  const line = (name: string, one: z.output<typeof load>) => [
    name,
    one.requests.average.toFixed(0),
    `${one.latency.p50} ms`,
    `${one.latency.p99} ms`,
    (bare.requests.average / one.requests.average).toFixed(2),
    String(one.non2xx),
  ];
  printTable(
    ['50 connections, 10 s', 'Requests/s', 'Median', '99th', 'Time against bare', 'Refused'],
    [line('Bare route, same rows', bare), line('Sits read, kept', list)],
  );
} finally {
  await browser.close();
  await app.stop();
  rmSync(folder, { recursive: true, force: true });
}
