import type { WindowName } from '@/core/condition-types';
import type { Weapon } from '@/core/ground-types';
import type { Gate } from '@/core/verdict-types';
import { type ReadFrom, reader } from '@/db/client';
import type { ClubScope } from '@/server/scope';
import { gatesFor, loadBookingContext } from './booking-context';

export interface Holder {
  sitId: string;
  memberId: string;
  memberName: string;
}

export interface Gates {
  /** Every stand in use; an empty list: it may be booked. */
  gatesByStand: Map<string, Gate[]>;
  /** Who holds a stand in the window. */
  takenBy: Map<string, Holder>;
}

/** The rules of booking for all stands at once, in a handful of queries. A null member leaves rules about the person out. */
export async function loadGates(
  scope: ClubScope,
  ask: { day: string; window: WindowName; memberId: string | null; weapon: Weapon | null; now: number },
  from: ReadFrom = reader(),
): Promise<Gates> {
  const { day, window, memberId, weapon, now } = ask;
  const context = await loadBookingContext(scope, { day, windows: [window], memberId, now }, from);
  const standIds = [...context.stands.keys()];
  const taken = context.otherSits.filter((sit) => sit.day === day && sit.windows.includes(window));
  return {
    gatesByStand: new Map(standIds.map((id) => [id, gatesFor(context, id, { weapon, guests: [] })])),
    takenBy: new Map(
      taken.map(({ standId, sitId, memberId: holderId, memberName }) => [
        standId,
        { sitId, memberId: holderId, memberName },
      ]),
    ),
  };
}
