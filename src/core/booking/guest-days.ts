import type { WindowName } from '../condition-types';
import { addDays } from '../day-time';
import type { Gate } from '../verdict-types';
import { GATE_WORDS } from '../words/gates';
import type { BookingMember, GuestHunt } from './booking-types';
import type { ClubRules } from './rules';

type Hunt = Pick<GuestHunt, 'day' | 'windows' | 'guests'>;

/**
 * Guest days used: one for each guest and day. A stay that begins after noon is not charged for the day of arrival, so
 * Friday noon to Sunday is 2 (practice): an evening-only day costs nothing for guests who hunt on the next day too.
 */
export function countGuestDays(hunts: readonly Hunt[]): number {
  const days = new Map<string, { guests: number; evening: boolean }>();
  for (const hunt of hunts) {
    if (hunt.guests <= 0 || hunt.windows.length === 0) continue;
    const seen = days.get(hunt.day) ?? { guests: 0, evening: true };
    const eveningOnly = hunt.windows.every((w: WindowName) => w === 'evening');
    days.set(hunt.day, { guests: Math.max(seen.guests, hunt.guests), evening: seen.evening && eveningOnly });
  }
  let count = 0;
  for (const [day, { guests, evening }] of days) {
    const arrival = evening && !days.has(addDays(day, -1));
    const staying = arrival ? (days.get(addDays(day, 1))?.guests ?? 0) : 0;
    count += Math.max(0, guests - staying);
  }
  return count;
}

/** Guest days left to a member this season; null: no limit. */
export function guestDaysLeft(rules: Pick<ClubRules, 'guestDaysPerSeason'>, hunts: readonly Hunt[]): number | null {
  return rules.guestDaysPerSeason === null ? null : Math.max(0, rules.guestDaysPerSeason - countGuestDays(hunts));
}

/** Guests at once, and guest days a season. */
export function guestGates(input: {
  rules: Pick<ClubRules, 'guestDaysPerSeason' | 'guestsAtOnce'>;
  member: Pick<BookingMember, 'name'>;
  hunt: Hunt;
  others: readonly Hunt[];
}): Gate[] {
  const { rules, member, hunt, others } = input;
  if (hunt.guests <= 0) return [];
  if (hunt.guests > rules.guestsAtOnce) {
    const text = GATE_WORDS.guestsAtOnce(rules.guestsAtOnce, hunt.guests);
    return [{ code: 'guest_days', text, endsOn: null }];
  }
  const most = rules.guestDaysPerSeason;
  if (most === null) return [];
  const used = countGuestDays(others);
  const added = countGuestDays([...others, hunt]) - used;
  if (added <= 0 || used + added <= most) return [];
  const text = GATE_WORDS.guestDays(member.name, used, most, added);
  return [{ code: 'guest_days', text, endsOn: null }];
}
