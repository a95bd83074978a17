import type { PressureEvent, PressureKind } from './condition-types';
import { distanceM } from './geometry';
import type { Point } from './ground-types';

const DAY_MS = 86_400_000;

export interface PressureSettings {
  halfLifeDays: number;
  /** A chased deer is back within a day or so. */
  bumpHalfLifeDays: number;
  /** Distance at which an event weighs 1/e of what it weighs at the stand, metres. */
  distanceM: number;
  /** Nothing is counted beyond this distance (metres) or age (days). */
  reachM: number;
  forgetDays: number;
  weights: Record<PressureKind, number>;
  /** Most that promise may lose in full daylight, 0-1. */
  mostCut: number;
  /** Pressure at which the cut is 63 % of the most. */
  saturateAt: number;
  /** Share of the daylight cut that acts at dawn and dusk; none at night. */
  twilightShare: number;
  /** How much a fully pressed stand raises the cost of alerting deer again: quiet is raised to 1 + this. */
  extraAlert: number;
}

/**
 * Half-life: design choice, 25 % left after 3 days (Sunday's shift lasted to Wednesday: Wiskirchen et al. 2022, Wildl. Res. 49:500).
 * Most: -17 to -31 % by day there. Bump: back within 13 h to a day (D'Angelo et al. 2003; Sweeney et al. 1971). Twilight: no
 * change in Sullivan et al. 2018, Wildl. Biol., so it takes a small part. Weights and distance: our choice after 200-400 yd of practice.
 */
export const DEFAULT_PRESSURE: PressureSettings = {
  halfLifeDays: 1.5,
  bumpHalfLifeDays: 0.5,
  distanceM: 180,
  reachM: 800,
  forgetDays: 14,
  weights: { sit: 1, bump: 1, camera_check: 0.4, work: 0.8, walk_through: 0.5, drive: 0.2 },
  mostCut: 1 / 3,
  saturateAt: 1.8,
  twilightShare: 0.3,
  extraAlert: 0.5,
};

/** Weight of a kind after so many days, at the place itself. */
export function pressureAfterDays(kind: PressureKind, bumped: number, days: number, s: PressureSettings): number {
  if (!(days >= 0) || days > s.forgetDays) return 0;
  const flushed = kind === 'bump' ? Math.max(1, bumped) : Math.max(0, bumped);
  const bump = flushed > 0 ? s.weights.bump * Math.sqrt(Math.min(flushed, 9)) * 0.5 ** (days / s.bumpHalfLifeDays) : 0;
  const visit = kind === 'bump' ? 0 : s.weights[kind] * 0.5 ** (days / s.halfLifeDays);
  return bump + visit;
}

/** Share of an event's weight that is felt at a distance in metres. */
export function pressureOverDistance(metres: number, s: PressureSettings): number {
  return metres > s.reachM ? 0 : Math.exp(-metres / s.distanceM);
}

/** An event with its share at one place worked out: what does not depend on the hour. */
export interface NearEvent {
  event: PressureEvent;
  nearness: number;
}

export function nearEvents(place: Point, events: PressureEvent[], s: PressureSettings): NearEvent[] {
  const near: NearEvent[] = [];
  for (const event of events) {
    const nearness = pressureOverDistance(distanceM(place, event.place), s);
    if (nearness > 0) near.push({ event, nearness });
  }
  return near;
}

/** Pressure left at an instant (0 = none, about 1 = one sit just over). Events after the instant count nothing. */
export function pressureLeft(near: NearEvent[], at: number, s: PressureSettings): number {
  let sum = 0;
  for (const { event, nearness } of near) {
    if (event.at <= at) sum += nearness * pressureAfterDays(event.kind, event.bumped, (at - event.at) / DAY_MS, s);
  }
  return sum;
}

/** 0-1: how far a stand is pressed; repeats add up and level off. */
export function pressed(pressure: number, s: PressureSettings): number {
  return 1 - Math.exp(-Math.max(0, pressure) / s.saturateAt);
}

/**
 * Factor (1 - mostCut to 1) on promise. `dayShare` and `twilightShare` are the shares of the sit's promise that fall in full
 * daylight and in twilight.
 */
export function pressureOnPromise(
  pressure: number,
  dayShare: number,
  twilightShare: number,
  s: PressureSettings,
): number {
  return 1 - s.mostCut * pressed(pressure, s) * Math.min(1, dayShare + s.twilightShare * twilightShare);
}

/** Exponent (1 to 1 + extraAlert) on quiet: deer alerted lately are alerted sooner. A sit nobody can notice costs no more. */
export function pressureOnQuiet(pressure: number, s: PressureSettings): number {
  return 1 + s.extraAlert * pressed(pressure, s);
}

/** Share of daylight promise that one more sit now takes from a full-daylight sit `daysLater` at the same stand, 0-1. */
export function marginalCost(pressure: number, daysLater: number, s: PressureSettings): number {
  const left = pressure * 0.5 ** (daysLater / s.halfLifeDays);
  const more = left + pressureAfterDays('sit', 0, daysLater, s);
  return pressureOnPromise(left, 1, 0, s) - pressureOnPromise(more, 1, 0, s);
}
