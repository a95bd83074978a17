import { can } from '../permissions';
import type { Gate } from '../types';
import type { BookingMember, BookingStand } from './booking-types';

/** Whether the member may hunt at all, and this stand. A guest's dates are checked by access-window.ts. */
export function whoMayHuntGates(
  stand: Pick<BookingStand, 'name' | 'allowedMemberIds'>,
  member: Pick<BookingMember, 'id' | 'name' | 'role'>,
): Gate[] {
  if (!can(member.role, 'sits.book')) {
    return [{ code: 'not_permitted', text: `A ${member.role} does not hold sits in this club.`, endsOn: null }];
  }
  if (stand.allowedMemberIds === null || stand.allowedMemberIds.includes(member.id)) return [];
  const text = `${stand.name} is kept for named members, and ${member.name} is not one of them.`;
  return [{ code: 'not_permitted', text, endsOn: null }];
}
