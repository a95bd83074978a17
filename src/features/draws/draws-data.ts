import { and, asc, desc, eq, isNull } from 'drizzle-orm';
import { type ReadFrom, reader, type Tx } from '@/db/client';
import { drawEntries, draws, memberships, users } from '@/db/schema';
import type { ClubScope } from '@/server/scope';

export type DrawRow = typeof draws.$inferSelect;
export type EntryRow = typeof drawEntries.$inferSelect;

export function listDraws(scope: ClubScope, from: ReadFrom = reader()): Promise<DrawRow[]> {
  return from
    .select()
    .from(draws)
    .where(eq(draws.clubId, scope.club.id))
    .orderBy(desc(draws.day), desc(draws.createdAt));
}

export async function findDraw(scope: ClubScope, id: string, from: ReadFrom = reader()): Promise<DrawRow | null> {
  const [row] = await from
    .select()
    .from(draws)
    .where(and(eq(draws.clubId, scope.club.id), eq(draws.id, id)));
  return row ?? null;
}

export async function insertDraw(tx: Tx, row: typeof draws.$inferInsert): Promise<void> {
  await tx.insert(draws).values(row);
}

export async function updateDraw(scope: ClubScope, tx: Tx, id: string, set: Partial<DrawRow>): Promise<void> {
  await tx
    .update(draws)
    .set(set)
    .where(and(eq(draws.clubId, scope.club.id), eq(draws.id, id)));
}

/** Entries of people still in the club, by name. */
export function listEntries(scope: ClubScope, drawId: string, from: ReadFrom = reader()) {
  return from
    .select({ entry: drawEntries, userId: users.id, name: users.name })
    .from(drawEntries)
    .innerJoin(memberships, eq(memberships.id, drawEntries.memberId))
    .innerJoin(users, eq(users.id, memberships.userId))
    .where(and(eq(drawEntries.clubId, scope.club.id), eq(drawEntries.drawId, drawId), isNull(memberships.removedAt)))
    .orderBy(asc(users.name), asc(drawEntries.memberId));
}

export async function putEntry(tx: Tx, row: typeof drawEntries.$inferInsert): Promise<void> {
  const { drawId: _, clubId: __, memberId: ___, ...wishes } = row;
  await tx
    .insert(drawEntries)
    .values(row)
    .onConflictDoUpdate({ target: [drawEntries.drawId, drawEntries.memberId], set: wishes });
}

const entryOf = (scope: ClubScope, drawId: string, memberId: string) =>
  and(eq(drawEntries.clubId, scope.club.id), eq(drawEntries.drawId, drawId), eq(drawEntries.memberId, memberId));

/** What a member brought to the draw when it was made. */
export async function updateEntry(
  scope: ClubScope,
  tx: Tx,
  at: Pick<EntryRow, 'drawId' | 'memberId'>,
  set: Pick<EntryRow, 'points' | 'turn'>,
): Promise<void> {
  await tx
    .update(drawEntries)
    .set(set)
    .where(entryOf(scope, at.drawId, at.memberId));
}

export async function deleteEntry(scope: ClubScope, tx: Tx, drawId: string, memberId: string): Promise<void> {
  await tx.delete(drawEntries).where(entryOf(scope, drawId, memberId));
}
