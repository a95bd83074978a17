import { type JobRunRow, listJobNames, listLastRuns } from '@/db/queries/job-runs';
import type { ClubScope } from '@/server/scope';
import { momentText } from './words/audit-text';

export interface JobRunLine {
  id: string;
  when: string;
  /** unfinished: its process ended, and another takes it up. */
  state: 'done' | 'failed' | 'running' | 'unfinished';
  attempts: number;
  /** What it said when done, or the error. */
  said: string;
}

export interface JobView {
  name: string;
  last: JobRunLine[];
  failed: JobRunLine[];
}

/** Our choice: enough to see whether a failure is a habit. */
const RUNS_A_JOB = 5;

function stateOf(row: JobRunRow, now: number): JobRunLine['state'] {
  if (row.finishedAt !== null) return row.error === null ? 'done' : 'failed';
  return (row.leaseUntil ?? 0) > now ? 'running' : 'unfinished';
}

function lineOf(scope: ClubScope, row: JobRunRow, now: number): JobRunLine {
  return {
    id: row.id,
    when: momentText(row.startedAt, scope.club),
    state: stateOf(row, now),
    attempts: row.attempts,
    said: row.error ?? row.result ?? '',
  };
}

/** The last runs of each job of this installation and the last that failed, the newest first. */
export async function readJobs(scope: ClubScope, now: number): Promise<JobView[]> {
  const views: JobView[] = [];
  for (const name of await listJobNames()) {
    const last = await listLastRuns(name, { most: RUNS_A_JOB });
    const failed = await listLastRuns(name, { most: RUNS_A_JOB, failed: true });
    const lines = (rows: JobRunRow[]) => rows.map((row) => lineOf(scope, row, now));
    views.push({ name, last: lines(last), failed: lines(failed) });
  }
  return views;
}
