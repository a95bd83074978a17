import type { BookingStand, GuestHunt } from '@/core/booking/booking-types';
import { reader } from '@/db/client';
import { type BookingContext, gatesFor, hostOf, loadBookingContext } from '@/features/bookings/booking-context';
import { guestRefusals, seatRefusals } from '@/features/bookings/check-sit';
import { guestHunts, guestKey } from '@/features/bookings/guest-parties';
import { windowsHeld } from '@/features/bookings/words/sits';
import { AppError } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import type { DrawRow, EntryRow } from './draws-data';

/** What the rules of booking say of one member of a draw. */
export interface EntrantRules {
  /** By place: the rule that forbids it. Places of slots that are not wanted are not asked about. */
  ruleTexts: (string | null)[];
  liveClaims: number;
  /** Sits of the season, by slot. */
  seasonSits: number[];
  /** The season's days with guests if they came along to these slots too; null: no guests. */
  huntsWith: ((slots: readonly number[]) => GuestHunt[]) | null;
}

/** Why the guests may not come along in a slot; null: they may. */
export async function guestRefusal(
  scope: ClubScope,
  day: string,
  entry: Pick<EntryRow, 'memberId' | 'guests'>,
): Promise<string | null> {
  try {
    return (await guestRefusals(scope, reader(), { ...entry, day }))[0]?.text ?? null;
  } catch (error) {
    if (error instanceof AppError) return error.message;
    throw error;
  }
}

function standRefusal(context: BookingContext, stand: BookingStand, entry: EntryRow): string | null {
  const guests = entry.guests.map(guestKey);
  const [gate] = gatesFor(context, stand.id, { weapon: entry.weapon, guests });
  if (gate) return gate.text;
  return seatRefusals(context, { standId: stand.id, guests: entry.guests }, stand.name)[0]?.text ?? null;
}

export async function loadEntrantRules(
  scope: ClubScope,
  draw: DrawRow,
  entry: EntryRow,
  stands: readonly BookingStand[],
  now: number,
): Promise<EntrantRules> {
  const contexts: BookingContext[] = [];
  const ruleTexts: (string | null)[] = [];
  for (const [slot, { day, windows }] of draw.slots.entries()) {
    const ask = { day, windows: windowsHeld(windows), standIds: draw.standIds, memberId: entry.memberId, now };
    const context = await loadBookingContext(scope, ask, reader());
    contexts.push(context);
    const wanted = entry.slots.includes(slot);
    const byGuests = wanted && entry.guests.length > 0 ? await guestRefusal(scope, day, entry) : null;
    ruleTexts.push(...stands.map((stand) => (wanted ? (byGuests ?? standRefusal(context, stand, entry)) : null)));
  }
  const [first] = contexts;
  const live = first?.otherSits.filter((sit) => sit.memberId === entry.memberId && sit.endAt > now) ?? [];
  const host = first?.member ? hostOf(first.member) : null;
  const parties = (slots: readonly number[]) =>
    slots.flatMap((slot) => {
      const at = draw.slots[slot];
      return at ? [{ day: at.day, windows: windowsHeld(at.windows), people: entry.guests.map(guestKey) }] : [];
    });
  return {
    ruleTexts,
    liveClaims: live.length,
    seasonSits: contexts.map((context) => context.memberCount),
    huntsWith:
      host && entry.guests.length > 0
        ? (slots) => guestHunts([...(contexts[slots[0] ?? 0]?.guestParties ?? []), ...parties(slots)])
        : null,
  };
}
