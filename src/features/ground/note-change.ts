import type { Tx } from '@/db/client';
import { audit } from '@/server/audit';
import type { ClubScope } from '@/server/scope';

export type GroundSubject = 'stand' | 'approach' | 'feature' | 'parking' | 'closure' | 'map_item';

/** The audit row of a change to the ground. */
export function noteChange(
  scope: ClubScope,
  tx: Tx,
  note: { subject: GroundSubject; verb: string; id: string; summary: string; detail?: Record<string, unknown> },
  now: number,
): Promise<void> {
  return audit(
    tx,
    {
      clubId: scope.club.id,
      actor: scope.actor,
      action: `${note.subject}.${note.verb}`,
      subjectType: note.subject,
      subjectId: note.id,
      summary: note.summary,
      ...(note.detail ? { detail: note.detail } : {}),
    },
    now,
  );
}
