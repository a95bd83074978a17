/** Altitude of the sun's centre, as refraction shows it, when its upper edge meets the horizon: minus its radius of 16'. */
export const RISE_SET_ALTITUDE_DEG = -16 / 60;

const HOUR = 3_600_000;

/**
 * Night for stability: from one hour before sunset to one hour after sunrise (EPA-454/R-99-005; NOAA ARL prints the same).
 * `altitudeAt` gives the sun's apparent altitude in degrees at an instant, so polar days and nights need no special case.
 */
export function isStabilityNight(at: number, altitudeAt: (at: number) => number): boolean {
  return [at, at - HOUR, at + HOUR].some((t) => altitudeAt(t) < RISE_SET_ALTITUDE_DEG);
}
