import { describe, expect, it } from 'vitest';
import { STABILITY_CLASSES } from '../air/stability-types';
import { DEFAULT_SETTINGS } from '../settings';
import { directionErrorDeg, normalNodes, widenByVariable } from './error-model';
import { extraScatterDeg, scatterDeg, speedScatterDeg } from './scatter';

const s = DEFAULT_SETTINGS.wind;

describe('direction error by speed and lead', () => {
  it('holds the default bands: 60, 40, 30 and 25 degrees, and all but uniform under 2 m/s', () => {
    expect([2.5, 4, 6, 8].map((v) => directionErrorDeg(v, 24, s))).toEqual([60, 40, 30, 25]);
    // Mean resultant length at 1 m/s: next to nothing left of the direction.
    expect(Math.exp(-0.5 * ((directionErrorDeg(1, 24, s) * Math.PI) / 180) ** 2)).toBeLessThan(0.1);
  });
  it('grows by 5 degrees a day after the first and never past 90 from lead alone', () => {
    expect([0, 24, 48, 168].map((h) => directionErrorDeg(8, h, s))).toEqual([25, 25, 30, 55]);
    expect(directionErrorDeg(2.5, 24 * 30, s)).toBe(90);
    expect(directionErrorDeg(0.5, 24 * 30, s)).toBe(155);
  });
  it('never grows with speed', () => {
    for (let v = 0; v < 12; v += 0.1) {
      expect(directionErrorDeg(v + 0.1, 24, s)).toBeLessThanOrEqual(directionErrorDeg(v, 24, s));
    }
  });
  it('is uniform for a wholly variable moment and unchanged for a steady one', () => {
    expect(widenByVariable(30, 0)).toBe(30);
    expect(widenByVariable(30, 0.5)).toBeGreaterThan(60);
    expect(widenByVariable(30, 1)).toBeGreaterThan(180);
  });
});

describe('nodes of the lasting error', () => {
  it.each([1, 5, 11, 15])('%s nodes have weight 1, mean 0 and variance 1', (n) => {
    const { z, weights } = normalNodes(n);
    const sum = (f: (x: number) => number) => z.reduce((t, x, i) => t + f(x) * (weights[i] ?? 0), 0);
    expect(sum(() => 1)).toBeCloseTo(1, 12);
    expect(sum((x) => x)).toBeCloseTo(0, 12);
    expect(sum((x) => x * x)).toBeCloseTo(n === 1 ? 0 : 1, 12);
  });
});

describe('scatter (Joffre & Laurila 1988: 0.32/V rad to 5 m/s, 0.065 rad above)', () => {
  it.each([
    [0.5, 36.7],
    [1, 18.3],
    [1.5, 12.2],
    [2, 9.2],
    [3, 6.1],
    [4, 4.6],
    [5, 3.7],
    [9, 3.7],
  ])('%s m/s: %s degrees', (v, deg) => expect(Math.abs(speedScatterDeg(v, 90) - deg)).toBeLessThan(0.05));
  it('is all but continuous at 5 m/s, falls with speed and is capped', () => {
    expect(speedScatterDeg(5.0001, 90) - speedScatterDeg(5, 90)).toBeLessThan(0.06);
    for (let v = 0; v < 4.9; v += 0.1) {
      expect(speedScatterDeg(v + 0.1, 40)).toBeLessThanOrEqual(speedScatterDeg(v, 40));
    }
    expect(speedScatterDeg(0, 40)).toBe(40);
  });
  it('is never less than the class’s sigma-theta, and only the rest widens a plume', () => {
    for (const c of STABILITY_CLASSES) {
      for (const v of [0.3, 1, 3, 8]) {
        const total = scatterDeg(c, v, 40);
        const extra = extraScatterDeg(c, total);
        expect(extra).toBeLessThan(total);
        expect(extra).toBeGreaterThanOrEqual(0);
      }
    }
    expect(scatterDeg('D', 6, 40)).toBe(10);
    expect(extraScatterDeg('D', 10)).toBe(0);
    expect(scatterDeg('F', 1, 40)).toBeCloseTo(18.3, 1);
  });
});
