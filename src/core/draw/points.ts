/** How a draw counts points. Weighted lottery with one entry more than points, as posted for managed hunts (practice). */
export interface PointRules {
  /** Added by a draw that gave nothing. */
  pointsPerMiss: number;
  /** Whether being given a stand takes all points back to none. */
  resetOnGiven: boolean;
  /** Hours of work for the club that earn one point; null: work earns none. */
  workHoursPerPoint: number | null;
}

/** One point for a draw missed, none after a success; a work day of 4 hours earns one (practice). */
export const DEFAULT_POINT_RULES: PointRules = { pointsPerMiss: 1, resetOnGiven: true, workHoursPerPoint: 4 };

/** A draw the member entered that was published, by its day; or hours of work credited. Days are YYYY-MM-DD. */
export type PointEvent = { day: string; kind: 'given' | 'missed' } | { day: string; kind: 'worked'; hours: number };

/** Points a member brings to a draw, from what came before it, in any order. Work of the day of a success counts after it. */
export function countPoints(events: readonly PointEvent[], rules: PointRules): number {
  const last = events
    .filter((event) => event.kind === 'given')
    .map((event) => event.day)
    .sort()
    .at(-1);
  const counted =
    rules.resetOnGiven && last !== undefined
      ? events.filter((event) => (event.kind === 'missed' ? event.day > last : event.day >= last))
      : events;
  const misses = counted.filter((event) => event.kind === 'missed').length;
  const hours = counted.reduce((sum, event) => sum + (event.kind === 'worked' ? event.hours : 0), 0);
  const worked = rules.workHoursPerPoint === null ? 0 : Math.floor(hours / rules.workHoursPerPoint + 1e-9);
  return misses * rules.pointsPerMiss + worked;
}
