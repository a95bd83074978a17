import type { Suitability } from '@/core/ground-types';
import type { MadeGround } from './build-ground';
import type { DemoDay } from './demo-day';
import type { DemoRows } from './demo-rows';
import type { SitRow } from './sit-planner';

const MINUTE_MS = 60_000;
const HOUR_MS = 60 * MINUTE_MS;

/** Deer an hour: 2.7 an outing of 3.7 hours (Meier et al. 2025, Wildl. Res.). */
const DEER_PER_HOUR = 0.73;
const BY_SUITABILITY: Record<Suitability, number> = { prime: 1.25, usable: 0.85, avoid: 0.5 };
/** Some days nothing moves and on some everything does: the mean is 1. */
const MOOD = [0, 0.2, 0.4, 0.8, 1, 1.2, 1.6, 2.8];
/** Upper ends of the shares of does, fawns and antlered bucks; the rest were not made out. */
const DOES = 0.5;
const FAWNS = 0.76;
const BUCKS = 0.91;

const NOTES = [
  '',
  '',
  '',
  'Wind held.',
  'Wind swirled after eight.',
  'Two does fed to the last light.',
  'Squirrels, nothing else.',
  'A young eight came by at forty yards.',
  'Heard the neighbour shoot.',
  'Acorns still falling.',
  'Blew twice from behind me.',
];

function bumps(day: DemoDay, chance: number): number {
  return day.dice.chance(chance) ? day.dice.whole(1, 3) : 0;
}

/** What was seen in the sits that have ended; one in eight was never written down. */
export function buildLogs(day: DemoDay, ground: MadeGround, sits: readonly SitRow[]): DemoRows['sitLogs'] {
  return sits.flatMap((sit) => {
    if (sit.status !== 'booked' || sit.day >= day.today || day.dice.chance(0.12)) return [];
    const stand = ground.stands.find(({ id }) => id === sit.standId);
    const suitability = (sit.windows === 'evening' ? stand?.evening : stand?.morning) ?? 'usable';
    const startAt = sit.startAt + day.dice.whole(0, 25) * MINUTE_MS;
    const endAt = sit.endAt - day.dice.whole(0, 30) * MINUTE_MS;
    const mean = (DEER_PER_HOUR * BY_SUITABILITY[suitability] * day.dice.pick(MOOD) * (endAt - startAt)) / HOUR_MS;
    const seen = { antleredBucks: 0, does: 0, fawns: 0, unknown: 0 };
    for (let deer = day.dice.count(mean); deer > 0; deer--) {
      const share = day.dice.share();
      if (share < DOES) seen.does++;
      else if (share < FAWNS) seen.fawns++;
      else if (share < BUCKS) seen.antleredBucks++;
      else seen.unknown++;
    }
    const log = {
      sitId: sit.id,
      clubId: sit.clubId,
      startAt,
      endAt,
      ...seen,
      bumpedIn: bumps(day, 0.12),
      bumpedSitting: bumps(day, 0.06),
      bumpedOut: bumps(day, 0.11),
      notes: day.dice.pick(NOTES),
      createdAt: sit.endAt + day.dice.whole(30, 180) * MINUTE_MS,
    };
    return [log];
  });
}
