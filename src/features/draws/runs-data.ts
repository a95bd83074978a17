import { and, desc, eq, isNull } from 'drizzle-orm';
import { type ReadFrom, reader, type Tx } from '@/db/client';
import { drawRuns } from '@/db/schema';
import type { ClubScope } from '@/server/scope';

export type RunRow = typeof drawRuns.$inferSelect;

/** The work on a draw that began last. */
export async function findLastRun(scope: ClubScope, drawId: string, from: ReadFrom = reader()): Promise<RunRow | null> {
  const [row] = await from
    .select()
    .from(drawRuns)
    .where(and(eq(drawRuns.clubId, scope.club.id), eq(drawRuns.drawId, drawId)))
    .orderBy(desc(drawRuns.startedAt), desc(drawRuns.id))
    .limit(1);
  return row ?? null;
}

export async function insertRun(tx: Tx, row: typeof drawRuns.$inferInsert): Promise<void> {
  await tx.insert(drawRuns).values(row);
}

/** Changes a run that has not ended; false: it has. */
export async function updateLiveRun(
  scope: ClubScope,
  tx: Tx,
  id: string,
  set: Partial<Pick<RunRow, 'leaseUntil' | 'value' | 'bound' | 'endedAt' | 'outcome' | 'message'>>,
): Promise<boolean> {
  const rows = await tx
    .update(drawRuns)
    .set(set)
    .where(and(eq(drawRuns.clubId, scope.club.id), eq(drawRuns.id, id), isNull(drawRuns.endedAt)))
    .returning({ id: drawRuns.id });
  return rows.length > 0;
}
