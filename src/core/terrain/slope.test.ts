import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { apartDeg } from '../angles';
import { fromLocal, toLocal } from '../geometry';
import type { Point } from '../ground-types';
import { type HeightGrid, heightAt, slopeAt } from './height-grid';

const CENTRE = { lat: 41.1, lon: -77.3 };
const STEP = 1 / 1200;

/** A grid of posts about the centre over a shape of the ground given in metres. */
function gridOver(height: (p: Point) => number): HeightGrid {
  const [rows, columns] = [13, 13];
  const [southLat, westLon] = [CENTRE.lat - 6 * STEP, CENTRE.lon - 6 * STEP];
  const heights = Array.from({ length: rows * columns }, (_, i) => {
    const at = { lat: southLat + Math.floor(i / columns) * STEP, lon: westLon + (i % columns) * STEP };
    return height(toLocal(CENTRE, at));
  });
  return { southLat, westLon, stepDeg: STEP, rows, columns, heights };
}

describe('slope', () => {
  it('is exact on a plane of any tilt, anywhere between posts', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0.6, max: 80, noNaN: true }),
        fc.double({ min: 0, max: 359.9, noNaN: true }),
        fc.double({ min: -200, max: 200, noNaN: true }),
        fc.double({ min: -200, max: 200, noNaN: true }),
        (percent, downhill, eastM, northM) => {
          const rad = (downhill * Math.PI) / 180;
          const grid = gridOver((p) => 300 - (percent / 100) * (p.eastM * Math.sin(rad) + p.northM * Math.cos(rad)));
          const found = slopeAt(grid, fromLocal(CENTRE, { eastM, northM }), 90);
          expect(found?.percent).toBeCloseTo(percent, 1);
          expect(apartDeg(found?.downhillDeg ?? 999, downhill)).toBeLessThan(0.05);
        },
      ),
    );
  });

  it('points straight away from the top of a cone on all its sides', () => {
    const grid = gridOver((p) => 400 - 0.2 * Math.hypot(p.eastM, p.northM));
    for (let bearing = 0; bearing < 360; bearing += 15) {
      const rad = (bearing * Math.PI) / 180;
      const at = fromLocal(CENTRE, { eastM: 320 * Math.sin(rad), northM: 320 * Math.cos(rad) });
      const found = slopeAt(grid, at, 90);
      expect(Math.abs((found?.percent ?? 0) - 20)).toBeLessThan(1);
      expect(apartDeg(found?.downhillDeg ?? 999, bearing)).toBeLessThan(3);
    }
  });

  it('says no direction on level ground and on the very top', () => {
    expect(
      slopeAt(
        gridOver(() => 250),
        CENTRE,
        90,
      ),
    ).toEqual({ percent: 0, downhillDeg: null });
    expect(
      slopeAt(
        gridOver((p) => 400 - 0.2 * Math.hypot(p.eastM, p.northM)),
        CENTRE,
        90,
      )?.downhillDeg,
    ).toBeNull();
  });

  it('says nothing beyond the posts it has', () => {
    expect(
      slopeAt(
        gridOver(() => 1),
        { lat: CENTRE.lat + 6 * STEP, lon: CENTRE.lon },
        90,
      ),
    ).toBeNull();
    expect(
      heightAt(
        gridOver(() => 1),
        { lat: CENTRE.lat + 7 * STEP, lon: CENTRE.lon },
      ),
    ).toBeNull();
  });
});
