import { describe, expect, it } from 'vitest';
import { beaufort } from './beaufort';
import { ktToMps, mphToMps } from './units';

/** Force, mph and knots as the US National Weather Service prints them, and the WMO's m/s bounds (m/s from memory). */
const ROWS: [number, [number, number], [number, number], [number, number]][] = [
  [1, [1, 3], [1, 3], [0.3, 1.5]],
  [2, [4, 7], [4, 6], [1.6, 3.3]],
  [3, [8, 12], [7, 10], [3.4, 5.4]],
  [4, [13, 18], [11, 16], [5.5, 7.9]],
  [5, [19, 24], [17, 21], [8, 10.7]],
  [6, [25, 31], [22, 27], [10.8, 13.8]],
  [7, [32, 38], [28, 33], [13.9, 17.1]],
  [8, [39, 46], [34, 40], [17.2, 20.7]],
  [9, [47, 54], [41, 47], [20.8, 24.4]],
  [10, [55, 63], [48, 55], [24.5, 28.4]],
  [11, [64, 73], [56, 63], [28.5, 32.6]],
];

describe('beaufort', () => {
  it.each(ROWS)('force %d holds its printed rows', (force, mph, kt, mps) => {
    for (const v of mps) expect(beaufort(v).force).toBe(force);
    // The rows of the three units contradict one another here: 18 mph is 8.05 m/s, 16 kt 8.23 and 21 kt 10.80.
    for (const v of mph) if (v !== 18) expect(beaufort(mphToMps(v)).force).toBe(force);
    for (const v of kt) if (v !== 16 && v !== 21) expect(beaufort(ktToMps(v)).force).toBe(force);
  });

  it('ends at calm and hurricane force, and settles speeds between printed rows by m/s', () => {
    expect(beaufort(0)).toMatchObject({ force: 0, name: 'calm' });
    expect(beaufort(0.2).force).toBe(0);
    expect(beaufort(mphToMps(75)).force).toBe(12);
    expect(beaufort(80).force).toBe(12);
    // 12.5 mph is 5.588 m/s, past the 5.5 where force 4 begins.
    expect(beaufort(mphToMps(12.5)).force).toBe(4);
  });
});
