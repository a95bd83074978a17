import type { DemoDay } from './demo-day';
import type { DemoRows } from './demo-rows';
import type { SitRow } from './sit-planner';

/** Quiet said of sits that went clean and of those that did not: apart, but not by much, as a young club's are. */
const CLEAN = [48, 96] as const;
const BUMPED = [34, 84] as const;

/** What was thought of the sits that have a log. */
export function buildPredictions(
  day: DemoDay,
  sitLogs: DemoRows['sitLogs'],
  sits: readonly SitRow[],
): DemoRows['sitPredictions'] {
  const bySit = new Map(sits.map((sit) => [sit.id, sit]));
  return sitLogs.flatMap((log) => {
    const sit = bySit.get(log.sitId);
    if (!sit) return [];
    const [least, most] = log.bumpedIn + log.bumpedSitting + log.bumpedOut === 0 ? CLEAN : BUMPED;
    const quiet = day.dice.whole(least, most);
    return [{ sitId: sit.id, clubId: sit.clubId, standId: sit.standId, quiet, at: sit.startAt }];
  });
}
