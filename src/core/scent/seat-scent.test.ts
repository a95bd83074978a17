import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { STABILITY_CLASSES, type StabilityClass } from '../air/stability-types';
import { normalizeDeg } from '../angles';
import { pointAt } from '../geometry';
import type { LocalShape, Point } from '../ground-types';
import { DEFAULT_SETTINGS } from '../settings';
import type { ScenarioSet } from '../wind/scenario-types';
import { chanceOfExposure, windedChanceOf } from './saturate';
import { scentField } from './scent-field';
import { scentGround, sourceGeometry } from './scent-ground';
import { seatScent } from './seat-scent';

const s = DEFAULT_SETTINGS.scent;
const SEAT: Point = { eastM: 0, northM: 0 };

interface Wind {
  deg: number | null;
  mps: number;
}
function setOf(courses: Wind[][], over: Partial<ScenarioSet> = {}): ScenarioSet {
  const at = (courses[0] ?? []).map((_, t) => t * 1_800_000);
  return {
    at,
    known: at.map(() => true),
    scenarios: courses.map((course) => ({
      weight: 1 / courses.length,
      steps: course.map(({ deg, mps }) => ({ fromDeg: deg, speedMps: mps })),
    })),
    scatterDeg: at.map(() => 10),
    bundleDeg: at.map(() => 0),
    leadHours: 12,
    source: 'error_model',
    level: 'seat',
    ...over,
  };
}
const spread = (deg: number, mps: number, steps: number): Wind[][] =>
  [-40, -25, -10, 0, 10, 25, 40].map((turn) =>
    Array.from({ length: steps }, () => ({ deg: normalizeDeg(deg + turn), mps })),
  );
const point = (bearing: number, distance: number): LocalShape => ({
  type: 'point',
  at: pointAt(SEAT, bearing, distance),
});
const block = (bearing: number, distance: number, size: number): LocalShape => {
  const c = pointAt(SEAT, bearing, distance);
  const corner = (e: number, n: number): Point => ({ eastM: c.eastM + e * size, northM: c.northM + n * size });
  return { type: 'area', rings: [[corner(-0.5, -0.5), corner(0.5, -0.5), corner(0.5, 0.5), corner(-0.5, 0.5)]] };
};

function ask(shapes: LocalShape[], set: ScenarioSet, c: StabilityClass = 'D', deer = 1, settings = s) {
  const ground = scentGround(
    shapes.map((shape) => ({ shape })),
    settings,
  );
  const source = sourceGeometry(ground, SEAT, 5);
  const shares = new Float64Array(shapes.length * set.at.length).fill(deer);
  const stability = set.at.map(() => c);
  return seatScent({ source, set, stability, deer: shares, minutes: 30, detail: 'full' });
}

describe('the curve from index to chance (our own choice)', () => {
  it('gives even odds for two hours at 300 yards straight downwind in neutral air at 2 m/s', () => {
    const full = ask([point(180, 274.32)], setOf([Array.from({ length: 4 }, () => ({ deg: 0, mps: 2 }))]));
    expect(Math.abs((full.windedChance ?? 0) - 0.5)).toBeLessThan(0.005);
    expect(windedChanceOf(1, s.exposureMinutes, s)).toBeCloseTo(0.5, 12);
  });
  it('does not care how a stay is cut up, and index and time act alike', () => {
    const once = windedChanceOf(0.7, 60, s);
    const twice = 1 - (1 - windedChanceOf(0.7, 30, s)) ** 2;
    expect(twice).toBeCloseTo(once, 12);
    expect(windedChanceOf(1.4, 30, s)).toBeCloseTo(once, 12);
    expect(windedChanceOf(-3, 30, s)).toBeCloseTo(0, 12);
  });
  it('the table is within 0.1 % of 1 - exp(-x)', () => {
    for (let x = 1e-6; x < 20; x = x * 1.07 + 1e-4) {
      expect(Math.abs(chanceOfExposure(x) / -Math.expm1(-x) - 1)).toBeLessThan(1e-3);
    }
    expect(chanceOfExposure(1e9)).toBe(1);
  });
});

describe('scent from a seat', () => {
  it('falls with distance beyond touchdown, is none upwind, and more in stable air far out', () => {
    const at = (bearing: number, d: number, c: StabilityClass = 'D') =>
      ask([point(bearing, d)], setOf([[{ deg: 0, mps: 2 }]], { scatterDeg: [0] }), c).windedChance ?? 0;
    expect(at(180, 100)).toBeGreaterThan(at(180, 200));
    expect(at(180, 200)).toBeGreaterThan(at(180, 400));
    expect(at(0, 100)).toBe(0);
    expect(at(180, 300, 'F')).toBeGreaterThan(at(180, 300, 'D'));
    expect(at(180, 300, 'D')).toBeGreaterThan(at(180, 300, 'B'));
  });
  it('names each step’s chance and the feature most reached', () => {
    const set = setOf(
      [
        [
          { deg: 0, mps: 2 },
          { deg: 90, mps: 2 },
          { deg: 0, mps: 2 },
        ],
      ],
      { known: [true, true, false] },
    );
    const { byStep } = ask([point(180, 100), point(270, 100)], set);
    expect(byStep.map((b) => b.featureIndex)).toEqual([0, 1, null]);
    expect(byStep[2]?.chance).toBeNull();
    expect(byStep[0]?.chance).toBeCloseTo(byStep[1]?.chance ?? 0, 6);
  });
  it('counts lasting error and chance apart: one scenario in two is worth half, not one minus the square', () => {
    const one = ask([point(180, 60)], setOf([Array.from({ length: 8 }, () => ({ deg: 0, mps: 1 }))])).windedChance ?? 0;
    const half = ask(
      [point(180, 60)],
      setOf([
        Array.from({ length: 8 }, () => ({ deg: 0, mps: 1 })),
        Array.from({ length: 8 }, () => ({ deg: 180, mps: 1 })),
      ]),
    ).windedChance;
    expect(half).toBeCloseTo(one / 2, 9);
  });
  it('says nothing without a forecast and ignores features out of reach', () => {
    expect(ask([point(180, 100)], setOf([[{ deg: 0, mps: 2 }]], { known: [false] })).windedChance).toBeNull();
    expect(ask([point(180, 900)], setOf([[{ deg: 0, mps: 2 }]])).windedChance).toBe(0);
  });
  it('is never lower when a wind at least 60 degrees off is turned to blow at a bedding area', () => {
    const deg = fc.double({ min: 0, max: 360, noNaN: true });
    fc.assert(
      fc.property(
        deg,
        fc.double({ min: 60, max: 300, noNaN: true }),
        fc.double({ min: 80, max: 600, noNaN: true }),
        fc.double({ min: 0.5, max: 9, noNaN: true }),
        (bed, turn, d, mps) => {
          const chance = (from: number) =>
            ask([block(bed, d, 80)], setOf(spread(from, mps, 3), { bundleDeg: [7, 7, 7] })).windedChance ?? 0;
          expect(chance(normalizeDeg(bed + 180))).toBeGreaterThanOrEqual(chance(normalizeDeg(bed + 180 + turn)));
        },
      ),
      { numRuns: 150 },
    );
  });
  it('does not change when the whole world is turned', () => {
    const deg = fc.double({ min: 0, max: 360, noNaN: true });
    fc.assert(
      fc.property(deg, deg, fc.double({ min: 40, max: 600, noNaN: true }), (turn, wind, d) => {
        const chance = (by: number) =>
          ask(
            [
              point(normalizeDeg(150 + by), d),
              { type: 'line', points: [pointAt(SEAT, 200 + by, 150), pointAt(SEAT, 260 + by, 300)] },
            ],
            setOf(spread(normalizeDeg(wind + by), 2, 2), { bundleDeg: [8, 8] }),
          ).windedChance ?? 0;
        expect(Math.abs(chance(turn) - chance(0))).toBeLessThan(0.005);
      }),
      { numRuns: 60 },
    );
  });
  it('never gives NaN and stays within 0 and 1 for odd places, winds and shares', () => {
    const odd = fc.oneof(fc.double(), fc.double({ min: -500, max: 500, noNaN: true }));
    const windArb = fc.record({
      deg: fc.oneof(fc.constant(null), fc.double({ min: -720, max: 720, noNaN: true })),
      mps: fc.double({ min: 0, max: 120, noNaN: true }),
    });
    fc.assert(
      fc.property(
        odd,
        odd,
        fc.array(windArb, { minLength: 1, maxLength: 4 }),
        odd,
        fc.constantFrom(...STABILITY_CLASSES),
        (e, n, course, deer, c) => {
          const full = ask([{ type: 'point', at: { eastM: e, northM: n } }, point(90, 0)], setOf([course]), c, deer);
          for (const v of [full.windedChance ?? 0, ...full.byFeature, ...full.byStep.map((b) => b.chance ?? 0)]) {
            expect(v).toBeGreaterThanOrEqual(0);
            expect(v).toBeLessThanOrEqual(1);
          }
        },
      ),
    );
  });
});

describe('scent field', () => {
  const grid = { origin: { eastM: -300, northM: -300 }, cellM: 20, columns: 30, rows: 30 };
  const field = (set: ScenarioSet) => scentField({ at: SEAT, heightM: 5 }, set, 0, 'D', grid, s);
  it('is strongest downwind and nothing upwind', () => {
    const values = field(setOf([[{ deg: 0, mps: 2 }]]));
    expect(values?.[5 * 30 + 15]).toBeGreaterThan(0.5);
    expect(values?.[25 * 30 + 15]).toBe(0);
  });
  it('is the index seatScent uses: even odds of two hours at an index of one', () => {
    const one = { origin: { eastM: -0.5, northM: -274.82 }, cellM: 1, columns: 1, rows: 1 };
    const value = scentField({ at: SEAT, heightM: 5 }, setOf([[{ deg: 0, mps: 2 }]]), 0, 'D', one, s)?.[0] ?? 0;
    expect(value).toBeCloseTo(1, 6);
  });
  it('is even round a calm and null without a forecast', () => {
    const values = field(setOf([[{ deg: null, mps: 0 }]]));
    expect(values?.[5 * 30 + 15]).toBeCloseTo(values?.[24 * 30 + 15] ?? 0, 1);
    expect(field(setOf([[{ deg: 0, mps: 2 }]], { known: [false] }))).toBeNull();
  });
});
