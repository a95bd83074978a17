import { clockText } from '@/features/bookings/words/sits';
import { now as clock } from '@/server/clock';
import { notFound } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { findDraw } from './draws-data';
import { isAtWork } from './runs';
import { findLastRun } from './runs-data';
import { DRAW_ERRORS } from './words/errors';

/** How far the making of a draw is, as its admin sees it. */
export interface RunView {
  id: string;
  atWork: boolean;
  sinceText: string;
  /** How much better than the best found so far an answer could be, in per cent; null: none is found yet. */
  gapPercent: string | null;
  /** Of a run that ended without a result: what to do. */
  message: string | null;
}

/** The last work on a draw; null: none was begun. */
export async function readRun(scope: ClubScope, drawId: string, now = clock()): Promise<RunView | null> {
  if (!(await findDraw(scope, drawId))) throw notFound();
  const run = await findLastRun(scope, drawId);
  if (!run) return null;
  const { value, bound, startedAt } = run;
  const lost = run.outcome === 'lost' || (run.endedAt === null && !isAtWork(run, now));
  const gap = value === null || bound === null || value <= 0 ? null : Math.max(0, bound - value) / value;
  return {
    id: run.id,
    atWork: isAtWork(run, now),
    sinceText: clockText(startedAt, scope.club),
    gapPercent: gap === null ? null : (gap * 100).toFixed(1),
    message: lost ? DRAW_ERRORS.lost : run.message,
  };
}
