import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { distanceM, insideRings } from '../geometry';
import type { LocalShape, Point } from '../ground-types';
import { DEFAULT_SETTINGS } from '../settings';
import { sampleFeature } from './sample-feature';

const s = DEFAULT_SETTINGS.scent;
const p = (eastM: number, northM: number): Point => ({ eastM, northM });
const square = (size: number): Point[] => [p(0, 0), p(size, 0), p(size, size), p(0, size)];

describe('samples of a feature', () => {
  it('of a point are the point', () => {
    expect(sampleFeature({ type: 'point', at: p(3, 4) }, s)).toEqual({ points: [p(3, 4)], weights: [1] });
  });
  it('of a line lie evenly along it, also round a corner', () => {
    const { points } = sampleFeature({ type: 'line', points: [p(0, 0), p(100, 0), p(100, 60)] }, s);
    expect(points).toEqual([p(20, 0), p(60, 0), p(100, 0), p(100, 40)]);
  });
  it('of an area lie inside it, not in its hole, and are bounded however large it is', () => {
    for (const size of [10, 100, 500, 5000, 1e6]) {
      const { points } = sampleFeature({ type: 'area', rings: [square(size)] }, s);
      expect(points.length).toBeGreaterThan(0);
      expect(points.length).toBeLessThanOrEqual(s.mostSamples);
      for (const q of points) expect(insideRings(q, [square(size)])).toBe(true);
    }
    const hole = [p(30, 30), p(70, 30), p(70, 70), p(30, 70)];
    for (const q of sampleFeature({ type: 'area', rings: [square(100), hole] }, s).points) {
      expect(insideRings(q, [hole])).toBe(false);
    }
  });
  it('turn with the feature', () => {
    const ring = [p(0, 0), p(180, 20), p(150, 130), p(40, 160)];
    const turn = (q: Point, deg: number): Point => {
      const [c, n] = [Math.cos((deg * Math.PI) / 180), Math.sin((deg * Math.PI) / 180)];
      return p(q.eastM * c + q.northM * n, q.northM * c - q.eastM * n);
    };
    fc.assert(
      fc.property(fc.double({ min: 0, max: 360, noNaN: true }), (deg) => {
        const still = sampleFeature({ type: 'area', rings: [ring] }, s).points;
        const turned = sampleFeature({ type: 'area', rings: [ring.map((q) => turn(q, deg))] }, s).points;
        expect(turned).toHaveLength(still.length);
        still.forEach((q, i) => {
          expect(distanceM(turn(q, deg), turned[i] ?? p(1e9, 0))).toBeLessThan(1e-6);
        });
      }),
    );
  });
  it('have weights that sum to 1, or are none, for any shape', () => {
    const point = fc.record({ eastM: fc.double(), northM: fc.double() });
    const shape: fc.Arbitrary<LocalShape> = fc.oneof(
      fc.record({ type: fc.constant('point' as const), at: point }),
      fc.record({ type: fc.constant('line' as const), points: fc.array(point, { maxLength: 5 }) }),
      fc.record({
        type: fc.constant('area' as const),
        rings: fc.array(fc.array(point, { maxLength: 5 }), { maxLength: 2 }),
      }),
    );
    fc.assert(
      fc.property(shape, (sh) => {
        const { points, weights } = sampleFeature(sh, s);
        expect(weights).toHaveLength(points.length);
        expect(points.length).toBeLessThanOrEqual(s.mostSamples);
        if (points.length > 0) expect(weights.reduce((a, b) => a + b, 0)).toBeCloseTo(1, 9);
      }),
    );
  });
});
