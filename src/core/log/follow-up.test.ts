import { describe, expect, it } from 'vitest';
import { followFrom, waitAfterHit } from './follow-up';

const MINUTE = 60_000;

describe('waiting before following a deer', () => {
  // State hunter education: 30 minutes; 4 to 6 hours when hit outside heart and lungs.
  it('is half an hour after a hit in heart or lungs', () => {
    expect(waitAfterHit('heart_lungs')).toEqual({ leastMs: 30 * MINUTE, mostMs: 30 * MINUTE });
  });

  it('is four to six hours after any other, and when nobody is sure', () => {
    expect(followFrom(1_000, 'elsewhere')).toEqual({ earliest: 1_000 + 240 * MINUTE, latest: 1_000 + 360 * MINUTE });
    expect(followFrom(1_000, 'unsure')).toEqual(followFrom(1_000, 'elsewhere'));
  });
});
