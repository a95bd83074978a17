import type { ClubRules } from '../booking/rules';
import { legalLightRuleOf } from '../booking/seasons';
import type { WindowName } from '../condition-types';
import { addDays, dayOf, formatClock, localToUtc } from '../day-time';
import type { Weapon } from '../ground-types';
import { legalLight } from '../legal-light';
import type { Place } from '../sun';

const MINUTE_MS = 60_000;
const HOUR_MS = 60 * MINUTE_MS;
const ROUND_MS = 5 * MINUTE_MS;

export interface BackByInput {
  day: string;
  windows: readonly WindowName[];
  /** End of the last window. */
  endAt: number;
  weapon: Weapon;
  walkOutSeconds: number;
  rules: Pick<ClubRules, 'legalLight' | 'seasons'>;
  place: Place;
}

/**
 * When a person may be expected back at the parking place: the end of the window, or of an evening the club's legal end
 * where that is later, and the walk out; up to the next five minutes. UTC ms.
 */
export function defaultBackBy({ day, windows, endAt, weapon, walkOutSeconds, rules, place }: BackByInput): number {
  const rule = windows.includes('evening') ? legalLightRuleOf(rules, day, weapon) : null;
  const legalEnd = (rule && legalLight(rule, day, place)?.endAt) ?? endAt;
  return Math.ceil((Math.max(endAt, legalEnd) + walkOutSeconds * 1000) / ROUND_MS) * ROUND_MS;
}

/**
 * The first instant after `now` at which the club's clock shows `clock` ('HH:MM'): tomorrow where today's is past, the
 * second of a time shown twice where the first is past. UTC ms.
 */
export function nextClock(clock: string, now: number, zone: string): number {
  const today = dayOf(now, zone);
  const first = localToUtc(today, clock, zone);
  if (first > now) return first;
  // When clocks go back an hour a time is shown twice (half an hour on Lord Howe Island).
  for (const later of [first + HOUR_MS / 2, first + HOUR_MS]) {
    if (later > now && formatClock(later, zone) === clock) return later;
  }
  return localToUtc(addDays(today, 1), clock, zone);
}
