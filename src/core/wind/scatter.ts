import { sigmaThetaDeg } from '../air/sigma-theta';
import type { StabilityClass } from '../air/stability-types';

const DEG = 180 / Math.PI;

/**
 * Direction scatter of a steady wind, degrees, falling with speed: 0.32/V rad to 5 m/s, 0.065 rad above (Joffre & Laurila
 * 1988, J. Appl. Meteor. 27:550-561; 1-min data at 10 m over sea ice, so a floor for woods). Capped near zero speed.
 */
export function speedScatterDeg(speedMps: number, capDeg: number): number {
  const rad = speedMps > 5 ? 0.065 : 0.32 / Math.max(1e-6, speedMps);
  return Math.min(capDeg, rad * DEG);
}

/** Fast scatter about the half-hour mean direction, degrees: the class's sigma-theta, but no less than the speed's floor. */
export function scatterDeg(c: StabilityClass, speedMps: number, capDeg: number): number {
  return Math.min(capDeg, Math.max(sigmaThetaDeg(c), speedScatterDeg(speedMps, capDeg)));
}

/** The part of a scatter that the class's plume curves do not already hold, degrees. */
export function extraScatterDeg(c: StabilityClass, scatter: number): number {
  const own = sigmaThetaDeg(c);
  return scatter > own ? Math.sqrt(scatter * scatter - own * own) : 0;
}
