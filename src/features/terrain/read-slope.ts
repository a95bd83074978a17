import { chooseElevation } from '@/adapters/elevation/choose';
import type { ElevationPort } from '@/adapters/elevation/port';
import { fromLocal, type LatLon } from '@/core/geometry';
import { heightAt, slopeAt } from '@/core/terrain/height-grid';
import { env } from '@/env';
import { AppError } from '@/server/errors';
import { loadHeights } from './load-heights';
import type { Bounds } from './tiles';
import { HEIGHT_ERRORS } from './words';

/** As far as the heights stand apart: nearer ones would only repeat what lies between the same posts. */
const REACH_M = 90;
/** A post and its neighbours beyond that reach, so that bilinear heights are whole. */
const PAD_M = 250;

export interface SlopeView {
  heightM: number;
  slopePercent: number;
  /** null: level ground drains nowhere in particular. */
  drainBearingDeg: number | null;
  /** Whose heights these are. */
  source: string;
}

export function boundsAround(places: LatLon[], padM: number): Bounds {
  const corners = places.flatMap((at) => [
    fromLocal(at, { eastM: -padM, northM: -padM }),
    fromLocal(at, { eastM: padM, northM: padM }),
  ]);
  return {
    south: Math.min(...corners.map(({ lat }) => lat)),
    north: Math.max(...corners.map(({ lat }) => lat)),
    west: Math.min(...corners.map(({ lon }) => lon)),
    east: Math.max(...corners.map(({ lon }) => lon)),
  };
}

/** How steep the ground is at a place and where cold air drains from it, for a steward to take or leave. */
export async function readSlope(
  at: LatLon,
  now: number,
  port: ElevationPort = chooseElevation(env),
): Promise<SlopeView> {
  const loaded = await loadHeights(port, boundsAround([at], PAD_M), now);
  if (!loaded.ok) throw new AppError('unavailable', HEIGHT_ERRORS.noSlope(loaded.message));
  const slope = slopeAt(loaded.grid, at, REACH_M);
  const heightM = heightAt(loaded.grid, at);
  if (!slope || heightM === null) throw new AppError('unavailable', HEIGHT_ERRORS.unknown);
  return {
    heightM,
    slopePercent: Math.round(slope.percent),
    drainBearingDeg: slope.downhillDeg === null ? null : Math.round(slope.downhillDeg) % 360,
    source: loaded.label,
  };
}
