import { addDays, dayOf, localToUtc } from '@/core/day-time';
import { write } from '@/db/client';
import { clockText } from '@/features/bookings/sit-words';
import { listStands } from '@/features/ground/stands-data';
import { newId } from '@/lib/ids';
import { newRequestKey } from '@/lib/request-key';
import { AppError } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import type { EnterDrawInput, OpenDrawInput } from './draw-schema';
import { deleteEntry, insertDraw, putEntry, updateDraw } from './draws-data';
import { drawName, needDraw, noteDraw } from './note-draw';

const invalid = (field: string, message: string) => new AppError('invalid', message, { fields: { [field]: message } });

export async function openDraw(scope: ClubScope, input: OpenDrawInput, now: number): Promise<{ id: string }> {
  const { club, member } = scope;
  const today = dayOf(now, club.zone);
  const { day, windows, standIds, closesDay, closesClock, note } = input;
  if (day < today || day > addDays(today, 366)) throw invalid('day', 'Choose a day from today to a year ahead.');
  const closesAt = localToUtc(closesDay, closesClock, club.zone);
  if (closesAt <= now) throw invalid('closesClock', 'Entries close after now.');
  if (closesDay > day) throw invalid('closesDay', 'Entries close before the day of the draw is over.');
  const pointRules = {
    pointsPerMiss: input.pointsPerMiss,
    resetOnGiven: input.resetOnGiven,
    workHoursPerPoint: input.workHoursPerPoint > 0 ? input.workHoursPerPoint : null,
  };
  return write(async (tx) => {
    const known = new Set((await listStands(scope, tx)).map((stand) => stand.id));
    if (standIds.some((id) => !known.has(id)))
      throw invalid('standIds', 'One of the stands is not in use. Choose anew.');
    const id = newId('draw');
    const row = { day, windows, standIds: [...new Set(standIds)], closesAt, pointRules, note, seed: newRequestKey() };
    const made = { id, clubId: club.id, state: 'open' as const, createdBy: member.id, createdAt: now };
    await insertDraw(tx, { ...row, ...made });
    await noteDraw(scope, tx, { id, verb: 'opened', summary: `Opened ${drawName(row)}.`, detail: row }, now);
    return { id };
  });
}

/** Calls a draw off before it is published; nobody's points change. */
export async function cancelDraw(scope: ClubScope, drawId: string, now: number): Promise<{ id: string }> {
  return write(async (tx) => {
    const draw = await needDraw(scope, drawId, ['open', 'drawn'], tx);
    await updateDraw(scope, tx, draw.id, { state: 'cancelled' });
    await noteDraw(scope, tx, { id: draw.id, verb: 'cancelled', summary: `Called off ${drawName(draw)}.` }, now);
    return { id: draw.id };
  });
}

/** A member's own wishes; a second time they take the place of the first. */
export async function enterDraw(scope: ClubScope, input: EnterDrawInput, now: number): Promise<{ entered: boolean }> {
  const { drawId, choices, ...rest } = input;
  if (choices.length === 0 && !rest.anyByScore) {
    throw invalid('choices.0', 'Choose a stand, or leave it to the score.');
  }
  return write(async (tx) => {
    const draw = await needDraw(scope, drawId, ['open'], tx);
    refuseLate(scope, draw.closesAt, now);
    if (choices.some((id) => !draw.standIds.includes(id)))
      throw invalid('choices.0', 'Choose from the stands of this draw.');
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

function refuseLate(scope: ClubScope, closesAt: number, now: number): void {
  if (now < closesAt) return;
  throw new AppError(
    'conflict',
    `Entries closed at ${clockText(closesAt, scope.club)} on ${dayOf(closesAt, scope.club.zone)}.`,
  );
}
