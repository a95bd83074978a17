import { openSeasons } from '@/core/booking/seasons';
import type { Weapon } from '@/core/ground-types';
import type { MadeClub, MadeMember } from './build-club';
import type { MadeGround, StandRow } from './build-ground';
import { type DemoDay, daysFrom, momentOf } from './demo-day';
import type { SitPlanner, Windows } from './sit-planner';

const FIRST_DAY = -70;
const OPENING_DAY = -10;
/** Quieter of late, so that stands have rested and can be booked. */
const LATELY = -4;
const TRIES = 6;
/** Who shoots the crossbow; the others draw a bow. */
const CROSSBOW = ['nora', 'dell', 'lenore'];
const GUEST_FROM = -20;
const NOTES = [
  '',
  '',
  '',
  '',
  'Text me when you are out.',
  'Walking in early.',
  'Out by ten.',
  'Truck stays at the gate.',
];

function weaponOn(day: DemoDay, club: MadeClub, on: string, member: MadeMember): Weapon {
  const open = new Set(openSeasons(club.row.rules.seasons, on, null).flatMap((season) => season.weapons));
  if (open.has('rifle') && day.dice.chance(0.75)) return 'rifle';
  if (open.has('muzzleloader') && day.dice.chance(0.7)) return 'muzzleloader';
  return CROSSBOW.includes(member.key) ? 'crossbow' : 'bow';
}

function windowsFor(day: DemoDay): Windows {
  const share = day.dice.share();
  if (share < 0.07) return 'all_day';
  return share < 0.52 ? 'morning' : 'evening';
}

/** Stands in the order a sensible member would want them: prime ones come up three times as often. */
function wanted(day: DemoDay, stands: readonly StandRow[], windows: Windows): StandRow[] {
  const suits = (stand: StandRow) =>
    windows === 'all_day' ? [stand.morning, stand.evening] : [windows === 'morning' ? stand.morning : stand.evening];
  const fit = stands.filter((stand) => !suits(stand).includes('avoid'));
  const weighted = fit.flatMap((stand) => (suits(stand).includes('prime') ? [stand, stand, stand] : [stand]));
  return [...new Set(day.dice.shuffle(weighted))];
}

/** About one sit on a working day and three on a day of the weekend, more when firearms open. */
function sitsOn(day: DemoDay, n: number): number {
  const weekday = new Date(`${daysFrom(day, n)}T00:00:00Z`).getUTCDay();
  const weekend = weekday === 0 || weekday === 6;
  const usual = weekend ? 3.2 : 0.9;
  return day.dice.count(n < LATELY ? usual : usual / 3) + (n === OPENING_DAY ? 4 : 0);
}

/** A season of sits up to yesterday, each booked the evening before. */
export function planPastSeason(day: DemoDay, club: MadeClub, ground: MadeGround, planner: SitPlanner): void {
  const hunters = club.members.filter(({ role }) => role !== 'guest' && role !== 'landowner');
  const guest = club.members.find(({ role }) => role === 'guest');
  let minute = 0;
  for (let n = FIRST_DAY; n < 0; n++) {
    const on = daysFrom(day, n);
    for (let sit = sitsOn(day, n); sit > 0; sit--) {
      const member = day.dice.pick(hunters);
      const windows = windowsFor(day);
      const weapon = weaponOn(day, club, on, member);
      const bookedAt = momentOf(day, n - 1, '17:00') + 60_000 * (minute++ % 240);
      const note = day.dice.pick(NOTES);
      for (const stand of wanted(day, ground.stands, windows).slice(0, TRIES)) {
        const room = n > GUEST_FROM && guest?.sponsor === member.key && stand.seats > 1;
        const guests = room && guest ? [{ name: guest.name, memberId: guest.id }] : [];
        if (planner.book({ day: on, stand, member, windows, weapon, bookedAt, note, guests })) break;
      }
    }
  }
}
