import { asc, eq, inArray } from 'drizzle-orm';
import { type ReadFrom, reader, type Tx } from '@/db/client';
import { memberships, OVERDUE_STEPS, overdueSteps } from '@/db/schema';

export type OverdueStepRow = typeof overdueSteps.$inferSelect;

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

/** The account behind a membership. */
export async function findUserOfMember(memberId: string, from: ReadFrom): Promise<string | null> {
  const [row] = await from.select({ userId: memberships.userId }).from(memberships).where(eq(memberships.id, memberId));
  return row?.userId ?? null;
}
