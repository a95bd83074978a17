import { type WalkStretch, walkStretches } from './approach/walk-stretches';
import type { StandFrame } from './ground-frame';
import type { ScoredApproach } from './ground-types';
import { type FieldGrid, scentField } from './scent/scent-field';
import type { SitFrame } from './sit-frame';
import { sunPosition } from './sun';
import type { ApproachOption } from './verdict-types';

/** The air about one stand in one half hour, laid out on the ground. */
export interface Moment {
  at: number;
  sun: { altitudeDeg: number; azimuthDeg: number };
  /** At the seat; null: no forecast reaches this half hour. */
  wind: { fromDeg: number | null; speedMps: number | null; gustMps: number | null } | null;
  /** Relative scent index by cell, row by row from the south, 1 at the settings' reference; null as for the wind. */
  field: { grid: FieldGrid; values: Float64Array } | null;
}

/** A square of ground about a stand, as far each way as scent is followed or `mostM`, whichever is less. */
export function gridAbout(stand: StandFrame, reachM: number, cellM: number, mostM: number): FieldGrid {
  const half = Math.ceil(Math.min(reachM, mostM) / cellM);
  const { eastM, northM } = stand.stand.at;
  return {
    origin: { eastM: eastM - half * cellM, northM: northM - half * cellM },
    cellM,
    columns: 2 * half,
    rows: 2 * half,
  };
}

/** One step of a sit at one stand of a frame. `step` counts from the window's start; null beyond its end. */
export function momentAt(frame: SitFrame, stand: StandFrame, step: number, grid: FieldGrid): Moment | null {
  const { settings, place } = frame.ground.input;
  const at = frame.window.stepAts[step];
  if (at === undefined) return null;
  const seat = frame.air?.seatOf(stand.stand) ?? null;
  const air = seat?.air[step];
  const source = { at: stand.stand.at, heightM: stand.stand.seatHeightM };
  const values = seat && air ? scentField(source, seat.set, step, air.stability, grid, settings.scent) : null;
  const middle = at + settings.air.stepMinutes * 30_000;
  return {
    at,
    sun: sunPosition(middle, place.lat, place.lon),
    wind: air && values ? { fromDeg: air.seatFromDeg, speedMps: air.seatSpeedMps, gustMps: air.gustMps } : null,
    field: values ? { grid, values } : null,
  };
}

/** The walk in by a way at the time a verdict recommends, piece by piece. Judged at its middle, as the verdict is. */
export function walkInStretches(frame: SitFrame, way: ApproachOption, approach: ScoredApproach): WalkStretch[] {
  const middle = way.inBy - way.walkSeconds * 500;
  return walkStretches(approach, frame.ground.input.features, middle, frame.walks);
}
