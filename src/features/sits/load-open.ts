import { type SitWindow, WINDOW_NAMES } from '@/core/condition-types';
import type { Weapon } from '@/core/ground-types';
import type { Gate } from '@/core/verdict-types';
import { type ReadFrom, reader } from '@/db/client';
import { gatesFor, loadBookingContext } from '@/features/bookings/booking-context';
import type { ClubScope } from '@/server/scope';
import { findOwnSit } from './data';
import type { OwnSit } from './view-types';

export interface OpenStands {
  gatesByStand: Map<string, Gate[]>;
  /** The person's own sit in the window. */
  mine: OwnSit | null;
}

/** The person a list is made for; null for the club itself, which holds no sits. */
export function readerOf(scope: ClubScope): string | null {
  return scope.member.userId === null ? null : scope.member.id;
}

/**
 * What the booking rules say of every stand in a window. A person who has a sit in it is shown where it could be moved:
 * their own sit stands in no stand's way.
 */
export async function loadOpenStands(
  scope: ClubScope,
  ask: { window: SitWindow; memberId: string | null; weapon: Weapon | null; now: number },
  from: ReadFrom = reader(),
): Promise<OpenStands> {
  const { window, memberId, weapon, now } = ask;
  const own = memberId
    ? await findOwnSit(scope, { memberId, day: window.day, windows: [window.window, 'all_day'] }, from)
    : null;
  const context = await loadBookingContext(
    scope,
    { day: window.day, windows: [window.window], memberId, now, exceptSitId: own?.sitId ?? null },
    from,
  );
  const gatesByStand = new Map(
    [...context.stands.keys()].map((id) => [id, gatesFor(context, id, { weapon, guests: [] })]),
  );
  if (!own) return { gatesByStand, mine: null };
  // One's own sit is never "not open", whatever has changed since it was booked.
  gatesByStand.set(own.standId, []);
  const { endAt: _, ...mine } = own;
  return { gatesByStand, mine };
}

/** The same for all windows of some days, each day's other window included. */
export async function loadOpenWeek(
  scope: ClubScope,
  ask: { windows: SitWindow[]; memberId: string | null; weapon: Weapon | null; now: number },
  from: ReadFrom = reader(),
): Promise<Map<string, OpenStands>> {
  const byWindow = new Map<string, OpenStands>();
  for (const window of ask.windows) {
    byWindow.set(windowKey(window), await loadOpenStands(scope, { ...ask, window }, from));
  }
  return byWindow;
}

export function windowKey({ day, window }: Pick<SitWindow, 'day' | 'window'>): string {
  return `${day} ${WINDOW_NAMES.indexOf(window)}`;
}
