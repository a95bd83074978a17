import { dayOf, formatDay } from '@/core/day-time';
import { reader, write } from '@/db/client';
import { gatesFor, loadBookingContext } from '@/features/bookings/booking-context';
import { guestKey } from '@/features/bookings/guest-parties';
import { clockText, windowsHeld } from '@/features/bookings/words/sits';
import { AppError } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import type { EnterDrawInput } from './draw-schema';
import { type DrawRow, deleteEntry, putEntry } from './draws-data';
import { invalidDraw } from './invalid-draw';
import { guestRefusal } from './load-entrant';
import { needDraw } from './note-draw';
import { slotName } from './slots';
import { DRAW_ERRORS } from './words/errors';

/** A member's own wishes; a second time they take the place of the first. */
export async function enterDraw(scope: ClubScope, input: EnterDrawInput, now: number): Promise<{ entered: boolean }> {
  const { drawId, choices, ...rest } = input;
  if (choices.length === 0 && !rest.anyByScore) throw invalidDraw('choices.0', DRAW_ERRORS.chooseOrLeave);
  await refuseGuests(scope, await needDraw(scope, drawId, ['open']), input, now);
  return write(async (tx) => {
    const draw = await needDraw(scope, drawId, ['open'], tx);
    refuseLate(scope, draw.closesAt, now);
    if (choices.some((id) => !draw.standIds.includes(id))) throw invalidDraw('choices.0', DRAW_ERRORS.notOfDraw);
    if (rest.slots.some((slot) => slot >= draw.slots.length)) throw invalidDraw('slots', DRAW_ERRORS.notASlot);
    await putEntry(tx, { drawId, clubId: scope.club.id, memberId: scope.member.id, choices, ...rest, at: now });
    return { entered: true };
  });
}

export async function leaveDraw(scope: ClubScope, drawId: string, now: number): Promise<{ entered: boolean }> {
  return write(async (tx) => {
    const draw = await needDraw(scope, drawId, ['open'], tx);
    refuseLate(scope, draw.closesAt, now);
    await deleteEntry(scope, tx, drawId, scope.member.id);
    return { entered: false };
  });
}

/** What already stands against the guests in a window that is wanted: said now, not when the draw is made. */
async function refuseGuests(scope: ClubScope, draw: DrawRow, input: EnterDrawInput, now: number): Promise<void> {
  if (input.guests.length === 0) return;
  const memberId = scope.member.id;
  for (const number of input.slots) {
    const slot = draw.slots[number];
    if (!slot) continue;
    const ask = { day: slot.day, windows: windowsHeld(slot.windows), standIds: draw.standIds, memberId, now };
    const context = await loadBookingContext(scope, ask, reader());
    const hunt = { weapon: input.weapon, guests: input.guests.map(guestKey) };
    const gates = [...context.stands.keys()].slice(0, 1).flatMap((id) => gatesFor(context, id, hunt));
    const why =
      (await guestRefusal(scope, slot.day, { memberId, guests: input.guests })) ??
      gates.find((gate) => gate.code === 'guest_days')?.text;
    if (why) throw invalidDraw('guests', DRAW_ERRORS.guestsOn(slotName(slot), why));
  }
}

function refuseLate(scope: ClubScope, closesAt: number, now: number): void {
  if (now < closesAt) return;
  const day = formatDay(dayOf(closesAt, scope.club.zone));
  throw new AppError('conflict', DRAW_ERRORS.entriesClosed(clockText(closesAt, scope.club), day));
}
