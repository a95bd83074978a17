import { and, asc, eq, isNull, sql } from 'drizzle-orm';
import { type ReadFrom, reader, type Tx } from '@/db/client';
import { stands } from '@/db/schema';
import type { ClubScope } from '@/server/scope';

export type StandRow = typeof stands.$inferSelect;
/** What an officer sets of a stand. */
export type StandValues = Omit<StandRow, 'id' | 'clubId' | 'version' | 'createdAt' | 'removedAt'>;

const kept = (scope: ClubScope) => and(eq(stands.clubId, scope.club.id), isNull(stands.removedAt));

export function listStands(scope: ClubScope, from: ReadFrom = reader()): Promise<StandRow[]> {
  return from
    .select()
    .from(stands)
    .where(kept(scope))
    .orderBy(asc(sql`lower(${stands.name})`), asc(stands.id));
}

export async function getStand(scope: ClubScope, id: string, from: ReadFrom = reader()): Promise<StandRow | null> {
  const [row] = await from
    .select()
    .from(stands)
    .where(and(kept(scope), eq(stands.id, id)));
  return row ?? null;
}

export async function insertStand(scope: ClubScope, tx: Tx, row: StandValues & { id: string; createdAt: number }) {
  await tx.insert(stands).values({ ...row, clubId: scope.club.id });
}

/** Saves over the version that was read; null when another save came between. */
export async function updateStand(
  scope: ClubScope,
  tx: Tx,
  at: { id: string; version: number },
  set: Partial<StandValues & { removedAt: number }>,
): Promise<StandRow | null> {
  const [row] = await tx
    .update(stands)
    .set({ ...set, version: at.version + 1 })
    .where(and(kept(scope), eq(stands.id, at.id), eq(stands.version, at.version)))
    .returning();
  return row ?? null;
}
