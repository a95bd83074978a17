import { and, asc, desc, eq, isNotNull, isNull } from 'drizzle-orm';
import { type ReadFrom, reader, type Tx } from '@/db/client';
import { chores, drawEntries, draws, memberships, sits, users, workDayMembers, workDays } from '@/db/schema';
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

/** Entries of people still in the club, by name, with what became of their sits. */
export function listEntries(scope: ClubScope, drawId: string, from: ReadFrom = reader()) {
  return from
    .select({ entry: drawEntries, userId: users.id, name: users.name, sitStatus: sits.status })
    .from(drawEntries)
    .innerJoin(memberships, eq(memberships.id, drawEntries.memberId))
    .innerJoin(users, eq(users.id, memberships.userId))
    .leftJoin(sits, eq(sits.id, drawEntries.sitId))
    .where(and(eq(drawEntries.clubId, scope.club.id), eq(drawEntries.drawId, drawId), isNull(memberships.removedAt)))
    .orderBy(asc(users.name), asc(drawEntries.memberId));
}

export async function putEntry(tx: Tx, row: typeof drawEntries.$inferInsert): Promise<void> {
  const { weapon, choices, anyByScore, at } = row;
  await tx
    .insert(drawEntries)
    .values(row)
    .onConflictDoUpdate({
      target: [drawEntries.drawId, drawEntries.memberId],
      set: { weapon, choices, anyByScore, at },
    });
}

const entryOf = (scope: ClubScope, drawId: string, memberId: string) =>
  and(eq(drawEntries.clubId, scope.club.id), eq(drawEntries.drawId, drawId), eq(drawEntries.memberId, memberId));

export async function updateEntry(
  scope: ClubScope,
  tx: Tx,
  at: Pick<EntryRow, 'drawId' | 'memberId'>,
  set: Partial<EntryRow>,
): Promise<void> {
  await tx
    .update(drawEntries)
    .set(set)
    .where(entryOf(scope, at.drawId, at.memberId));
}

export async function deleteEntry(scope: ClubScope, tx: Tx, drawId: string, memberId: string): Promise<void> {
  await tx.delete(drawEntries).where(entryOf(scope, drawId, memberId));
}

/** What members got of the draws published so far. */
export function listPastResults(scope: ClubScope, from: ReadFrom = reader()) {
  return from
    .select({ memberId: drawEntries.memberId, day: draws.day, standId: drawEntries.standId })
    .from(drawEntries)
    .innerJoin(draws, eq(draws.id, drawEntries.drawId))
    .where(and(eq(drawEntries.clubId, scope.club.id), eq(draws.state, 'published')));
}

/** Hours credited to members on work days and for chores. */
export async function listWorkHours(
  scope: ClubScope,
  from: ReadFrom = reader(),
): Promise<{ memberId: string | null; day: string | null; hours: number | null }[]> {
  const onDays = await from
    .select({ memberId: workDayMembers.memberId, day: workDays.day, hours: workDayMembers.hours })
    .from(workDayMembers)
    .innerJoin(workDays, eq(workDays.id, workDayMembers.workDayId))
    .where(
      and(eq(workDayMembers.clubId, scope.club.id), isNotNull(workDayMembers.hours), isNull(workDays.cancelledAt)),
    );
  const forChores = await from
    .select({ memberId: chores.doneBy, day: chores.doneOn, hours: chores.hours })
    .from(chores)
    .where(and(eq(chores.clubId, scope.club.id), isNotNull(chores.doneOn), isNull(chores.removedAt)));
  return [...onDays, ...forChores];
}
