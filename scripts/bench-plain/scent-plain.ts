import { type StabilityClass, stabilityIndex } from '@/core/air/stability-types';
import type { Point } from '@/core/ground-types';
import { sweptPlume } from '@/core/scent/plume';
import { WIDENINGS_DEG, wideningLevel } from '@/core/scent/plume-table';
import type { SampledFeature } from '@/core/scent/sample-feature';
import { referenceStrength, windedChanceOf } from '@/core/scent/saturate';
import type { ScentGround } from '@/core/scent/scent-ground';
import { extraScatterDeg } from '@/core/wind/scatter';
import type { ScenarioSet } from '@/core/wind/scenario-types';

export interface PlainScentQuestion {
  ground: ScentGround;
  at: Point;
  heightM: number;
  set: ScenarioSet;
  stability: readonly StabilityClass[];
  /** deer[feature * steps + step]. */
  deer: Float64Array;
  minutes: number;
}

const FAR_M = 300;
const DEG = 180 / Math.PI;

/**
 * The chance that deer wind a seat, straight from the formulas: every sample of every feature for every scenario and step,
 * no table, nothing kept. What the fast version must agree with.
 */
export function plainSeatScent(q: PlainScentQuestion): { windedChance: number; byFeature: number[]; byStep: number[] } {
  const steps = q.set.at.length;
  const byFeature = q.ground.near.map(() => 0);
  const byStep = q.set.at.map(() => 0);
  let windedChance = 0;
  for (const { weight, steps: course } of q.set.scenarios) {
    let missedAll = 1;
    const missedInStep = q.set.at.map(() => 1);
    for (let f = 0; f < q.ground.featureCount; f++) {
      let missed = 1;
      for (let t = 0; t < steps; t++) {
        const step = course[t];
        const deer = q.deer[f * steps + t] ?? 0;
        if (!step || !q.set.known[t] || !(deer > 0)) continue;
        const kept = 1 - deer * chanceAt(q, f, t, step.fromDeg, step.speedMps);
        missed *= kept;
        missedInStep[t] = (missedInStep[t] ?? 1) * kept;
      }
      byFeature[f] = (byFeature[f] ?? 0) + weight * (1 - missed);
      missedAll *= missed;
    }
    windedChance += weight * (1 - missedAll);
    missedInStep.forEach((kept, t) => {
      byStep[t] = (byStep[t] ?? 0) + weight * (1 - kept);
    });
  }
  return { windedChance, byFeature, byStep };
}

function samplesOf(q: PlainScentQuestion, f: number): SampledFeature {
  const near = q.ground.near[f];
  const first = near?.points[0];
  if (!near || !first) return { points: [], weights: [] };
  const far = Math.hypot(first.eastM - q.at.eastM, first.northM - q.at.northM) > FAR_M;
  return far ? (q.ground.far[f] ?? near) : near;
}

/** Directions a wind of no direction is averaged over. */
const ROUND = 120;

function chanceAt(q: PlainScentQuestion, f: number, t: number, fromDeg: number | null, speedMps: number): number {
  if (fromDeg !== null) return chanceFrom(q, f, t, fromDeg, speedMps);
  let sum = 0;
  for (let i = 0; i < ROUND; i++) sum += chanceFrom(q, f, t, (360 * i) / ROUND, speedMps);
  return sum / ROUND;
}

function chanceFrom(q: PlainScentQuestion, f: number, t: number, fromDeg: number, speedMps: number): number {
  const s = q.ground.settings;
  const c = q.stability[t] ?? 'D';
  const widening = Math.hypot(extraScatterDeg(c, q.set.scatterDeg[t] ?? 0), q.set.bundleDeg[t] ?? 0);
  const swept = WIDENINGS_DEG[wideningLevel(widening)] ?? 0;
  const { points, weights } = samplesOf(q, f);
  let sum = 0;
  let squares = 0;
  points.forEach((p, j) => {
    const [east, north] = [p.eastM - q.at.eastM, p.northM - q.at.northM];
    const distanceM = Math.hypot(east, north);
    if (distanceM > s.reachM) return;
    const towards = Math.atan2(east, north) * DEG;
    const offDeg = ((((towards - (fromDeg + 180)) % 360) + 540) % 360) - 180;
    const index = sweptPlume(c, { distanceM, offDeg, zM: s.noseHeightM }, q.heightM, swept) / referenceStrength(s);
    sum += (weights[j] ?? 0) * index;
    squares += (weights[j] ?? 0) * index * index;
  });
  if (!(squares > 0) || stabilityIndex(c) < 0) return 0;
  const share = Math.min(1, (sum * sum) / squares);
  return share * windedChanceOf(sum / share / Math.max(s.leastSpeedMps, speedMps), q.minutes, s);
}
