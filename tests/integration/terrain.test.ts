import { afterAll, describe, expect, it } from 'vitest';
import { hillHeightM } from '@/adapters/elevation/fake/hill';
import { serveFakeElevation, stopFakeElevation } from '@/adapters/elevation/fake/serve';
import { makeHostedElevation } from '@/adapters/elevation/hosted';
import type { ElevationPort } from '@/adapters/elevation/port';
import { apartDeg } from '@/core/angles';
import { fromLocal } from '@/core/geometry';
import { slopeAt } from '@/core/terrain/height-grid';
import { loadHeights } from '@/features/terrain/load-heights';
import { readContours } from '@/features/terrain/read-contours';
import { readSlope } from '@/features/terrain/read-slope';
import { HAS_GDAL, runGdal } from '../helpers/gdal';
import { addMember, makeClub, TEST_NOW } from '../helpers/make-club';

afterAll(() => stopFakeElevation());

/** The hosted adapter over the made hills, counting what it asks for; each test has a source of its own. */
async function countingPort(source: string): Promise<ElevationPort & { requests: number }> {
  const port = makeHostedElevation({ url: await serveFakeElevation(), source, label: 'made hills' });
  const counted = {
    ...port,
    requests: 0,
    heights: (...args: Parameters<ElevationPort['heights']>) => {
      counted.requests += 1;
      return port.heights(...args);
    },
  };
  return counted;
}

const PLACE = { lat: 34.117, lon: -84 };

describe('slope of a place', () => {
  it('agrees with the hill itself', async () => {
    const port = await countingPort('slope');
    for (const [eastM, northM] of [
      [0, 0],
      [400, -250],
      [-800, 600],
      [1200, 900],
    ] as const) {
      const at = fromLocal(PLACE, { eastM, northM });
      const near = (e: number, n: number) => hillHeightM(fromLocal(at, { eastM: e, northM: n }));
      const east = (near(90, 0) - near(-90, 0)) / 180;
      const north = (near(0, 90) - near(0, -90)) / 180;
      const found = await readSlope(at, TEST_NOW, port);
      expect(Math.abs(found.slopePercent - 100 * Math.hypot(east, north))).toBeLessThan(1.5);
      expect(found.heightM).toBeCloseTo(near(0, 0), -1);
      const downhill = (Math.atan2(-east, -north) * 180) / Math.PI;
      if (found.drainBearingDeg !== null && found.slopePercent > 4) {
        expect(apartDeg(found.drainBearingDeg, downhill)).toBeLessThan(10);
      }
    }
  });

  it('asks for a place once, however often it is read, and for neighbours not at all', async () => {
    const port = await countingPort('cache');
    const first = await readSlope(PLACE, TEST_NOW, port);
    const asked = port.requests;
    expect(asked).toBeGreaterThan(0);
    expect(asked).toBeLessThanOrEqual(4);
    expect(await readSlope(PLACE, TEST_NOW + 1, port)).toEqual(first);
    expect(port.requests).toBe(asked);
  });

  it('says plainly when the service is away, and asks again later', async () => {
    const port: ElevationPort = {
      source: 'away',
      label: 'away',
      heights: async () => ({ ok: false, reason: 'unavailable', message: 'The elevation service is out of order.' }),
    };
    await expect(readSlope(PLACE, TEST_NOW, port)).rejects.toMatchObject({ code: 'unavailable' });
    const back = await countingPort('away');
    expect((await readSlope(PLACE, TEST_NOW, back)).source).toBe('made hills');
  });

  it('refuses an answer that cannot be heights', async () => {
    const { createServer } = await import('node:http');
    const bodies = ['{"elevation":[1,2]}', '{"elevation":["a"]}', 'no', '{"elevation":[99999]}'];
    const server = createServer((_, response) => response.end(bodies.shift())).listen(0, '127.0.0.1');
    await new Promise((done) => server.once('listening', done));
    const address = server.address();
    if (address === null || typeof address === 'string') throw new Error('No port.');
    const port = makeHostedElevation({ url: `http://127.0.0.1:${address.port}/`, source: 'bad', label: 'bad' });
    for (let i = 0; i < 4; i++) expect(await port.heights([PLACE])).toMatchObject({ ok: false, reason: 'bad_answer' });
    server.closeAllConnections();
    await new Promise((done) => server.close(done));
    expect(await port.heights([PLACE])).toMatchObject({ ok: false, reason: 'unavailable' });
  });
});

it('draws contours over what a club has, and never more ground than is asked for at once', async () => {
  const { scope } = await addMember(await makeClub(), 'steward');
  const port = await countingPort('contours');
  const far = { lat: 35, lon: -84 };
  const view = await readContours(scope, [fromLocal(PLACE, { eastM: 2500, northM: 2500 }), far], TEST_NOW, port);
  expect(view).toMatchObject({ unit: 'ft', source: 'made hills' });
  expect(view.lines.length).toBeGreaterThan(10);
  expect(
    view.lines.flat().every(([lon = 0, lat = 0]) => Math.abs(lat - 34.13) < 0.05 && Math.abs(lon + 83.99) < 0.06),
  ).toBe(true);
  expect(port.requests).toBeLessThanOrEqual(64);
});

describe.skipIf(!HAS_GDAL)('beside gdaldem (left out where gdal-bin is not installed)', () => {
  it('finds the slope and aspect that GDAL finds', async () => {
    const port = await countingPort('gdal');
    const loaded = await loadHeights(port, { south: 34.11, north: 34.13, west: -84.01, east: -83.99 }, TEST_NOW);
    if (!loaded.ok) throw new Error(loaded.message);
    // The same posts, laid on a plane grid of 90 m for GDAL: Horn's sums are about metres.
    const { rows, columns, heights } = loaded.grid;
    const lines = Array.from({ length: rows }, (_, i) =>
      heights.slice((rows - 1 - i) * columns, (rows - i) * columns).join(' '),
    );
    const asc = `ncols ${columns}\nnrows ${rows}\nxllcorner 0\nyllcorner 0\ncellsize 90\nNODATA_value -9999\n${lines.join('\n')}\n`;
    const read = (kind: string, more: string[]) => {
      const tif = runGdal('gdaldem', [kind, 'in.asc', 'out.tif', ...more], { 'in.asc': asc }, 'out.tif');
      const xyz = runGdal('gdal_translate', ['-of', 'XYZ', 'in.tif', 'out.xyz'], { 'in.tif': tif }, 'out.xyz');
      return xyz
        .toString()
        .trim()
        .split('\n')
        .map((line) => Number(line.split(' ')[2]));
    };
    const [slopes, aspects] = [read('slope', ['-p']), read('aspect', [])];
    const { slopeOf } = await import('@/core/terrain/slope');
    let compared = 0;
    for (let row = 1; row < rows - 1; row += 3) {
      for (let column = 1; column < columns - 1; column += 3) {
        const z = (dy: number, dx: number) => heights[(row + dy) * columns + column + dx] ?? Number.NaN;
        const found = slopeOf(
          [z(1, -1), z(1, 0), z(1, 1), z(0, -1), z(0, 0), z(0, 1), z(-1, -1), z(-1, 0), z(-1, 1)],
          90,
          90,
        );
        const at = (rows - 1 - row) * columns + column;
        expect(found.percent).toBeCloseTo(slopes[at] ?? Number.NaN, 3);
        if (found.downhillDeg !== null)
          expect(apartDeg(found.downhillDeg, aspects[at] ?? Number.NaN)).toBeLessThan(0.01);
        compared += 1;
      }
    }
    expect(compared).toBeGreaterThan(50);
    expect(slopeAt(loaded.grid, PLACE, 90)?.percent).toBeGreaterThan(0);
  });
});
