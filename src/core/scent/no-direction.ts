import { WIND_BINS } from './angular-table';
import { chanceOfExposure } from './saturate';
import type { AngularTable } from './scent-ground';

/** Exposures are kept at levels a fifth apart; a line between two is within 0.5 % of the curve. */
const RATIO = 1.2;
const LOG_RATIO = Math.log(RATIO);

function levelOf(table: AngularTable, count: number, level: number): Float64Array {
  const kept = table.noDirection.get(level);
  if (kept) return kept;
  const made = meanOverDirections(table, count, RATIO ** level);
  table.noDirection.set(level, made);
  return made;
}

/** Each feature's chance as its mean over all directions, worked out in full. */
export function meanOverDirections(table: AngularTable, count: number, perIndex: number): Float64Array {
  const chance = new Float64Array(count);
  const { values, places } = table;
  for (let e = 0; e < values.length; e += 4) {
    const f = places[e] as number;
    const p = (values[e + 1] as number) * chanceOfExposure((values[e + 2] as number) * perIndex);
    chance[f] = (chance[f] as number) + p / WIND_BINS;
  }
  return chance;
}

/** The same between two kept levels of exposure per unit of index, written to `out`. */
export function noDirectionChance(table: AngularTable, perIndex: number, out: Float64Array): Float64Array {
  if (!(perIndex > 0)) return out.fill(0);
  const level = Math.floor(Math.log(perIndex) / LOG_RATIO);
  const low = levelOf(table, out.length, level);
  const high = levelOf(table, out.length, level + 1);
  const part = (perIndex / RATIO ** level - 1) / (RATIO - 1);
  for (let f = 0; f < out.length; f++) {
    const a = low[f] as number;
    out[f] = a + ((high[f] as number) - a) * part;
  }
  return out;
}
