import { describe, expect, it } from 'vitest';
import { DEFAULT_APPROACH } from './approach-settings';
import { seenHeardChance } from './seen-heard';

const s = DEFAULT_APPROACH;
const chance = (metres: number, dark = 0, wind: number | null = null) => seenHeardChance(metres, dark, wind, s);

describe('being seen or heard on the way', () => {
  it('stays under the 70 % within 100 m of hikers on trails in open, unhunted land (Taylor & Knight 2003)', () => {
    for (const metres of [0, 25, 50, 75, 100]) {
      expect(chance(metres)).toBeLessThanOrEqual(0.7);
      expect(chance(metres)).toBeGreaterThan(0.15);
    }
  });

  it('tapers by 200 m and leaves nothing at 400 m (practice: disturbance carries 200-400 yd)', () => {
    expect(chance(200)).toBeLessThan(chance(100) / 2);
    expect(chance(390)).toBeGreaterThan(0);
    expect(chance(400)).toBe(0);
    expect(chance(5000)).toBe(0);
  });

  it('falls with every step away', () => {
    for (let d = 0; d < 395; d += 5) expect(chance(d + 5)).toBeLessThan(chance(d));
  });

  it('is less in the dark and less in wind, never nothing; unknown wind masks nothing', () => {
    expect(chance(50, 1)).toBeLessThan(chance(50));
    expect(chance(50, 0, 8)).toBeLessThan(chance(50, 0, 2));
    expect(chance(50, 1, 100)).toBeGreaterThan(0.05);
    expect(chance(50, 0, null)).toBe(chance(50, 0, 0));
  });
});
