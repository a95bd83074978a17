import fc from 'fast-check';
import geodesic from 'geographiclib-geodesic';
import { describe, expect, it } from 'vitest';
import { apartDeg } from './angles';
import { bearingDeg, distanceM, distanceToShapeM, fromLocal, insideRings, lengthM, pointAt, toLocal } from './geometry';

const WGS84 = geodesic.Geodesic.WGS84;
const offset = fc.double({ min: -10_000, max: 10_000, noNaN: true });
const centre = fc.record({
  lat: fc.double({ min: -65, max: 65, noNaN: true }),
  lon: fc.double({ min: -180, max: 180, noNaN: true }),
});

describe('local metres against geodesics on WGS 84 (geographiclib)', () => {
  it('give distance within 0.1 % and bearing within a tenth of a degree between any two places of a club', () => {
    const near = fc.double({ min: -3500, max: 3500, noNaN: true });
    const place = fc.record({ eastM: near, northM: near });
    const lat = fc.double({ min: -50, max: 50, noNaN: true });
    fc.assert(
      fc.property(centre, lat, place, place, ({ lon }, centreLat, a, b) => {
        fc.pre(distanceM(a, b) > 20);
        const club = { lat: centreLat, lon };
        const [from, to] = [fromLocal(club, a), fromLocal(club, b)];
        const line = WGS84.Inverse(from.lat, from.lon, to.lat, to.lon);
        expect(Math.abs(distanceM(a, b) / (line.s12 ?? Number.NaN) - 1)).toBeLessThan(0.001);
        expect(apartDeg(bearingDeg(a, b), line.azi1 ?? Number.NaN)).toBeLessThan(0.1);
      }),
      { numRuns: 500 },
    );
  });

  it('measure 300 yd between stands to within an inch or two at a club', () => {
    const club = { lat: 34.1167, lon: -84 };
    const line = WGS84.Direct(34.12, -84.003, 63, 274.32);
    const a = toLocal(club, { lat: 34.12, lon: -84.003 });
    const b = toLocal(club, { lat: line.lat2 ?? 0, lon: line.lon2 ?? 0 });
    expect(Math.abs(distanceM(a, b) - 274.32)).toBeLessThan(0.05);
  });

  it('come back to the same place, also over the date line', () => {
    fc.assert(
      fc.property(centre, offset, offset, (at, eastM, northM) => {
        const back = toLocal(at, fromLocal(at, { eastM, northM }));
        expect(back.eastM).toBeCloseTo(eastM, 4);
        expect(back.northM).toBeCloseTo(northM, 4);
      }),
    );
  });
});

describe('plane geometry', () => {
  const square = [
    { eastM: 0, northM: 0 },
    { eastM: 100, northM: 0 },
    { eastM: 100, northM: 100 },
    { eastM: 0, northM: 100 },
  ];
  const hole = [
    { eastM: 40, northM: 40 },
    { eastM: 60, northM: 40 },
    { eastM: 60, northM: 60 },
    { eastM: 40, northM: 60 },
  ];

  it('knows inside from outside and a hole from both', () => {
    expect(insideRings({ eastM: 10, northM: 10 }, [square, hole])).toBe(true);
    expect(insideRings({ eastM: 50, northM: 50 }, [square, hole])).toBe(false);
    expect(insideRings({ eastM: 150, northM: 50 }, [square, hole])).toBe(false);
  });

  it('measures to points, lines and areas', () => {
    expect(distanceToShapeM({ eastM: 3, northM: 4 }, { type: 'point', at: { eastM: 0, northM: 0 } })).toBe(5);
    expect(distanceToShapeM({ eastM: 50, northM: -20 }, { type: 'line', points: square.slice(0, 2) })).toBe(20);
    expect(distanceToShapeM({ eastM: 103, northM: 104 }, { type: 'area', rings: [square] })).toBe(5);
    expect(distanceToShapeM({ eastM: 50, northM: 50 }, { type: 'area', rings: [square] })).toBe(0);
    expect(distanceToShapeM({ eastM: 50, northM: 50 }, { type: 'area', rings: [square, hole] })).toBe(10);
    // The side from the last point back to the first counts.
    expect(distanceToShapeM({ eastM: -7, northM: 50 }, { type: 'area', rings: [square] })).toBe(7);
    expect(lengthM(square)).toBe(300);
  });

  it('goes out and back by distance and bearing', () => {
    const bearing = fc.double({ min: 0, max: 359.99, noNaN: true });
    fc.assert(
      fc.property(bearing, fc.double({ min: 0.1, max: 5000, noNaN: true }), (deg, metres) => {
        const there = pointAt({ eastM: 12, northM: -7 }, deg, metres);
        expect(distanceM({ eastM: 12, northM: -7 }, there)).toBeCloseTo(metres, 6);
        expect(apartDeg(bearingDeg({ eastM: 12, northM: -7 }, there), deg)).toBeLessThan(1e-6);
      }),
    );
  });
});
