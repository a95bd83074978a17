import type { StabilityClass } from '../air/stability-types';
import { normalizeDeg } from '../angles';
import { extraScatterDeg } from '../wind/scatter';
import type { ScenarioSet } from '../wind/scenario-types';
import { angularTable, WIND_BINS } from './angular-table';
import { wideningLevel } from './plume-table';
import { chanceOfExposure, exposurePerIndex } from './saturate';
import type { AngularTable, SourceGeometry } from './scent-ground';

const BIN_DEG = 360 / WIND_BINS;

export interface ScentQuestion {
  source: SourceGeometry;
  /** Wind at the source (level 'seat' for a stand). */
  set: ScenarioSet;
  /** One class for each step of the set. */
  stability: readonly StabilityClass[];
  /** Share (0-1) of deer at a feature in a step: deer[feature * steps + step], features by the ground's index. */
  deer: Float64Array;
  /** How long the source stays in each step, minutes. */
  minutes: number;
  /** Steps to count, from and up to (not including); all when left out. */
  steps?: { from: number; to: number };
  /** 'list' leaves byStep empty. */
  detail: 'list' | 'full';
}

export interface SeatScent {
  /** Chance (0-1) that deer anywhere wind the source at least once; null: no step has a forecast. */
  windedChance: number | null;
  /** The same for each feature by the ground's index. */
  byFeature: Float64Array;
  /** In each step alone, and the feature most reached; chance null where no forecast. Empty for detail 'list'. */
  byStep: { chance: number | null; featureIndex: number | null }[];
}

/** What one step holds for every scenario. */
interface StepPlan {
  table: AngularTable;
  /** Chances by source feature for a wind of no direction, by speed. */
  anyWay: { speedMps: number; chance: Float64Array } | null;
}

/**
 * Chance that deer wind a source during a sit: the mean over scenarios of one minus the product, over features and steps, of
 * not being winded, deer present by the caller's shares. Wind speeds under the settings' least are raised to it. An index
 * turned into a chance by our own curve (saturate.ts): good for comparing stands, no promise.
 */
export function seatScent(q: ScentQuestion): SeatScent {
  const { source, set } = q;
  const steps = set.at.length;
  const from = Math.max(0, q.steps?.from ?? 0);
  const to = Math.min(steps, q.steps?.to ?? steps);
  const count = source.features.length;
  const byFeature = new Float64Array(source.ground.featureCount);
  const plans: (StepPlan | null)[] = [];
  for (let t = 0; t < to; t++) plans.push(t >= from && set.known[t] ? planStep(q, t) : null);
  const full = q.detail === 'full';
  const stepFeature = full ? new Float64Array(steps * count) : null;
  const stepChance = new Float64Array(steps);
  const perIndex = exposurePerIndex(q.minutes, source.ground.settings);
  const missed = new Float64Array(count);
  let windedChance = 0;
  for (const { weight, steps: course } of set.scenarios) {
    missed.fill(1);
    let missedAll = 1;
    for (let t = from; t < to; t++) {
      const plan = plans[t];
      const step = course[t];
      if (!plan || !step) continue;
      const speed = Math.max(source.ground.settings.leastSpeedMps, step.speedMps);
      const stepRow = stepFeature ? stepFeature.subarray(t * count, (t + 1) * count) : null;
      const missedStep =
        step.fromDeg === null
          ? anyDirection(q, plan, t, speed, perIndex / speed, missed, stepRow, weight)
          : oneDirection(q, plan.table, t, step.fromDeg, perIndex / speed, missed, stepRow, weight);
      missedAll *= missedStep;
      stepChance[t] = (stepChance[t] ?? 0) + weight * (1 - missedStep);
    }
    windedChance += weight * (1 - missedAll);
    for (let f = 0; f < count; f++) {
      const i = source.features[f] ?? 0;
      byFeature[i] = (byFeature[i] ?? 0) + weight * (1 - (missed[f] ?? 1));
    }
  }
  const some = plans.some((p) => p !== null) && set.scenarios.length > 0;
  const byStep = stepFeature
    ? set.at.map((_, t) => ({
        chance: plans[t] && some ? Math.min(1, stepChance[t] ?? 0) : null,
        featureIndex: most(source, stepFeature.subarray(t * count, (t + 1) * count)),
      }))
    : [];
  return { windedChance: some ? Math.min(1, Math.max(0, windedChance)) : null, byFeature, byStep };
}

function planStep(q: ScentQuestion, t: number): StepPlan {
  const c = q.stability[t] ?? 'D';
  const widening = Math.hypot(extraScatterDeg(c, q.set.scatterDeg[t] ?? 0), q.set.bundleDeg[t] ?? 0);
  return { table: angularTable(q.source, c, wideningLevel(widening)), anyWay: null };
}

/** Adds one scenario's step with a direction; answers the chance that no feature was reached. */
function oneDirection(
  q: ScentQuestion,
  table: AngularTable,
  t: number,
  fromDeg: number,
  perIndex: number,
  missed: Float64Array,
  stepRow: Float64Array | null,
  weight: number,
): number {
  const { features } = q.source;
  const steps = q.set.at.length;
  const x = normalizeDeg(fromDeg) / BIN_DEG;
  const bin = Math.min(WIND_BINS - 1, Math.floor(x));
  const part = x - bin;
  const end = table.start[bin + 1] as number;
  let missedStep = 1;
  for (let e = table.start[bin] as number; e < end; e++) {
    const f = table.feature[e] as number;
    const deer = q.deer[(features[f] as number) * steps + t] as number;
    if (!(deer > 0)) continue;
    const index = table.index[e] as number;
    const share = table.share[e] as number;
    const shareHere = share + ((table.nextShare[e] as number) - share) * part;
    const indexHere = index + ((table.nextIndex[e] as number) - index) * part;
    const p = deer * shareHere * chanceOfExposure((indexHere * perIndex) / shareHere);
    missed[f] = (missed[f] as number) * (1 - p);
    missedStep *= 1 - p;
    if (stepRow) stepRow[f] = (stepRow[f] as number) + weight * p;
  }
  return missedStep;
}

/** The same for a wind of no direction: each feature's chance is its mean over all directions. */
function anyDirection(
  q: ScentQuestion,
  plan: StepPlan,
  t: number,
  speedMps: number,
  perIndex: number,
  missed: Float64Array,
  stepRow: Float64Array | null,
  weight: number,
): number {
  if (!plan.anyWay || plan.anyWay.speedMps !== speedMps) {
    plan.anyWay = { speedMps, chance: meanOverDirections(plan.table, q.source.features.length, perIndex) };
  }
  const steps = q.set.at.length;
  let missedStep = 1;
  for (let f = 0; f < plan.anyWay.chance.length; f++) {
    const deer = q.deer[(q.source.features[f] as number) * steps + t] as number;
    const p = Math.max(deer, 0) * (plan.anyWay.chance[f] as number);
    missed[f] = (missed[f] as number) * (1 - p);
    missedStep *= 1 - p;
    if (stepRow) stepRow[f] = (stepRow[f] as number) + weight * p;
  }
  return missedStep;
}

function meanOverDirections(table: AngularTable, count: number, perIndex: number): Float64Array {
  const chance = new Float64Array(count);
  for (let e = 0; e < table.feature.length; e++) {
    const share = table.share[e] as number;
    const f = table.feature[e] as number;
    const p = share * chanceOfExposure(((table.index[e] as number) * perIndex) / share);
    chance[f] = (chance[f] as number) + p / WIND_BINS;
  }
  return chance;
}

function most(source: SourceGeometry, row: Float64Array): number | null {
  let best: number | null = null;
  let most = 0;
  row.forEach((p, f) => {
    if (p > most) {
      most = p;
      best = source.features[f] ?? null;
    }
  });
  return best;
}
