import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { apartDeg, normalizeDeg } from './angles';
import {
  circularMean,
  circularSdDeg,
  meanWind,
  wrappedNormalInArc,
  wrappedNormalInArcs,
  yamartinoSdDeg,
} from './circular';
import { SECTORS } from './sectors';

describe('circular sums', () => {
  it.each([
    // Mardia's roulette data (published mean 51, R 0.711, from memory); SDs by the formulas SciPy and Yamartino 1984 state.
    [[43, 45, 52, 61, 75, 88, 88, 279, 357], 51.05, 0.710991, 47.323, 47.088],
    [[51, 67, 40, 109, 31, 358], 48.6272, 0.836436, 34.244, 34.081],
    [[350, 10, 20, 340, 0, 30, 15, 355], 5, 0.963309, 15.666, 15.615],
    [[340, 350, 0, 10, 20], 0, 0.9698, 14.189, 14.149],
  ])('of %j', (data, mean, r, sd, yamartino) => {
    const sums = circularMean(data);
    expect(apartDeg(sums.meanDeg ?? Number.NaN, mean)).toBeLessThan(1e-3);
    expect(sums.r).toBeCloseTo(r, 5);
    expect(circularSdDeg(sums.r)).toBeCloseTo(sd, 2);
    expect(yamartinoSdDeg(sums.r)).toBeCloseTo(yamartino, 2);
  });

  it('say so when there is no mean', () => {
    expect(circularMean([0, 180])).toMatchObject({ meanDeg: null });
    expect(circularMean([])).toEqual({ meanDeg: null, r: 0 });
    expect(circularSdDeg(0)).toBe(Number.POSITIVE_INFINITY);
    // 180 / sqrt 3, the cap of Yamartino's estimate.
    expect(yamartinoSdDeg(0)).toBeCloseTo(103.923, 3);
    expect(circularSdDeg(1)).toBe(0);
  });

  it('weigh directions, and winds by their speed', () => {
    expect(circularMean([350, 90], [1, 0]).meanDeg).toBeCloseTo(350, 9);
    // Computed by hand from the definition in EPA's meteorological monitoring guidance, 6.2.
    const mean = meanWind([
      { fromDeg: 350, speed: 2 },
      { fromDeg: 10, speed: 4 },
      { fromDeg: 90, speed: 1 },
    ]);
    expect(mean.fromDeg).toBeCloseTo(12.845, 3);
    expect(mean.speed).toBeCloseTo(2.0202, 4);
    expect(meanWind([])).toEqual({ fromDeg: null, speed: 0 });
  });
});

/** Chance within +-h of the arc's centre for a wrapped normal, computed independently with SciPy. */
const HALF_WIDTHS = [11.25, 22.5, 30, 45, 67.5, 90];
const CENTRED: [number, number[]][] = [
  [10, [0.7394, 0.9756, 0.9973, 1, 1, 1]],
  [20, [0.4262, 0.7394, 0.8664, 0.9756, 0.9993, 1]],
  [30, [0.2923, 0.5467, 0.6827, 0.8664, 0.9756, 0.9973]],
  [40, [0.2215, 0.4262, 0.5467, 0.7394, 0.9085, 0.9756]],
  [50, [0.178, 0.3473, 0.4515, 0.6319, 0.823, 0.9281]],
  [60, [0.1487, 0.2923, 0.3829, 0.5467, 0.7394, 0.8664]],
  [90, [0.0995, 0.1976, 0.2613, 0.3834, 0.5479, 0.6854]],
];
const OFF_CENTRE: [number, number, number, number][] = [
  [40, 22.5, 10, 0.0401],
  [40, 22.5, 20, 0.1899],
  [40, 22.5, 30, 0.2612],
  [40, 22.5, 45, 0.2662],
  [40, 22.5, 60, 0.2365],
  [60, 30, 10, 0.0013],
  [60, 30, 20, 0.0668],
  [60, 30, 30, 0.1573],
  [60, 30, 45, 0.2297],
  [60, 30, 60, 0.2417],
  [180, 30, 45, 0.0009],
  [180, 30, 60, 0.012],
];

describe('wrappedNormalInArc', () => {
  it.each(CENTRED)('matches SciPy at sigma %d, mean on the centre', (sigma, row) => {
    row.forEach((value, i) => {
      const h = HALF_WIDTHS[i] ?? 0;
      const p = wrappedNormalInArc(0, sigma, { fromDeg: 360 - h, toDeg: h });
      expect(Math.abs(p - value)).toBeLessThan(1e-4);
    });
  });

  it.each(OFF_CENTRE)('matches SciPy %d off centre, half width %d, sigma %d', (off, h, sigma, value) => {
    const p = wrappedNormalInArc(200 + off, sigma, { fromDeg: 200 - h, toDeg: 200 + h });
    expect(Math.abs(p - value)).toBeLessThan(1e-4);
  });

  it('agrees with the published forecast errors', () => {
    // Lavdas: 38 % within 22.5 degrees is sigma 45; 53 % is sigma 31. A normal's mean absolute error is 0.798 sigma.
    const arc = { fromDeg: 67.5, toDeg: 112.5 };
    expect(wrappedNormalInArc(90, 45, arc)).toBeCloseTo(0.38, 2);
    expect(wrappedNormalInArc(90, 31, arc)).toBeCloseTo(0.53, 2);
  });

  it('sums to 1 over the 16 sectors and comes to the width over 360 at a great spread', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0, max: 360, noNaN: true }),
        fc.double({ min: 0.5, max: 600, noNaN: true }),
        (mean, sigma) => {
          const sum = SECTORS.reduce(
            (total, s) => total + wrappedNormalInArc(mean, sigma, { fromDeg: s.lowerDeg, toDeg: s.upperDeg }),
            0,
          );
          expect(sum).toBeCloseTo(1, 9);
        },
      ),
    );
    expect(wrappedNormalInArc(10, Number.POSITIVE_INFINITY, { fromDeg: 100, toDeg: 190 })).toBe(0.25);
    expect(wrappedNormalInArc(10, 399, { fromDeg: 100, toDeg: 190 })).toBeCloseTo(0.25, 9);
  });

  it('is the same turned by any angle, never falls when the arc widens, and is the plain test with no spread', () => {
    const deg = fc.integer({ min: 0, max: 359 });
    fc.assert(
      fc.property(
        deg,
        deg,
        fc.integer({ min: 1, max: 300 }),
        fc.integer({ min: 1, max: 59 }),
        fc.integer({ min: 0, max: 120 }),
        deg,
        (mean, from, width, more, sigma, turn) => {
          const at = (m: number, f: number, w: number) =>
            wrappedNormalInArc(m, sigma, { fromDeg: normalizeDeg(f), toDeg: normalizeDeg(f + w) });
          const p = at(mean, from, width);
          expect(at(mean + turn, from + turn, width)).toBeCloseTo(p, 9);
          expect(at(mean, from, width + more)).toBeGreaterThanOrEqual(p - 1e-12);
          if (sigma === 0) expect(p).toBe(normalizeDeg(mean - from) <= width ? 1 : 0);
        },
      ),
    );
  });

  it('counts overlapping arcs once', () => {
    const one = wrappedNormalInArc(0, 30, { fromDeg: 330, toDeg: 60 });
    const both = wrappedNormalInArcs(0, 30, [
      { fromDeg: 330, toDeg: 20 },
      { fromDeg: 350, toDeg: 60 },
    ]);
    expect(both).toBeCloseTo(one, 12);
    expect(wrappedNormalInArcs(0, 30, [])).toBe(0);
  });
});
