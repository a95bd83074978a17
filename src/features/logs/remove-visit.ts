import { write } from '@/db/client';
import { momentText } from '@/features/clubs/words/audit-text';
import { audit } from '@/server/audit';
import { AppError, notFound } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { findVisit, markVisitRemoved } from './visits-data';
import { VISIT_AUDIT, VISIT_ERRORS } from './words/visits';

/** Takes a visit out of the count of pressure; its row stays. */
export async function removeVisit(scope: ClubScope, id: string, now: number): Promise<{ id: string }> {
  return write(async (tx) => {
    const visit = await findVisit(scope, id, tx);
    if (!visit) throw notFound();
    if (visit.memberId !== scope.member.id && !scope.can('log.write_any')) {
      throw new AppError('forbidden', VISIT_ERRORS.notYours);
    }
    await markVisitRemoved(scope, tx, id, now);
    await audit(
      tx,
      {
        clubId: scope.club.id,
        actor: scope.actor,
        action: 'visit.removed',
        subjectType: 'visit',
        subjectId: id,
        summary: VISIT_AUDIT.removed(visit.kind, momentText(visit.at, scope.club)),
      },
      now,
    );
    return { id };
  });
}
