import type { Suitability } from '../ground-types';
import { shareAt } from '../whereabouts';
import { crosswindFactor, crosswindShare } from './crosswind';
import type { InRange } from './in-range';
import type { PromiseSettings } from './promise-settings';
import { clearShare } from './sun-in-eyes';
import { rainFactor, strongWindFactor } from './weather-effects';

/** A half hour as promise sees it. Speeds at the seat, m/s; null: unknown. */
export interface PromiseStep {
  /** Weights of the six times of day. */
  times: number[];
  /** Chance (0-1) of deer at each feature. */
  shares: Float64Array;
  seatSpeedMps: number | null;
  precipMm: number | null;
  cloudPercent: number | null;
  fromDeg: number | null;
}

/** Factors that make up promise; 1 is no effect. */
export interface PromiseFactors {
  base: number;
  features: number;
  crosswind: number;
  sun: number;
  rain: number;
  wind: number;
  sightings: number;
  pressure: number;
}

/** How much of a sit's promise falls in each step. A little is left at night so that no share is empty. */
export function movementOf(times: number[], s: PromiseSettings): number {
  const m = s.movement;
  return 0.01 + shareAt([m.night, m.dawn, m.morning, m.midday, m.afternoon, m.dusk], times);
}

/** Shares of the sit's promise in full daylight and in twilight, each 0-1. */
export function lightShares(steps: PromiseStep[], moves: number[]): { day: number; twilight: number } {
  let day = 0;
  let twilight = 0;
  let total = 0;
  steps.forEach((step, i) => {
    const move = moves[i] as number;
    const [, dawn, morning, midday, afternoon, dusk] = step.times as [number, number, number, number, number, number];
    day += move * (morning + midday + afternoon);
    twilight += move * (dawn + dusk);
    total += move;
  });
  return total > 0 ? { day: day / total, twilight: twilight / total } : { day: 0, twilight: 0 };
}

/** Mean chance that some feature in range is in use, without and with the wind across its line. */
function featureUse(steps: PromiseStep[], moves: number[], inRange: InRange[], s: PromiseSettings) {
  let plain = 0;
  let crossed = 0;
  let total = 0;
  steps.forEach((step, i) => {
    const move = moves[i] as number;
    let none = 1;
    let noneCrossed = 1;
    for (const { feature, share, lineDeg } of inRange) {
      const use = (step.shares[feature] as number) * share;
      none *= 1 - use;
      const across = lineDeg === null ? 1 : crosswindFactor(crosswindShare(step.fromDeg, lineDeg), s);
      noneCrossed *= 1 - Math.min(1, use * across);
    }
    plain += move * (1 - none);
    crossed += move * (1 - noneCrossed);
    total += move;
  });
  return total > 0 ? { plain: plain / total, crossed: crossed / total } : { plain: 0, crossed: 0 };
}

/** Everything about promise that the air and the ground decide. `glare` is the sun in the eyes (0-1) of each step. */
export function promiseFactors(
  steps: PromiseStep[],
  moves: number[],
  suitability: Suitability,
  inRange: InRange[],
  glare: ArrayLike<number>,
  s: PromiseSettings,
): Omit<PromiseFactors, 'sightings' | 'pressure'> {
  const span = s.fullFeatureFactor - s.noFeatureFactor;
  const use = featureUse(steps, moves, inRange, s);
  const features = s.noFeatureFactor + span * use.plain;
  let total = 0;
  let sun = 0;
  let rain = 0;
  let wind = 0;
  steps.forEach((step, i) => {
    const move = moves[i] as number;
    total += move;
    sun += move * (1 - s.sunCost * (glare[i] as number) * clearShare(step.cloudPercent, s));
    rain += move * rainFactor(step.precipMm, s);
    wind += move * strongWindFactor(step.seatSpeedMps, s);
  });
  const mean = (sum: number) => (total > 0 ? sum / total : 1);
  return {
    base: s.suitability[suitability],
    features,
    crosswind: (s.noFeatureFactor + span * use.crossed) / features,
    sun: mean(sun),
    rain: mean(rain),
    wind: mean(wind),
  };
}

/** Promise (0-1) of a whole window from its factors. */
export function promiseOf(f: PromiseFactors): number {
  const p = f.base * f.features * f.crosswind * f.sun * f.rain * f.wind * f.sightings * f.pressure;
  return Math.min(0.97, Math.max(0.01, p));
}

/** Promise of sitting only a share (0-1) of the window's movement: deer come as a Poisson process. */
export function promiseSeated(promise: number, seatedShare: number): number {
  return 1 - (1 - promise) ** Math.min(1, Math.max(0, seatedShare));
}
