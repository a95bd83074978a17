import { write } from '@/db/client';
import { AppError, notFound } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { getApproach, updateApproach } from './approaches-data';
import { noteChange } from './note-change';
import { listBookedSits } from './people-data';
import { changedSince, namedSits } from './refuse';
import { GROUND_AUDIT } from './words/audit';
import { GROUND_ERRORS } from './words/errors';

/** Refused while a booked sit means to walk in by it. */
export function removeApproach(
  scope: ClubScope,
  at: { id: string; version: number },
  now: number,
): Promise<{ name: string }> {
  return write(async (tx) => {
    const approach = await getApproach(scope, at.id, tx);
    if (!approach) throw notFound();
    const sits = await listBookedSits(scope, { standId: approach.standId, now }, tx);
    const walked = sits.filter((sit) => sit.approachId === at.id);
    if (walked.length > 0) {
      const message = GROUND_ERRORS.approachBooked(approach.name, namedSits(walked));
      throw new AppError('conflict', message);
    }
    if (!(await updateApproach(scope, tx, at, { removedAt: now }))) throw await changedSince(scope, approach, tx);
    const summary = GROUND_AUDIT.approachRemoved(approach.name);
    await noteChange(scope, tx, { subject: 'approach', verb: 'removed', id: at.id, summary }, now);
    return { name: approach.name };
  });
}
