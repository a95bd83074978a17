import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { placeAir } from '../air/place-air';
import { normalizeDeg } from '../angles';
import type { EnsembleMember, Forecast } from '../condition-types';
import type { Arc } from '../ground-types';
import { DEFAULT_SETTINGS, type ScoringSettings } from '../settings';
import { arcHold } from './arc-hold';
import { buildScenarios } from './scenarios';

const HOUR = 3_600_000;
const NOON = Date.UTC(2016, 10, 15, 17);

function forecast(wind: { deg: number | null; mps: number }[], members: EnsembleMember[] = []): Forecast {
  return {
    issuedAt: NOON - 12 * HOUR,
    fetchedAt: NOON - 12 * HOUR,
    source: 'test',
    hours: wind.map((w, n) => ({
      at: NOON + n * HOUR,
      windFromDeg: w.deg,
      windSpeedMps: w.mps,
      gustMps: null,
      tempC: 5,
      pressureHpa: null,
      precipMm: 0,
      cloudPercent: 100,
      radiationWm2: null,
      thunder: false,
    })),
    members,
  };
}
const steady = (deg: number | null, mps: number): Forecast => forecast(Array.from({ length: 7 }, () => ({ deg, mps })));
const withError = (deg: number): ScoringSettings => ({
  ...DEFAULT_SETTINGS,
  wind: { ...DEFAULT_SETTINGS.wind, errorBySpeed: [{ speedMps: 0, deg }] },
});
const EXACT: ScoringSettings = { ...withError(0), wind: { ...withError(0).wind, scatterCapDeg: 0 } };

function set(f: Forecast, settings = DEFAULT_SETTINGS, hours = 5) {
  const steps = placeAir({ lat: 34.1, lon: -84, startAt: NOON, endAt: NOON + hours * HOUR, forecast: f }, settings.air);
  return { steps, set: buildScenarios(steps, f, settings) };
}
const around = (centre: number, half: number): Arc => ({
  fromDeg: normalizeDeg(centre - half),
  toDeg: normalizeDeg(centre + half),
});

describe('arc hold of a sit', () => {
  it('with a spread of zero is the plain arc test', () => {
    const deg = fc.integer({ min: 0, max: 359 });
    fc.assert(
      fc.property(deg, deg, fc.integer({ min: 1, max: 359 }), (wind, from, width) => {
        const hold = arcHold(set(steady(wind, 5), EXACT, 2).set, [{ fromDeg: from, toDeg: from + width }]);
        const inside = (wind - from + 360) % 360 <= width ? 1 : 0;
        expect(hold.byStep).toEqual(hold.byStep.map(() => inside));
        expect(hold.summary).toMatchObject({ shareOfTime: inside, neverLeaves: inside, worstShare: inside });
      }),
    );
  });
  it('names the half hour a turning wind leaves', () => {
    const f = forecast([280, 290, 300, 20, 30, 40].map((deg) => ({ deg, mps: 8 })));
    const { summary } = arcHold(set(f, EXACT).set, [{ fromDeg: 270, toDeg: 315 }]);
    expect(summary).toMatchObject({ neverLeaves: 0, likeliestLeavingAt: NOON + 2 * HOUR });
    expect(summary?.shareOfTime).toBeCloseTo(0.4, 12);
    expect(
      arcHold(set(steady(290, 8), EXACT).set, [{ fromDeg: 270, toDeg: 315 }]).summary?.likeliestLeavingAt,
    ).toBeNull();
  });
  it('keeps lasting error and scatter apart: scatter alone never makes a centred wind leave', () => {
    const still = { ...withError(0) };
    const { summary } = arcHold(set(steady(90, 4), still).set, [around(90, 20)]);
    expect(summary?.neverLeaves).toBe(1);
    expect(summary?.shareOfTime).toBeLessThan(0.99);
  });
  it('never falls when an arc is widened', () => {
    const deg = fc.double({ min: 0, max: 359, noNaN: true });
    const wide = fc.double({ min: 0, max: 180, noNaN: true });
    fc.assert(
      fc.property(
        deg,
        deg,
        wide,
        wide,
        wide,
        fc.double({ min: 0, max: 12, noNaN: true }),
        (wind, from, w, a, b, mps) => {
          const built = set(steady(wind, mps), DEFAULT_SETTINGS, 2).set;
          const narrow = arcHold(built, [{ fromDeg: from, toDeg: from + w }]);
          const wider = arcHold(built, [{ fromDeg: from - a, toDeg: Math.min(from - a + 360, from + w + b) }]);
          narrow.byStep.forEach((p, t) => {
            expect(wider.byStep[t]).toBeGreaterThanOrEqual((p ?? 0) - 1e-9);
          });
          expect(wider.summary?.neverLeaves).toBeGreaterThanOrEqual((narrow.summary?.neverLeaves ?? 0) - 1e-9);
        },
      ),
    );
  });
  it('gives a union no more than the sum of its parts, and 1 for the full circle', () => {
    const built = set(steady(90, 4)).set;
    expect(arcHold(built, [{ fromDeg: 0, toDeg: 360 }]).summary).toMatchObject({ shareOfTime: 1, neverLeaves: 1 });
    const both = arcHold(built, [around(80, 20), around(100, 20)]).byStep[0] ?? 0;
    expect(both).toBeCloseTo(arcHold(built, [around(90, 30)]).byStep[0] ?? 0, 9);
    expect(arcHold(built, []).summary?.shareOfTime).toBe(0);
  });
  it('of 16 sectors sums to 1', () => {
    const built = set(steady(123, 3)).set;
    let sum = 0;
    for (let i = 0; i < 16; i++) sum += arcHold(built, [around(22.5 * i, 11.25)]).byStep[4] ?? 0;
    expect(sum).toBeCloseTo(1, 9);
  });
  it('does not change when the whole world is turned', () => {
    const deg = fc.double({ min: 0, max: 360, noNaN: true });
    fc.assert(
      fc.property(deg, deg, fc.double({ min: 0, max: 10, noNaN: true }), (turn, wind, mps) => {
        const f = (by: number) =>
          forecast([0, 20, 35, 30, 50, 70].map((d) => ({ deg: normalizeDeg(wind + d + by), mps })));
        const hold = (by: number) =>
          arcHold(set(f(by)).set, [{ fromDeg: normalizeDeg(30 + by), toDeg: normalizeDeg(110 + by) }]);
        const [a, b] = [hold(0), hold(turn)];
        a.byStep.forEach((p, t) => {
          expect(b.byStep[t]).toBeCloseTo(p ?? 0, 6);
        });
        expect(b.summary?.neverLeaves).toBeCloseTo(a.summary?.neverLeaves ?? 0, 6);
      }),
      { numRuns: 50 },
    );
  });
});
