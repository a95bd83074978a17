import { addDays, dayOf, localToUtc } from '@/core/day-time';
import { write } from '@/db/client';
import { insertVisit } from '@/features/logs/visits-data';
import { newId } from '@/lib/ids';
import { AppError, notFound } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import type { FinishChoreInput } from './chore-schema';
import { findChore, updateChore } from './chores-data';
import { noteUpkeep } from './note-upkeep';
import { CHORE_AUDIT, CHORE_ERRORS } from './words/chores';

/** Work presses on the deer for some days; an older visit weighs nothing. */
const VISIT_DAYS = 21;

/**
 * Marks a chore done and credits the hours: to its assignee, or to whoever marks a chore nobody had. Where it has a place the
 * work is written down as a visit, so that the list of stands knows of it.
 */
export async function finishChore(
  scope: ClubScope,
  input: FinishChoreInput,
  now: number,
): Promise<{ id: string; title: string }> {
  const today = dayOf(now, scope.club.zone);
  if (input.doneOn > today || input.doneOn < addDays(today, -366)) {
    const message = input.doneOn > today ? CHORE_ERRORS.toCome : CHORE_ERRORS.old;
    throw new AppError('invalid', message, { fields: { doneOn: message } });
  }
  return write(async (tx) => {
    const chore = await findChore(scope, input.id, tx);
    if (!chore) throw notFound();
    const { id, title } = chore;
    if (chore.doneOn !== null) {
      throw new AppError('conflict', CHORE_ERRORS.markedDone(chore.doerName));
    }
    const mine = chore.assigneeId === null || chore.assigneeId === scope.member.id;
    if (!mine && !scope.can('chores.write')) {
      throw new AppError('forbidden', CHORE_ERRORS.others(chore.assigneeName));
    }
    const doneBy = chore.assigneeId ?? scope.member.id;
    await updateChore(scope, tx, chore, { doneOn: input.doneOn, doneBy, hours: input.hours });
    if (chore.lat !== null && chore.lon !== null && input.doneOn >= addDays(today, -VISIT_DAYS)) {
      await insertVisit(tx, {
        id: newId('visit'),
        clubId: scope.club.id,
        kind: 'work',
        at: Math.min(now, localToUtc(input.doneOn, '12:00', scope.club.zone)),
        lat: chore.lat,
        lon: chore.lon,
        standId: chore.place.startsWith('stand:') ? chore.place.slice('stand:'.length) : null,
        memberId: doneBy,
        notes: title,
        createdAt: now,
      });
    }
    const who = chore.assigneeId === null ? scope.member.name : (chore.assigneeName ?? scope.member.name);
    const summary = CHORE_AUDIT.done(title, who, input.hours);
    await noteUpkeep(scope, tx, { subject: 'chore', verb: 'done', id, summary, detail: { ...input, doneBy } }, now);
    return { id, title };
  });
}
