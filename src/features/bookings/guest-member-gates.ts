import { guestActive } from '@/core/access-window';
import { formatDay } from '@/core/day-time';
import type { Role } from '@/core/permissions';
import type { Gate } from '@/core/verdict-types';
import { SIT_ERRORS } from './words/errors';

export interface DatedGuest {
  name: string;
  role: Role;
  guestFrom: string | null;
  guestTo: string | null;
  /** null: nobody answers for this guest any more. */
  sponsorId: string | null;
}

function guestDates(name: string, day: string, fromDay: string | null, toDay: string | null): string {
  if (fromDay === null || toDay === null) return SIT_ERRORS.guestWithoutDates(name, formatDay(day));
  return SIT_ERRORS.guestOutOfDates(name, formatDay(day), formatDay(fromDay, true), formatDay(toDay, true));
}

/** A guest sits only within the dates of the invitation and while the member who answers for them is in the club. */
export function guestMemberGates(guest: DatedGuest, day: string): Gate[] {
  if (guest.role !== 'guest') return [];
  const gates: Gate[] = [];
  const { guestFrom, guestTo } = guest;
  if (!guestActive({ role: 'guest', fromDay: guestFrom, toDay: guestTo }, day)) {
    const endsOn = guestFrom !== null && day < guestFrom ? guestFrom : null;
    gates.push({ code: 'not_permitted', text: guestDates(guest.name, day, guestFrom, guestTo), endsOn });
  }
  if (guest.sponsorId === null) {
    const text = SIT_ERRORS.guestWithoutSponsor(guest.name);
    gates.push({ code: 'not_permitted', text, endsOn: null });
  }
  return gates;
}
