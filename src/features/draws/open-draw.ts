import { addDays, dayOf, daysBetween, localToUtc } from '@/core/day-time';
import { write } from '@/db/client';
import { listStands } from '@/features/ground/stands-data';
import { newId } from '@/lib/ids';
import { newRequestKey } from '@/lib/request-key';
import { AppError } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import type { OpenDrawInput } from './draw-schema';
import { insertDraw, updateDraw } from './draws-data';
import { invalidDraw } from './invalid-draw';
import { drawName, needDraw, noteDraw } from './note-draw';
import { liveRun } from './runs';
import { inOrder, overlapAt } from './slots';
import { DRAW_AUDIT, DRAW_ERRORS } from './words/errors';
import { DRAW_FIELD_ERRORS } from './words/forms';

/** The windows of one draw lie within a week: what is far apart is drawn apart, with the points of the day. */
const MOST_DAYS_APART = 7;

export async function openDraw(scope: ClubScope, input: OpenDrawInput, now: number): Promise<{ id: string }> {
  const { club, member } = scope;
  const today = dayOf(now, club.zone);
  const { standIds, closesDay, closesClock, note } = input;
  const out = input.slots.findIndex(({ day }) => day < today || day > addDays(today, 366));
  if (out >= 0) throw invalidDraw(`slots.${out}.day`, DRAW_ERRORS.dayRange);
  const twice = overlapAt(input.slots);
  if (twice >= 0) throw invalidDraw(`slots.${twice}.windows`, DRAW_FIELD_ERRORS.overlap);
  const slots = inOrder(input.slots);
  const day = slots[0]?.day ?? today;
  const last = slots.at(-1)?.day ?? day;
  if (daysBetween(day, last) >= MOST_DAYS_APART) {
    const far = input.slots.findIndex((slot) => slot.day === last);
    throw invalidDraw(`slots.${far}.day`, DRAW_FIELD_ERRORS.spread(MOST_DAYS_APART));
  }
  const closesAt = localToUtc(closesDay, closesClock, club.zone);
  if (closesAt <= now) throw invalidDraw('closesClock', DRAW_ERRORS.closesPast);
  if (closesDay > day) throw invalidDraw('closesDay', DRAW_ERRORS.closesLate);
  const pointRules = {
    pointsPerMiss: input.pointsPerMiss,
    resetOnGiven: input.resetOnGiven,
    workHoursPerPoint: input.workHoursPerPoint > 0 ? input.workHoursPerPoint : null,
  };
  return write(async (tx) => {
    const known = new Set((await listStands(scope, tx)).map((stand) => stand.id));
    if (standIds.some((id) => !known.has(id))) throw invalidDraw('standIds', DRAW_ERRORS.standGone);
    const id = newId('draw');
    const row = { day, slots, standIds: [...new Set(standIds)], closesAt, pointRules, note, seed: newRequestKey() };
    const made = { id, clubId: club.id, state: 'open' as const, createdBy: member.id, createdAt: now };
    await insertDraw(tx, { ...row, ...made });
    await noteDraw(scope, tx, { id, verb: 'opened', summary: DRAW_AUDIT.opened(drawName(row)), detail: row }, now);
    return { id };
  });
}

/** Calls a draw off before it is published; nobody's points change. */
export async function cancelDraw(scope: ClubScope, drawId: string, now: number): Promise<{ id: string }> {
  return write(async (tx) => {
    const draw = await needDraw(scope, drawId, ['open', 'drawn'], tx);
    if (await liveRun(scope, drawId, now, tx)) throw new AppError('conflict', DRAW_ERRORS.atWork);
    await updateDraw(scope, tx, draw.id, { state: 'cancelled' });
    const summary = DRAW_AUDIT.cancelled(drawName(draw));
    await noteDraw(scope, tx, { id: draw.id, verb: 'cancelled', summary }, now);
    return { id: draw.id };
  });
}
