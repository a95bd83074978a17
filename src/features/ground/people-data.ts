import { and, asc, desc, eq, gt, gte, isNull, lte, sql } from 'drizzle-orm';
import { can, type Role } from '@/core/permissions';
import { type ReadFrom, reader } from '@/db/client';
import { auditLog, memberships, sits, stands, users } from '@/db/schema';
import type { ClubScope } from '@/server/scope';

export interface BookedSit {
  id: string;
  standId: string;
  standName: string;
  memberName: string;
  day: string;
  approachId: string | null;
  windows: 'morning' | 'evening' | 'all_day';
}

/** Sits that stand and have not ended, at one stand or all, within days where those are given. */
export function listBookedSits(
  scope: ClubScope,
  want: { standId: string | null; fromDay?: string; toDay?: string | null; now: number },
  from: ReadFrom = reader(),
): Promise<BookedSit[]> {
  return from
    .select({
      id: sits.id,
      standId: sits.standId,
      standName: stands.name,
      memberName: users.name,
      day: sits.day,
      approachId: sits.approachId,
      windows: sits.windows,
    })
    .from(sits)
    .innerJoin(stands, eq(stands.id, sits.standId))
    .innerJoin(memberships, eq(memberships.id, sits.memberId))
    .innerJoin(users, eq(users.id, memberships.userId))
    .where(
      and(
        eq(sits.clubId, scope.club.id),
        eq(sits.status, 'booked'),
        gt(sits.endAt, want.now),
        want.standId === null ? undefined : eq(sits.standId, want.standId),
        want.fromDay ? gte(sits.day, want.fromDay) : undefined,
        want.toDay ? lte(sits.day, want.toDay) : undefined,
      ),
    )
    .orderBy(asc(sits.day), asc(sits.startAt));
}

export interface Hunter {
  /** Membership id. */
  id: string;
  name: string;
  role: Role;
}

/** Everyone who may hold a sit. */
export async function listHunters(scope: ClubScope, from: ReadFrom = reader()): Promise<Hunter[]> {
  const rows = await from
    .select({ id: memberships.id, name: users.name, role: memberships.role })
    .from(memberships)
    .innerJoin(users, eq(users.id, memberships.userId))
    .where(and(eq(memberships.clubId, scope.club.id), isNull(memberships.removedAt)))
    .orderBy(asc(users.name));
  return rows.filter((row) => can(row.role, 'sits.book'));
}

/** Who last changed a thing; null where no change is on record. */
export async function lastChangedBy(scope: ClubScope, id: string, from: ReadFrom = reader()): Promise<string | null> {
  const [row] = await from
    .select({ name: auditLog.actorName })
    .from(auditLog)
    .where(and(eq(auditLog.clubId, scope.club.id), eq(auditLog.subjectId, id)))
    .orderBy(desc(auditLog.at), sql`${auditLog}.rowid desc`)
    .limit(1);
  return row?.name ?? null;
}
