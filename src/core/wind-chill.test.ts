import { describe, expect, it } from 'vitest';
import { FROSTBITE_30_MIN_C, windChillC, windChillF } from './wind-chill';

describe('windChillF', () => {
  it.each([
    // US National Weather Service chart: temperature F, then wind chill at 5, 10, 15 and 20 mph.
    [40, [36, 34, 32, 30]],
    [30, [25, 21, 19, 17]],
    [20, [13, 9, 6, 4]],
    [10, [1, -4, -7, -9]],
  ])('prints the chart row of %d F', (temp, row) => {
    const ours = [5, 10, 15, 20].map((mph) => Math.round(windChillF(temp, mph) ?? Number.NaN));
    expect(ours).toEqual(row);
  });

  it.each([
    // The printed example (0 F, 15 mph: -19), and the formula worked by hand.
    [0, 15, -19.4],
    [40, 5, 36.47],
    [30, 10, 21.25],
    [20, 15, 6.22],
    [10, 20, -8.88],
    [-10, 5, -22.26],
    [-10, 10, -28.33],
  ])('%d F at %d mph', (temp, mph, chill) => {
    expect(windChillF(temp, mph)).toBeCloseTo(chill, 1);
  });

  it('is null outside its bounds and never warmer than the air inside them', () => {
    expect(windChillF(50.1, 10)).toBeNull();
    expect(windChillF(30, 2.9)).toBeNull();
    expect(windChillF(Number.NaN, 10)).toBeNull();
    expect(windChillF(50, 3)).not.toBeNull();
    for (let f = -45; f <= 40; f += 5) expect(windChillF(f, 5) ?? 99).toBeLessThan(f);
  });

  it('agrees with the metric form', () => {
    // 13.12 + 0.6215 T - 11.37 V^0.16 + 0.3965 T V^0.16, degrees C and km/h (US National Weather Service).
    for (const [c, mps] of [
      [0, 4],
      [-10, 8],
      [-25, 15],
    ] as const) {
      const v = (mps * 3.6) ** 0.16;
      expect(Math.abs((windChillC(c, mps) ?? 99) - (13.12 + 0.6215 * c - 11.37 * v + 0.3965 * c * v))).toBeLessThan(
        0.1,
      );
    }
    expect(FROSTBITE_30_MIN_C).toBeCloseTo(-27.8, 1);
  });
});
