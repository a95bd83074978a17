import { and, asc, eq, gte, isNull, or } from 'drizzle-orm';
import { type ReadFrom, reader, type Tx } from '@/db/client';
import { closures } from '@/db/schema';
import type { ClubScope } from '@/server/scope';

export type ClosureRow = typeof closures.$inferSelect;
/** standId null: the whole ground. toDay null: until opened again. */
export type ClosureValues = Pick<ClosureRow, 'standId' | 'fromDay' | 'toDay' | 'reason'>;

const kept = (scope: ClubScope) => and(eq(closures.clubId, scope.club.id), isNull(closures.removedAt));

export function listClosures(scope: ClubScope, from: ReadFrom = reader()): Promise<ClosureRow[]> {
  return from.select().from(closures).where(kept(scope)).orderBy(asc(closures.fromDay), asc(closures.id));
}

/** Closures that hold on a day or later. */
export function listClosuresFrom(scope: ClubScope, day: string, from: ReadFrom = reader()): Promise<ClosureRow[]> {
  return from
    .select()
    .from(closures)
    .where(and(kept(scope), or(isNull(closures.toDay), gte(closures.toDay, day))))
    .orderBy(asc(closures.fromDay), asc(closures.id));
}

export async function getClosure(scope: ClubScope, id: string, from: ReadFrom = reader()): Promise<ClosureRow | null> {
  const [row] = await from
    .select()
    .from(closures)
    .where(and(kept(scope), eq(closures.id, id)));
  return row ?? null;
}

export async function insertClosure(
  scope: ClubScope,
  tx: Tx,
  row: ClosureValues & { id: string; createdAt: number },
): Promise<void> {
  await tx.insert(closures).values({ ...row, clubId: scope.club.id, byMemberId: scope.member.id });
}

export async function updateClosure(
  scope: ClubScope,
  tx: Tx,
  id: string,
  set: Partial<ClosureValues & { removedAt: number }>,
): Promise<ClosureRow | null> {
  const [row] = await tx
    .update(closures)
    .set(set)
    .where(and(kept(scope), eq(closures.id, id)))
    .returning();
  return row ?? null;
}

/** A stand that goes takes its closures with it. */
export async function removeClosuresOf(scope: ClubScope, tx: Tx, standId: string, now: number): Promise<void> {
  await tx
    .update(closures)
    .set({ removedAt: now })
    .where(and(kept(scope), eq(closures.standId, standId)));
}
