/** What came of a shot, and how long to wait before going after a deer that was hit. */

export const SHOTS = ['none', 'missed', 'hit'] as const;
export type Shot = (typeof SHOTS)[number];

export const HIT_PLACES = ['heart_lungs', 'elsewhere', 'unsure'] as const;
export type HitPlace = (typeof HIT_PLACES)[number];

export const FOLLOW_UPS = ['waiting', 'recovered', 'not_found'] as const;
export type FollowUp = (typeof FOLLOW_UPS)[number];

const MINUTE_MS = 60_000;
const HOUR_MS = 60 * MINUTE_MS;

export interface Wait {
  leastMs: number;
  /** Same as the least where one time is taught. */
  mostMs: number;
}

/**
 * How long to wait before following a deer: 30 minutes after a hit in heart or lungs, 4 to 6 hours after any other (state
 * hunter education). A hit nobody is sure of takes the longer time (our choice, the careful one).
 */
export function waitAfterHit(place: HitPlace): Wait {
  return place === 'heart_lungs'
    ? { leastMs: 30 * MINUTE_MS, mostMs: 30 * MINUTE_MS }
    : { leastMs: 4 * HOUR_MS, mostMs: 6 * HOUR_MS };
}

/** The instants, UTC milliseconds, from which to follow a deer hit at `shotAt`. */
export function followFrom(shotAt: number, place: HitPlace): { earliest: number; latest: number } {
  const { leastMs, mostMs } = waitAfterHit(place);
  return { earliest: shotAt + leastMs, latest: shotAt + mostMs };
}
