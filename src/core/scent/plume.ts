import type { StabilityClass } from '../air/stability-types';
import { toRad } from '../angles';
import { briggsSigmaY, briggsSigmaZ } from './briggs';

export interface PlumeInput {
  /** Source strength; the answer is in its unit per cubic metre when it is per second. */
  q: number;
  speedMps: number;
  sigmaYM: number;
  sigmaZM: number;
  /** Source height, m. */
  heightM: number;
  /** Crosswind distance and height of the receiver, m. */
  yM: number;
  zM: number;
}

/** The two vertical exponentials: the plume and its reflection from the ground. */
export function verticalTerm(sigmaZM: number, heightM: number, zM: number): number {
  const two = 2 * sigmaZM * sigmaZM;
  return Math.exp(-((zM - heightM) ** 2) / two) + Math.exp(-((zM + heightM) ** 2) / two);
}

/** Gaussian plume with ground reflection (Boubel et al. 1994 ch. 19; EPA-454/B-95-003b). 0 where a spread is 0. */
export function gaussianPlume(p: PlumeInput): number {
  if (!(p.sigmaYM > 0) || !(p.sigmaZM > 0) || !(p.speedMps > 0)) return 0;
  const across = Math.exp(-(p.yM * p.yM) / (2 * p.sigmaYM * p.sigmaYM));
  const vertical = verticalTerm(p.sigmaZM, p.heightM, p.zM);
  return (p.q / (2 * Math.PI * p.speedMps * p.sigmaYM * p.sigmaZM)) * across * vertical;
}

/** Gaussian plume of unit strength on Briggs curves at x m downwind (0 at and upwind of the source) and y m across. */
export function briggsPlume(
  c: StabilityClass,
  at: { xM: number; yM: number; zM: number },
  source: { heightM: number; speedMps: number },
): number {
  if (!(at.xM > 0)) return 0;
  const [sigmaYM, sigmaZM] = [briggsSigmaY(c, at.xM), briggsSigmaZ(c, at.xM)];
  return gaussianPlume({ q: 1, ...source, sigmaYM, sigmaZM, yM: at.yM, zM: at.zM });
}

/** Nearest a receiver counts as being, m: the curves say nothing of a person's own body length. */
export const NEAREST_M = 5;

/** Angular half-width (standard deviation, radians) at a distance: the curve's own and a widening in degrees. */
export function sweptSigmaRad(c: StabilityClass, distanceM: number, wideningDeg: number): number {
  return Math.hypot(briggsSigmaY(c, distanceM) / distanceM, toRad(wideningDeg));
}

/**
 * Plume of unit strength and speed 1 m/s in polar form: receiver at a distance (m) and an angle off the downwind line (deg),
 * the crosswind distance taken along the arc. `wideningDeg` is the spread of the wind's own direction, which sweeps the plume
 * to and fro and thins it by as much: what crosses any arc stays the same. 0 from 90 degrees off.
 */
export function sweptPlume(
  c: StabilityClass,
  receiver: { distanceM: number; offDeg: number; zM: number },
  heightM: number,
  wideningDeg: number,
): number {
  if (Math.abs(receiver.offDeg) >= 90) return 0;
  const d = Math.max(NEAREST_M, receiver.distanceM);
  const sigmaRad = sweptSigmaRad(c, d, wideningDeg);
  const sigmaYM = d * sigmaRad;
  const yM = d * toRad(receiver.offDeg);
  return gaussianPlume({ q: 1, speedMps: 1, sigmaYM, sigmaZM: briggsSigmaZ(c, d), heightM, yM, zM: receiver.zM });
}
