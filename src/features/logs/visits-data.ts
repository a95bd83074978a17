import { and, desc, eq, gte, isNull } from 'drizzle-orm';
import { type ReadFrom, reader, type Tx } from '@/db/client';
import { memberships, stands, users, visits } from '@/db/schema';
import type { ClubScope } from '@/server/scope';

export type VisitRow = typeof visits.$inferSelect;

function selectVisits(from: ReadFrom) {
  return from
    .select({ visit: visits, standName: stands.name, memberName: users.name })
    .from(visits)
    .leftJoin(stands, eq(stands.id, visits.standId))
    .leftJoin(memberships, eq(memberships.id, visits.memberId))
    .leftJoin(users, eq(users.id, memberships.userId));
}

/** Visits since an instant, the latest first. */
export function listVisits(scope: ClubScope, since: number, from: ReadFrom = reader()) {
  return selectVisits(from)
    .where(and(eq(visits.clubId, scope.club.id), isNull(visits.removedAt), gte(visits.at, since)))
    .orderBy(desc(visits.at), desc(visits.id))
    .limit(200);
}

export async function findVisit(scope: ClubScope, id: string, from: ReadFrom = reader()): Promise<VisitRow | null> {
  const [row] = await from
    .select()
    .from(visits)
    .where(and(eq(visits.clubId, scope.club.id), eq(visits.id, id), isNull(visits.removedAt)));
  return row ?? null;
}

/** The same visit written before: a form sent twice. */
export async function findSameVisit(
  scope: ClubScope,
  visit: Pick<VisitRow, 'kind' | 'at' | 'lat' | 'lon' | 'memberId'>,
  from: ReadFrom,
): Promise<VisitRow | null> {
  const [row] = await from
    .select()
    .from(visits)
    .where(
      and(
        eq(visits.clubId, scope.club.id),
        eq(visits.kind, visit.kind),
        eq(visits.at, visit.at),
        eq(visits.lat, visit.lat),
        eq(visits.lon, visit.lon),
        eq(visits.memberId, visit.memberId),
        isNull(visits.removedAt),
      ),
    );
  return row ?? null;
}

export async function insertVisit(tx: Tx, row: typeof visits.$inferInsert): Promise<void> {
  await tx.insert(visits).values(row);
}

export async function markVisitRemoved(scope: ClubScope, tx: Tx, id: string, now: number): Promise<void> {
  await tx
    .update(visits)
    .set({ removedAt: now })
    .where(and(eq(visits.clubId, scope.club.id), eq(visits.id, id)));
}
