import type { MultiPolygon, Position } from 'geojson';
import type { WindowName } from '@/core/condition-types';

export interface StretchView {
  from: Position;
  to: Position;
  startM: number;
  endM: number;
  chance: number;
  driven: boolean;
  /** What costs most there; null: nothing that is mapped. */
  worst: string | null;
}

/** One half hour of a sit at one stand, for the map and in words. */
export interface MomentView {
  stand: { id: string; name: string; at: Position };
  window: { day: string; window: WindowName; startAt: number; endAt: number };
  /** Starts of the half hours. */
  steps: number[];
  step: number;
  at: number;
  /** null: no forecast reaches it. */
  wind: { fromDeg: number | null; speedMps: number | null; gustMps: number | null } | null;
  /** Ground at or over each level of the relative scent index, the widest first; empty without a forecast. */
  bands: { level: number; area: MultiPolygon }[];
  /** Chance that deer wind the seat in this half hour, and where most. */
  winded: { chance: number; most: string | null } | null;
  sun: { altitudeDeg: number; azimuthDeg: number; inEyes: boolean };
  way: {
    name: string;
    leaveBy: number;
    inBy: number;
    inChance: number;
    stretches: StretchView[];
  } | null;
  sitters: { standId: string; standName: string; at: Position; name: string }[];
  /** Where the forecast comes from; null: there is none. */
  forecast: string | null;
}
