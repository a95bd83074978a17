import { and, asc, desc, eq, gte, isNotNull, isNull, lte, sql } from 'drizzle-orm';
import { alias } from 'drizzle-orm/sqlite-core';
import { type ReadFrom, reader, type Tx } from '@/db/client';
import { chores, memberships, users, workDayMembers, workDays } from '@/db/schema';
import type { ClubScope } from '@/server/scope';

export type ChoreRow = typeof chores.$inferSelect;

const assigned = alias(memberships, 'assigned');
const assignee = alias(users, 'assignee');
const did = alias(memberships, 'did');
const doer = alias(users, 'doer');

function selectChores(from: ReadFrom) {
  return from
    .select({ chore: chores, assigneeName: assignee.name, assigneeEmail: assignee.email, doerName: doer.name })
    .from(chores)
    .leftJoin(assigned, eq(assigned.id, chores.assigneeId))
    .leftJoin(assignee, eq(assignee.id, assigned.userId))
    .leftJoin(did, eq(did.id, chores.doneBy))
    .leftJoin(doer, eq(doer.id, did.userId));
}

type Joined = Awaited<ReturnType<typeof selectChores>>[number];
export type ChoreDetail = ChoreRow & Omit<Joined, 'chore'>;

const flat = ({ chore, ...names }: Joined): ChoreDetail => ({ ...chore, ...names });
const kept = (scope: ClubScope) => and(eq(chores.clubId, scope.club.id), isNull(chores.removedAt));

/** Still to do, the soonest due first and those without a day last. */
export async function listOpenChores(scope: ClubScope, from: ReadFrom = reader()): Promise<ChoreDetail[]> {
  const rows = await selectChores(from)
    .where(and(kept(scope), isNull(chores.doneOn)))
    .orderBy(sql`${chores.dueOn} is null`, asc(chores.dueOn), asc(chores.createdAt));
  return rows.map(flat);
}

/** Done, the latest first. */
export async function listDoneChores(scope: ClubScope, most: number, from: ReadFrom = reader()) {
  const rows = await selectChores(from)
    .where(and(kept(scope), isNotNull(chores.doneOn)))
    .orderBy(desc(chores.doneOn), desc(chores.createdAt))
    .limit(most);
  return rows.map(flat);
}

export async function findChore(scope: ClubScope, id: string, from: ReadFrom = reader()): Promise<ChoreDetail | null> {
  const [row] = await selectChores(from).where(and(kept(scope), eq(chores.id, id)));
  return row ? flat(row) : null;
}

export async function insertChore(tx: Tx, row: typeof chores.$inferInsert): Promise<void> {
  await tx.insert(chores).values(row);
}

/** Saves over the version that was read; false when another save came between. */
export async function updateChore(
  scope: ClubScope,
  tx: Tx,
  at: { id: string; version: number },
  set: Partial<typeof chores.$inferInsert>,
): Promise<boolean> {
  const rows = await tx
    .update(chores)
    .set({ ...set, version: at.version + 1 })
    .where(and(kept(scope), eq(chores.id, at.id), eq(chores.version, at.version)))
    .returning({ id: chores.id });
  return rows.length > 0;
}

/** Hours credited to each member for chores and work days between two days, both inside. */
export async function sumHours(
  scope: ClubScope,
  days: { fromDay: string; toDay: string },
  from: ReadFrom = reader(),
): Promise<Map<string, number>> {
  const ofChores = await from
    .select({ memberId: chores.doneBy, hours: sql<number>`sum(${chores.hours})` })
    .from(chores)
    .where(and(kept(scope), gte(chores.doneOn, days.fromDay), lte(chores.doneOn, days.toDay)))
    .groupBy(chores.doneBy);
  const ofDays = await from
    .select({ memberId: workDayMembers.memberId, hours: sql<number>`sum(${workDayMembers.hours})` })
    .from(workDayMembers)
    .innerJoin(workDays, eq(workDays.id, workDayMembers.workDayId))
    .where(
      and(
        eq(workDayMembers.clubId, scope.club.id),
        isNull(workDays.cancelledAt),
        gte(workDays.day, days.fromDay),
        lte(workDays.day, days.toDay),
      ),
    )
    .groupBy(workDayMembers.memberId);
  const sums = new Map<string, number>();
  for (const { memberId, hours } of [...ofChores, ...ofDays]) {
    if (memberId !== null) sums.set(memberId, (sums.get(memberId) ?? 0) + Number(hours ?? 0));
  }
  return sums;
}

/** Members who may be given a chore, or who look after the stands. */
export function listPeople(scope: ClubScope, from: ReadFrom = reader()) {
  return from
    .select({ id: memberships.id, name: users.name, email: users.email, role: memberships.role })
    .from(memberships)
    .innerJoin(users, eq(users.id, memberships.userId))
    .where(and(eq(memberships.clubId, scope.club.id), isNull(memberships.removedAt)))
    .orderBy(asc(users.name));
}
