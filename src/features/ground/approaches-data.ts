import { and, asc, eq, isNull, sql } from 'drizzle-orm';
import { type ReadFrom, reader, type Tx } from '@/db/client';
import { approaches } from '@/db/schema';
import type { ClubScope } from '@/server/scope';

export type ApproachRow = typeof approaches.$inferSelect;
export type ApproachValues = Omit<ApproachRow, 'id' | 'clubId' | 'standId' | 'version' | 'removedAt'>;

const kept = (scope: ClubScope) => and(eq(approaches.clubId, scope.club.id), isNull(approaches.removedAt));
const byName = [asc(sql`lower(${approaches.name})`), asc(approaches.id)];

export function listApproaches(scope: ClubScope, from: ReadFrom = reader()): Promise<ApproachRow[]> {
  return from
    .select()
    .from(approaches)
    .where(kept(scope))
    .orderBy(...byName);
}

export function listApproachesOf(scope: ClubScope, standId: string, from: ReadFrom = reader()): Promise<ApproachRow[]> {
  return from
    .select()
    .from(approaches)
    .where(and(kept(scope), eq(approaches.standId, standId)))
    .orderBy(...byName);
}

export async function getApproach(
  scope: ClubScope,
  id: string,
  from: ReadFrom = reader(),
): Promise<ApproachRow | null> {
  const [row] = await from
    .select()
    .from(approaches)
    .where(and(kept(scope), eq(approaches.id, id)));
  return row ?? null;
}

export async function insertApproach(
  scope: ClubScope,
  tx: Tx,
  row: ApproachValues & { id: string; standId: string },
): Promise<void> {
  await tx.insert(approaches).values({ ...row, clubId: scope.club.id });
}

/** Saves over the version that was read; null when another save came between. */
export async function updateApproach(
  scope: ClubScope,
  tx: Tx,
  at: { id: string; version: number },
  set: Partial<ApproachValues & { standId: string; removedAt: number }>,
): Promise<ApproachRow | null> {
  const [row] = await tx
    .update(approaches)
    .set({ ...set, version: at.version + 1 })
    .where(and(kept(scope), eq(approaches.id, at.id), eq(approaches.version, at.version)))
    .returning();
  return row ?? null;
}

/** A stand that goes takes its approaches with it. */
export async function removeApproachesOf(scope: ClubScope, tx: Tx, standId: string, now: number): Promise<void> {
  await tx
    .update(approaches)
    .set({ removedAt: now })
    .where(and(kept(scope), eq(approaches.standId, standId)));
}
