import { and, desc, eq, gte, sql } from 'drizzle-orm';
import { type ReadFrom, reader, type Tx } from '@/db/client';
import { closures, inspections, memberships, sits, users } from '@/db/schema';
import type { ClubScope } from '@/server/scope';

export type InspectionRow = typeof inspections.$inferSelect;
export type InspectionDetail = InspectionRow & {
  byName: string;
  closureOpen: boolean;
  /** The closure was made by this inspection and still holds; one that stood before is not its own. */
  closedByIt: boolean;
};

const select = (from: ReadFrom) =>
  from
    .select({
      inspection: inspections,
      byName: users.name,
      closureId: closures.id,
      removedAt: closures.removedAt,
      toDay: closures.toDay,
      closedAt: closures.createdAt,
    })
    .from(inspections)
    .innerJoin(memberships, eq(memberships.id, inspections.byMemberId))
    .innerJoin(users, eq(users.id, memberships.userId))
    .leftJoin(closures, eq(closures.id, inspections.closureId));

function flat(row: Awaited<ReturnType<typeof select>>[number]): InspectionDetail {
  const { inspection, byName } = row;
  const closureOpen = row.closureId !== null && row.removedAt === null && row.toDay === null;
  const closedByIt = closureOpen && row.closedAt === inspection.createdAt;
  return { ...inspection, byName, closureOpen, closedByIt };
}

const latestFirst = [desc(inspections.day), desc(inspections.createdAt), sql`${inspections}.rowid desc`];

export async function listInspectionsOf(scope: ClubScope, standId: string, from: ReadFrom = reader()) {
  const rows = await select(from)
    .where(and(eq(inspections.clubId, scope.club.id), eq(inspections.standId, standId)))
    .orderBy(...latestFirst)
    .limit(50);
  return rows.map(flat);
}

/** The latest of each stand. */
export async function lastInspections(
  scope: ClubScope,
  from: ReadFrom = reader(),
): Promise<Map<string, InspectionDetail>> {
  const rows = await select(from)
    .where(eq(inspections.clubId, scope.club.id))
    .orderBy(...latestFirst);
  const last = new Map<string, InspectionDetail>();
  for (const row of rows.map(flat)) if (!last.has(row.standId)) last.set(row.standId, row);
  return last;
}

export async function insertInspection(tx: Tx, row: typeof inspections.$inferInsert): Promise<void> {
  await tx.insert(inspections).values(row);
}

/** Whose booked sits at a stand are still to come, with their addresses. */
export function listBookedAt(scope: ClubScope, standId: string, from: { day: string; now: number }, tx: ReadFrom) {
  return tx
    .select({
      id: sits.id,
      day: sits.day,
      windows: sits.windows,
      memberName: users.name,
      memberEmail: users.email,
    })
    .from(sits)
    .innerJoin(memberships, eq(memberships.id, sits.memberId))
    .innerJoin(users, eq(users.id, memberships.userId))
    .where(
      and(
        eq(sits.clubId, scope.club.id),
        eq(sits.standId, standId),
        eq(sits.status, 'booked'),
        gte(sits.day, from.day),
        gte(sits.endAt, from.now),
      ),
    );
}
