import type { StabilityClass } from '../air/stability-types';
import { briggsSigmaZ } from './briggs';
import { NEAREST_M, sweptSigmaRad, verticalTerm } from './plume';

const STEP_M = 0.5;
const DEG = 180 / Math.PI;

/** By distance: the swept plume's angular spread and its strength on the axis. */
export interface PlumeTable {
  readonly sigmaDeg: Float64Array;
  readonly onAxis: Float64Array;
}

/** Widenings a table is kept for, degrees. A widening is rounded to one of them, here and wherever the plume is swept. */
export const WIDENINGS_DEG = [0, 4, 6, 9, 13, 18, 25, 35] as const;

/** Index of the nearest kept widening. */
export function wideningLevel(deg: number): number {
  let best = 0;
  for (let i = 1; i < WIDENINGS_DEG.length; i++) {
    if (Math.abs((WIDENINGS_DEG[i] ?? 0) - deg) < Math.abs((WIDENINGS_DEG[best] ?? 0) - deg)) best = i;
  }
  return best;
}

/**
 * Table of a class, widening and source height for receivers at `zM`, out to `reachM`. Within 1 % of sweptPlume, or of the
 * reference strength where that is more, from 10 m out.
 */
export function plumeTable(
  c: StabilityClass,
  wideningDeg: number,
  heightM: number,
  zM: number,
  reachM: number,
): PlumeTable {
  const n = Math.ceil(reachM / STEP_M) + 2;
  const sigmaDeg = new Float64Array(n);
  const onAxis = new Float64Array(n);
  for (let i = 0; i < n; i++) {
    const d = Math.max(NEAREST_M, i * STEP_M);
    const sigmaRad = sweptSigmaRad(c, d, wideningDeg);
    const sigmaZ = briggsSigmaZ(c, d);
    sigmaDeg[i] = sigmaRad * DEG;
    onAxis[i] = verticalTerm(sigmaZ, heightM, zM) / (2 * Math.PI * d * sigmaRad * sigmaZ);
  }
  return { sigmaDeg, onAxis };
}

/** Linear in distance; the end value is held. */
export function atDistance(values: Float64Array, distanceM: number): number {
  const x = distanceM / STEP_M;
  const i = Math.min(values.length - 2, Math.floor(x));
  const low = values[i] ?? 0;
  return low + ((values[i + 1] ?? low) - low) * Math.min(1, x - i);
}
