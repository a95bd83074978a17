import type { Tx } from '@/db/client';
import { audit } from '@/server/audit';

/** Account changes belong to no club. */
export async function auditAccount(
  tx: Tx,
  user: { id: string; name: string },
  verb: string,
  summary: string,
  now: number,
): Promise<void> {
  await audit(
    tx,
    {
      clubId: null,
      actor: { userId: user.id, name: user.name },
      action: `account.${verb}`,
      subjectType: 'user',
      subjectId: user.id,
      summary,
    },
    now,
  );
}
