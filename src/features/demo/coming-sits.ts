import type { Weapon } from '@/core/ground-types';
import type { MadeClub } from './build-club';
import type { MadeGround } from './build-ground';
import { type DemoDay, daysFrom, momentOf } from './demo-day';
import type { SitPlanner, Windows } from './sit-planner';

interface Coming {
  /** Days from today. */
  on: number;
  /** The first of these that the rules allow, else any stand. */
  stands: string[];
  member: string;
  windows: Windows;
  weapon: Weapon;
  withGuest?: boolean;
  note?: string;
  cancelReason?: string;
}

const COMING: readonly Coming[] = [
  { on: 0, stands: ['gap', 'orchard', 'cedar'], member: 'rufus', windows: 'morning', weapon: 'bow' },
  { on: 0, stands: ['hourglass', 'corn', 'hay'], member: 'lenore', windows: 'evening', weapon: 'rifle' },
  {
    on: 1,
    stands: ['saddle', 'kiln', 'draw'],
    member: 'hollis',
    windows: 'morning',
    weapon: 'bow',
    note: 'Out by noon.',
  },
  { on: 1, stands: ['orchard', 'hay', 'corn'], member: 'odalys', windows: 'evening', weapon: 'rifle', withGuest: true },
  {
    on: 1,
    stands: ['draw', 'alder', 'kiln'],
    member: 'dell',
    windows: 'evening',
    weapon: 'crossbow',
    cancelReason: 'Called in to work',
  },
  { on: 2, stands: ['pool', 'cedar', 'lower-ford'], member: 'dell', windows: 'morning', weapon: 'crossbow' },
  { on: 5, stands: ['draw', 'saddle', 'kiln'], member: 'abel', windows: 'all_day', weapon: 'rifle' },
  { on: 6, stands: ['orchard', 'gap', 'corn'], member: 'nora', windows: 'evening', weapon: 'crossbow' },
];

const PAST_CANCELLED: Coming = {
  on: -12,
  stands: ['cedar', 'pool', 'alder', 'kiln'],
  member: 'silas',
  windows: 'evening',
  weapon: 'bow',
  cancelReason: 'The wind went round to the south',
};

/** Those that fit before the rest, each in their old order. */
function wantedFirst<T>(all: readonly T[], fits: (one: T) => boolean): T[] {
  return [...all.filter(fits), ...all.filter((one) => !fits(one))];
}

/** The sit as wished, or at another stand or by another member where a rule forbids it. */
function book(day: DemoDay, club: MadeClub, ground: MadeGround, planner: SitPlanner, sit: Coming, at: number): void {
  const hunters = club.members.filter(({ role }) => role !== 'guest' && role !== 'landowner');
  const guest = club.members.find(({ role }) => role === 'guest');
  const wished = sit.stands.map((key) => ground.standIds.get(key));
  const stands = wantedFirst(ground.stands, ({ id }) => wished.includes(id));
  const members = wantedFirst(hunters, ({ key }) => key === sit.member);
  const { windows, weapon, note = '', cancelReason } = sit;
  const wishes = members.flatMap((member) =>
    stands.map((stand) => ({
      day: daysFrom(day, sit.on),
      stand,
      member,
      windows,
      weapon,
      note,
      bookedAt: at,
      guests:
        sit.withGuest && guest?.sponsor === member.key && stand.seats > 1
          ? [{ name: guest.name, memberId: guest.id }]
          : [],
      ...(cancelReason ? { cancelled: { at: at + 45 * 60_000, reason: cancelReason } } : {}),
    })),
  );
  wishes.some((wish) => planner.book(wish));
}

/** A few sits from today on, all booked yesterday, and two that were given up. */
export function planComingSits(day: DemoDay, club: MadeClub, ground: MadeGround, planner: SitPlanner): void {
  book(day, club, ground, planner, PAST_CANCELLED, momentOf(day, PAST_CANCELLED.on - 1, '16:30'));
  const first = momentOf(day, -1, '21:05');
  COMING.forEach((sit, i) => {
    book(day, club, ground, planner, sit, first + i * 7 * 60_000);
  });
}
