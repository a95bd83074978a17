import { normalizeDeg, toRad } from '../angles';
import { circularSdDeg } from '../circular';
import { tableCdf } from './arc-probability';
import type { ScenarioSet } from './scenario-types';

/** Bins of 5 degrees from north clockwise: bin i holds [5i, 5i + 5). */
export const DIRECTION_BINS = 72;
const BIN_DEG = 360 / DIRECTION_BINS;

/** What the scenarios of one step add up to: 72 shares that sum to 1; null: no forecast there. */
export function directionShares(set: ScenarioSet, t: number): number[] | null {
  if (!set.known[t] || set.scenarios.length === 0) return null;
  const bins = new Array<number>(DIRECTION_BINS).fill(0);
  const sigma = Math.hypot(set.scatterDeg[t] ?? 0, set.bundleDeg[t] ?? 0);
  for (const { weight, steps } of set.scenarios) {
    const from = steps[t]?.fromDeg ?? null;
    if (from === null || sigma > 200)
      for (let i = 0; i < DIRECTION_BINS; i++) bins[i] = (bins[i] ?? 0) + weight / DIRECTION_BINS;
    else addNormal(bins, from, sigma, weight);
  }
  const total = bins.reduce((a, b) => a + b, 0);
  return bins.map((b) => b / total);
}

function addNormal(bins: number[], from: number, sigma: number, weight: number): void {
  if (sigma < 1e-6) {
    const i = Math.floor(normalizeDeg(from) / BIN_DEG) % DIRECTION_BINS;
    bins[i] = (bins[i] ?? 0) + weight;
    return;
  }
  const first = Math.floor((from - 6 * sigma) / BIN_DEG);
  const last = Math.ceil((from + 6 * sigma) / BIN_DEG);
  let below = tableCdf((first * BIN_DEG - from) / sigma);
  for (let b = first; b <= last; b++) {
    const upTo = tableCdf(((b + 1) * BIN_DEG - from) / sigma);
    const i = ((b % DIRECTION_BINS) + DIRECTION_BINS) % DIRECTION_BINS;
    bins[i] = (bins[i] ?? 0) + weight * (upTo - below);
    below = upTo;
  }
}

/** The mean of the steps' shares over the sit; null: no step has a forecast. */
export function sitDirectionShares(set: ScenarioSet): number[] | null {
  const steps = set.at.map((_, t) => directionShares(set, t)).filter((s): s is number[] => s !== null);
  if (steps.length === 0) return null;
  return Array.from(
    { length: DIRECTION_BINS },
    (_, i) => steps.reduce((sum, s) => sum + (s[i] ?? 0), 0) / steps.length,
  );
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
