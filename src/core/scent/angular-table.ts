import { type StabilityClass, stabilityIndex } from '../air/stability-types';
import { atDistance, WIDENINGS_DEG } from './plume-table';
import { type AngularTable, groundPlume, type SourceGeometry } from './scent-ground';
import { reserve, type TableScratch } from './table-scratch';

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

/** Exposure of one feature by wind direction, and the bins that hold any. */
interface Row {
  sum: Float64Array;
  squares: Float64Array;
  from: number;
  to: number;
}

function makeTable(g: SourceGeometry, c: StabilityClass, level: number): AngularTable {
  const plume = groundPlume(g.ground, c, level, g.heightM);
  const count = g.features.length;
  const row: Row = { sum: new Float64Array(WIND_BINS), squares: new Float64Array(WIND_BINS), from: 0, to: -1 };
  const out = g.ground.scratch;
  out.count = 0;
  for (let f = 0; f < count; f++) {
    row.sum.fill(0);
    row.squares.fill(0);
    row.from = Number.POSITIVE_INFINITY;
    row.to = Number.NEGATIVE_INFINITY;
    const until = g.sampleStart[f + 1] as number;
    for (let j = g.sampleStart[f] as number; j < until; j++) {
      const d = g.distanceM[j] as number;
      const strength = atDistance(plume.onAxis, d) / g.ground.reference;
      addSample(row, g.windFromDeg[j] as number, atDistance(plume.sigmaDeg, d), strength, g.weight[j] as number);
    }
    addEntries(row, f, out);
  }
  return pack(out);
}

function addSample(row: Row, centreDeg: number, sigma: number, strength: number, weight: number): void {
  const half = Math.min(89.9, REACH_SIGMA * sigma);
  const first = Math.ceil((centreDeg - half) / BIN_DEG);
  const last = Math.floor((centreDeg + half) / BIN_DEG);
  if (first > last || !(strength > LEAST_INDEX)) return;
  // A normal curve at even steps, each from the one before by a ratio that itself falls by a fixed factor.
  const scale = -0.5 / (sigma * sigma);
  const off = first * BIN_DEG - centreDeg;
  let v = strength * Math.exp(off * off * scale);
  let ratio = Math.exp((2 * off * BIN_DEG + BIN_DEG * BIN_DEG) * scale);
  const fall = Math.exp(2 * BIN_DEG * BIN_DEG * scale);
  for (let b = first; b <= last; b++) {
    const at = b < 0 ? b + WIND_BINS : b >= WIND_BINS ? b - WIND_BINS : b;
    row.sum[at] = (row.sum[at] as number) + weight * v;
    row.squares[at] = (row.squares[at] as number) + weight * v * v;
    v *= ratio;
    ratio *= fall;
  }
  // Bins of one feature may run either way round north: keep them next to those already there.
  const shift =
    row.to < row.from ? 0 : Math.round(((row.from + row.to) / 2 - (first + last) / 2) / WIND_BINS) * WIND_BINS;
  row.from = Math.min(row.from, first + shift);
  row.to = Math.max(row.to, last + shift);
}

/** Share of a feature that bears its mean: one when exposure is even, small when one corner has it all. */
function shareOf(sum: number, squares: number): number {
  return squares > 0 ? Math.min(1, (sum * sum) / squares) : 0;
}

/** One entry for each bin that is reached, or whose next one is. */
function addEntries(row: Row, f: number, out: TableScratch): void {
  const last = Math.min(row.to, row.from + WIND_BINS - 2);
  if (!(last >= row.from - 1)) return;
  reserve(out, WIND_BINS);
  let b = (row.from - 1 + 2 * WIND_BINS) % WIND_BINS;
  let here = row.sum[b] as number;
  let shareHere = shareOf(here, row.squares[b] as number);
  for (let i = row.from - 1; i <= last; i++) {
    const next = b + 1 === WIND_BINS ? 0 : b + 1;
    const there = row.sum[next] as number;
    const shareThere = shareOf(there, row.squares[next] as number);
    if (here > LEAST_INDEX || there > LEAST_INDEX) {
      const share = shareHere > 0 && shareThere > 0 ? (shareHere + shareThere) / 2 : shareHere || shareThere;
      const at = 4 * out.count;
      out.bins[out.count++] = b;
      out.values[at] = f;
      out.values[at + 1] = share;
      out.values[at + 2] = here / share;
      out.values[at + 3] = (there - here) / share;
    }
    b = next;
    here = there;
    shareHere = shareThere;
  }
}

/** Entries in order of bin, features in order within each. */
function pack({ count, bins, values }: TableScratch): AngularTable {
  const start = new Int32Array(WIND_BINS + 1);
  for (let i = 0; i < count; i++) {
    const b = bins[i] as number;
    start[b + 1] = (start[b + 1] as number) + 1;
  }
  for (let b = 0; b < WIND_BINS; b++) start[b + 1] = (start[b + 1] as number) + (start[b] as number);
  const packed = new Float32Array(4 * count);
  const places = new Int32Array(packed.buffer);
  const fill = start.slice(0, WIND_BINS);
  for (let i = 0; i < count; i++) {
    const b = bins[i] as number;
    const to = 4 * (fill[b] as number);
    fill[b] = (fill[b] as number) + 1;
    places[to] = values[4 * i] as number;
    packed[to + 1] = values[4 * i + 1] as number;
    packed[to + 2] = values[4 * i + 2] as number;
    packed[to + 3] = values[4 * i + 3] as number;
  }
  return { start, values: packed, places, noDirection: new Map() };
}
