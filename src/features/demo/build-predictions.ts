import { normalizeDeg } from '@/core/angles';
import { arcsFor, arcWidthDeg } from '@/core/arcs';
import type { Suitability } from '@/core/ground-types';
import { DEFAULT_SCORE, sitScore } from '@/core/score';
import type { MadeGround, StandRow } from './build-ground';
import type { DemoDay } from './demo-day';
import type { DemoRows } from './demo-rows';
import { type SitRow, windowsOf } from './sit-planner';

/** Quiet said of sits that went clean and of those that did not: apart, but not by much, as a young club's are. */
const CLEAN = [48, 96] as const;
const BUMPED = [34, 84] as const;
const PROMISE: Record<Suitability, readonly [number, number]> = { prime: [45, 75], usable: [28, 58], avoid: [10, 30] };
/** How often a member sits on a wind in the stand's good arcs: less often where deer were bumped. */
const ON_A_GOOD_WIND = { clean: 0.9, bumped: 0.6 };

function windOf(day: DemoDay, stand: StandRow, sit: SitRow, clean: boolean): number {
  const any = day.dice.whole(0, 359);
  const arcs = windowsOf(sit.windows).flatMap((window) => arcsFor(stand.arcs, window));
  const arc =
    arcs.length > 0 && day.dice.chance(clean ? ON_A_GOOD_WIND.clean : ON_A_GOOD_WIND.bumped)
      ? day.dice.pick(arcs)
      : null;
  return arc ? normalizeDeg(arc.fromDeg + day.dice.share() * arcWidthDeg(arc)) : any;
}

/** What was thought of the sits that have a log. */
export function buildPredictions(
  day: DemoDay,
  ground: MadeGround,
  sitLogs: DemoRows['sitLogs'],
  sits: readonly SitRow[],
): DemoRows['sitPredictions'] {
  const bySit = new Map(sits.map((sit) => [sit.id, sit]));
  return sitLogs.flatMap((log) => {
    const sit = bySit.get(log.sitId);
    const stand = ground.stands.find(({ id }) => id === sit?.standId);
    if (!sit || !stand) return [];
    const clean = log.bumpedIn + log.bumpedSitting + log.bumpedOut === 0;
    const [least, most] = clean ? CLEAN : BUMPED;
    const quiet = day.dice.whole(least, most);
    const promise = day.dice.whole(...PROMISE[sit.windows === 'evening' ? stand.evening : stand.morning]);
    const score = sitScore(quiet / 100, promise / 100, DEFAULT_SCORE);
    const windFromDeg = windOf(day, stand, sit, clean);
    return [{ sitId: sit.id, clubId: sit.clubId, standId: sit.standId, quiet, score, windFromDeg, at: sit.startAt }];
  });
}
