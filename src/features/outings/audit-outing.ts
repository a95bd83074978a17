import type { Tx } from '@/db/client';
import { audit } from '@/server/audit';
import type { ClubScope } from '@/server/scope';

interface Entry {
  id: string;
  summary: string;
  detail?: Record<string, unknown>;
}

/** verb: signed_in, signed_out, moved, told, linked, unlinked. */
export async function auditOuting(tx: Tx, scope: ClubScope, verb: string, entry: Entry, now: number): Promise<void> {
  await audit(
    tx,
    {
      clubId: scope.club.id,
      actor: scope.actor,
      action: `outing.${verb}`,
      subjectType: 'outing',
      subjectId: entry.id,
      summary: entry.summary,
      ...(entry.detail ? { detail: entry.detail } : {}),
    },
    now,
  );
}
