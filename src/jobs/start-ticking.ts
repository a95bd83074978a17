import { log } from '@/server/log';
import { runDueJobs } from './run-due-jobs';

const TICK_MS = 2_000;
const holder = globalThis as { windrestJobs?: NodeJS.Timeout };

/** Looks for due jobs every two seconds in this process. Calling it twice starts one clock. */
export function startTicking(): void {
  if (holder.windrestJobs) return;
  let busy = false;
  holder.windrestJobs = setInterval(async () => {
    if (busy) return;
    busy = true;
    try {
      await runDueJobs(Date.now());
    } catch (error) {
      log.error({ err: error }, 'jobs could not run');
    } finally {
      busy = false;
    }
  }, TICK_MS);
  holder.windrestJobs.unref();
}
