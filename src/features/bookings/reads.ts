import { weaponWord } from '@/core/booking/seasons';
import { WEAPONS, type Weapon } from '@/core/ground-types';
import { type ReadFrom, reader } from '@/db/client';
import type { ClubScope } from '@/server/scope';
import { listPastSits, listUpcomingSits } from './data';
import { listApproachesForRules, listSponsoredGuests, listStandsForRules } from './rules-data';
import { type SitView, sitView } from './sit-view';

const MOST_PAST = 60;

/** What a form that changes a sit offers. No positions. */
export interface SitOptions {
  stands: { id: string; name: string; seats: number; weapons: { value: Weapon; label: string }[] }[];
  waysIn: { id: string; standId: string; name: string }[];
  /** Guests with an account whom this member sponsors. */
  guests: { id: string; name: string }[];
  guestsAtOnce: number;
}

export async function readSitOptions(scope: ClubScope, from: ReadFrom = reader()): Promise<SitOptions> {
  const stands = await listStandsForRules(scope, null, from);
  const ways = await listApproachesForRules(scope, null, from);
  const { id } = scope.member;
  return {
    stands: stands
      .filter(({ allowedMemberIds }) => allowedMemberIds === null || allowedMemberIds.includes(id))
      .map((stand) => ({
        id: stand.id,
        name: stand.name,
        seats: stand.seats,
        weapons: WEAPONS.filter((weapon) => stand.shotRangeM[weapon] !== undefined).map((weapon) => ({
          value: weapon,
          label: weaponWord(weapon),
        })),
      })),
    waysIn: ways
      .filter((way) => way.direction !== 'out')
      .map((way) => ({ id: way.id, standId: way.standId, name: way.name })),
    guests: await listSponsoredGuests(scope, id, from),
    guestsAtOnce: scope.club.rules.guestsAtOnce,
  };
}

export interface MySits {
  upcoming: SitView[];
  /** Ended or cancelled, the latest first. */
  past: SitView[];
}

export async function readMySits(scope: ClubScope, now: number): Promise<MySits> {
  const { id } = scope.member;
  const view = (sit: Parameters<typeof sitView>[1]) => sitView(scope, sit);
  return {
    upcoming: (await listUpcomingSits(scope, id, now)).map(view),
    past: (await listPastSits(scope, id, now, MOST_PAST)).map(view),
  };
}
