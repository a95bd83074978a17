import { gini } from '../draw/fairness';

/** What the Gini coefficient would be by luck alone, 0-1: the mean of many lots, and the ends of the middle 95 % of them. */
export interface ByLot {
  mean: number;
  low: number;
  high: number;
}

const LOTS = 400;
const TAIL = 0.025;

/** mulberry32: the same numbers each time, so that a report does not change when it is opened again. */
function makeShare(): () => number {
  let state = 1;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let t = Math.imul(state ^ (state >>> 15), state | 1);
    t ^= t + Math.imul(t ^ (t >>> 7), t | 61);
    return ((t ^ (t >>> 14)) >>> 0) / 4294967296;
  };
}

/**
 * Gini coefficients of the good sits had they been dealt out by lot among the sits judged: few of them never come out even.
 * `judged` are each member's sits that might have been good ones; null with none, or no good sit.
 */
export function giniByLot(judged: readonly number[], good: number): ByLot | null {
  const owners = judged.flatMap((sits, member) => Array.from({ length: sits }, () => member));
  if (good <= 0 || owners.length < good) return null;
  const share = makeShare();
  const found = Array.from({ length: LOTS }, () => {
    const counts = judged.map(() => 0);
    for (let n = 0; n < good; n++) {
      const at = n + Math.floor(share() * (owners.length - n));
      const owner = owners[at] ?? 0;
      owners[at] = owners[n] ?? 0;
      owners[n] = owner;
      counts[owner] = (counts[owner] ?? 0) + 1;
    }
    return gini(counts) ?? 0;
  }).sort((a, b) => a - b);
  const end = Math.floor(LOTS * TAIL);
  return {
    mean: found.reduce((sum, one) => sum + one, 0) / LOTS,
    low: found[end] ?? 0,
    high: found[LOTS - 1 - end] ?? 0,
  };
}

/** Whether good sits lie as luck and the number of sits would have it. */
export function sharedAs(ofGood: number, lot: ByLot): 'by_lot' | 'less_even' | 'more_even' {
  if (ofGood > lot.high) return 'less_even';
  return ofGood < lot.low ? 'more_even' : 'by_lot';
}
