import type { Tx } from '@/db/client';
import type { ClubScope } from '@/server/scope';
import { cancelSitIn } from './cancel-sit';
import { listUpcomingSits } from './data';

/** Cancels every sit of a member that has not ended, inside a change of which it is a part; gives how many. */
export async function cancelSitsOf(
  tx: Tx,
  scope: ClubScope,
  memberId: string,
  reason: string,
  now: number,
): Promise<number> {
  const sits = await listUpcomingSits(scope, memberId, now, tx);
  for (const sit of sits) await cancelSitIn(tx, scope, sit, reason, now);
  return sits.length;
}
