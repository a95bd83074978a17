import type { Tx } from '@/db/client';
import { audit } from '@/server/audit';
import type { ClubScope } from '@/server/scope';

interface Entry {
  action: string;
  subjectType: 'club' | 'member' | 'invitation' | 'audit_log';
  subjectId: string;
  summary: string;
  detail?: Record<string, unknown>;
}

/** An audit row of this club by whoever acts. */
export async function auditClub(tx: Tx, scope: ClubScope, entry: Entry, now: number): Promise<void> {
  await audit(tx, { clubId: scope.club.id, actor: scope.actor, ...entry }, now);
}
