import fc from 'fast-check';
import { Geodesic, PolygonArea } from 'geographiclib-geodesic';
import type { Polygon } from 'geojson';
import { describe, expect, it } from 'vitest';
import { CENTRE, spot, THINGS, WOOD } from './example-things';
import { legBetween, legText, localOf, sizeOf, sizeText } from './measure';
import { metresPerPixel, scaleBar } from './scale-bar';
import { snapIndex, snapTo } from './snap';
import { splitArea, splitLine } from './split';

function geodesicArea(area: Polygon): number {
  return area.coordinates.reduce((sum, ring, i) => {
    const polygon = new PolygonArea.PolygonArea(Geodesic.WGS84, false);
    for (const [lon = 0, lat = 0] of ring.slice(0, -1)) polygon.AddPoint(lat, lon);
    const own = Math.abs(polygon.Compute(false, true).area ?? 0);
    return i === 0 ? own : sum - own;
  }, 0);
}

const square = WOOD.geometry as Polygon;
const holed: Polygon = {
  type: 'Polygon',
  coordinates: [...square.coordinates, [spot(-50, 50), spot(-50, 100), spot(50, 100), spot(50, 50), spot(-50, 50)]],
};

describe('sizes', () => {
  it('agree with the geodesic (Karney 2013, geographiclib) to a tenth of a percent', () => {
    for (const area of [square, holed]) {
      const { areaM2 } = sizeOf(CENTRE, area);
      expect(Math.abs((areaM2 ?? 0) / geodesicArea(area) - 1)).toBeLessThan(0.001);
    }
    const inverse = Geodesic.WGS84.Inverse(
      spot(-300, -100)[1] ?? 0,
      spot(-300, -100)[0] ?? 0,
      spot(100, 200)[1] ?? 0,
      spot(100, 200)[0] ?? 0,
    );
    const leg = legBetween(CENTRE, spot(-300, -100), spot(100, 200), null);
    expect(Math.abs(leg.metres / (inverse.s12 ?? 0) - 1)).toBeLessThan(0.001);
    expect(leg.trueDeg).toBeCloseTo(inverse.azi1 ?? 0, 0);
  });

  it('are told in yards and acres', () => {
    // 400 m x 400 m: 39.54 acres (1 acre = 4046.856 m2), 1600 m round.
    expect(sizeText(CENTRE, square, 'us')).toBe('39.5 acres, 1.0 mi round');
    expect(sizeText(CENTRE, { type: 'LineString', coordinates: [spot(0, 0), spot(91.44, 0)] }, 'us')).toBe('100 yd');
    expect(sizeText(CENTRE, { type: 'Point', coordinates: spot(0, 0) }, 'us')).toBe('');
  });

  it('give the compass bearing as the true one less the declination', () => {
    const leg = legBetween(CENTRE, spot(0, 0), spot(0, 200), -11);
    expect(leg.magneticDeg).toBeCloseTo(11, 6);
    expect(legText(leg, 'us')).toBe('219 yd toward N, 0° true, 11° by compass');
  });
});

describe('the scale bar', () => {
  it('is round, fits, and is as long as it says', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0.01, max: 5000, noNaN: true }),
        fc.constantFrom('us' as const, 'metric' as const),
        (perPx, units) => {
          const bar = scaleBar(perPx, 140, units);
          if (!bar) throw new Error('no bar');
          expect(bar.px).toBeLessThanOrEqual(140.0001);
          expect(bar.px).toBeGreaterThan(140 / 2.51);
          const metres = units === 'us' ? bar.length * 0.9144 : bar.length;
          expect(metres).toBeCloseTo(bar.px * perPx, 6);
          expect(['1', '2', '5']).toContain(bar.length.toExponential().slice(0, 1));
        },
      ),
    );
    expect(scaleBar(0, 140, 'us')).toBeNull();
  });

  it('knows the ground under a pixel: 156,543 m at the equator at zoom 0 (OGC WMTS 1.0, annex E.4)', () => {
    expect(metresPerPixel(0, 0)).toBeCloseTo(156543.0339, 3);
    expect(metresPerPixel(60, 1)).toBeCloseTo(156543.0339 / 4, 3);
  });
});

describe('snapping', () => {
  const index = snapIndex(THINGS);
  const reach = { lon: 0.0001, lat: 0.00008 };

  it('takes a corner before a side, and leaves open ground alone', () => {
    const [lon = 0, lat = 0] = spot(200, 400);
    expect(snapTo(index, [lon + 0.00003, lat], reach)).toEqual([lon, lat]);
    const side = snapTo(index, spot(203, 300), reach);
    expect(side && localOf(CENTRE, side).eastM).toBeCloseTo(200, 1);
    expect(snapTo(index, spot(600, 600), reach)).toBeNull();
  });
});

describe('splitting', () => {
  it('cuts a line in two that meet where it was cut', () => {
    const line = { type: 'LineString' as const, coordinates: [spot(0, 0), spot(100, 0), spot(200, 0)] };
    const split = splitLine(CENTRE, line, spot(50, 8));
    if (!split.ok) throw new Error(split.message);
    const [a, b] = split.parts;
    expect(a?.coordinates.at(-1)).toEqual(b?.coordinates[0]);
    const lengths = split.parts.map((part) => sizeOf(CENTRE, part).lengthM);
    expect(lengths[0]).toBeCloseTo(50, 3);
    expect(lengths[1]).toBeCloseTo(150, 3);
    const atCorner = splitLine(CENTRE, line, spot(100, 3));
    expect(atCorner.ok && atCorner.parts.map((part) => part.coordinates.length)).toEqual([2, 2]);
    expect(splitLine(CENTRE, line, spot(-5, 0)).ok).toBe(false);
  });

  it('cuts an area into pieces that add up to it, holes and all', () => {
    fc.assert(
      fc.property(fc.integer({ min: -190, max: 190 }), fc.integer({ min: -190, max: 190 }), (a, b) => {
        for (const area of [square, holed]) {
          const split = splitArea(CENTRE, area, [spot(a, -20), spot((a + b) / 2 + 3, 200), spot(b, 430)]);
          if (!split.ok) throw new Error(split.message);
          const sum = split.parts.reduce((total, part) => total + (sizeOf(CENTRE, part).areaM2 ?? 0), 0);
          expect(sum).toBeCloseTo(sizeOf(CENTRE, area).areaM2 ?? 0, 0);
        }
      }),
      { numRuns: 40 },
    );
  });

  it('says what to do with a cut that does not cross', () => {
    const beside = splitArea(CENTRE, square, [spot(300, 0), spot(300, 100)]);
    expect(!beside.ok && beside.message).toMatch(/across the area/);
  });
});
