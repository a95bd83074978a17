import { and, asc, eq, isNull } from 'drizzle-orm';
import { type ReadFrom, reader, type Tx } from '@/db/client';
import { drawEntries, drawResults, memberships, sits, users } from '@/db/schema';
import type { ClubScope } from '@/server/scope';

export type ResultRow = typeof drawResults.$inferSelect;

/** What came of the wishes of people still in the club, window by window and by turn, with what became of their sits. */
export function listResults(scope: ClubScope, drawId: string, from: ReadFrom = reader()) {
  return from
    .select({ result: drawResults, entry: drawEntries, userId: users.id, name: users.name, sitStatus: sits.status })
    .from(drawResults)
    .innerJoin(
      drawEntries,
      and(eq(drawEntries.drawId, drawResults.drawId), eq(drawEntries.memberId, drawResults.memberId)),
    )
    .innerJoin(memberships, eq(memberships.id, drawResults.memberId))
    .innerJoin(users, eq(users.id, memberships.userId))
    .leftJoin(sits, eq(sits.id, drawResults.sitId))
    .where(and(eq(drawResults.clubId, scope.club.id), eq(drawResults.drawId, drawId), isNull(memberships.removedAt)))
    .orderBy(asc(drawResults.slot), asc(drawEntries.turn), asc(drawResults.memberId));
}

export type ResultLine = Awaited<ReturnType<typeof listResults>>[number];

/** Puts what a draw gave in the place of what an earlier making of it gave. */
export async function replaceResults(
  scope: ClubScope,
  tx: Tx,
  drawId: string,
  rows: (typeof drawResults.$inferInsert)[],
): Promise<void> {
  await tx.delete(drawResults).where(and(eq(drawResults.clubId, scope.club.id), eq(drawResults.drawId, drawId)));
  if (rows.length > 0) await tx.insert(drawResults).values(rows);
}

export async function updateResult(
  scope: ClubScope,
  tx: Tx,
  at: Pick<ResultRow, 'drawId' | 'memberId' | 'slot'>,
  set: Partial<Pick<ResultRow, 'standId' | 'reasons' | 'sitId' | 'swapWith'>>,
): Promise<void> {
  await tx
    .update(drawResults)
    .set(set)
    .where(
      and(
        eq(drawResults.clubId, scope.club.id),
        eq(drawResults.drawId, at.drawId),
        eq(drawResults.memberId, at.memberId),
        eq(drawResults.slot, at.slot),
      ),
    );
}
