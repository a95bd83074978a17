import { normalizeDeg, toRad } from '../angles';
import { circularSdDeg } from '../circular';
import { tableCdf } from './arc-probability';
import type { ScenarioSet } from './scenario-types';

/** Bins of 5 degrees from north clockwise: bin i holds [5i, 5i + 5). */
export const DIRECTION_BINS = 72;
const BIN_DEG = 360 / DIRECTION_BINS;

/** What the scenarios of one step add up to: 72 shares that sum to 1; null: no forecast there. */
export function directionShares(set: ScenarioSet, t: number): number[] | null {
  const bins = new Float64Array(DIRECTION_BINS);
  return addStep(bins, set, t) ? toShares(bins) : null;
}

/** The mean of the steps' shares over the sit; null: no step has a forecast. */
export function sitDirectionShares(set: ScenarioSet): number[] | null {
  const bins = new Float64Array(DIRECTION_BINS);
  let some = false;
  for (let t = 0; t < set.at.length; t++) some = addStep(bins, set, t) || some;
  return some ? toShares(bins) : null;
}

function toShares(bins: Float64Array): number[] {
  let total = 0;
  for (const bin of bins) total += bin;
  return Array.from(bins, (bin) => bin / total);
}

/** Adds one step's scenarios, all of them together a weight of 1; false where there is no forecast. */
function addStep(bins: Float64Array, set: ScenarioSet, t: number): boolean {
  if (!set.known[t] || set.scenarios.length === 0) return false;
  const sigma = Math.hypot(set.scatterDeg[t] ?? 0, set.bundleDeg[t] ?? 0);
  for (const { weight, steps } of set.scenarios) {
    const from = steps[t]?.fromDeg ?? null;
    if (from === null || sigma > 200) {
      for (let i = 0; i < DIRECTION_BINS; i++) bins[i] = (bins[i] as number) + weight / DIRECTION_BINS;
    } else addNormal(bins, from, sigma, weight);
  }
  return true;
}

/** Beyond this many standard deviations lies less than 1 in 10,000, left out. */
const REACH_SIGMA = 4;

function addNormal(bins: Float64Array, from: number, sigma: number, weight: number): void {
  let i = Math.floor(normalizeDeg(from) / BIN_DEG) % DIRECTION_BINS;
  if (sigma < 1e-6) {
    bins[i] = (bins[i] as number) + weight;
    return;
  }
  const first = Math.floor((from - REACH_SIGMA * sigma) / BIN_DEG);
  const last = Math.ceil((from + REACH_SIGMA * sigma) / BIN_DEG);
  i = ((first % DIRECTION_BINS) + DIRECTION_BINS) % DIRECTION_BINS;
  let below = tableCdf((first * BIN_DEG - from) / sigma);
  for (let b = first; b <= last; b++) {
    const upTo = tableCdf(((b + 1) * BIN_DEG - from) / sigma);
    bins[i] = (bins[i] as number) + weight * (upTo - below);
    below = upTo;
    i = i + 1 === DIRECTION_BINS ? 0 : i + 1;
  }
}

export interface DirectionSummary {
  /** null when no direction stands out (resultant length under 0.05) or nothing is known. */
  meanFromDeg: number | null;
  /** Circular standard deviation, degrees, at most 180. */
  spreadDeg: number | null;
  /** Mean speed over scenarios, m/s. */
  speedMps: number | null;
}

/** Mean direction, spread and speed of some steps (all when left out) over scenarios, bundle and scatter. */
export function directionSummary(set: ScenarioSet, only?: number): DirectionSummary {
  let cos = 0;
  let sin = 0;
  let speed = 0;
  let total = 0;
  for (let t = 0; t < set.at.length; t++) {
    if (!set.known[t] || (only !== undefined && only !== t)) continue;
    const sigma = toRad(Math.hypot(set.scatterDeg[t] ?? 0, set.bundleDeg[t] ?? 0));
    const r = Math.exp((-sigma * sigma) / 2);
    for (const { weight, steps } of set.scenarios) {
      const step = steps[t];
      if (!step) continue;
      total += weight;
      speed += weight * step.speedMps;
      if (step.fromDeg === null) continue;
      cos += weight * r * Math.cos(toRad(step.fromDeg));
      sin += weight * r * Math.sin(toRad(step.fromDeg));
    }
  }
  if (total <= 0) return { meanFromDeg: null, spreadDeg: null, speedMps: null };
  const r = Math.min(1, Math.hypot(cos, sin) / total);
  const meanFromDeg = r < 0.05 ? null : normalizeDeg((Math.atan2(sin, cos) * 180) / Math.PI);
  return { meanFromDeg, spreadDeg: Math.min(180, circularSdDeg(r)), speedMps: speed / total };
}
