import { and, asc, eq, inArray, isNull } from 'drizzle-orm';
import { PERMISSIONS_BY_ROLE, ROLES } from '@/core/permissions';
import { type ReadFrom, reader, type Tx } from '@/db/client';
import { memberships, OVERDUE_STEPS, overdueSteps, users } from '@/db/schema';
import type { ClubScope } from '@/server/scope';

export type OverdueStepRow = typeof overdueSteps.$inferSelect;

const OFFICER_ROLES = ROLES.filter((role) => PERMISSIONS_BY_ROLE[role].includes('board.sign_for_others'));

/** True when this process is the one that takes the step. */
export async function insertStep(tx: Tx, row: typeof overdueSteps.$inferInsert): Promise<boolean> {
  const made = await tx
    .insert(overdueSteps)
    .values(row)
    .onConflictDoNothing({ target: overdueSteps.id })
    .returning({ id: overdueSteps.id });
  return made.length > 0;
}

/** The steps taken for some outings, for every back-by time they had. */
export async function listSteps(outingIds: string[], from: ReadFrom = reader()): Promise<OverdueStepRow[]> {
  if (outingIds.length === 0) return [];
  const rows = await from
    .select()
    .from(overdueSteps)
    .where(inArray(overdueSteps.outingId, outingIds))
    .orderBy(asc(overdueSteps.at), asc(overdueSteps.id));
  // Steps taken at the same instant: in the order they are meant to come.
  return rows.sort((a, b) => a.at - b.at || OVERDUE_STEPS.indexOf(a.step) - OVERDUE_STEPS.indexOf(b.step));
}

/** Who signs for others in the club, by name. */
export async function listOfficers(scope: ClubScope, from: ReadFrom = reader()) {
  return from
    .select({ memberId: memberships.id, name: users.name, email: users.email })
    .from(memberships)
    .innerJoin(users, eq(users.id, memberships.userId))
    .where(
      and(
        eq(memberships.clubId, scope.club.id),
        isNull(memberships.removedAt),
        inArray(memberships.role, OFFICER_ROLES),
      ),
    )
    .orderBy(asc(users.name), asc(memberships.id));
}

/** The account behind a membership. */
export async function findUserOfMember(memberId: string, from: ReadFrom): Promise<string | null> {
  const [row] = await from.select({ userId: memberships.userId }).from(memberships).where(eq(memberships.id, memberId));
  return row?.userId ?? null;
}
