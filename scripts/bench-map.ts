import { createClient } from '@libsql/client';
import { fromLocal } from '@/core/geometry';
import { DEMO_PLACE } from '@/features/demo/demo-place';
import { launchBrowser, newVisitor } from '../tests/helpers/browser';
import { serveApp } from '../tests/helpers/serve-app';
import { signInDemo } from '../tests/helpers/sign-in';

/** Frame times of the ground map while it is moved about, with 5,000 features drawn. Needs a build and Chromium. Speeds are printed, never asserted. */
const FEATURES = 5000;
const KINDS = ['bedding', 'mast', 'travel_line', 'scrape', 'food_plot'] as const;

function geometryOf(i: number, kind: (typeof KINDS)[number]) {
  const east = ((i % 100) - 50) * 34;
  const north = (Math.floor(i / 100) - 25) * 52;
  const spot = (dx: number, dy: number) => {
    const { lat, lon } = fromLocal(DEMO_PLACE, { eastM: east + dx, northM: north + dy });
    return [lon, lat];
  };
  if (kind === 'scrape') return { type: 'Point', coordinates: spot(0, 0) };
  if (kind === 'travel_line') return { type: 'LineString', coordinates: [spot(0, 0), spot(14, 18), spot(10, 40)] };
  return { type: 'Polygon', coordinates: [[spot(0, 0), spot(24, 3), spot(26, 30), spot(4, 36), spot(0, 0)]] };
}

async function fill(databaseUrl: string): Promise<void> {
  const client = createClient({ url: databaseUrl });
  const found = await client.execute("select id from clubs where slug = 'tansy-fork'");
  const club = String(found.rows[0]?.id);
  for (let from = 0; from < FEATURES; from += 500) {
    await client.batch(
      Array.from({ length: 500 }, (_, n) => {
        const i = from + n;
        const kind = KINDS[i % KINDS.length] ?? 'bedding';
        return {
          sql: "insert into features (id, club_id, name, kind, geometry, months) values (?, ?, ?, ?, ?, '[1,11,12]')",
          args: [`ftr_bench${i}`, club, `Place ${i}`, kind, JSON.stringify(geometryOf(i, kind))],
        };
      }),
    );
  }
  client.close();
}

const app = await serveApp({ seed: true, env: { RUN_JOBS: '0' } });
const browser = await launchBrowser();
try {
  await fill(app.databaseUrl);
  const { page } = await newVisitor(browser, app.url, { width: 1280, height: 800 });
  await signInDemo(page, 'abel');
  const began = performance.now();
  await page.goto('/clubs/tansy-fork/ground', { waitUntil: 'commit' });
  console.log(`The server answers after ${Math.round(performance.now() - began)} ms`);
  await page.waitForLoadState('domcontentloaded');
  console.log(`The page is there after ${Math.round(performance.now() - began)} ms`);
  await page.locator('.m-map canvas').first().waitFor();
  console.log(`Map of ${FEATURES} features on the screen after ${Math.round(performance.now() - began)} ms`);
  // As text: the tool that runs this file would weave helpers of its own into a function.
  await page.evaluate(
    'window.frames5 = []; let last = performance.now(); requestAnimationFrame(function tick(at) { frames5.push(at - last); last = at; requestAnimationFrame(tick); });',
  );
  const box = await page.locator('.m-map').boundingBox();
  if (!box) throw new Error('The map has no size.');
  const [x, y] = [box.x + box.width / 2, box.y + box.height / 2];
  await page.mouse.move(x, y);
  await page.mouse.down();
  for (let i = 0; i < 120; i++) await page.mouse.move(x + 160 * Math.sin(i / 12), y + 120 * Math.cos(i / 9));
  await page.mouse.up();
  const frames = await page.evaluate<number[]>('frames5');
  const sorted = frames.slice(5).toSorted((a, b) => a - b);
  const at = (share: number) => (sorted[Math.floor(sorted.length * share)] ?? 0).toFixed(1);
  console.log(
    `${sorted.length} frames while moved: half under ${at(0.5)} ms, nineteen of twenty under ${at(0.95)} ms, worst ${at(0.999)} ms`,
  );
} finally {
  await browser.close();
  await app.stop();
}
