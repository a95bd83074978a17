import { normalizeDeg, toRad } from '../angles';
import type { DriftSettings } from '../settings';

/** NWCG PMS 437: upslope 3-8 mph, downslope 2-5 mph. m/s. */
export const UPSLOPE_MPS = { least: 3 * 0.44704, most: 8 * 0.44704 };
export const DOWNSLOPE_MPS = { least: 2 * 0.44704, most: 5 * 0.44704 };

/** Slope in percent at which drain flow is at its strongest, our choice. */
const STEEP_PERCENT = 40;

export interface SlopeDriftInput {
  /** Where cold air drains to, so also the way the slope faces; null: flat or unknown. */
  drainBearingDeg: number | null;
  slopePercent: number | null;
  sunAltitudeDeg: number;
  sunAzimuthDeg: number;
  /** 0-100. */
  cloudPercent: number;
  /** General 10 m wind, m/s. */
  generalSpeedMps: number;
}

export interface SlopeDrift {
  phase: 'none' | 'down' | 'turning' | 'up';
  /** Where the drift comes from; null with phase 'none'. */
  fromDeg: number | null;
  speedMps: number;
  /** How much of it is added to the general wind, 0-1. */
  weight: number;
}

export const NO_DRIFT: SlopeDrift = { phase: 'none', fromDeg: null, speedMps: 0, weight: 0 };

const ramp = (x: number, from: number, to: number): number => Math.max(0, Math.min(1, (x - from) / (to - from)));

/** Cosine of the sun's incidence on a slope, 0 with the sun down or behind the hill. Plane geometry of a tilted surface. */
export function sunOnSlope(altitudeDeg: number, azimuthDeg: number, aspectDeg: number, slopePercent: number): number {
  if (altitudeDeg <= 0) return 0;
  const slope = Math.atan(slopePercent / 100);
  const alt = toRad(altitudeDeg);
  const across = Math.cos(alt) * Math.sin(slope) * Math.cos(toRad(azimuthDeg - aspectDeg));
  return Math.max(0, Math.sin(alt) * Math.cos(slope) + across);
}

/**
 * Drain and upslope flow at a stand. Down the drain bearing from about sunset until the sun has warmed the slope, up it by
 * day, dying and turning between; the sun's own geometry makes east slopes turn first, then south, then west. Clear sky and
 * light general wind only (NWCG PMS 437; Schroeder & Buck 1970 ch. 7). Speeds stay inside the published ranges.
 */
export function slopeDrift(input: SlopeDriftInput, s: DriftSettings): SlopeDrift {
  const slope = input.slopePercent ?? s.slopeWhenUnknownPercent;
  if (
    !s.modelled ||
    input.drainBearingDeg === null ||
    !Number.isFinite(input.drainBearingDeg) ||
    !(slope >= s.leastSlopePercent)
  )
    return NO_DRIFT;
  const clear = 1 - ramp(input.cloudPercent, s.wholeBelowCloudPercent, s.goneAboveCloudPercent);
  const light = 1 - ramp(input.generalSpeedMps, s.wholeBelowMps, s.goneAboveMps);
  const sun = sunOnSlope(input.sunAltitudeDeg, input.sunAzimuthDeg, input.drainBearingDeg, slope);
  const turn = 2 * ramp(sun, s.drainUntilSun, s.upslopeFromSun) - 1;
  const weight = Math.abs(turn) * clear * light;
  if (!(weight > 0)) return NO_DRIFT;
  const range = turn < 0 ? DOWNSLOPE_MPS : UPSLOPE_MPS;
  const vigour = turn < 0 ? ramp(slope, 0, STEEP_PERCENT) : ramp(sun, s.upslopeFromSun / 2, 1);
  return {
    phase: Math.abs(turn) < 0.9 ? 'turning' : turn < 0 ? 'down' : 'up',
    fromDeg: normalizeDeg(turn < 0 ? input.drainBearingDeg + 180 : input.drainBearingDeg),
    speedMps: range.least + (range.most - range.least) * vigour,
    weight,
  };
}
