import type { WindowName } from '../condition-types';
import { formatDay } from '../day-time';
import type { Gate } from '../verdict-types';
import { GATE_WORDS } from '../words/gates';
import type { BookingMember, BookingStand, OtherSit } from './booking-types';

function shared(a: readonly WindowName[], b: readonly WindowName[]): WindowName[] {
  return a.filter((w) => b.includes(w));
}

interface Claim {
  day: string;
  windows: readonly WindowName[];
  sits: readonly OtherSit[];
}

/** The stand is already claimed in one of the windows. */
export function takenGates(stand: Pick<BookingStand, 'id' | 'name'>, claim: Claim): Gate[] {
  return claim.sits
    .filter((sit) => sit.standId === stand.id && sit.day === claim.day)
    .flatMap((sit): Gate[] => {
      const windows = shared(sit.windows, claim.windows);
      if (windows.length === 0) return [];
      const text = GATE_WORDS.taken(stand.name, formatDay(claim.day), windows, sit.memberName);
      return [{ code: 'taken', text, endsOn: null }];
    });
}

/** The member already sits somewhere in one of the windows. */
export function memberBusyGates(
  member: Pick<BookingMember, 'id' | 'name'>,
  stand: Pick<BookingStand, 'id'>,
  claim: Claim,
): Gate[] {
  return claim.sits
    .filter((sit) => sit.memberId === member.id && sit.day === claim.day && sit.standId !== stand.id)
    .flatMap((sit): Gate[] => {
      const windows = shared(sit.windows, claim.windows);
      if (windows.length === 0) return [];
      const text = GATE_WORDS.memberBusy(member.name, sit.standName, formatDay(claim.day), windows);
      return [{ code: 'member_busy', text, endsOn: null }];
    });
}
