import type { Tx } from '@/db/client';
import { insertAudit } from '@/db/queries/audit';
import { newId } from '@/lib/ids';

export interface Actor {
  userId: string | null;
  name: string;
}

export interface AuditEntry {
  clubId: string | null;
  actor: Actor;
  /** subject.verb, such as `sit.booked`. */
  action: string;
  subjectType: string;
  subjectId: string;
  /** One plain sentence. */
  summary: string;
  /** Before and after, or what else an officer may need; never a secret. */
  detail?: Record<string, unknown>;
}

/** Written in the same transaction as the change it tells of. */
export async function audit(tx: Tx, entry: AuditEntry, at: number): Promise<void> {
  await insertAudit(tx, {
    id: newId('audit'),
    clubId: entry.clubId,
    at,
    actorUserId: entry.actor.userId,
    actorName: entry.actor.name,
    action: entry.action,
    subjectType: entry.subjectType,
    subjectId: entry.subjectId,
    summary: entry.summary,
    detail: entry.detail ?? {},
  });
}
