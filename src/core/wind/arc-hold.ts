import type { Arc } from '../ground-types';
import type { ArcHoldSummary } from '../verdict-types';
import { arcTest, chanceInArcs } from './arc-probability';
import type { ScenarioSet } from './scenario-types';

export interface ArcHold {
  /** Chance that the wind is in the arcs at each step, scatter counted; null: no forecast there. */
  byStep: (number | null)[];
  /** null: no step has a forecast. */
  summary: ArcHoldSummary | null;
}

/**
 * How a stand's good arcs hold the wind of a sit. Shares of time count lasting error and fast scatter together. Leaving
 * counts lasting error alone: a scenario stays in a step when its half-hour mean direction is in the arcs, so a flick of the
 * wind is not called leaving. A step of no direction stays by its share of the circle. Empty `arcs` hold nothing.
 */
export function arcHold(set: ScenarioSet, arcs: readonly Arc[]): ArcHold {
  const test = arcTest(arcs);
  const steps = set.at.length;
  const byStep: (number | null)[] = [];
  for (let t = 0; t < steps; t++) {
    if (!set.known[t] || set.scenarios.length === 0) {
      byStep.push(null);
      continue;
    }
    const sigma = Math.hypot(set.scatterDeg[t] ?? 0, set.bundleDeg[t] ?? 0);
    let share = 0;
    for (const { weight, steps: course } of set.scenarios) {
      share += weight * chanceInArcs(test, course[t]?.fromDeg ?? null, sigma);
    }
    byStep.push(Math.min(1, share));
  }
  return { byStep, summary: summarize(set, byStep, test) };
}

function summarize(
  set: ScenarioSet,
  byStep: (number | null)[],
  test: ReturnType<typeof arcTest>,
): ArcHoldSummary | null {
  const first = byStep.findIndex((p) => p !== null);
  if (first < 0) return null;
  let sum = 0;
  let count = 0;
  let worst = first;
  byStep.forEach((p, t) => {
    if (p === null) return;
    sum += p;
    count++;
    if (p < (byStep[worst] ?? 1)) worst = t;
  });
  const { neverLeaves, leavesAt } = leaving(set, test);
  let likeliest = 0;
  leavesAt.forEach((p, t) => {
    if (p > (leavesAt[likeliest] ?? 0)) likeliest = t;
  });
  return {
    shareOfTime: sum / count,
    neverLeaves,
    likeliestLeavingAt: neverLeaves >= 0.5 ? null : (set.at[likeliest] ?? null),
    worstAt: set.at[worst] ?? 0,
    worstShare: byStep[worst] ?? 0,
  };
}

/**
 * Chance of never leaving, and of first leaving at each step. Within one scenario the bundle's errors last, so its chance of
 * having stayed is the least so far; a step of no direction is a fresh draw of the whole circle and multiplies it.
 */
function leaving(set: ScenarioSet, test: ReturnType<typeof arcTest>): { neverLeaves: number; leavesAt: number[] } {
  const leavesAt = set.at.map(() => 0);
  let neverLeaves = 0;
  for (const { weight, steps } of set.scenarios) {
    let stayed = 1;
    for (let t = 0; t < leavesAt.length; t++) {
      if (!set.known[t]) continue;
      const from = steps[t]?.fromDeg ?? null;
      const inArcs = chanceInArcs(test, from, set.bundleDeg[t] ?? 0);
      const stays = from === null ? stayed * inArcs : Math.min(stayed, inArcs);
      leavesAt[t] = (leavesAt[t] ?? 0) + weight * (stayed - stays);
      stayed = stays;
    }
    neverLeaves += weight * stayed;
  }
  return { neverLeaves: Math.min(1, neverLeaves), leavesAt };
}
