import type { GuestHunt } from '@/core/booking/booking-types';
import { WINDOW_NAMES, type WindowName } from '@/core/condition-types';
import type { SitGuest } from '@/db/schema';

/** Guests on one sit, each by a key that is the same wherever the same person is named. */
export interface GuestParty {
  day: string;
  windows: WindowName[];
  people: string[];
}

export function guestKey(guest: SitGuest): string {
  return guest.memberId ?? `named:${guest.name.trim().toLowerCase()}`;
}

function peopleIn(parties: readonly GuestParty[], day: string, window: WindowName): Set<string> {
  return new Set(parties.filter((p) => p.day === day && p.windows.includes(window)).flatMap((p) => p.people));
}

/** One record a day and window: guests at several stands at once add up, the same guest twice does not. */
export function guestHunts(parties: readonly GuestParty[]): GuestHunt[] {
  const days = [...new Set(parties.map((p) => p.day))].sort();
  return days.flatMap((day) =>
    WINDOW_NAMES.map((window) => ({
      sitId: '',
      day,
      windows: [window],
      guests: peopleIn(parties, day, window).size,
    })).filter((hunt) => hunt.guests > 0),
  );
}

/** Guests at once when a party joins the others of its day; 0 for a party of none. */
export function guestsTogether(others: readonly GuestParty[], party: GuestParty): number {
  if (party.people.length === 0) return 0;
  return Math.max(...party.windows.map((w) => new Set([...peopleIn(others, party.day, w), ...party.people]).size), 0);
}
