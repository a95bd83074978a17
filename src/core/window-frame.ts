import type { LowSunMinute } from './promise/sun-in-eyes';
import type { ScoringSettings } from './settings';
import { type Place, sunPosition, sunTimes } from './sun';
import type { ScoredFeature, SitWindow } from './types';
import { type SunMarks, shareAt, timeWeights, usesOf } from './whereabouts';

const MIN = 60_000;

/** What every stand shares in one window, the wind aside. */
export interface WindowFrame {
  window: SitWindow;
  sun: SunMarks;
  /** Starts of the half hours. */
  stepAts: number[];
  /** Weights of the six times of day at the middle of each half hour. */
  times: number[][];
  /** Chance (0-1) of deer at each feature, by half hour. */
  shares: Float64Array[];
  /** Minutes with the sun low enough to blind, and the half hour each falls in. */
  lowSun: (LowSunMinute & { step: number })[];
  /** Chances of deer at each feature at any instant, worked out once a quarter hour. */
  sharesAt: (at: number) => Float64Array;
}

/** Instants the day is cut into for walks: a quarter hour is finer than where deer are is known. */
const QUARTER_MS = 15 * MIN;

export function toQuarter(at: number): number {
  return Math.round(at / QUARTER_MS) * QUARTER_MS;
}

function lowSunMinutes(window: SitWindow, place: Place, belowDeg: number): WindowFrame['lowSun'] {
  const found: WindowFrame['lowSun'] = [];
  const steps = Math.ceil((window.endAt - window.startAt) / (30 * MIN));
  for (let step = 0; step < steps; step++) {
    const from = window.startAt + step * 30 * MIN;
    const until = Math.min(from + 30 * MIN, window.endAt);
    const ends = [from, until].map((at) => sunPosition(at, place.lat, place.lon).altitudeDeg);
    // The sun climbs no faster than 15 degrees an hour: a half hour whose ends are both far from low has no low minute.
    if (Math.min(...ends) > belowDeg + 8 || Math.max(...ends) < -8) continue;
    for (let at = from; at < until; at += MIN) {
      const sun = sunPosition(at, place.lat, place.lon);
      if (sun.altitudeDeg > -0.3 && sun.altitudeDeg < belowDeg) found.push({ at, ...sun, step });
    }
  }
  return found;
}

export function frameWindow(
  window: SitWindow,
  place: Place,
  features: ScoredFeature[],
  settings: ScoringSettings,
): WindowFrame {
  const sun = sunTimes(window.day, place.zone, place.lat, place.lon);
  const month = Number(window.day.slice(5, 7));
  const uses = features.map((f) => usesOf(f, month, settings.whereabouts));
  const sharesFor = (times: number[]) => Float64Array.from(uses, (use) => shareAt(use, times));
  const stepAts: number[] = [];
  for (let at = window.startAt; at < window.endAt && stepAts.length < 200; at += 30 * MIN) stepAts.push(at);
  const times = stepAts.map((at) => timeWeights(Math.min(at + 15 * MIN, window.endAt), sun));
  const kept = new Map<number, Float64Array>();
  const sharesAt = (at: number) => {
    const quarter = toQuarter(at);
    const known = kept.get(quarter) ?? sharesFor(timeWeights(quarter, sun));
    kept.set(quarter, known);
    return known;
  };
  return {
    window,
    sun,
    stepAts,
    times,
    shares: times.map(sharesFor),
    lowSun: lowSunMinutes(window, place, settings.promise.sunAltitudeDeg),
    sharesAt,
  };
}
