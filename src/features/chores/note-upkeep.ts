import type { Tx } from '@/db/client';
import { audit } from '@/server/audit';
import type { ClubScope } from '@/server/scope';

/** The audit row of a chore, an inspection or a work day. */
export function noteUpkeep(
  scope: ClubScope,
  tx: Tx,
  note: {
    subject: 'chore' | 'inspection' | 'work_day';
    verb: string;
    id: string;
    summary: string;
    detail?: Record<string, unknown>;
  },
  now: number,
): Promise<void> {
  const { subject, verb, id, summary, detail } = note;
  const entry = { clubId: scope.club.id, actor: scope.actor, action: `${subject}.${verb}`, subjectType: subject };
  return audit(tx, { ...entry, subjectId: id, summary, ...(detail ? { detail } : {}) }, now);
}
