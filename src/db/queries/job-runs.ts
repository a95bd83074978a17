import { and, asc, desc, eq, isNotNull, sql } from 'drizzle-orm';
import { reader, type Tx } from '../client';
import { jobRuns } from '../schema';

export type JobRunRow = typeof jobRuns.$inferSelect;

const taken = (row: JobRunRow | undefined, now: number) =>
  row !== undefined && (row.finishedAt !== null || (row.leaseUntil ?? 0) > now);

/** A look without a write, for the many ticks that find nothing to do. */
export async function slotIsTaken(id: string, now: number): Promise<boolean> {
  const [row] = await reader().select().from(jobRuns).where(eq(jobRuns.id, id));
  return taken(row, now);
}

/** Takes a slot for this process: null when it is done, or held by a process whose lease still runs. */
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
      set: { leaseUntil, startedAt: now, attempts: sql`${jobRuns.attempts} + 1` },
    })
    .returning();
  return row ?? null;
}

export async function finishSlot(tx: Tx, id: string, set: Partial<JobRunRow>): Promise<void> {
  await tx.update(jobRuns).set(set).where(eq(jobRuns.id, id));
}

export async function deleteOldRuns(tx: Tx, before: number): Promise<void> {
  await tx.delete(jobRuns).where(sql`${jobRuns.slotAt} < ${before} and ${jobRuns.finishedAt} is not null`);
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
