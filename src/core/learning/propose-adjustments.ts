import { shareInterval } from '../intervals';
import type { SitOutcome } from './learning-types';

export interface LearningSettings {
  /** Fewer sits than this say nothing about a stand. */
  leastSits: number;
  /** Sits that the sums are held to be worth: a stand with as many of its own goes half the way. */
  priorSits: number;
  /** Most points of quiet a stand may be moved either way. */
  mostPoints: number;
}

/** All our choice. */
export const DEFAULT_LEARNING: LearningSettings = { leastSits: 5, priorSits: 20, mostPoints: 15 };

export interface Proposal {
  standId: string;
  sits: number;
  clean: number;
  /** Mean quiet predicted without any adjustment, 0-100. */
  predicted: number;
  /** Points of quiet to add to what the sums say, shrunk and bounded; and with the ends of the 95 % interval of its share of clean sits. */
  points: number;
  lowPoints: number;
  highPoints: number;
  /** The interval leaves zero out. */
  sure: boolean;
}

/**
 * For each stand with sits enough, how many points of quiet its own log asks to be added to the sums: the share of clean sits
 * less the mean prediction, shrunk by n / (n + prior), bounded either way. Adjustments already in a prediction are taken out
 * first, so that what is proposed stands in their place. In order of stand id.
 */
export function proposeAdjustments(
  outcomes: readonly SitOutcome[],
  s: LearningSettings = DEFAULT_LEARNING,
): Proposal[] {
  const byStand = new Map<string, SitOutcome[]>();
  for (const one of outcomes) byStand.set(one.standId, [...(byStand.get(one.standId) ?? []), one]);
  const bound = (points: number) => Math.min(s.mostPoints, Math.max(-s.mostPoints, points)) + 0;
  return [...byStand]
    .filter(([, sits]) => sits.length >= s.leastSits)
    .map(([standId, sits]): Proposal => {
      const n = sits.length;
      const clean = sits.filter((one) => one.clean).length;
      const predicted = sits.reduce((sum, one) => sum + one.quiet - one.adjustedBy, 0) / n;
      const shrink = n / (n + s.priorSits);
      const toPoints = (share: number) => bound(shrink * (100 * share - predicted));
      const { low, high } = shareInterval(clean, n);
      const [lowPoints, highPoints] = [toPoints(low), toPoints(high)];
      return {
        standId,
        sits: n,
        clean,
        predicted,
        points: toPoints(clean / n),
        lowPoints,
        highPoints,
        sure: lowPoints > 0 || highPoints < 0,
      };
    })
    .sort((a, b) => (a.standId < b.standId ? -1 : 1));
}
