import { chanceOfExposure } from '../scent/saturate';
import type { ApproachSettings } from './approach-settings';
import { senseFactor } from './seen-heard';
import type { WalkGround, WalkSlot } from './walk-ground';

/** Bearing bins of the walk tables: 3 degrees each, so that a line between two is within 1 % of the curve. */
export const WALK_BINS = 120;

/** The wind at the moment of a walk: one entry a scenario with a direction, the rest as one with none. */
export interface WalkWind {
  /** The two bins each direction lies between, and how far it is past the first, 0-1. */
  low: Int32Array;
  high: Int32Array;
  part: Float64Array;
  weights: Float64Array;
  /** One over the speed at walking height, s/m, of each entry. */
  perSpeed: Float64Array;
  anyWeight: number;
  anyPerSpeed: number;
  /** Mean open wind, m/s. */
  speedMps: number;
  /** 0 (A) to 5 (F). */
  stability: number;
}

/** Everything about an instant that a walk needs and that all walks share. */
export interface WalkMoment {
  /** 0 (day) to 1 (night). */
  dark: number;
  /** Chance (0-1) of deer at each feature. */
  shares: Float64Array;
  /** null: no forecast; then only sight and sound count. */
  wind: WalkWind | null;
}

export interface WalkChance {
  /** Chance (0-1) that deer somewhere are alerted by the walk. */
  chance: number;
  /** Feature that costs most, and its part; null when none is touched. */
  worst: { feature: number; chance: number } | null;
}

/** Places deer use less than this are passed over. */
const LEAST_SHARE = 0.005;

function scentChance(table: Float32Array, slot: number, wind: WalkWind): number {
  const row = slot * WALK_BINS;
  const { low, high, part, weights, perSpeed } = wind;
  let sum = 0;
  for (let i = 0; i < low.length; i++) {
    const a = table[row + (low[i] as number)] as number;
    const b = table[row + (high[i] as number)] as number;
    const exposure = a + (b - a) * (part[i] as number);
    if (exposure > 0) sum += (weights[i] as number) * chanceOfExposure(exposure * (perSpeed[i] as number));
  }
  if (wind.anyWeight > 0) {
    let any = 0;
    for (let bin = 0; bin < WALK_BINS; bin++) {
      const exposure = table[row + bin] as number;
      if (exposure > 0) any += chanceOfExposure(exposure * wind.anyPerSpeed);
    }
    sum += (wind.anyWeight * any) / WALK_BINS;
  }
  return sum;
}

/**
 * Chance that a walk alerts deer: for each feature, deer being there times being winded or noticed at the worst point of the
 * way; then at least one of them, or of deer nobody has mapped. `table` is the walk's own for the wind's stability class.
 */
export function walkChance(
  ground: WalkGround,
  table: Float32Array | null,
  moment: WalkMoment,
  s: ApproachSettings,
): WalkChance {
  const sense = s.seenNearChance * senseFactor(moment.dark, moment.wind?.speedMps ?? null, s);
  let unnoticed = (1 - s.unmappedPer100M) ** (ground.walkedM / 100);
  let worst = -1;
  let most = 0;
  const { slots } = ground;
  for (let i = 0; i < slots.length; i++) {
    const slot = slots[i] as WalkSlot;
    const share = moment.shares[slot.feature] as number;
    if (share < LEAST_SHARE) continue;
    const scent = table && moment.wind ? scentChance(table, i, moment.wind) : 0;
    const part = share * (1 - (1 - scent) * (1 - sense * slot.seen));
    unnoticed *= 1 - part;
    if (part > most) {
      worst = slot.feature;
      most = part;
    }
  }
  return { chance: 1 - unnoticed, worst: worst < 0 ? null : { feature: worst, chance: most } };
}
