import type { Point } from './ground-types';

/**
 * What a sit meets: its window, the weather, what people did near by and what the stand has seen. SI units; a wind direction
 * is where the wind comes FROM, degrees clockwise from true north. Instants are UTC milliseconds.
 */

export type WindowName = 'morning' | 'evening';
export const WINDOW_NAMES = ['morning', 'evening'] as const satisfies readonly WindowName[];

/** One hour of weather at the club's place. null: not given. */
export interface WeatherHour {
  at: number;
  /** null with a speed above zero is a variable wind; speed 0 is calm whatever stands here. 10 m wind. */
  windFromDeg: number | null;
  windSpeedMps: number | null;
  gustMps: number | null;
  tempC: number | null;
  pressureHpa: number | null;
  precipMm: number | null;
  /** 0-100. */
  cloudPercent: number | null;
  /** Downward shortwave, W/m2. */
  radiationWm2: number | null;
  thunder: boolean;
}

export interface EnsembleMember {
  id: string;
  /** Same instants as the forecast's hours, one for one. */
  hours: { at: number; windFromDeg: number | null; windSpeedMps: number | null }[];
}

export interface Forecast {
  /** When the weather service made it. */
  issuedAt: number;
  /** When this app got it. */
  fetchedAt: number;
  source: string;
  hours: WeatherHour[];
  members: EnsembleMember[];
}

export const PRESSURE_KINDS = ['sit', 'bump', 'camera_check', 'work', 'walk_through', 'drive'] as const;
export type PressureKind = (typeof PRESSURE_KINDS)[number];

export interface PressureEvent {
  at: number;
  kind: PressureKind;
  place: Point;
  standId: string | null;
  /** Deer bumped during it, when known. */
  bumped: number;
}

/** Deer seen from a stand in past sits, for shrinking its rate to the club's mean. */
export interface StandSightings {
  standId: string;
  sits: number;
  hours: number;
  deer: number;
}

/** One window of one day at the club: what the list ranks. */
export interface SitWindow {
  /** YYYY-MM-DD in the club's zone. */
  day: string;
  window: WindowName;
  startAt: number;
  endAt: number;
}
