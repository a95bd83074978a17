import { describe, expect, it } from 'vitest';
import { MOST_ATTEMPTS, waitAfter } from './back-off';

describe('waitAfter', () => {
  it('waits 1, 5, 15 and 60 minutes, then 4 hours, and never less than the time before', () => {
    const waits = Array.from({ length: MOST_ATTEMPTS - 1 }, (_, index) => waitAfter(index + 1));
    expect(waits.slice(0, 5)).toEqual([60_000, 300_000, 900_000, 3_600_000, 14_400_000]);
    expect([...waits].sort((a, b) => Number(a) - Number(b))).toEqual(waits);
  });

  it('gives up with the eighth failure', () => {
    expect(waitAfter(7)).toBeGreaterThan(0);
    expect(waitAfter(8)).toBeNull();
    expect(waitAfter(9)).toBeNull();
  });
});
