import type { StandSightings } from '../condition-types';
import type { PromiseSettings } from './promise-settings';

/** Deer an hour over a whole log; the published default where no hours were sat. */
export function clubRate(log: StandSightings[], s: PromiseSettings): number {
  let deer = 0;
  let hours = 0;
  for (const row of log) {
    deer += row.deer;
    hours += row.hours;
  }
  return hours > 0 && deer > 0 ? deer / hours : s.defaultRatePerHour;
}

/**
 * A stand's deer an hour, shrunk to the club's: the mean of a gamma with the club's rate as prior, worth so many hours, after a Poisson count.
 * Few hours stay near the club's mean; many hours stand on their own.
 */
export function shrunkRate(
  own: { deer: number; hours: number } | null,
  clubRatePerHour: number,
  priorHours: number,
): number {
  const deer = Math.max(0, own?.deer ?? 0);
  const hours = Math.max(0, own?.hours ?? 0);
  return (deer + clubRatePerHour * priorHours) / (hours + priorHours);
}

/** Factor on promise from a stand's own log, within bounds; 1 with no log. */
export function sightingsFactor(own: StandSightings | null, clubRatePerHour: number, s: PromiseSettings): number {
  const ratio = shrunkRate(own, clubRatePerHour, s.sightingsPriorHours) / clubRatePerHour;
  return Math.min(s.sightingsMost, Math.max(s.sightingsLeast, ratio ** s.sightingsPower));
}
