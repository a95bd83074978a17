import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { DEMO_PLACE, positionOf } from '@/features/demo/demo-place';
import { axeFindings, DESKTOP, keepPicture, launchBrowser, newVisitor, PHONE } from '../helpers/browser';
import { HAS_GDAL, runGdal } from '../helpers/gdal';
import { type ServedApp, serveApp } from '../helpers/serve-app';
import { signInDemo } from '../helpers/sign-in';

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

const NAMES = ['Cedar ladder', 'Far scrape', 'WPT 021'];

/** A receiver's file as GDAL writes it. */
function gpxByGdal(east: number): Buffer {
  const features = NAMES.map((name, i) => ({
    type: 'Feature',
    properties: { name: `${name} ${east}`, desc: 'Off the receiver' },
    geometry: { type: 'Point', coordinates: positionOf([east + i * 40, 900]) },
  }));
  const source = JSON.stringify({ type: 'FeatureCollection', features });
  const args = ['-f', 'GPX', '-nln', 'waypoints', '-nlt', 'POINT', 'out.gpx', 'in.geojson'];
  return runGdal('ogr2ogr', args, { 'in.geojson': source }, 'out.gpx');
}

const file = (name: string, body: Buffer | string) => ({
  name,
  mimeType: 'application/gpx+xml',
  buffer: Buffer.from(body),
});

describe.skipIf(!HAS_GDAL)(
  'a steward brings in a file that GDAL wrote (left out where gdal-bin is not installed)',
  () => {
    it.each([
      ['phone', PHONE, -200],
      ['desktop', DESKTOP, 300],
    ] as const)('at %s size', async (size, viewport, east) => {
      const { page, troubles, context } = await newVisitor(browser, app.url, viewport);
      await signInDemo(page, 'abel');
      await page.goto('/clubs/tansy-fork/ground');
      await page.getByRole('link', { name: 'Bring in a file' }).click();
      await page.getByRole('heading', { name: 'Bring in a file', level: 1 }).waitFor();
      expect(await axeFindings(page)).toEqual([]);
      await keepPicture(page, `import-upload-${size}`);

      await page
        .getByLabel('File', { exact: true })
        .setInputFiles(file('bomb.gpx', '<?xml version="1.0"?>\n<!DOCTYPE gpx [<!ENTITY a "b">]>\n<gpx/>'));
      await page.getByRole('button', { name: 'Read the file' }).click();
      await page.getByText('Line 2 declares a document type').waitFor();
      // The browser itself reports the refusal.
      const refused = troubles.splice(0).filter((text) => !text.includes('400'));
      expect(refused).toEqual([]);

      await page.getByLabel('File', { exact: true }).setInputFiles(file(`walk-${size}.gpx`, gpxByGdal(east)));
      await page.getByRole('button', { name: 'Read the file' }).click();
      await page.getByRole('heading', { name: `walk-${size}.gpx` }).waitFor();
      await page.getByText('Will be added: 2 · Kind not known: 1').waitFor();
      expect(await axeFindings(page)).toEqual([]);
      await keepPicture(page, `import-review-${size}`);
      await page.getByLabel(`What WPT 021 ${east}, row 3, is`).selectOption('item:camera');
      await page.getByText('Will be added: 3 · Kind not known: 0').waitFor();
      await page.getByRole('button', { name: 'Add 3 to the ground' }).click();
      await page.getByText('3 things', { exact: true }).waitFor();
      await keepPicture(page, `import-saved-${size}`);

      await page.goto('/clubs/tansy-fork/stands');
      await page.getByText(`Cedar ladder ${east}`).first().waitFor();
      await page.goto('/clubs/tansy-fork/ground');
      await page.getByText(`Far scrape ${east}`).first().waitFor();
      await page.goto('/clubs/tansy-fork/ground/import');
      await page.getByRole('link', { name: `walk-${size}.gpx` }).click();
      await page.getByRole('button', { name: 'Undo the import' }).click();
      await page.getByRole('alertdialog').getByRole('button', { name: 'Undo the import' }).click();
      await page.getByText('was taken away again').waitFor();
      await page.goto('/clubs/tansy-fork/stands');
      await page.getByRole('heading', { level: 1 }).waitFor();
      expect(await page.getByText(`Cedar ladder ${east}`).count()).toBe(0);
      expect(troubles).toEqual([]);
      await context.close();
    });

    it('takes the ground out as a file that GDAL reads', async () => {
      const { page, context } = await newVisitor(browser, app.url, DESKTOP);
      await signInDemo(page, 'abel');
      await page.goto('/clubs/tansy-fork/ground/export');
      expect(await axeFindings(page)).toEqual([]);
      await keepPicture(page, 'export-desktop');
      const download = page.waitForEvent('download');
      await page.getByRole('link', { name: /Take out \d+ things/ }).click();
      const name = (await download).suggestedFilename();
      expect(name).toMatch(/^ground-tansy-fork-.*\.gpx$/);
      const answer = await page.request.get('/api/clubs/tansy-fork/ground/export?format=gpx&layers=stands');
      expect(answer.headers()['cache-control']).toBe('private, no-store');
      const told = runGdal('ogrinfo', ['-al', '-so', 'in.gpx', 'waypoints'], {
        'in.gpx': await answer.body(),
      }).toString();
      expect(told).toMatch(/Feature Count: \d\d/);
      expect(told).toContain(`(${DEMO_PLACE.lon.toFixed(0)}`);
      await context.close();
    });
  },
);

/** A receiver left on for a day: larger than what is read beside other requests. */
function longTrack(): string {
  const points = Array.from({ length: 40_000 }, (_, i) => {
    const [lon, lat] = positionOf([i / 40, 400 + 200 * Math.sin(i / 4000)]);
    return `<trkpt lat="${lat}" lon="${lon}"/>`;
  });
  return `<?xml version="1.0"?>\n<gpx xmlns="http://www.topografix.com/GPX/1/1" version="1.1" creator="test"><trk><name>Long walk</name><trkseg>\n${points.join('\n')}\n</trkseg></trk></gpx>`;
}

describe('a steward brings in a large file', () => {
  it('which is read in a thread of its own', async () => {
    const body = longTrack();
    expect(body.length).toBeGreaterThan(1024 * 1024);
    const { page, troubles, context } = await newVisitor(browser, app.url, DESKTOP);
    await signInDemo(page, 'abel');
    await page.goto('/clubs/tansy-fork/ground/import');
    await page.getByLabel('File', { exact: true }).setInputFiles(file('day.gpx', body));
    await page.getByRole('button', { name: 'Read the file' }).click();
    await page.getByRole('heading', { name: 'day.gpx' }).waitFor({ timeout: 120_000 });
    await page.getByText('Long walk').waitFor();
    await page.getByText(/Thinned from 40000 points/).waitFor();
    expect(troubles).toEqual([]);
    await context.close();
  });
});
