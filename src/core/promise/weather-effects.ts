import type { PromiseSettings } from './promise-settings';

function ramp(value: number | null, from: number, full: number): number {
  if (value === null || !(value > from)) return 0;
  return Math.min(1, (value - from) / (full - from));
}

/** Factor (1 - rainCost to 1) for rain in mm an hour; a drizzle costs little. Unknown rain is none. */
export function rainFactor(mmPerHour: number | null, s: PromiseSettings): number {
  return 1 - s.rainCost * ramp(mmPerHour, 0.3, s.heavyRainMm);
}

/** Factor (1 - windCost to 1) for the wind at the seat in m/s. */
export function strongWindFactor(seatSpeedMps: number | null, s: PromiseSettings): number {
  return 1 - s.windCost * ramp(seatSpeedMps, s.strongWindFromMps, s.strongWindFullMps);
}
