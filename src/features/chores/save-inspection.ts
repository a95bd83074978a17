import { addDays, dayOf } from '@/core/day-time';
import { itemsFor } from '@/core/upkeep/inspection';
import { write } from '@/db/client';
import { closeGroundIn } from '@/features/ground/close-ground';
import { listClosuresFrom } from '@/features/ground/closures-data';
import { openAgainIn } from '@/features/ground/open-again';
import { getStand } from '@/features/ground/stands-data';
import { newId } from '@/lib/ids';
import { AppError, notFound } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { mailClosed } from './closed-mails';
import { firstLine } from './first-line';
import type { InspectionInput } from './inspection-schema';
import { insertInspection, listInspectionsOf } from './inspections-data';
import { noteUpkeep } from './note-upkeep';
import { addChoreIn } from './save-chore';
import { INSPECTION_ERRORS, INSPECTION_LEAVES } from './words/inspections';

/** A chore to mend a stand is due in so many days. Our choice. */
const MEND_DAYS = 14;

export interface SavedInspection {
  standName: string;
  /** Booked sits whose members were told that the stand is closed. */
  told: number;
  /** A chore was made to mend it. */
  chore: boolean;
  /** What an inspection had closed was opened again. */
  opened: boolean;
}

/**
 * Keeps an inspection. Closed shuts the stand at once and tells those booked there; fix first and closed make a chore; a
 * pass opens what an earlier inspection closed, where that is asked for. All of it is one change.
 */
export async function saveInspection(
  scope: ClubScope,
  { reopen, ...input }: InspectionInput,
  now: number,
): Promise<SavedInspection> {
  const today = dayOf(now, scope.club.zone);
  if (input.day > today || input.day < addDays(today, -366)) {
    const message = input.day > today ? INSPECTION_ERRORS.toCome : INSPECTION_ERRORS.old;
    throw new AppError('invalid', message, { fields: { day: message } });
  }
  return write(async (tx) => {
    const stand = await getStand(scope, input.standId, tx);
    if (!stand) throw notFound();
    if (itemsFor(stand.kind).some((item) => input.answers[item] === undefined)) {
      throw new AppError('conflict', INSPECTION_ERRORS.otherKind(stand.name));
    }
    const id = newId('inspection');
    const reason = firstLine(input.notes);
    let closureId: string | null = null;
    let told = 0;
    if (input.result === 'closed') {
      const open = (await listClosuresFrom(scope, today, tx)).find(
        (closure) => closure.standId === stand.id && closure.toDay === null && closure.fromDay <= today,
      );
      const values = { standId: stand.id, fromDay: today, toDay: null, reason: INSPECTION_LEAVES.closure(reason) };
      closureId = open?.id ?? (await closeGroundIn(tx, scope, values, stand.name, now)).id;
      told = await mailClosed(tx, scope, { stand, reason, closureId, day: today }, now);
    }
    const closing = reopen ? (await listInspectionsOf(scope, stand.id, tx)).find((one) => one.closedByIt) : undefined;
    if (closing?.closureId) await openAgainIn(tx, scope, closing.closureId, now);
    await insertInspection(tx, {
      ...input,
      id,
      clubId: scope.club.id,
      byMemberId: scope.member.id,
      closureId,
      createdAt: now,
    });
    const chore = input.result !== 'pass';
    if (chore) {
      const place = { of: 'stand' as const, id: stand.id };
      const title = INSPECTION_LEAVES.chore(stand.name);
      const dueOn = addDays(today, MEND_DAYS);
      await addChoreIn(tx, scope, { title, notes: input.notes, assigneeId: null, place, dueOn }, now);
    }
    const summary = INSPECTION_LEAVES.audit(stand.name, input.result, reason);
    const opened = closing?.closureId ?? null;
    const detail = { result: input.result, answers: input.answers, closureId, opened };
    await noteUpkeep(scope, tx, { subject: 'inspection', verb: 'added', id, summary, detail }, now);
    return { standName: stand.name, told, chore, opened: opened !== null };
  });
}
