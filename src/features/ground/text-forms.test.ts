import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { SECTOR_NAMES } from '@/core/sectors';
import { numberText, parseNumber } from '@/features/clubs/read-number';
import { arcText, readArcs } from './arc-text';
import { bearingText, formatBearing, parseBearing } from './bearing-text';
import { geometryText, parseGeometry, parsePoints, pointsText } from './geometry-text';
import { farFromClub, parseDegrees } from './place-text';

const club = { lat: 38.6, lon: -83.2 };
const place = fc.tuple(
  fc.integer({ min: -83_700_000, max: -82_700_000 }).map((n) => n / 1e6),
  fc.integer({ min: 38_100_000, max: 39_100_000 }).map((n) => n / 1e6),
);

describe('numbers', () => {
  it('reads decimals with a point or a comma and nothing else', () => {
    expect(['12', ' 12.5 ', '12,5', '-3', '.5'].map(parseNumber)).toEqual([12, 12.5, 12.5, -3, 0.5]);
    expect(['', 'abc', '1e5', '0x10', '1.2.3', 'Infinity', '12 ft'].map(parseNumber)).toEqual(Array(7).fill(null));
  });

  it('shows what it reads back', () => {
    fc.assert(
      fc.property(fc.integer({ min: -1e8, max: 1e8 }), (n) => {
        expect(parseNumber(numberText(n / 100))).toBe(n / 100 + 0);
      }),
    );
  });
});

describe('bearings', () => {
  it('takes a compass point for its middle and degrees as they stand', () => {
    // WMO-No. 306, code table 0877: the 16 points stand 22.5 degrees apart from north.
    const read = (text: string) => parseBearing(text);
    expect(read('NW')).toEqual({ ok: true, deg: 315 });
    expect(read('nnw')).toEqual({ ok: true, deg: 337.5 });
    expect(read('210°')).toEqual({ ok: true, deg: 210 });
    expect(read('360')).toEqual({ ok: true, deg: 0 });
    expect(read(' ')).toEqual({ ok: true, deg: null });
    expect([read('361').ok, read('-5').ok, read('uphill').ok]).toEqual([false, false, false]);
    expect(formatBearing(315)).toBe('NW · 315°');
    expect(formatBearing(359.8)).toBe('N · 0°');
  });

  it('comes back from what the form shows', () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 35999 }), (n) => {
        expect(parseBearing(bearingText(n / 100))).toEqual({ ok: true, deg: n / 100 });
      }),
    );
  });
});

describe('good winds', () => {
  const end = fc.oneof(fc.constantFrom<string>(...SECTOR_NAMES), fc.integer({ min: 0, max: 359 }).map(String));

  it('comes back from what the form shows, for each window', () => {
    fc.assert(
      fc.property(
        fc.array(fc.tuple(end, end), { minLength: 1, maxLength: 5 }),
        fc.constantFrom(null, 'morning' as const, 'evening' as const),
        (spans, window) => {
          const text = spans.map(([a, b]) => `${a}-${b}`).join(', ');
          const first = readArcs(text, window);
          // The same number twice is one direction and is refused.
          fc.pre(first.ok);
          expect(readArcs(arcText(first.arcs, window), window)).toEqual(first);
          expect(arcText(first.arcs, window === null ? 'morning' : null)).toBe('');
        },
      ),
    );
  });

  it('shows points as points and degrees as degrees', () => {
    const shown = (text: string) => {
      const read = readArcs(text, null);
      return read.ok ? arcText(read.arcs, null) : read.message;
    };
    expect(shown('nw to n; SW')).toBe('NW-N, SW');
    expect(shown('310-20, any')).toBe('310-20, any');
    expect(shown('NW-20')).toBe('303.75-20');
    expect(readArcs('NW-north by west', null).ok).toBe(false);
  });
});

describe('places', () => {
  it('takes signs or letters, not both', () => {
    expect(parseDegrees('38.6051', 'lat')).toBe(38.6051);
    expect(parseDegrees('83.1952 W', 'lon')).toBe(-83.1952);
    expect(parseDegrees('38.6° S', 'lat')).toBe(-38.6);
    expect(['-83 W', '91', '', 'north', '83 N 5'].map((t) => parseDegrees(t, 'lat'))).toEqual(Array(5).fill(null));
    expect(parseDegrees('38.6 N', 'lon')).toBe(null);
  });

  it('asks about swapped numbers and a lost sign', () => {
    expect(farFromClub(club, { lat: 38.7, lon: -83.1 })).toBe(null);
    expect(farFromClub(club, { lat: -83.2, lon: 38.6 })).toMatch(/swap/);
    expect(farFromClub(club, { lat: 38.6, lon: 83.2 })).toMatch(/minus/);
    // 1 degree of latitude is 111 km (WGS 84).
    expect(farFromClub(club, { lat: 39.6, lon: -83.2 })).toMatch(/100 km/);
    expect(farFromClub(club, { lat: 39.4, lon: -83.2 })).toBe(null);
  });
});

describe('geometry', () => {
  it('lines come back from what the form shows', () => {
    fc.assert(
      fc.property(fc.array(place, { minLength: 2, maxLength: 12 }), (points) => {
        const read = parseGeometry('line', pointsText(points), club);
        expect(read).toEqual({ ok: true, geometry: { type: 'LineString', coordinates: points } });
        expect(read.ok && geometryText(read.geometry)).toEqual({ shape: 'line', text: pointsText(points) });
      }),
    );
  });

  it('an area closes itself, winds anticlockwise and comes back', () => {
    const clockwise = '38.60, -83.20\n38.61, -83.20\n38.61, -83.19';
    const read = parseGeometry('area', clockwise, club);
    // RFC 7946, 3.1.6: the outer ring is anticlockwise and closed.
    expect(read).toEqual({
      ok: true,
      geometry: {
        type: 'Polygon',
        coordinates: [
          [
            [-83.2, 38.6],
            [-83.19, 38.61],
            [-83.2, 38.61],
            [-83.2, 38.6],
          ],
        ],
      },
    });
    if (!read.ok) return;
    const again = parseGeometry('area', geometryText(read.geometry).text, club);
    expect(again).toEqual(read);
  });

  it('takes pasted GeoJSON, bare or in a Feature, and keeps holes through the form', () => {
    const outer = [
      [-83.2, 38.6],
      [-83.1, 38.6],
      [-83.1, 38.7],
      [-83.2, 38.6],
    ];
    const hole = [
      [-83.12, 38.61],
      [-83.12, 38.62],
      [-83.11, 38.62],
      [-83.12, 38.61],
    ];
    const geometry = { type: 'Polygon', coordinates: [outer, hole] };
    const read = parseGeometry('area', JSON.stringify({ type: 'Feature', properties: {}, geometry }), club);
    expect(read.ok && read.geometry.coordinates).toHaveLength(2);
    if (read.ok) expect(parseGeometry('area', geometryText(read.geometry).text, club)).toEqual(read);
    expect(parseGeometry('point', '{"type":"Point","coordinates":[-83.2,38.6,210]}', club)).toEqual({
      ok: true,
      geometry: { type: 'Point', coordinates: [-83.2, 38.6] },
    });
  });

  it.each([
    ['line', '38.6, -83.2', /needs 2/],
    ['area', '38.6, -83.2\n38.6, -83.1', /needs 3/],
    ['area', '38.6, -83.2\n38.6, -83.1\n38.6, -83.0', /no area/],
    ['point', '38.6, -83.2\n38.6, -83.1', /one place/],
    ['line', '38.6, -83.2\nthe creek', /Line 2/],
    ['line', '-83.2, 38.6\n-83.1, 38.6', /Line 1.*swap/],
    ['line', '{"type":"Polygon"}', /one GeoJSON/],
    ['line', '{"type":"Point","coordinates":[-83.2,38.6]}', /is a point/],
    ['point', '{"type":"Point","coordinates":[38.6,-83.2]}', /swap/],
    ['line', '{"type":', /cannot be read/],
    ['point', '', /needs 1/],
  ] as const)('%s %j is refused', (shape, text, message) => {
    const read = parseGeometry(shape, text, club);
    expect(read.ok).toBe(false);
    expect(!read.ok && read.message).toMatch(message);
  });

  it('never throws, and what it takes lies near the club', () => {
    const number = fc.integer({ min: -100, max: 100 });
    const lines = fc.array(fc.tuple(number, number)).map((pairs) => pairs.map((p) => p.join(', ')).join('\n'));
    fc.assert(
      fc.property(fc.oneof(fc.string(), fc.json(), lines), fc.constantFrom('point', 'line', 'area'), (text, shape) => {
        const read = parseGeometry(shape, text, club);
        if (!read.ok) expect(read.message).not.toBe('');
        else expect(parsePoints(geometryText(read.geometry).text, club).ok).toBe(true);
      }),
    );
  });
});
