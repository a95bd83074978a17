import { and, asc, desc, eq, isNotNull, isNull, lt, sql } from 'drizzle-orm';
import { reader, type Tx } from '../client';
import { jobRuns } from '../schema';

export type JobRunRow = typeof jobRuns.$inferSelect;

/** A slot is tried so often: a job that ends every process must not end them for ever. Our choice. */
const MOST_ATTEMPTS = 3;
/** Wait after a try that failed. */
const RETRY_MS = 60_000;

function taken(row: JobRunRow | undefined, now: number): boolean {
  if (!row) return false;
  if (row.attempts >= MOST_ATTEMPTS && row.finishedAt !== null) return true;
  if (row.finishedAt !== null) return row.error === null || row.finishedAt + RETRY_MS > now;
  return (row.leaseUntil ?? 0) > now || row.attempts > MOST_ATTEMPTS;
}

/** A look without a write, for the many ticks that find nothing to do. */
export async function slotIsTaken(id: string, now: number): Promise<boolean> {
  const [row] = await reader().select().from(jobRuns).where(eq(jobRuns.id, id));
  return taken(row, now);
}

/**
 * Takes a slot for this process: null when it is done, or held by a process whose lease still runs. A process that was
 * ended leaves its lease to run out, and the slot is taken again; so is one whose try failed.
 */
export async function leaseSlot(
  tx: Tx,
  slot: { id: string; name: string; slotAt: number },
  now: number,
  leaseUntil: number,
): Promise<JobRunRow | null> {
  const [seen] = await tx.select().from(jobRuns).where(eq(jobRuns.id, slot.id));
  if (taken(seen, now)) return null;
  const [row] = await tx
    .insert(jobRuns)
    .values({ ...slot, leaseUntil, attempts: 1, startedAt: now })
    .onConflictDoUpdate({
      target: jobRuns.id,
      set: { leaseUntil, startedAt: now, finishedAt: null, attempts: sql`${jobRuns.attempts} + 1` },
    })
    .returning();
  return row ?? null;
}

/** Keeps how a try ended, unless its lease ran out meanwhile and another process has taken the slot. */
export async function finishSlot(
  tx: Tx,
  lease: Pick<JobRunRow, 'id' | 'attempts'>,
  set: Partial<JobRunRow>,
): Promise<void> {
  await tx
    .update(jobRuns)
    .set(set)
    .where(and(eq(jobRuns.id, lease.id), eq(jobRuns.attempts, lease.attempts), isNull(jobRuns.finishedAt)));
}

export async function deleteOldRuns(tx: Tx, before: number): Promise<void> {
  await tx.delete(jobRuns).where(lt(jobRuns.slotAt, before));
}

/** The last runs of one job, or of those that failed. */
export function listLastRuns(name: string, want: { most: number; failed?: boolean }): Promise<JobRunRow[]> {
  return reader()
    .select()
    .from(jobRuns)
    .where(and(eq(jobRuns.name, name), want.failed ? isNotNull(jobRuns.error) : undefined))
    .orderBy(desc(jobRuns.slotAt))
    .limit(want.most);
}

export async function listJobNames(): Promise<string[]> {
  const rows = await reader().selectDistinct({ name: jobRuns.name }).from(jobRuns).orderBy(asc(jobRuns.name));
  return rows.map((row) => row.name);
}
