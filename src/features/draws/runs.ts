import type { ReadFrom } from '@/db/client';
import type { ClubScope } from '@/server/scope';
import { findLastRun, type RunRow } from './runs-data';

/** A process at work moves the lease on every second; of one that ended nothing is heard for so long. */
export const LEASE_MS = 15_000;

export const isAtWork = (run: RunRow | null, now: number) =>
  run !== null && run.endedAt === null && run.leaseUntil > now;

/** The run that is at work on a draw now; null: none is, or its process has ended. */
export async function liveRun(scope: ClubScope, drawId: string, now: number, from?: ReadFrom): Promise<RunRow | null> {
  const run = await findLastRun(scope, drawId, from);
  return isAtWork(run, now) ? run : null;
}
