import { write } from '@/db/client';
import { finishSlot, leaseSlot, slotIsTaken } from '@/db/queries/job-runs';
import { log } from '@/server/log';
import type { Job } from './job';

/** No run takes longer; of a process that was ended, another takes over after it. */
const LEASE_MS = 5 * 60_000;

export interface JobOutcome {
  id: string;
  result: string | null;
  error: string | null;
}

/**
 * Runs a job if its slot is due and neither done nor held by another process; null when it was not its turn. The slot's
 * id comes from the job and the clock, so any number of processes agree on it.
 */
export async function runDueJob(job: Job, now: number): Promise<JobOutcome | null> {
  const slotAt = Math.floor(now / job.everyMs) * job.everyMs;
  const id = `${job.name}@${slotAt}`;
  if (await slotIsTaken(id, now)) return null;
  const lease = await write((tx) => leaseSlot(tx, { id, name: job.name, slotAt }, now, now + LEASE_MS));
  if (!lease) return null;
  try {
    const result = await job.run(now);
    await write((tx) => finishSlot(tx, lease, { finishedAt: now, leaseUntil: null, error: null, result }));
    return { id, result, error: null };
  } catch (error) {
    log.error({ job: id, err: error }, 'job failed');
    const message = error instanceof Error ? error.message : String(error);
    await write((tx) => finishSlot(tx, lease, { finishedAt: now, leaseUntil: null, error: message }));
    return { id, result: null, error: message };
  }
}

/** Runs every one of the jobs that is due, one after the other; what ran, with its result. One that cannot run stops no other. */
export async function runDueJobs(now: number, jobs: readonly Job[]): Promise<JobOutcome[]> {
  const outcomes: JobOutcome[] = [];
  for (const job of jobs) {
    try {
      const outcome = await runDueJob(job, now);
      if (outcome) outcomes.push(outcome);
    } catch (error) {
      log.error({ job: job.name, err: error }, 'a job could not be started or its end not be kept');
      outcomes.push({ id: job.name, result: null, error: error instanceof Error ? error.message : String(error) });
    }
  }
  return outcomes;
}
