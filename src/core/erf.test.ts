import { describe, expect, it } from 'vitest';
import { erf, erfc, normalCdf } from './erf';

describe('the error function', () => {
  it.each([
    // Abramowitz & Stegun, table 7.1 (values from memory).
    [0, 0],
    [0.1, 0.1124629160182849],
    [0.5, 0.5204998778130465],
    [1, 0.8427007929497149],
    [1.5, 0.9661051464753108],
    [2, 0.9953222650189527],
    [3, 0.9999779095030014],
  ])('erf(%d)', (x, value) => {
    expect(Math.abs(erf(x) - value)).toBeLessThan(1e-12);
    expect(erf(-x)).toBeCloseTo(-value, 12);
  });

  it('keeps its tail', () => {
    // erfc(4) and erfc(5), values from memory.
    expect(erfc(4) / 1.541725790028002e-8).toBeCloseTo(1, 9);
    expect(erfc(5) / 1.5374597944280347e-12).toBeCloseTo(1, 9);
    expect(erf(Number.POSITIVE_INFINITY)).toBe(1);
    expect(erfc(Number.POSITIVE_INFINITY)).toBe(0);
  });

  it('joins smoothly where the two forms meet and always rises', () => {
    expect(Math.abs(erfc(2.5 - 1e-9) - erfc(2.5 + 1e-9))).toBeLessThan(1e-11);
    for (let x = -4; x < 4; x += 0.01) expect(normalCdf(x + 0.01)).toBeGreaterThan(normalCdf(x));
    expect(normalCdf(1.959963985)).toBeCloseTo(0.975, 9);
  });
});
