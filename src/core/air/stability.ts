import { srdtDay } from './srdt';
import type { StabilityClass } from './stability-types';
import { netRadiationIndex, turnerClass } from './turner';

export interface StabilityInput {
  /** By the night rule, see night-rule.ts. */
  isNight: boolean;
  sunAltitudeDeg: number;
  /** 10 m wind, m/s. */
  speedMps: number;
  /** 0-100. */
  cloudPercent: number;
  /** Downward shortwave, W/m2; null: not given. */
  radiationWm2: number | null;
}

/**
 * Stability class. By day the SRDT method when the forecast gives radiation; by night, or without it, Turner's method from
 * sun height and cloud (forecasts give no delta-T, which SRDT needs at night).
 */
export function stabilityOf(input: StabilityInput): StabilityClass {
  const speed = Math.max(0, input.speedMps);
  if (!input.isNight && input.radiationWm2 !== null) return srdtDay(speed, input.radiationWm2);
  return turnerClass(speed, netRadiationIndex({ ...input, ceilingFt: null }));
}
