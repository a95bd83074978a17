import { type Interval, shareInterval } from '../intervals';
import type { SitOutcome } from './learning-types';

export interface ReliabilityRow {
  /** Quiet from, and up to but without (the last bin holds 100). */
  fromQuiet: number;
  toQuiet: number;
  sits: number;
  clean: number;
  /** Mean predicted quiet and the share that went clean, 0-1; null: no sit. */
  predicted: number | null;
  observed: number | null;
  /** 95 % of the share. */
  interval: Interval | null;
}

/** Brier score in its parts: score = reliability - resolution + uncertainty + within. All 0-1; null: no sit. */
export interface BrierParts {
  sits: number;
  score: number;
  /** How far what was said lies from what came, bin by bin: 0 is best. */
  reliability: number;
  /** How far the bins lie from the mean of all: more is better. */
  resolution: number;
  /** Of the outcome itself. */
  uncertainty: number;
  /** What predictions that differ inside a bin add. */
  within: number;
}

export interface Reliability {
  rows: ReliabilityRow[];
  brier: BrierParts | null;
}

const mean = (list: number[]) => list.reduce((a, b) => a + b, 0) / list.length;

/**
 * Predicted quiet against clean sits in equal bins, and the Brier score (mean square of prediction less outcome) with its parts
 * (Murphy 1973, J. Appl. Meteorol. 12, by the means of the bins; what differs inside a bin is kept apart as Stephenson et al.
 * 2008 do, so that the parts always sum to the score).
 */
export function reliabilityOf(outcomes: readonly SitOutcome[], bins = 5): Reliability {
  const all = outcomes.map(({ quiet, clean }) => ({ p: Math.min(1, Math.max(0, quiet / 100)), o: clean ? 1 : 0 }));
  const width = 100 / bins;
  const binned = Array.from({ length: bins }, (_, i) =>
    all.filter(({ p }) => Math.min(bins - 1, Math.floor(p * bins + 1e-9)) === i),
  );
  const rows = binned.map((sits, i): ReliabilityRow => {
    const clean = sits.filter(({ o }) => o === 1).length;
    const some = sits.length > 0;
    return {
      fromQuiet: i * width,
      toQuiet: (i + 1) * width,
      sits: sits.length,
      clean,
      predicted: some ? mean(sits.map(({ p }) => p)) : null,
      observed: some ? clean / sits.length : null,
      interval: some ? shareInterval(clean, sits.length) : null,
    };
  });
  if (all.length === 0) return { rows, brier: null };
  const base = mean(all.map(({ o }) => o));
  const score = mean(all.map(({ p, o }) => (p - o) ** 2));
  const overBins = (part: (row: ReliabilityRow) => number) =>
    rows.reduce((sum, row) => sum + (row.sits / all.length) * part(row), 0);
  const reliability = overBins((row) => ((row.predicted ?? 0) - (row.observed ?? 0)) ** 2);
  const resolution = overBins((row) => ((row.observed ?? base) - base) ** 2);
  const uncertainty = base * (1 - base);
  const within = score - (reliability - resolution + uncertainty);
  return { rows, brier: { sits: all.length, score, reliability, resolution, uncertainty, within } };
}
