import type { BookingStand, GuestHunt, OtherSit } from '@/core/booking/booking-types';
import { checkBooking } from '@/core/booking/check-booking';
import { huntingYear } from '@/core/booking/hunting-year';
import { WINDOW_NAMES, type WindowName } from '@/core/condition-types';
import { toLocal } from '@/core/geometry';
import { WEAPONS, type Weapon } from '@/core/ground-types';
import { sitWindow } from '@/core/windows';
import type { MadeClub, MadeMember } from './build-club';
import type { MadeGround, StandRow } from './build-ground';
import type { DemoDay } from './demo-day';
import type { DemoRows } from './demo-rows';

export type SitRow = DemoRows['sits'][number];
export type Windows = SitRow['windows'];

export interface SitWish {
  day: string;
  stand: StandRow;
  member: MadeMember;
  windows: Windows;
  weapon: Weapon;
  bookedAt: number;
  guests?: SitRow['guests'];
  note?: string;
  /** Booked and given up again. */
  cancelled?: { at: number; reason: string };
}

export interface SitPlanner {
  /** Books it when every rule of the club allows it; false when one does not. */
  book(wish: SitWish): boolean;
  sits: SitRow[];
}

export const windowsOf = (windows: Windows): WindowName[] => (windows === 'all_day' ? [...WINDOW_NAMES] : [windows]);

function bookingStand(club: MadeClub, ground: MadeGround, closures: DemoRows['closures'], row: StandRow): BookingStand {
  return {
    id: row.id,
    name: row.name,
    at: toLocal(club.row, row),
    restDays: row.restDays ?? null,
    mostSitsSeason: row.mostSitsSeason ?? null,
    weapons: WEAPONS.filter((weapon) => row.shotRangeM[weapon] !== undefined),
    closures: closures.flatMap(({ standId, fromDay, toDay = null, reason }) =>
      standId === row.id ? [{ fromDay, toDay, reason }] : [],
    ),
    allowedMemberIds: row.allowedMemberIds ?? null,
    approaches: ground.approaches
      .filter(({ standId }) => standId === row.id)
      .map(({ points }) => points.map(([lon = 0, lat = 0]) => toLocal(club.row, { lat, lon }))),
  };
}

/** Keeps the sits of the demo to the club's own rules, by the same check a member's booking goes through. */
export function makePlanner(
  day: DemoDay,
  club: MadeClub,
  ground: MadeGround,
  closures: DemoRows['closures'],
): SitPlanner {
  const { rules, zone, id: clubId } = club.row;
  const stands = new Map(ground.stands.map((row) => [row.id, bookingStand(club, ground, closures, row)]));
  const closedDays = closures.flatMap(({ standId, fromDay, toDay, reason }) =>
    standId || !toDay ? [] : [{ fromDay, toDay, reason }],
  );
  const sits: SitRow[] = [];
  const others: OtherSit[] = [];
  const guestHunts: (GuestHunt & { memberId: string })[] = [];

  function book(wish: SitWish): boolean {
    const stand = stands.get(wish.stand.id);
    if (!stand) return false;
    const { member, day: on, weapon, guests = [] } = wish;
    const windows = windowsOf(wish.windows);
    const spans = windows.map((window) => sitWindow(on, window, rules, { ...club.row }));
    const year = huntingYear(on);
    const season = others.filter((sit) => sit.day >= year.fromDay && sit.day <= year.toDay);
    const gates = checkBooking({
      stand,
      member,
      day: on,
      windows,
      spans,
      weapon,
      guests: guests.length,
      guestHunts: guestHunts.filter((hunt) => hunt.memberId === member.id),
      now: wish.bookedAt,
      zone,
      units: 'us',
      rules,
      closedDays,
      otherSits: others,
      seasonCounts: {
        stand: season.filter((sit) => sit.standId === stand.id).length,
        member: season.filter((sit) => sit.memberId === member.id).length,
      },
      exceptSitId: null,
    });
    if (gates.length > 0) return false;
    const id = day.dice.id('sit');
    const startAt = Math.min(...spans.map((span) => span.startAt));
    const endAt = Math.max(...spans.map((span) => span.endAt));
    const waysIn = ground.approaches.filter((way) => way.standId === stand.id && way.direction !== 'out');
    sits.push({
      id,
      clubId,
      standId: stand.id,
      memberId: member.id,
      day: on,
      windows: wish.windows,
      startAt,
      endAt,
      weapon,
      approachId: waysIn[0]?.id ?? null,
      guests,
      note: wish.note ?? '',
      status: wish.cancelled ? 'cancelled' : 'booked',
      cancelReason: wish.cancelled?.reason ?? null,
      cancelledAt: wish.cancelled?.at ?? null,
      requestKey: day.dice.requestKey(),
      sequence: wish.cancelled ? 1 : 0,
      bookedBy: member.id,
      createdAt: wish.bookedAt,
      updatedAt: wish.cancelled?.at ?? wish.bookedAt,
    });
    if (wish.cancelled) return true;
    if (guests.length > 0) guestHunts.push({ sitId: id, day: on, windows, guests: guests.length, memberId: member.id });
    const { name: standName, at: standAt } = stand;
    const held = { sitId: id, standId: stand.id, standName, standAt, memberId: member.id, memberName: member.name };
    others.push({ ...held, day: on, windows, weapon, endAt });
    return true;
  }
  return { book, sits };
}

/** What holds each stand and member, one row a window. */
export function claimsOf(day: DemoDay, sits: readonly SitRow[]): DemoRows['claims'] {
  return sits
    .filter((sit) => sit.status === 'booked')
    .flatMap(({ id: sitId, clubId, standId, memberId, day: on, windows }) =>
      windowsOf(windows).map((window) => ({
        id: day.dice.id('claim'),
        clubId,
        sitId,
        standId,
        memberId,
        day: on,
        window,
      })),
    );
}
