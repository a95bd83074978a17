import { describe, expect, it } from 'vitest';
import { SHELTER_CLASSES } from '../ground-types';
import { DEFAULT_SETTINGS } from '../settings';
import { heightShare } from './power-law';
import { NWCG_FACTORS, shelterShare } from './shelter';
import { STABILITY_CLASSES } from './stability-types';

describe('power law (EPA-454/R-99-005 section 6.2.5 rural exponents; cells computed from them)', () => {
  it.each([
    ['A', [0.893, 0.919, 0.938, 0.953, 0.965]],
    ['B', [0.893, 0.919, 0.938, 0.953, 0.965]],
    ['C', [0.851, 0.887, 0.912, 0.933, 0.95]],
    ['D', [0.786, 0.835, 0.872, 0.901, 0.926]],
    ['E', [0.569, 0.656, 0.726, 0.785, 0.836]],
    ['F', [0.413, 0.516, 0.604, 0.683, 0.755]],
  ] as const)('class %s at 2, 3, 4, 5 and 6 m', (c, cells) => {
    cells.forEach((cell, i) => {
      expect(Math.abs(heightShare(c, i + 2) - cell)).toBeLessThan(0.001);
    });
  });
  it('carries 4 m/s to 6.0 m/s at 150 m (printed in a teaching sheet on stack plumes)', () => {
    expect(4 * heightShare('D', 150)).toBeCloseTo(6.004, 2);
  });
});

describe('shelter (NWCG wind adjustment factors)', () => {
  it('holds 0.4, 0.3, 0.2 and 0.1, and the defaults are shares of the first', () => {
    expect(SHELTER_CLASSES.map((s) => NWCG_FACTORS[s])).toEqual([0.4, 0.3, 0.2, 0.1]);
    for (const s of SHELTER_CLASSES) {
      expect(shelterShare(s, DEFAULT_SETTINGS.air)).toBeCloseTo(NWCG_FACTORS[s] / NWCG_FACTORS.open, 12);
    }
  });
  it('slows 15 mph to 1.5 mph in a dense stand (NWCG Firefighter Math 8.2)', () => {
    expect(15 * NWCG_FACTORS.dense_wood).toBeCloseTo(1.5, 12);
  });
  it('never puts a sheltered seat above open wind, whatever the setting', () => {
    const wild = { ...DEFAULT_SETTINGS.air, shelterShare: { open: 3, edge: Number.NaN, open_wood: -1, dense_wood: 2 } };
    for (const air of [DEFAULT_SETTINGS.air, wild]) {
      for (const s of SHELTER_CLASSES) {
        for (const c of STABILITY_CLASSES) {
          const seat = shelterShare(s, air) * heightShare(c, 5);
          expect(seat).toBeLessThanOrEqual(heightShare(c, 5));
          expect(seat).toBeGreaterThanOrEqual(0);
        }
      }
    }
  });
});
