import type { StabilityClass } from '../air/stability-types';
import { normalizeDeg } from '../angles';
import { extraScatterDeg } from '../wind/scatter';
import type { ScenarioSet } from '../wind/scenario-types';
import { angularTable, WIND_BINS } from './angular-table';
import { noDirectionChance } from './no-direction';
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
  /** Chance in each step alone, at either detail; 0 where no forecast. */
  stepChance: Float64Array;
  /** In each step alone, and the feature most reached; chance null where no forecast. Empty for detail 'list'. */
  byStep: { chance: number | null; featureIndex: number | null }[];
}

/** What one step holds for every scenario. */
interface StepPlan {
  table: AngularTable;
  /** Share of deer at each of the source's features: the step's stretch of one array for all steps. */
  deer: Float64Array;
  /** Where that stretch begins. */
  row: number;
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
  const deer = new Float64Array(to * count);
  for (let t = 0; t < to; t++) plans.push(t >= from && set.known[t] ? planStep(q, t, deer) : null);
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
          ? anyDirection(plan, speed, perIndex / speed, missed, stepRow, weight)
          : oneDirection(plan, step.fromDeg, perIndex / speed, missed, stepRow, weight);
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
  return { windedChance: some ? Math.min(1, Math.max(0, windedChance)) : null, byFeature, stepChance, byStep };
}

function planStep(q: ScentQuestion, t: number, deer: Float64Array): StepPlan {
  const c = q.stability[t] ?? 'D';
  const widening = Math.hypot(extraScatterDeg(c, q.set.scatterDeg[t] ?? 0), q.set.bundleDeg[t] ?? 0);
  const steps = q.set.at.length;
  const { features } = q.source;
  const row = t * features.length;
  for (let f = 0; f < features.length; f++) {
    const share = q.deer[(features[f] as number) * steps + t] as number;
    deer[row + f] = share > 0 ? Math.min(1, share) : 0;
  }
  return { table: angularTable(q.source, c, wideningLevel(widening)), deer, row, anyWay: null };
}

/** Adds one scenario's step with a direction; answers the chance that no feature was reached. */
function oneDirection(
  { table, deer, row }: StepPlan,
  fromDeg: number,
  perIndex: number,
  missed: Float64Array,
  stepRow: Float64Array | null,
  weight: number,
): number {
  const x = normalizeDeg(fromDeg) / BIN_DEG;
  const bin = Math.min(WIND_BINS - 1, Math.floor(x));
  const part = x - bin;
  const { values, places } = table;
  const end = 4 * (table.start[bin + 1] as number);
  let missedStep = 1;
  for (let e = 4 * (table.start[bin] as number); e < end; e += 4) {
    const f = places[e] as number;
    const index = (values[e + 2] as number) + (values[e + 3] as number) * part;
    const p = (deer[row + f] as number) * (values[e + 1] as number) * chanceOfExposure(index * perIndex);
    missed[f] = (missed[f] as number) * (1 - p);
    missedStep *= 1 - p;
    if (stepRow) stepRow[f] = (stepRow[f] as number) + weight * p;
  }
  return missedStep;
}

/** The same for a wind of no direction: each feature's chance is its mean over all directions. */
function anyDirection(
  plan: StepPlan,
  speedMps: number,
  perIndex: number,
  missed: Float64Array,
  stepRow: Float64Array | null,
  weight: number,
): number {
  if (!plan.anyWay || plan.anyWay.speedMps !== speedMps) {
    const chance = plan.anyWay?.chance ?? new Float64Array(missed.length);
    plan.anyWay = { speedMps, chance: noDirectionChance(plan.table, perIndex, chance) };
  }
  let missedStep = 1;
  for (let f = 0; f < missed.length; f++) {
    const p = (plan.deer[plan.row + f] as number) * (plan.anyWay.chance[f] as number);
    missed[f] = (missed[f] as number) * (1 - p);
    missedStep *= 1 - p;
    if (stepRow) stepRow[f] = (stepRow[f] as number) + weight * p;
  }
  return missedStep;
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
