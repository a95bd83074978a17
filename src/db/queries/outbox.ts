import { and, asc, eq, isNull, lte, or, sql } from 'drizzle-orm';
import { reader, type Tx } from '../client';
import { outbox } from '../schema';

export type OutboxRow = typeof outbox.$inferSelect;

/** True when the row is new: the same dedupe key is kept once. */
export async function insertMail(tx: Tx, row: typeof outbox.$inferInsert): Promise<boolean> {
  const made = await tx
    .insert(outbox)
    .values(row)
    .onConflictDoNothing({ target: outbox.dedupeKey })
    .returning({ id: outbox.id });
  return made.length > 0;
}

/** Takes up to `most` due rows for this process until `leaseUntil`. */
export async function leaseDueMail(tx: Tx, now: number, leaseUntil: number, most: number): Promise<OutboxRow[]> {
  const due = await tx
    .select({ id: outbox.id })
    .from(outbox)
    .where(
      and(
        isNull(outbox.sentAt),
        isNull(outbox.deadAt),
        lte(outbox.nextAttemptAt, now),
        or(isNull(outbox.leaseUntil), lte(outbox.leaseUntil, now)),
      ),
    )
    .orderBy(asc(outbox.nextAttemptAt), asc(outbox.id))
    .limit(most);
  const rows: OutboxRow[] = [];
  for (const { id } of due) {
    const [row] = await tx
      .update(outbox)
      .set({ leaseUntil, attempts: sql`${outbox.attempts} + 1` })
      .where(eq(outbox.id, id))
      .returning();
    if (row) rows.push(row);
  }
  return rows;
}

export async function updateMail(tx: Tx, id: string, set: Partial<typeof outbox.$inferInsert>): Promise<void> {
  await tx.update(outbox).set(set).where(eq(outbox.id, id));
}

export async function countMail(): Promise<{ waiting: number; dead: number }> {
  const [row] = await reader()
    .select({
      waiting: sql<number>`coalesce(sum(${outbox.sentAt} is null and ${outbox.deadAt} is null), 0)`,
      dead: sql<number>`coalesce(sum(${outbox.deadAt} is not null), 0)`,
    })
    .from(outbox);
  return { waiting: Number(row?.waiting ?? 0), dead: Number(row?.dead ?? 0) };
}
