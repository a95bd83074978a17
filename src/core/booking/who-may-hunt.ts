import { can } from '../permissions';
import type { Gate } from '../verdict-types';
import { GATE_WORDS } from '../words/gates';
import type { BookingMember, BookingStand } from './booking-types';

/** Whether the member may hunt at all, and this stand. A guest's dates are checked by access-window.ts. */
export function whoMayHuntGates(
  stand: Pick<BookingStand, 'name' | 'allowedMemberIds'>,
  member: Pick<BookingMember, 'id' | 'name' | 'role'>,
): Gate[] {
  if (!can(member.role, 'sits.book')) {
    return [{ code: 'not_permitted', text: GATE_WORDS.roleHoldsNone(member.role), endsOn: null }];
  }
  if (stand.allowedMemberIds === null || stand.allowedMemberIds.includes(member.id)) return [];
  const text = GATE_WORDS.notNamed(stand.name, member.name);
  return [{ code: 'not_permitted', text, endsOn: null }];
}
