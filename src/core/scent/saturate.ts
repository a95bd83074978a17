import type { ScentSettings } from '../settings';
import { sweptPlume } from './plume';

/** Wind at the seat the reference is taken at, m/s. */
const REFERENCE_MPS = 2;

/** Strength that counts as an index of one: neutral air, 2 m/s, straight downwind at the settings' reference distance. */
export function referenceStrength(s: ScentSettings): number {
  const receiver = { distanceM: s.halfAtM, offDeg: 0, zM: s.noseHeightM };
  return sweptPlume('D', receiver, s.halfSeatHeightM, 0) / REFERENCE_MPS;
}

/** Exposure that `minutes` of an index of one amount to, in the exponent of chanceOfExposure. */
export function exposurePerIndex(minutes: number, s: ScentSettings): number {
  return (Math.LN2 * minutes) / s.exposureMinutes;
}

/**
 * Chance (0-1) that a deer winds the hunter, from the relative index and how long it stays: even odds at an index of one for
 * the settings' exposure time; doubling either acts alike, and cutting a stay in pieces changes nothing. Our choice of curve:
 * no study gives one.
 */
export function windedChanceOf(index: number, minutes: number, s: ScentSettings): number {
  return -Math.expm1(-Math.max(0, index) * exposurePerIndex(minutes, s));
}

const PER_UNIT = 256;
const MOST = 16;
const TABLE = Float64Array.from({ length: MOST * PER_UNIT + 2 }, (_, i) => -Math.expm1(-i / PER_UNIT));

/** 1 - exp(-x) for x >= 0 from a table, within 0.1 %. */
export function chanceOfExposure(x: number): number {
  if (x < 0.02) return x - 0.5 * x * x;
  if (x >= MOST) return 1;
  const at = x * PER_UNIT;
  const i = at | 0;
  const low = TABLE[i] ?? 1;
  return low + ((TABLE[i + 1] ?? 1) - low) * (at - i);
}
