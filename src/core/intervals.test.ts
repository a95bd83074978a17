import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { countInterval, ratioInterval, shareInterval } from './intervals';

describe('countInterval', () => {
  // Exact 95 % limits of a Poisson count as printed in tables after Garwood 1936 (Pearson and Hartley, Biometrika Tables, table 40).
  it.each([
    [0, 0, 3.689],
    [1, 0.0253, 5.572],
    [2, 0.242, 7.225],
    [5, 1.623, 11.668],
    [10, 4.795, 18.39],
    [20, 12.217, 30.888],
    [50, 37.11, 65.92],
    [100, 81.36, 121.63],
  ])('of %d is %f to %f', (count, low, high) => {
    const found = countInterval(count);
    expect(Math.abs(found.low - low)).toBeLessThan(0.006);
    expect(Math.abs(found.high - high)).toBeLessThan(0.006);
  });

  it('holds the count, and rises with it', () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 5000 }), (count) => {
        const [a, b] = [countInterval(count), countInterval(count + 1)];
        expect(a.low).toBeLessThanOrEqual(count);
        expect(a.high).toBeGreaterThan(count);
        expect(b.low).toBeGreaterThan(a.low);
        expect(b.high).toBeGreaterThan(a.high);
      }),
      { numRuns: 60 },
    );
  });
});

describe('shareInterval', () => {
  // Newcombe 1998, Statistics in Medicine 17, table I, method 3 (score without continuity correction).
  it.each([
    [81, 263, 0.2553, 0.3662],
    [15, 148, 0.0624, 0.1605],
    [0, 20, 0, 0.1611],
    [1, 29, 0.0061, 0.1718],
  ])('of %d in %d is %f to %f', (some, all, low, high) => {
    const found = shareInterval(some, all);
    expect(found.low).toBeCloseTo(low, 4);
    expect(found.high).toBeCloseTo(high, 4);
  });

  it('stays between 0 and 1 and holds the share', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 400 }), fc.nat(400), (all, n) => {
        const some = Math.min(all, n);
        const { low, high } = shareInterval(some, all);
        expect(low).toBeGreaterThanOrEqual(0);
        expect(high).toBeLessThanOrEqual(1);
        expect(low).toBeLessThanOrEqual(some / all);
        expect(high).toBeGreaterThanOrEqual(some / all);
      }),
    );
  });
});

describe('ratioInterval', () => {
  it('is the share of the sum turned into a ratio', () => {
    // 15 of 20 by Wilson's formula worked by hand: 0.5313 to 0.8881.
    const { low, high } = ratioInterval(15, 5);
    expect(low).toBeCloseTo(0.5313 / 0.4687, 2);
    expect(high).toBeCloseTo(0.8881 / 0.1119, 1);
  });

  it('read the other way round is the other way round', () => {
    const [a, b] = [ratioInterval(10, 15), ratioInterval(15, 10)];
    expect(a.low).toBeCloseTo(1 / b.high, 9);
    expect(a.high).toBeCloseTo(1 / b.low, 9);
  });
});
