import { cToF, fToC, mpsToMph } from './units';

/** The formula's own bounds: 50 F and below, 3 mph and above. */
const WARMEST_F = 50;
const LIGHTEST_MPH = 3;
const SLACK = 1e-9;

/** Wind chill in degrees F from degrees F and mph at 10 m (US National Weather Service, 2001); null outside its bounds. */
export function windChillF(tempF: number, windMph: number): number | null {
  if (!(tempF <= WARMEST_F + SLACK && windMph >= LIGHTEST_MPH - SLACK)) return null;
  const v = windMph ** 0.16;
  return 35.74 + 0.6215 * tempF - 35.75 * v + 0.4275 * tempF * v;
}

/** The same in degrees C from degrees C and m/s at 10 m; null outside the formula's bounds. */
export function windChillC(tempC: number, windMps: number): number | null {
  const chill = windChillF(cToF(tempC), mpsToMph(windMps));
  return chill === null ? null : fToC(chill);
}

/** Frostbite of bare skin within about 30 minutes from here down (US National Weather Service chart), degrees C. */
export const FROSTBITE_30_MIN_C = fToC(-18);
