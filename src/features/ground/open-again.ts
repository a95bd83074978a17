import { addDays, dayOf } from '@/core/day-time';
import { type Tx, write } from '@/db/client';
import { AppError, notFound } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { getClosure, updateClosure } from './closures-data';
import { noteChange } from './note-change';
import { getStand } from './stands-data';
import { GROUND_AUDIT } from './words/audit';
import { WHOLE_GROUND } from './words/closures';
import { GROUND_ERRORS } from './words/errors';

/** Opens a closure inside a change of which it is a part. */
export async function openAgainIn(tx: Tx, scope: ClubScope, id: string, now: number): Promise<{ id: string }> {
  const closure = await getClosure(scope, id, tx);
  if (!closure) throw notFound();
  if (closure.standId !== null && !scope.can('stands.write')) {
    throw new AppError('forbidden', GROUND_ERRORS.onlyStewardOpens);
  }
  const today = dayOf(now, scope.club.zone);
  if (closure.toDay !== null && closure.toDay < today) {
    throw new AppError('conflict', GROUND_ERRORS.closureOver);
  }
  const stand = closure.standId === null ? null : await getStand(scope, closure.standId, tx);
  const past = closure.fromDay < today;
  await updateClosure(scope, tx, id, past ? { toDay: addDays(today, -1) } : { removedAt: now });
  const summary = GROUND_AUDIT.opened(stand?.name ?? WHOLE_GROUND, today);
  await noteChange(scope, tx, { subject: 'closure', verb: 'opened', id, summary }, now);
  return { id };
}

/** Opens what was closed from today on; days already past stay on record as closed. */
export function openAgain(scope: ClubScope, id: string, now: number): Promise<{ id: string }> {
  return write((tx) => openAgainIn(tx, scope, id, now));
}
