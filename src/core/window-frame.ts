import { stepStarts } from './air/interpolate';
import type { SitWindow } from './condition-types';
import { movementOf } from './promise/promise-factors';
import type { LowSunMinute } from './promise/sun-in-eyes';
import type { ScoringSettings } from './settings';
import { type Place, sunPosition, sunTimes } from './sun';
import { type SunMarks, shareAt, timeWeights } from './whereabouts';

const MIN = 60_000;

/** What every stand shares in one window, the wind aside. */
export interface WindowFrame {
  window: SitWindow;
  sun: SunMarks;
  /** Starts of the steps. */
  stepAts: number[];
  /** Weights of the six times of day at the middle of each step. */
  times: number[][];
  /** Chance (0-1) of deer at each feature, by step. */
  shares: Float64Array[];
  /** The same as one table: feature by feature, its steps in a row. */
  deer: Float64Array;
  /** How much of the sit's promise falls in each step. */
  moves: number[];
  /** Minutes with the sun low enough to blind, and the step each falls in. */
  lowSun: (LowSunMinute & { step: number })[];
  /** Darkness (0 day, 1 night) and chances of deer at each feature at any instant, worked out once a quarter hour. */
  momentAt: (at: number) => { dark: number; shares: Float64Array };
}

/** Instants the day is cut into for walks: a quarter hour is finer than where deer are is known. */
const QUARTER_MS = 15 * MIN;

export function toQuarter(at: number): number {
  return Math.round(at / QUARTER_MS) * QUARTER_MS;
}

function lowSunMinutes(stepAts: number[], endAt: number, place: Place, belowDeg: number): WindowFrame['lowSun'] {
  const found: WindowFrame['lowSun'] = [];
  for (let step = 0; step < stepAts.length; step++) {
    const from = stepAts[step] as number;
    const until = Math.min(stepAts[step + 1] ?? endAt, endAt);
    const ends = [from, until].map((at) => sunPosition(at, place.lat, place.lon).altitudeDeg);
    // The sun climbs no faster than 15 degrees an hour: a step whose ends are both far from low has no low minute.
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
  usesIn: (month: number) => number[][],
  settings: ScoringSettings,
): WindowFrame {
  const sun = sunTimes(window.day, place.zone, place.lat, place.lon);
  const uses = usesIn(Number(window.day.slice(5, 7)));
  const sharesFor = (times: number[]) => Float64Array.from(uses, (use) => shareAt(use, times));
  const { stepMinutes } = settings.air;
  const stepAts = stepStarts(window.startAt, window.endAt, stepMinutes);
  const times = stepAts.map((at) => timeWeights(Math.min(at + (stepMinutes * MIN) / 2, window.endAt), sun));
  const kept = new Map<number, { dark: number; shares: Float64Array }>();
  const momentAt = (at: number) => {
    const quarter = toQuarter(at);
    let known = kept.get(quarter);
    if (!known) {
      const weights = timeWeights(quarter, sun);
      known = { dark: weights[0] as number, shares: sharesFor(weights) };
      kept.set(quarter, known);
    }
    return known;
  };
  const shares = times.map(sharesFor);
  const deer = new Float64Array(uses.length * times.length);
  shares.forEach((row, t) => {
    for (let f = 0; f < uses.length; f++) deer[f * times.length + t] = row[f] as number;
  });
  return {
    window,
    sun,
    stepAts,
    times,
    shares,
    deer,
    moves: times.map((weights) => movementOf(weights, settings.promise)),
    lowSun: lowSunMinutes(stepAts, window.endAt, place, settings.promise.sunAltitudeDeg),
    momentAt,
  };
}
