import { log } from '@/server/log';
import type { Job } from './job';
import { JOBS } from './list';
import { runDueJob } from './run-due-jobs';

const TICK_MS = 2_000;
const holder = globalThis as { windrestJobs?: NodeJS.Timeout };

/** Looks every two seconds for due jobs in this process, each by itself: a slow one holds up no other. */
export function startTicking(): void {
  if (holder.windrestJobs) return;
  const busy = new Set<string>();
  const look = async (job: Job) => {
    if (busy.has(job.name)) return;
    busy.add(job.name);
    try {
      await runDueJob(job, Date.now());
    } catch (error) {
      log.error({ job: job.name, err: error }, 'a job could not run');
    } finally {
      busy.delete(job.name);
    }
  };
  holder.windrestJobs = setInterval(() => {
    for (const job of JOBS) void look(job);
  }, TICK_MS);
  holder.windrestJobs.unref();
}
