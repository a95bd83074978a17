import { and, asc, desc, eq, gt, isNull, lte, sql } from 'drizzle-orm';
import { alias } from 'drizzle-orm/sqlite-core';
import { type ReadFrom, reader, type Tx } from '@/db/client';
import { memberships, sitLogs, sitPredictions, sits, standAdjustments, stands, users } from '@/db/schema';
import type { ClubScope } from '@/server/scope';

export type AdjustmentRow = typeof standAdjustments.$inferSelect;

/** Predicted sits that have a log, with what it says. */
export function listOutcomes(scope: ClubScope, from: ReadFrom = reader()) {
  return from
    .select({
      standId: sitPredictions.standId,
      quiet: sitPredictions.quiet,
      adjustedBy: sitPredictions.adjustedBy,
      bumped: sql<number>`${sitLogs.bumpedIn} + ${sitLogs.bumpedSitting} + ${sitLogs.bumpedOut}`,
    })
    .from(sitPredictions)
    .innerJoin(sitLogs, eq(sitLogs.sitId, sitPredictions.sitId))
    .where(eq(sitPredictions.clubId, scope.club.id));
}

/** Sits that have begun lately and whose prediction is not kept yet. */
export function listUnpredicted(scope: ClubScope, span: { from: number; until: number }, from: ReadFrom = reader()) {
  return from
    .select({ id: sits.id, standId: sits.standId, day: sits.day, windows: sits.windows, weapon: sits.weapon })
    .from(sits)
    .leftJoin(sitPredictions, eq(sitPredictions.sitId, sits.id))
    .where(
      and(
        eq(sits.clubId, scope.club.id),
        eq(sits.status, 'booked'),
        gt(sits.startAt, span.from),
        lte(sits.startAt, span.until),
        isNull(sitPredictions.sitId),
      ),
    )
    .orderBy(asc(sits.startAt));
}
export type UnpredictedSit = Awaited<ReturnType<typeof listUnpredicted>>[number];

/** Kept once: a second process that was slower changes nothing. */
export async function insertPrediction(tx: Tx, row: typeof sitPredictions.$inferInsert): Promise<boolean> {
  const rows = await tx
    .insert(sitPredictions)
    .values(row)
    .onConflictDoNothing()
    .returning({ id: sitPredictions.sitId });
  return rows.length > 0;
}

const applier = alias(users, 'applier');
const appliedMember = alias(memberships, 'applied_member');
const ender = alias(users, 'ender');
const endedMember = alias(memberships, 'ended_member');

/** Every adjustment a club ever applied, the latest first. */
export function listAdjustments(scope: ClubScope, from: ReadFrom = reader()) {
  return from
    .select({ row: standAdjustments, standName: stands.name, appliedByName: applier.name, endedByName: ender.name })
    .from(standAdjustments)
    .innerJoin(stands, eq(stands.id, standAdjustments.standId))
    .leftJoin(appliedMember, eq(appliedMember.id, standAdjustments.appliedBy))
    .leftJoin(applier, eq(applier.id, appliedMember.userId))
    .leftJoin(endedMember, eq(endedMember.id, standAdjustments.endedBy))
    .leftJoin(ender, eq(ender.id, endedMember.userId))
    .where(eq(standAdjustments.clubId, scope.club.id))
    .orderBy(desc(standAdjustments.appliedAt), desc(standAdjustments.id));
}

export async function insertAdjustment(tx: Tx, row: typeof standAdjustments.$inferInsert): Promise<void> {
  await tx.insert(standAdjustments).values(row);
}

/** Ends what holds for a stand; the rows ended. */
export function endAdjustments(
  scope: ClubScope,
  tx: Tx,
  standId: string,
  ended: { by: string; at: number },
): Promise<AdjustmentRow[]> {
  return tx
    .update(standAdjustments)
    .set({ endedBy: ended.by, endedAt: ended.at })
    .where(
      and(
        eq(standAdjustments.clubId, scope.club.id),
        eq(standAdjustments.standId, standId),
        isNull(standAdjustments.endedAt),
      ),
    )
    .returning();
}
