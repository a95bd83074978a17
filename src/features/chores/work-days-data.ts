import { and, asc, desc, eq, gte, isNull, lt } from 'drizzle-orm';
import { type ReadFrom, reader, type Tx } from '@/db/client';
import { memberships, users, workDayMembers, workDays } from '@/db/schema';
import type { ClubScope } from '@/server/scope';

export type WorkDayRow = typeof workDays.$inferSelect;

const ofClub = (scope: ClubScope) => eq(workDays.clubId, scope.club.id);

/** From a day on, the next first. */
export function listWorkDays(scope: ClubScope, fromDay: string, from: ReadFrom = reader()): Promise<WorkDayRow[]> {
  return from
    .select()
    .from(workDays)
    .where(and(ofClub(scope), isNull(workDays.cancelledAt), gte(workDays.day, fromDay)))
    .orderBy(asc(workDays.startAt));
}

export function listPastWorkDays(scope: ClubScope, before: string, most: number, from: ReadFrom = reader()) {
  return from
    .select()
    .from(workDays)
    .where(and(ofClub(scope), isNull(workDays.cancelledAt), lt(workDays.day, before)))
    .orderBy(desc(workDays.startAt))
    .limit(most);
}

/** Since a day, cancelled ones too: what a calendar has to know of. */
export function listWorkDaysSince(scope: ClubScope, fromDay: string, from: ReadFrom = reader()): Promise<WorkDayRow[]> {
  return from
    .select()
    .from(workDays)
    .where(and(ofClub(scope), gte(workDays.day, fromDay)))
    .orderBy(asc(workDays.startAt), asc(workDays.id));
}

export async function findWorkDay(scope: ClubScope, id: string, from: ReadFrom = reader()): Promise<WorkDayRow | null> {
  const [row] = await from
    .select()
    .from(workDays)
    .where(and(ofClub(scope), eq(workDays.id, id)));
  return row ?? null;
}

/** Who said they come to the club's work days, with the hours credited. */
export function listComing(scope: ClubScope, from: ReadFrom = reader()) {
  return from
    .select({
      workDayId: workDayMembers.workDayId,
      memberId: workDayMembers.memberId,
      hours: workDayMembers.hours,
      name: users.name,
    })
    .from(workDayMembers)
    .innerJoin(memberships, eq(memberships.id, workDayMembers.memberId))
    .innerJoin(users, eq(users.id, memberships.userId))
    .where(eq(workDayMembers.clubId, scope.club.id))
    .orderBy(asc(users.name));
}

export async function insertWorkDay(tx: Tx, row: typeof workDays.$inferInsert): Promise<void> {
  await tx.insert(workDays).values(row);
}

export async function updateWorkDay(scope: ClubScope, tx: Tx, id: string, set: Partial<WorkDayRow>): Promise<void> {
  await tx
    .update(workDays)
    .set(set)
    .where(and(ofClub(scope), eq(workDays.id, id)));
}

export async function putComing(tx: Tx, row: typeof workDayMembers.$inferInsert): Promise<void> {
  await tx
    .insert(workDayMembers)
    .values(row)
    .onConflictDoUpdate({
      target: [workDayMembers.workDayId, workDayMembers.memberId],
      set: { hours: row.hours ?? null, at: row.at },
    });
}

export async function deleteComing(scope: ClubScope, tx: Tx, workDayId: string, memberId: string): Promise<void> {
  await tx
    .delete(workDayMembers)
    .where(
      and(
        eq(workDayMembers.clubId, scope.club.id),
        eq(workDayMembers.workDayId, workDayId),
        eq(workDayMembers.memberId, memberId),
      ),
    );
}
