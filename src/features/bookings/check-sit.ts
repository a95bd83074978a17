import type { SitWindow } from '@/core/condition-types';
import { formatDay } from '@/core/day-time';
import type { Weapon } from '@/core/ground-types';
import type { ReadFrom, Tx } from '@/db/client';
import type { SitGuest } from '@/db/schema';
import { AppError } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { type BookingContext, gatesFor, loadBookingContext } from './booking-context';
import { guestMemberGates } from './guest-member-gates';
import { guestKey } from './guest-parties';
import { listMembersForRules } from './rules-data';
import { SIT_ERRORS } from './words/errors';
import { type SitWindows, windowsHeld } from './words/sits';

export interface WantedSit {
  memberId: string;
  standId: string;
  day: string;
  windows: SitWindows;
  weapon: Weapon;
  approachId: string | null;
  guests: SitGuest[];
}

export interface Refusal {
  about: 'sit' | 'guests';
  text: string;
}

export interface CheckedSit {
  standName: string;
  memberName: string;
  startAt: number;
  endAt: number;
  /** Empty: the rules allow it. */
  refusals: Refusal[];
}

const invalid = (field: string, message: string) => new AppError('invalid', message, { fields: { [field]: message } });

function spanOf(spans: SitWindow[]): { startAt: number; endAt: number } {
  return { startAt: Math.min(...spans.map((s) => s.startAt)), endAt: Math.max(...spans.map((s) => s.endAt)) };
}

/** A seat for each of the party. */
export function seatRefusals(
  context: BookingContext,
  wanted: Pick<WantedSit, 'standId' | 'guests'>,
  standName: string,
): Refusal[] {
  const seats = context.seats.get(wanted.standId) ?? 1;
  const people = wanted.guests.length + 1;
  if (wanted.guests.length === 0 || people <= seats) return [];
  return [{ about: 'guests', text: SIT_ERRORS.seats(standName, seats, people) }];
}

/** Guests with an account: in the club, and within the dates of their invitation. */
export async function guestRefusals(
  scope: ClubScope,
  from: ReadFrom,
  wanted: Pick<WantedSit, 'memberId' | 'guests' | 'day'>,
): Promise<Refusal[]> {
  const ids = wanted.guests.flatMap((guest) => guest.memberId ?? []);
  if (new Set(wanted.guests.map(guestKey)).size < wanted.guests.length) {
    throw invalid('guests', SIT_ERRORS.guestNamedTwice);
  }
  if (ids.includes(wanted.memberId)) throw invalid('guests', SIT_ERRORS.ownGuest);
  const found = await listMembersForRules(scope, ids, from);
  if (found.length < ids.length) throw invalid('guests', SIT_ERRORS.guestGone);
  return found
    .flatMap((member) => guestMemberGates(member, wanted.day))
    .map((gate) => ({ about: 'guests', text: gate.text }));
}

/** Looks at everything a sit must satisfy, inside the transaction that will write it. */
export async function checkSit(
  scope: ClubScope,
  tx: Tx,
  wanted: WantedSit,
  more: { now: number; exceptSitId: string | null },
): Promise<CheckedSit> {
  const { memberId, standId, day } = wanted;
  const windows = windowsHeld(wanted.windows);
  const context = await loadBookingContext(scope, { day, windows, memberId, standIds: [standId], ...more }, tx);
  const stand = context.stands.get(standId);
  if (!stand) throw invalid('standId', SIT_ERRORS.standNotInUse);
  if (!context.member) throw invalid('memberId', SIT_ERRORS.notMember);
  if (wanted.approachId !== null && !context.waysIn.some((way) => way.id === wanted.approachId)) {
    throw invalid('approachId', SIT_ERRORS.noWay(stand.name));
  }
  const gates = gatesFor(context, standId, { weapon: wanted.weapon, guests: wanted.guests.map(guestKey) });
  return {
    standName: stand.name,
    memberName: context.member.name,
    ...spanOf(context.spans),
    refusals: [
      ...gates.map((gate): Refusal => ({ about: gate.code === 'guest_days' ? 'guests' : 'sit', text: gate.text })),
      ...seatRefusals(context, wanted, stand.name),
      ...(await guestRefusals(scope, tx, wanted)),
    ],
  };
}

/** Refuses with the rules and their holders by name. */
export function refuseIfAny(refusals: Refusal[]): void {
  if (refusals.length === 0) return;
  throw new AppError('conflict', [...new Set(refusals.map((refusal) => refusal.text))].join(' '));
}

/** What a person is told when the index of claims, and no rule, stopped a sit. */
export function claimConflict(holders: { standName: string; memberName: string }[], day: string): AppError {
  return new AppError('conflict', SIT_ERRORS.taken(formatDay(day), holders));
}
