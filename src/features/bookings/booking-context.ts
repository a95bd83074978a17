import type { BookingStand, OtherSit } from '@/core/booking/booking-types';
import { checkBooking } from '@/core/booking/check-booking';
import { guestGates } from '@/core/booking/guest-days';
import { huntingYear } from '@/core/booking/hunting-year';
import type { ClosedDays, ClubRules } from '@/core/booking/rules';
import type { SitWindow, WindowName } from '@/core/condition-types';
import { addDays } from '@/core/day-time';
import { toLocal } from '@/core/geometry';
import { WEAPONS, type Weapon } from '@/core/ground-types';
import type { Gate } from '@/core/verdict-types';
import { sitWindow } from '@/core/windows';
import type { ReadFrom } from '@/db/client';
import type { ClubScope, ScopeClub } from '@/server/scope';
import { guestMemberGates } from './guest-member-gates';
import { type GuestParty, guestHunts, guestKey, guestsTogether } from './guest-parties';
import {
  countSits,
  listApproachesForRules,
  listClosuresForRules,
  listGuestSits,
  listMembersForRules,
  listOtherSits,
  listStandsForRules,
  type MemberForRules,
} from './rules-data';
import { SIT_ERRORS } from './words/errors';
import { windowsHeld } from './words/sits';

export interface ContextInput {
  day: string;
  windows: WindowName[];
  /** null: nobody in particular; rules about the person are left out. */
  memberId: string | null;
  now: number;
  /** null: every stand. */
  standIds?: string[] | null;
  exceptSitId?: string | null;
}

/** All that the rules of booking look at for one day, one person and any number of stands. */
export interface BookingContext {
  club: ScopeClub;
  input: ContextInput;
  rules: ClubRules;
  closedDays: ClosedDays[];
  spans: SitWindow[];
  stands: Map<string, BookingStand>;
  seats: Map<string, number>;
  waysIn: { id: string; standId: string; name: string }[];
  member: MemberForRules | null;
  otherSits: OtherSit[];
  standCounts: Map<string, number>;
  memberCount: number;
  guestParties: GuestParty[];
}

type Closure = Awaited<ReturnType<typeof listClosuresForRules>>[number];

const ofStand = (closure: Closure, standId: string) =>
  closure.standId === standId || (closure.standId === null && closure.toDay === null);

/** The whole ground closed between two days; without an end it is kept as a closure of each stand, which may have none. */
function closedDays(closures: Closure[]): ClosedDays[] {
  return closures.flatMap(({ standId, fromDay, toDay, reason }) =>
    standId === null && toDay !== null ? [{ fromDay, toDay, reason }] : [],
  );
}

async function loadMember(scope: ClubScope, memberId: string | null, from: ReadFrom): Promise<MemberForRules | null> {
  if (memberId === null) return null;
  return (await listMembersForRules(scope, [memberId], from))[0] ?? null;
}

async function loadGuestParties(scope: ClubScope, host: string, input: ContextInput, from: ReadFrom) {
  const year = huntingYear(input.day);
  const rows = await listGuestSits(scope, year, host, input.exceptSitId ?? null, from);
  return rows.map((row): GuestParty => {
    const self = row.memberId === host ? [] : [row.memberId];
    return { day: row.day, windows: windowsHeld(row.windows), people: [...self, ...row.guests.map(guestKey)] };
  });
}

/** The member who answers for guests: a guest's sponsor, else the member. */
export function hostOf(member: MemberForRules): { id: string; name: string } | null {
  if (member.role !== 'guest') return { id: member.id, name: member.name };
  return member.sponsorId === null ? null : { id: member.sponsorId, name: member.sponsorName ?? SIT_ERRORS.sponsor };
}

export async function loadBookingContext(
  scope: ClubScope,
  input: ContextInput,
  from: ReadFrom,
): Promise<BookingContext> {
  const { club } = scope;
  const standIds = input.standIds ?? null;
  const exceptSitId = input.exceptSitId ?? null;
  const standRows = await listStandsForRules(scope, standIds, from);
  const closures = await listClosuresForRules(scope, input.day, from);
  const ways = await listApproachesForRules(scope, standIds, from);
  const member = await loadMember(scope, input.memberId, from);
  const host = member ? hostOf(member) : null;
  const rest = Math.max(club.rules.restDaysDefault, ...standRows.map((s) => s.restDays ?? 0));
  const restDays = { fromDay: addDays(input.day, -rest), toDay: addDays(input.day, rest) };
  const others = await listOtherSits(scope, restDays, input.memberId, input.now, from);
  const counts = await countSits(scope, huntingYear(input.day), exceptSitId, from);
  const local = (lon: number, lat: number) => toLocal(club, { lat, lon });
  const standCounts = new Map<string, number>();
  for (const row of counts) standCounts.set(row.standId, (standCounts.get(row.standId) ?? 0) + row.sits);
  return {
    club,
    input,
    rules: club.rules,
    closedDays: closedDays(closures),
    spans: input.windows.map((window) => sitWindow(input.day, window, club.rules, club)),
    stands: new Map(
      standRows.map((row) => [
        row.id,
        {
          id: row.id,
          name: row.name,
          at: local(row.lon, row.lat),
          restDays: row.restDays,
          mostSitsSeason: row.mostSitsSeason,
          weapons: WEAPONS.filter((weapon) => row.shotRangeM[weapon] !== undefined),
          closures: closures.filter((closure) => ofStand(closure, row.id)),
          allowedMemberIds: input.memberId === null ? null : row.allowedMemberIds,
          approaches: ways
            .filter((way) => way.standId === row.id)
            .map((way) => way.points.map(([lon = 0, lat = 0]) => local(lon, lat))),
        },
      ]),
    ),
    seats: new Map(standRows.map((row) => [row.id, row.seats])),
    waysIn: ways.filter((way) => way.direction !== 'out'),
    member,
    otherSits: others.map(({ lat, lon, windows, ...sit }) => ({
      ...sit,
      windows: windowsHeld(windows),
      standAt: local(lon, lat),
    })),
    standCounts,
    memberCount: counts.filter((row) => row.memberId === input.memberId).reduce((sum, row) => sum + row.sits, 0),
    guestParties: host ? await loadGuestParties(scope, host.id, input, from) : [],
  };
}

const NOBODY: Pick<MemberForRules, 'id' | 'name' | 'role'> = { id: '', name: SIT_ERRORS.member, role: 'member' };

/** Every rule that forbids the sit at one stand of the context; empty when it may be booked. */
export function gatesFor(
  context: BookingContext,
  standId: string,
  hunt: { weapon: Weapon | null; guests: string[] },
): Gate[] {
  const { club, input, rules, member } = context;
  const stand = context.stands.get(standId);
  if (!stand) return [{ code: 'closed', text: SIT_ERRORS.standGone, endsOn: null }];
  const host = member ? hostOf(member) : null;
  const byGuest = member?.role === 'guest';
  const people = byGuest ? [member.id, ...hunt.guests] : hunt.guests;
  const party = { day: input.day, windows: input.windows, people };
  const guests = guestsTogether(context.guestParties, party);
  const others = guestHunts(context.guestParties);
  return [
    ...(member ? guestMemberGates(member, input.day) : []),
    ...checkBooking({
      stand,
      member: member ?? NOBODY,
      day: input.day,
      windows: input.windows,
      spans: context.spans,
      weapon: hunt.weapon,
      guests: byGuest ? 0 : guests,
      guestHunts: byGuest ? [] : others,
      now: input.now,
      zone: club.zone,
      units: club.units,
      rules,
      closedDays: context.closedDays,
      otherSits: context.otherSits,
      seasonCounts: { stand: context.standCounts.get(standId) ?? 0, member: context.memberCount },
      exceptSitId: input.exceptSitId ?? null,
    }),
    ...(byGuest && host ? guestGates({ rules, member: host, hunt: { ...party, guests }, others }) : []),
  ];
}
