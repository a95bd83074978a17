import { write } from '@/db/client';
import { momentText } from '@/features/clubs/audit-words';
import { audit } from '@/server/audit';
import { AppError, notFound } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { VISIT_WORDS } from './visit-schema';
import { findVisit, markVisitRemoved } from './visits-data';

/** Takes a visit out of the count of pressure; its row stays. */
export async function removeVisit(scope: ClubScope, id: string, now: number): Promise<{ id: string }> {
  return write(async (tx) => {
    const visit = await findVisit(scope, id, tx);
    if (!visit) throw notFound();
    if (visit.memberId !== scope.member.id && !scope.can('log.write_any')) {
      throw new AppError('forbidden', 'Only who wrote this visit down, or an officer, can take it out.');
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
        summary: `Took out a visit: ${VISIT_WORDS[visit.kind].toLowerCase()}, ${momentText(visit.at, scope.club)}.`,
      },
      now,
    );
    return { id };
  });
}
