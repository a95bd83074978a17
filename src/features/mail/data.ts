import { and, desc, eq, inArray, isNotNull, isNull } from 'drizzle-orm';
import { type ReadFrom, reader, type Tx } from '@/db/client';
import { keptMail, outbox } from '@/db/schema';
import type { ClubScope } from '@/server/scope';

export type KeptMailRow = typeof keptMail.$inferSelect;
type OutboxChange = Partial<typeof outbox.$inferInsert>;

/** Changes a row that this process leased and nobody has sent since. */
export async function settleLeased(tx: Tx, id: string, leaseUntil: number, set: OutboxChange): Promise<void> {
  await tx
    .update(outbox)
    .set(set)
    .where(and(eq(outbox.id, id), eq(outbox.leaseUntil, leaseUntil), isNull(outbox.sentAt)));
}

export async function insertKept(tx: Tx, row: typeof keptMail.$inferInsert): Promise<void> {
  await tx.insert(keptMail).values(row);
}

/** Those of some dedupe keys that were queued before. */
export async function hasMail(keys: string[], from: ReadFrom = reader()): Promise<Set<string>> {
  if (keys.length === 0) return new Set();
  const rows = await from.select({ key: outbox.dedupeKey }).from(outbox).where(inArray(outbox.dedupeKey, keys));
  return new Set(rows.map((row) => row.key));
}

/** Without the words: they may hold secret links. */
export function listDead(scope: ClubScope, from: ReadFrom = reader()) {
  return from
    .select({
      id: outbox.id,
      kind: outbox.kind,
      toEmail: outbox.toEmail,
      toName: outbox.toName,
      subject: outbox.subject,
      attempts: outbox.attempts,
      createdAt: outbox.createdAt,
      deadAt: outbox.deadAt,
      lastError: outbox.lastError,
    })
    .from(outbox)
    .where(and(eq(outbox.clubId, scope.club.id), isNotNull(outbox.deadAt), isNull(outbox.sentAt)))
    .orderBy(desc(outbox.deadAt))
    .limit(200);
}

/** Puts a dead letter back in the line; null when there is none of that id in the club. */
export async function reviveDead(scope: ClubScope, tx: Tx, id: string, now: number) {
  const [row] = await tx
    .update(outbox)
    .set({ deadAt: null, attempts: 0, nextAttemptAt: now, leaseUntil: null })
    .where(and(eq(outbox.id, id), eq(outbox.clubId, scope.club.id), isNotNull(outbox.deadAt), isNull(outbox.sentAt)))
    .returning({ subject: outbox.subject, toName: outbox.toName });
  return row ?? null;
}

export function listKept() {
  return reader()
    .select({ id: keptMail.id, toEmail: keptMail.toEmail, subject: keptMail.subject, at: keptMail.at })
    .from(keptMail)
    .orderBy(desc(keptMail.at), desc(keptMail.id))
    .limit(200);
}

export async function findKept(id: string): Promise<KeptMailRow | null> {
  const [row] = await reader().select().from(keptMail).where(eq(keptMail.id, id));
  return row ?? null;
}
