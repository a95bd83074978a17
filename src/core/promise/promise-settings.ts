import type { Suitability, TimeOfDay } from '../ground-types';

export interface PromiseSettings {
  /** Chance of deer in range in daylight that the steward's own rating of the window stands for. */
  suitability: Record<Suitability, number>;
  /** Factor on promise with no used feature in range, and with one always in use. */
  noFeatureFactor: number;
  fullFeatureFactor: number;
  /** Deer at a feature up to this many times the shot range still wander into it; falls to nothing there. */
  wanderTimes: number;
  /** Weight of a feature off the shot side. */
  offSideFactor: number;
  /** Most a travel line in range gains or loses as the wind crosses or follows it. */
  crosswindSpan: number;
  /** The sun bothers below this height and within this turn of the facing, degrees; it may take this share of promise. */
  sunAltitudeDeg: number;
  sunTurnDeg: number;
  sunCost: number;
  /** Cloud from this percent hides the sun wholly; below half of it not at all. */
  sunCloudPercent: number;
  /** Rain at this many mm an hour takes the whole rain cost. */
  heavyRainMm: number;
  rainCost: number;
  /** Seat wind at which the cost begins and is whole, m/s. */
  strongWindFromMps: number;
  strongWindFullMps: number;
  windCost: number;
  /** Hours of sits that the club's own mean counts for when a stand's sightings are shrunk to it. */
  sightingsPriorHours: number;
  /** Deer an hour where a club has no log at all. */
  defaultRatePerHour: number;
  /** Power and bounds of the factor from a stand's rate against the club's. */
  sightingsPower: number;
  sightingsLeast: number;
  sightingsMost: number;
  /** How much of a sit's promise falls at each time of day, per half hour. */
  movement: Record<TimeOfDay, number>;
  /** Shown, never counted: studies found nothing (Webb et al. 2010) or nothing peer reviewed was found (barometer). */
  moonWeight: 0;
  barometerWeight: 0;
}

/**
 * Rate: 2.7 deer in 3.7 h over 487 hunts (Meier et al. 2025, Wildl. Res.). Movement: twilight peaks (Webb et al. 2010, Int. J. Ecol.).
 * The rest is practice or our choice: see SETTING_NOTES.
 */
export const DEFAULT_PROMISE: PromiseSettings = {
  suitability: { prime: 0.6, usable: 0.42, avoid: 0.15 },
  noFeatureFactor: 0.75,
  fullFeatureFactor: 1.5,
  wanderTimes: 2,
  offSideFactor: 0.4,
  crosswindSpan: 0.15,
  sunAltitudeDeg: 20,
  sunTurnDeg: 50,
  sunCost: 0.4,
  sunCloudPercent: 80,
  heavyRainMm: 4,
  rainCost: 0.4,
  strongWindFromMps: 7,
  strongWindFullMps: 13,
  windCost: 0.35,
  sightingsPriorHours: 20,
  defaultRatePerHour: 0.73,
  sightingsPower: 0.5,
  sightingsLeast: 0.6,
  sightingsMost: 1.6,
  movement: { night: 0, dawn: 1, morning: 0.6, midday: 0.35, afternoon: 0.55, dusk: 1 },
  moonWeight: 0,
  barometerWeight: 0,
};
