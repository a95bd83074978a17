import { write } from '@/db/client';
import { finishSlot, leaseSlot, slotIsTaken } from '@/db/queries/job-runs';
import { log } from '@/server/log';
import { JOBS, type Job } from './list';

const LEASE_MS = 5 * 60_000;

export interface JobOutcome {
  id: string;
  result: string | null;
  error: string | null;
}

async function runSlot(job: Job, now: number): Promise<JobOutcome | null> {
  const slotAt = Math.floor(now / job.everyMs) * job.everyMs;
  const id = `${job.name}@${slotAt}`;
  if (await slotIsTaken(id, now)) return null;
  const leased = await write((tx) => leaseSlot(tx, { id, name: job.name, slotAt }, now, now + LEASE_MS));
  if (!leased) return null;
  try {
    const result = await job.run(now);
    await write((tx) => finishSlot(tx, id, { finishedAt: now, leaseUntil: null, error: null, result }));
    return { id, result, error: null };
  } catch (error) {
    log.error({ job: id, err: error }, 'job failed');
    const message = error instanceof Error ? error.message : String(error);
    await write((tx) => finishSlot(tx, id, { finishedAt: now, leaseUntil: null, error: message }));
    return { id, result: null, error: message };
  }
}

/** Runs every job whose slot is due and not yet taken by another process; what ran, with its result. */
export async function runDueJobs(now: number): Promise<JobOutcome[]> {
  const outcomes: JobOutcome[] = [];
  for (const job of JOBS) {
    const outcome = await runSlot(job, now);
    if (outcome) outcomes.push(outcome);
  }
  return outcomes;
}
