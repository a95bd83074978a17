import { turnDeg } from '@/core/angles';
import { compassSpan, mergeArcs } from '@/core/arcs';
import { circularMean } from '@/core/circular';
import type { Arc } from '@/core/ground-types';
import { SECTOR_WIDTH_DEG, type SectorName, sectorName } from '@/core/sectors';
import { STRIP_WORDS } from '../words/wind';

/** Bins of a direction histogram: bin i holds directions from 5i up to 5i + 5 degrees. */
export const BIN_COUNT = 72;
export const BIN_DEG = 5;
const BIN_CENTRES = Array.from({ length: BIN_COUNT }, (_, bin) => bin * BIN_DEG + BIN_DEG / 2);

/** One step of a sit. `shares`: 72 shares that sum to 1, from north clockwise; null: no forecast. */
export interface StripRow {
  at: number;
  shares: number[] | null;
  /** Share of the wind in the good arcs when it is known better than the bins tell. */
  hold?: number | null;
}

/** Arcs as spans of 0-360 that do not cross north, for drawing along a line. */
export function unrollArcs(arcs: readonly Arc[]): { from: number; to: number }[] {
  return mergeArcs(arcs)
    .flatMap(({ fromDeg, toDeg }) => {
      if (toDeg - fromDeg >= 360) return [{ from: 0, to: 360 }];
      if (toDeg >= fromDeg) return [{ from: fromDeg, to: toDeg }];
      return [
        { from: 0, to: toDeg },
        { from: fromDeg, to: 360 },
      ].filter((span) => span.to > span.from);
    })
    .sort((a, b) => a.from - b.from);
}

/** Share of a histogram inside a union of arcs, 0-1; bins cut by an arc's end count by the part inside. */
export function shareInArcs(shares: readonly number[], arcs: readonly Arc[]): number {
  const spans = unrollArcs(arcs);
  let sum = 0;
  shares.forEach((share, bin) => {
    const start = bin * BIN_DEG;
    for (const { from, to } of spans) {
      sum += (share * Math.max(0, Math.min(to, start + BIN_DEG) - Math.max(from, start))) / BIN_DEG;
    }
  });
  return Math.min(1, sum);
}

/** Mean of the rows that have a forecast; null when none has. */
export function mergeRows(rows: readonly StripRow[]): StripRow | null {
  const known = rows.flatMap((row) => (row.shares ? [row.shares] : []));
  const first = rows[0];
  if (!first || known.length === 0) return null;
  const shares = BIN_CENTRES.map((_, bin) => known.reduce((sum, row) => sum + (row[bin] ?? 0), 0) / known.length);
  const holds = rows.flatMap((row) => (typeof row.hold === 'number' ? [row.hold] : []));
  const hold = holds.length === known.length ? holds.reduce((a, b) => a + b, 0) / holds.length : undefined;
  return { at: first.at, shares, hold };
}

/** Below this resultant length a wind comes from nowhere in particular (spread of about 90 degrees; our choice). */
const SETTLED = 0.3;

/** Mean direction of a histogram; null when it is too spread to have one. */
export function settledDeg(shares: readonly number[] | null): number | null {
  if (!shares) return null;
  const mean = circularMean(BIN_CENTRES, shares);
  return mean.meanDeg === null || mean.r < SETTLED ? null : mean.meanDeg;
}

export function settledName(shares: readonly number[] | null): SectorName | null {
  const deg = settledDeg(shares);
  return deg === null ? null : sectorName(deg);
}

export function holdOf(row: StripRow, arcs: readonly Arc[]): number | null {
  if (typeof row.hold === 'number') return row.hold;
  return row.shares ? shareInArcs(row.shares, arcs) : null;
}

export function percent(share: number): string {
  return `${Math.round(share * 100)} %`;
}

export function nameArcs(arcs: readonly Arc[]): string {
  return mergeArcs(arcs).map(compassSpan).join(STRIP_WORDS.and);
}

/** The strip in words: 'Wind mostly NW, veering to N, 84 % in the good arcs NW-N'. */
export function describeWindStrip({ arcs, rows }: { arcs: readonly Arc[]; rows: readonly StripRow[] }): string {
  const merged = mergeRows(rows);
  const arcText = arcs.length === 0 ? STRIP_WORDS.noArcs : STRIP_WORDS.arcs(nameArcs(arcs));
  if (!merged?.shares) return STRIP_WORDS.noForecast(arcText, arcs.length > 0);
  const name = settledName(merged.shares);
  const wind = name ? STRIP_WORDS.mostly(name, describeTurn(rows)) : STRIP_WORDS.unsettled;
  if (arcs.length === 0) return STRIP_WORDS.only(wind, arcText);
  return STRIP_WORDS.share(wind, percent(holdOf(merged, arcs) ?? 0), arcText);
}

function describeTurn(rows: readonly StripRow[]): string {
  const known = rows.filter((row) => row.shares);
  const first = settledDeg(known[0]?.shares ?? null);
  const last = settledDeg(known.at(-1)?.shares ?? null);
  if (first === null || last === null) return '';
  const turn = turnDeg(first, last);
  if (Math.abs(turn) < SECTOR_WIDTH_DEG) return '';
  return turn > 0 ? STRIP_WORDS.veering(sectorName(last)) : STRIP_WORDS.backing(sectorName(last));
}
