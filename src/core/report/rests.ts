import { daysBetween } from '../day-time';

/** A day sat before the stand had its rest. */
export interface BrokenRest {
  day: string;
  /** The day sat before it. */
  after: string;
  /** Full days between the two. */
  rested: number;
}

export interface RestRecord {
  /** Times the stand was sat again. */
  times: number;
  /** How many of them came after its full rest. */
  kept: number;
  /** Fewest full days between two days sat; null: it was sat on one day at most. */
  least: number | null;
  broken: BrokenRest[];
}

/**
 * Whether a stand was given its rest, counted as booking counts it (core/booking/rest.ts): full days between two days sat,
 * and any number of sits on one day are one. `sitDays` in any order; `before` is the last day sat ahead of them, null: none.
 */
export function restsOf(input: { restDays: number; sitDays: readonly string[]; before: string | null }): RestRecord {
  const days = [...new Set(input.before === null ? input.sitDays : [input.before, ...input.sitDays])].sort();
  const gaps = days.slice(1).map((day, index) => {
    const after = days[index] ?? day;
    return { day, after, rested: daysBetween(after, day) - 1 };
  });
  const broken = gaps.filter(({ rested }) => rested < input.restDays);
  return {
    times: gaps.length,
    kept: gaps.length - broken.length,
    least: gaps.length === 0 ? null : Math.min(...gaps.map(({ rested }) => rested)),
    broken,
  };
}
