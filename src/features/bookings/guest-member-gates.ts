import { guestActive } from '@/core/access-window';
import { formatDay } from '@/core/day-time';
import type { Role } from '@/core/permissions';
import type { Gate } from '@/core/types';

export interface DatedGuest {
  name: string;
  role: Role;
  guestFrom: string | null;
  guestTo: string | null;
  /** null: nobody answers for this guest any more. */
  sponsorId: string | null;
}

/** A guest sits only within the dates of the invitation and while the member who answers for them is in the club. */
export function guestMemberGates(guest: DatedGuest, day: string): Gate[] {
  if (guest.role !== 'guest') return [];
  const gates: Gate[] = [];
  const { guestFrom, guestTo } = guest;
  if (!guestActive({ role: 'guest', fromDay: guestFrom, toDay: guestTo }, day)) {
    const dates =
      guestFrom === null || guestTo === null
        ? 'no dates are set for this guest'
        : `the invitation is from ${formatDay(guestFrom, true)} to ${formatDay(guestTo, true)}`;
    const endsOn = guestFrom !== null && day < guestFrom ? guestFrom : null;
    gates.push({ code: 'not_permitted', text: `${guest.name} may not sit on ${formatDay(day)}: ${dates}.`, endsOn });
  }
  if (guest.sponsorId === null) {
    const text = `${guest.name} is a guest, and no member of the club answers for them now.`;
    gates.push({ code: 'not_permitted', text, endsOn: null });
  }
  return gates;
}
