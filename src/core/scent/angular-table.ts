import { type StabilityClass, stabilityIndex } from '../air/stability-types';
import { atDistance, WIDENINGS_DEG } from './plume-table';
import { type AngularTable, groundPlume, type SourceGeometry } from './scent-ground';

export const WIND_BINS = 120;
const BIN_DEG = 360 / WIND_BINS;
/** Off the axis a plume is followed to this many standard deviations. */
const REACH_SIGMA = 3.2;
/** An index below this counts as none. */
const LEAST_INDEX = 1e-9;

/** The table of a class and widening level for a source, made when first asked for. */
export function angularTable(g: SourceGeometry, c: StabilityClass, level: number): AngularTable {
  const key = stabilityIndex(c) * WIDENINGS_DEG.length + level;
  const kept = g.tables.get(key);
  if (kept) return kept;
  const made = makeTable(g, c, level);
  g.tables.set(key, made);
  return made;
}

function makeTable(g: SourceGeometry, c: StabilityClass, level: number): AngularTable {
  const plume = groundPlume(g.ground, c, level, g.heightM);
  const count = g.features.length;
  const sum = new Float64Array(count * WIND_BINS);
  const squares = new Float64Array(count * WIND_BINS);
  for (let f = 0; f < count; f++) {
    const until = g.sampleStart[f + 1] ?? 0;
    for (let j = g.sampleStart[f] ?? 0; j < until; j++) {
      const d = g.distanceM[j] ?? 0;
      const sigma = atDistance(plume.sigmaDeg, d);
      const strength = atDistance(plume.onAxis, d) / g.ground.reference;
      addSample(sum, squares, f * WIND_BINS, g.windFromDeg[j] ?? 0, sigma, strength, g.weight[j] ?? 0);
    }
  }
  return pack(sum, squares, count);
}

function addSample(
  sum: Float64Array,
  squares: Float64Array,
  row: number,
  centreDeg: number,
  sigma: number,
  strength: number,
  weight: number,
): void {
  const half = Math.min(89.9, REACH_SIGMA * sigma);
  const first = Math.ceil((centreDeg - half) / BIN_DEG);
  const last = Math.floor((centreDeg + half) / BIN_DEG);
  const scale = -0.5 / (sigma * sigma);
  for (let b = first; b <= last; b++) {
    const off = b * BIN_DEG - centreDeg;
    const v = strength * Math.exp(off * off * scale);
    if (!(v > LEAST_INDEX)) continue;
    const at = row + (b < 0 ? b + WIND_BINS : b >= WIND_BINS ? b - WIND_BINS : b);
    sum[at] = (sum[at] ?? 0) + weight * v;
    squares[at] = (squares[at] ?? 0) + weight * v * v;
  }
}

/** Share of a feature that bears its mean: one when exposure is even, small when one corner has it all. */
function shareOf(sum: number, squares: number): number {
  return squares > 0 ? Math.min(1, (sum * sum) / squares) : 0;
}

function pack(sum: Float64Array, squares: Float64Array, count: number): AngularTable {
  const start = new Int32Array(WIND_BINS + 1);
  for (let f = 0; f < count; f++) {
    for (let b = 0; b < WIND_BINS; b++) {
      const next = f * WIND_BINS + ((b + 1) % WIND_BINS);
      if ((sum[f * WIND_BINS + b] ?? 0) > 0 || (sum[next] ?? 0) > 0) start[b + 1] = (start[b + 1] ?? 0) + 1;
    }
  }
  for (let b = 0; b < WIND_BINS; b++) start[b + 1] = (start[b + 1] ?? 0) + (start[b] ?? 0);
  const total = start[WIND_BINS] ?? 0;
  const table: AngularTable = {
    start,
    feature: new Int32Array(total),
    index: new Float32Array(total),
    nextIndex: new Float32Array(total),
    share: new Float32Array(total),
    nextShare: new Float32Array(total),
  };
  const fill = start.slice(0, WIND_BINS);
  for (let f = 0; f < count; f++) {
    for (let b = 0; b < WIND_BINS; b++) {
      const here = f * WIND_BINS + b;
      const next = f * WIND_BINS + ((b + 1) % WIND_BINS);
      const [a, z] = [sum[here] ?? 0, sum[next] ?? 0];
      if (!(a > 0 || z > 0)) continue;
      const e = fill[b] ?? 0;
      fill[b] = e + 1;
      table.feature[e] = f;
      table.index[e] = a;
      table.nextIndex[e] = z;
      const [shareA, shareZ] = [shareOf(a, squares[here] ?? 0), shareOf(z, squares[next] ?? 0)];
      // At the edge of reach only one end has a share: hold it, so that the mean is not squeezed into nothing.
      table.share[e] = shareA > 0 ? shareA : shareZ;
      table.nextShare[e] = shareZ > 0 ? shareZ : shareA;
    }
  }
  return table;
}
