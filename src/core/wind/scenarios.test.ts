import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { placeAir } from '../air/place-air';
import { standAir } from '../air/stand-air';
import { normalizeDeg } from '../angles';
import { wrappedNormalInArc } from '../circular';
import type { EnsembleMember, Forecast } from '../condition-types';
import type { Arc } from '../ground-types';
import { DEFAULT_SETTINGS, type ScoringSettings } from '../settings';
import { arcHold } from './arc-hold';
import { arcTest, chanceInArcs } from './arc-probability';
import { directionShares, directionSummary, sitDirectionShares } from './histogram';
import { buildScenarios } from './scenarios';
import { scenariosAtStand } from './stand-scenarios';

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

function set(f: Forecast, settings = DEFAULT_SETTINGS, hours = 5) {
  const steps = placeAir({ lat: 34.1, lon: -84, startAt: NOON, endAt: NOON + hours * HOUR, forecast: f }, settings.air);
  return { steps, set: buildScenarios(steps, f, settings) };
}
const around = (centre: number, half: number): Arc => ({
  fromDeg: normalizeDeg(centre - half),
  toDeg: normalizeDeg(centre + half),
});

describe('arc probability through the scenarios (wrapped normal, computed with SciPy)', () => {
  const HALVES = [11.25, 22.5, 30, 45, 67.5, 90];
  const ROWS: [number, number[]][] = [
    [20, [0.4262, 0.7394, 0.8664, 0.9756, 0.9993, 1]],
    [30, [0.2923, 0.5467, 0.6827, 0.8664, 0.9756, 0.9973]],
    [40, [0.2215, 0.4262, 0.5467, 0.7394, 0.9085, 0.9756]],
    [50, [0.178, 0.3473, 0.4515, 0.6319, 0.823, 0.9281]],
    [60, [0.1487, 0.2923, 0.3829, 0.5467, 0.7394, 0.8664]],
    [90, [0.0995, 0.1976, 0.2613, 0.3834, 0.5479, 0.6854]],
  ];
  it.each(ROWS)('error %s degrees, arc centred on the wind', (sigma, row) => {
    for (const mps of [2.5, 6]) {
      const built = set(steady(217, mps), withError(sigma)).set;
      HALVES.forEach((half, i) => {
        const p = arcHold(built, [around(217, half)]).byStep[0] ?? 0;
        expect(Math.abs(p - (row[i] ?? 0))).toBeLessThan(0.01);
      });
    }
  });
  it.each([
    [
      40,
      22.5,
      [
        [20, 0.1899],
        [30, 0.2612],
        [45, 0.2662],
        [60, 0.2365],
      ],
    ],
    [
      60,
      30,
      [
        [20, 0.0668],
        [30, 0.1573],
        [45, 0.2297],
        [60, 0.2417],
      ],
    ],
    [
      180,
      30,
      [
        [45, 0.0009],
        [60, 0.012],
      ],
    ],
  ] as [number, number, number[][]][])('arc %s degrees off, half width %s', (off, half, cells) => {
    for (const [sigma, expected] of cells) {
      const built = set(steady(10, 6), withError(sigma ?? 0)).set;
      const p = arcHold(built, [around(10 + off, half)]).byStep[0] ?? 0;
      expect(Math.abs(p - (expected ?? 0))).toBeLessThan(0.01);
    }
  });
  it('matches published forecast skill: 45 degrees is 38 % within 22.5 (Lavdas), 31 is 53 %', () => {
    const within = (sigma: number) =>
      arcHold(set(steady(0, 6), withError(sigma)).set, [around(0, 22.5)]).byStep[0] ?? 0;
    expect(Math.abs(within(45) - 0.38)).toBeLessThan(0.01);
    expect(Math.abs(within(31) - 0.53)).toBeLessThan(0.01);
  });
  it('the table agrees with the exact sum to 1e-5', () => {
    const deg = fc.double({ min: 0, max: 360, noNaN: true });
    fc.assert(
      fc.property(deg, deg, fc.double({ min: 1, max: 200, noNaN: true }), deg, (from, width, sigma, mean) => {
        const arc = { fromDeg: from, toDeg: from + width };
        expect(Math.abs(chanceInArcs(arcTest([arc]), mean, sigma) - wrappedNormalInArc(mean, sigma, arc))).toBeLessThan(
          1e-5,
        );
      }),
    );
  });
});

describe('calm and variable wind (METAR: VRB and 00000KT have no direction)', () => {
  it.each([
    [null, 3],
    [0, 0],
  ])('direction %s at %s m/s is uniform', (deg, mps) => {
    const built = set(steady(deg, mps)).set;
    expect(arcHold(built, [around(90, 45)]).byStep[0]).toBeCloseTo(0.25, 9);
    expect(directionShares(built, 0)).toEqual(directionShares(built, 0)?.map(() => expect.closeTo(1 / 72, 12)));
    expect(directionSummary(built).meanFromDeg).toBeNull();
  });
  it('spreads all but evenly at 1 m/s and stays continuous down to calm', () => {
    const share = (mps: number) => arcHold(set(steady(90, mps)).set, [around(90, 45)]).byStep[0] ?? 0;
    expect(share(1)).toBeLessThan(0.33);
    let before = share(8);
    for (let v = 7.9; v > 0.5; v -= 0.1) {
      const now = share(v);
      expect(now).toBeLessThanOrEqual(before + 0.004);
      expect(before - now).toBeLessThan(0.06);
      before = now;
    }
    expect(before).toBeLessThan(0.27);
  });
  it('a step beside a variable hour is wider than one that is not', () => {
    const f = forecast([
      { deg: 90, mps: 5 },
      { deg: null, mps: 5 },
      { deg: 90, mps: 5 },
    ]);
    const hold = arcHold(set(f, DEFAULT_SETTINGS, 1).set, [around(90, 45)]).byStep;
    const plain = arcHold(set(steady(90, 5), DEFAULT_SETTINGS, 1).set, [around(90, 45)]).byStep;
    expect(hold[0]).toBeLessThan((plain[0] ?? 0) - 0.1);
    expect(hold[1]).toBeCloseTo(0.25, 9);
  });
});

describe('sets', () => {
  it('have weights that sum to 1 and histograms that sum to 1', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0, max: 360, noNaN: true }),
        fc.double({ min: 0, max: 20, noNaN: true }),
        (deg, mps) => {
          const built = set(steady(deg, mps), {
            ...DEFAULT_SETTINGS,
            wind: { ...DEFAULT_SETTINGS.wind, strayShare: 0.1 },
          }).set;
          expect(built.scenarios.reduce((a, s) => a + s.weight, 0)).toBeCloseTo(1, 12);
          expect(sitDirectionShares(built)?.reduce((a, b) => a + b, 0)).toBeCloseTo(1, 9);
        },
      ),
      { numRuns: 40 },
    );
  });
  it('keep a lasting error through the sit: each scenario is off by the same way at every step', () => {
    const built = set(
      forecast([
        { deg: 350, mps: 6 },
        { deg: 10, mps: 6 },
        { deg: 30, mps: 6 },
        { deg: 50, mps: 6 },
        { deg: 70, mps: 6 },
        { deg: 90, mps: 6 },
      ]),
    ).set;
    const middle = built.scenarios[5];
    for (const { steps } of built.scenarios) {
      const off = steps.map((step, t) => normalizeDeg((step.fromDeg ?? 0) - (middle?.steps[t]?.fromDeg ?? 0)));
      for (const o of off) expect(Math.cos(((o - (off[0] ?? 0)) * Math.PI) / 180)).toBeCloseTo(1, 3);
    }
  });
  it('use ensemble members as they are, of equal weight, when there are enough', () => {
    const member = (id: string, deg: number): EnsembleMember => ({
      id,
      hours: Array.from({ length: 7 }, (_, n) => ({ at: NOON + n * HOUR, windFromDeg: deg, windSpeedMps: 4 })),
    });
    const members = [10, 20, 30, 40, 50, 60].map((d) => member(`m${d}`, d));
    const built = set({ ...steady(200, 4), members }).set;
    expect(built.source).toBe('members');
    expect(built.scenarios.map((s) => [s.weight, s.steps[3]?.fromDeg])).toEqual(
      [10, 20, 30, 40, 50, 60].map((d) => [1 / 6, expect.closeTo(d, 9)]),
    );
    expect(set({ ...steady(200, 4), members: members.slice(0, 3) }).set.source).toBe('error_model');
    const late = { id: 'late', hours: member('x', 90).hours.slice(4) };
    expect(set({ ...steady(200, 4), members: [...members, late] }).set.scenarios).toHaveLength(6);
  });
  it('say nothing without a forecast, and nothing for steps it does not reach', () => {
    const steps = placeAir(
      { lat: 34.1, lon: -84, startAt: NOON, endAt: NOON + HOUR, forecast: null },
      DEFAULT_SETTINGS.air,
    );
    const none = buildScenarios(steps, null, DEFAULT_SETTINGS);
    expect(none).toMatchObject({ source: 'none', scenarios: [], known: [false, false] });
    expect(arcHold(none, [around(0, 90)])).toEqual({ byStep: [null, null], summary: null });
    expect(directionShares(none, 0)).toBeNull();
    const short = set(forecast([{ deg: 90, mps: 5 }]), DEFAULT_SETTINGS, 2).set;
    expect(arcHold(short, [around(90, 45)]).byStep.map((p) => p === null)).toEqual([false, true, true, true]);
  });
  it('grow wider with lead', () => {
    const late: Forecast = { ...steady(90, 6), issuedAt: NOON - 120 * HOUR };
    expect(directionSummary(set(late).set).spreadDeg).toBeGreaterThan(
      (directionSummary(set(steady(90, 6)).set).spreadDeg ?? 0) + 10,
    );
    expect(set(late).set.leadHours).toBe(120);
    // The default table at 6 m/s and half a day: 30 degrees.
    expect(directionSummary(set(steady(90, 6)).set).spreadDeg).toBeCloseTo(30, 0);
  });
});

describe('at a stand', () => {
  const hill = { seatHeightM: 5, shelter: 'edge', drainBearingDeg: 90, slopePercent: 20 } as const;
  // 05:00 to 07:00 EST under a clear sky, light wind from the south.
  const dawn = Date.UTC(2016, 10, 15, 10);
  const f: Forecast = {
    ...steady(180, 1),
    hours: steady(180, 1).hours.map((h, n) => ({ ...h, at: dawn + n * HOUR, cloudPercent: 0 })),
  };
  const steps = placeAir(
    { lat: 34.1, lon: -84, startAt: dawn, endAt: dawn + 2 * HOUR, forecast: f },
    DEFAULT_SETTINGS.air,
  );
  const open = buildScenarios(steps, f, DEFAULT_SETTINGS);
  it('drain flow gathers what the general wind leaves wide', () => {
    const seat = scenariosAtStand(open, standAir(hill, steps, DEFAULT_SETTINGS.air));
    const west = [around(270, 45)];
    expect(arcHold(open, west).byStep[0]).toBeLessThan(0.3);
    expect(arcHold(seat, west).byStep[0]).toBeGreaterThan(0.7);
    expect(seat.level).toBe('seat');
  });
  it('drain flow also gathers a variable wind', () => {
    const variable = {
      ...open,
      scenarios: open.scenarios.map((s) => ({ ...s, steps: s.steps.map(() => ({ fromDeg: null, speedMps: 1 })) })),
    };
    const seat = scenariosAtStand(variable, standAir(hill, steps, DEFAULT_SETTINGS.air));
    expect(arcHold(seat, [around(270, 45)]).byStep[0]).toBeGreaterThan(0.6);
  });
  it('without drift only slows the wind', () => {
    const seat = scenariosAtStand(open, standAir({ ...hill, drainBearingDeg: null }, steps, DEFAULT_SETTINGS.air));
    expect(arcHold(seat, [around(180, 45)])).toEqual(arcHold(open, [around(180, 45)]));
    expect(seat.scenarios[0]?.steps[0]?.speedMps).toBeLessThan(0.75);
  });
});
