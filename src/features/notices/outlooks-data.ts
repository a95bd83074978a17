import { and, asc, desc, eq, gte, lt, max } from 'drizzle-orm';
import { type ReadFrom, reader, type Tx } from '@/db/client';
import { auditLog, sitOutlooks, sits } from '@/db/schema';
import type { ClubScope } from '@/server/scope';

export type OutlookRow = typeof sitOutlooks.$inferSelect;

export async function listOutlooks(scope: ClubScope, from: ReadFrom = reader()): Promise<Map<string, OutlookRow>> {
  const rows = await from.select().from(sitOutlooks).where(eq(sitOutlooks.clubId, scope.club.id));
  return new Map(rows.map((row) => [row.sitId, row]));
}

export async function findOutlook(scope: ClubScope, sitId: string, from: ReadFrom = reader()) {
  const [row] = await from
    .select()
    .from(sitOutlooks)
    .where(and(eq(sitOutlooks.clubId, scope.club.id), eq(sitOutlooks.sitId, sitId)));
  return row ?? null;
}

export async function putOutlook(tx: Tx, row: OutlookRow): Promise<void> {
  await tx.insert(sitOutlooks).values(row).onConflictDoUpdate({ target: sitOutlooks.sitId, set: row });
}

/** Outlooks nobody has looked at since an instant: their sits are over. */
export async function deleteOldOutlooks(tx: Tx, before: number): Promise<void> {
  await tx.delete(sitOutlooks).where(lt(sitOutlooks.updatedAt, before));
}

/** The last day before `today` on which each stand was booked and not given up. */
export async function lastSitDays(scope: ClubScope, today: string, from: ReadFrom = reader()) {
  const rows = await from
    .select({ standId: sits.standId, day: max(sits.day) })
    .from(sits)
    .where(and(eq(sits.clubId, scope.club.id), eq(sits.status, 'booked'), lt(sits.day, today)))
    .groupBy(sits.standId)
    .orderBy(asc(sits.standId));
  return new Map(rows.flatMap(({ standId, day }) => (day === null ? [] : [[standId, day] as const])));
}

/** Changes of the rules since an instant, the latest first. */
export function listRuleChanges(scope: ClubScope, since: number, from: ReadFrom = reader()) {
  return from
    .select()
    .from(auditLog)
    .where(and(eq(auditLog.clubId, scope.club.id), eq(auditLog.action, 'club.rules_changed'), gte(auditLog.at, since)))
    .orderBy(desc(auditLog.at))
    .limit(20);
}
