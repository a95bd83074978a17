import { and, eq } from 'drizzle-orm';
import { type ReadFrom, reader, type Tx } from '@/db/client';
import { memberships, setupAnswers, users } from '@/db/schema';
import type { ClubScope } from '@/server/scope';

export type SetupAnswerRow = typeof setupAnswers.$inferSelect;

export async function listSetupAnswers(scope: ClubScope, from: ReadFrom = reader()) {
  const rows = await from
    .select({ answer: setupAnswers, byName: users.name, byEmail: users.email })
    .from(setupAnswers)
    .innerJoin(memberships, eq(memberships.id, setupAnswers.byMemberId))
    .innerJoin(users, eq(users.id, memberships.userId))
    .where(eq(setupAnswers.clubId, scope.club.id));
  return new Map(
    rows.map(({ answer, byName, byEmail }) => [answer.findingKey, { ...answer, byName: byName || byEmail }]),
  );
}

/** The latest answer to a finding stands in place of the one before; the audit log keeps both. */
export async function putSetupAnswer(scope: ClubScope, tx: Tx, row: Omit<SetupAnswerRow, 'clubId'>): Promise<void> {
  await tx
    .insert(setupAnswers)
    .values({ ...row, clubId: scope.club.id })
    .onConflictDoUpdate({ target: [setupAnswers.clubId, setupAnswers.findingKey], set: row });
}

export async function deleteSetupAnswer(scope: ClubScope, tx: Tx, findingKey: string): Promise<void> {
  await tx
    .delete(setupAnswers)
    .where(and(eq(setupAnswers.clubId, scope.club.id), eq(setupAnswers.findingKey, findingKey)));
}
