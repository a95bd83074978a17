import { formatDay } from '../day-time';
import type { Gate, WindowName } from '../types';
import type { BookingMember, BookingStand, OtherSit } from './booking-types';

function shared(a: readonly WindowName[], b: readonly WindowName[]): WindowName[] {
  return a.filter((w) => b.includes(w));
}

interface Claim {
  day: string;
  windows: readonly WindowName[];
  sits: readonly OtherSit[];
}

function when(day: string, windows: readonly WindowName[]): string {
  return `on ${formatDay(day)}, ${windows.join(' and ')}`;
}

/** The stand is already claimed in one of the windows. */
export function takenGates(stand: Pick<BookingStand, 'id' | 'name'>, claim: Claim): Gate[] {
  return claim.sits
    .filter((sit) => sit.standId === stand.id && sit.day === claim.day)
    .flatMap((sit): Gate[] => {
      const windows = shared(sit.windows, claim.windows);
      if (windows.length === 0) return [];
      const text = `${stand.name} is taken ${when(claim.day, windows)}: ${sit.memberName} has it.`;
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
      const text = `${member.name} already has ${sit.standName} ${when(claim.day, windows)}. One stand a member in each window.`;
      return [{ code: 'member_busy', text, endsOn: null }];
    });
}
