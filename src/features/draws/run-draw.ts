import { chooseSolver } from '@/adapters/solver/choose';
import type { SolveProgress } from '@/adapters/solver/port';
import { dayOf, formatDay } from '@/core/day-time';
import { faultOf, type Given, placesOf } from '@/core/draw/allotment';
import { buildProgram, readGiven } from '@/core/draw/build-program';
import { solveOptions } from '@/core/draw/solve-options';
import { write } from '@/db/client';
import type { DrawResult } from '@/db/schema';
import { clockText } from '@/features/bookings/words/sits';
import { newId } from '@/lib/ids';
import { now as clock } from '@/server/clock';
import { AppError } from '@/server/errors';
import { log } from '@/server/log';
import type { ClubScope } from '@/server/scope';
import { type DrawRow, updateDraw, updateEntry } from './draws-data';
import { type LoadedDraw, loadDraw } from './load-draw';
import { drawName, needDraw, noteDraw } from './note-draw';
import { replaceResults } from './results-data';
import { isAtWork, LEASE_MS, liveRun } from './runs';
import { findLastRun, insertRun, updateLiveRun } from './runs-data';
import { tellResults } from './tell-results';
import { DRAW_AUDIT, DRAW_ERRORS } from './words/errors';

const BEAT_MS = 1_000;
const MAY_BE_MADE = ['open', 'drawn'] as const;

export interface StartedRun {
  runId: string;
  /** Whether this call began it; else it was at work already. */
  began: boolean;
}

/** Notes that the draw is being made; while one run is at work a second call gets that one. */
export async function beginRun(scope: ClubScope, drawId: string, now: number): Promise<StartedRun> {
  return write(async (tx) => {
    const draw = await needDraw(scope, drawId, MAY_BE_MADE, tx);
    if (now < draw.closesAt) {
      const day = formatDay(dayOf(draw.closesAt, scope.club.zone));
      throw new AppError('conflict', DRAW_ERRORS.stillOpen(clockText(draw.closesAt, scope.club), day));
    }
    const last = await findLastRun(scope, drawId, tx);
    if (last && isAtWork(last, now)) return { runId: last.id, began: false };
    if (last) await updateLiveRun(scope, tx, last.id, { endedAt: now, outcome: 'lost' });
    const runId = newId('drawRun');
    const row = { drawId, clubId: scope.club.id, startedBy: scope.member.id, startedAt: now };
    await insertRun(tx, { id: runId, ...row, leaseUntil: now + LEASE_MS });
    return { runId, began: true };
  });
}

/** Stops the run at work; the draw stays as it was. Its process hears of it at its next beat. */
export async function stopRun(scope: ClubScope, drawId: string, now: number): Promise<{ id: string }> {
  return write(async (tx) => {
    const run = await liveRun(scope, drawId, now, tx);
    if (!run) throw new AppError('conflict', DRAW_ERRORS.notAtWork);
    await updateLiveRun(scope, tx, run.id, { endedAt: now, outcome: 'stopped' });
    return { id: drawId };
  });
}

/** Begins to make the draw and answers at once; the work goes on in this process, its state stands in its run. */
export async function startDraw(scope: ClubScope, drawId: string, now: number): Promise<StartedRun> {
  const started = await beginRun(scope, drawId, now);
  if (started.began) {
    void workOn(scope, drawId, started.runId, now).catch((err: unknown) => log.error({ err, drawId }, 'draw run'));
  }
  return started;
}

/** Makes the draw and waits for it. Throws what stood against it. */
export async function runDraw(scope: ClubScope, drawId: string, now: number): Promise<{ id: string }> {
  const { runId, began } = await beginRun(scope, drawId, now);
  if (!began) throw new AppError('conflict', DRAW_ERRORS.atWork);
  const refusal = await workOn(scope, drawId, runId, now);
  if (refusal) throw refusal;
  return { id: drawId };
}

/** Does the work of a run to its end, whatever that is; gives the refusal it ended with. */
export async function workOn(scope: ClubScope, drawId: string, runId: string, now: number): Promise<AppError | null> {
  const stop = new AbortController();
  let progress: SolveProgress | null = null;
  const beat = setInterval(() => void tell().catch((err: unknown) => log.error({ err, runId }, 'draw beat')), BEAT_MS);
  async function tell() {
    const whole = (worth: number | null | undefined) => (worth == null ? null : Math.round(worth));
    const set = { leaseUntil: clock() + LEASE_MS, value: whole(progress?.value), bound: whole(progress?.bound) };
    if (!(await write((tx) => updateLiveRun(scope, tx, runId, set)))) stop.abort();
  }
  try {
    const draw = await needDraw(scope, drawId, MAY_BE_MADE);
    const loaded = await loadDraw(scope, draw, now);
    const onProgress = (heard: SolveProgress) => {
      progress = heard;
    };
    const solved = await solveDraw(loaded, draw.seed, { signal: stop.signal, onProgress });
    if (solved) await keepResults(scope, { draw, runId, loaded, ...solved }, now);
    return null;
  } catch (error) {
    const known = error instanceof AppError;
    if (!known) log.error({ err: error, drawId }, 'the draw could not be made');
    const refusal = known ? error : new AppError('internal', DRAW_ERRORS.failed);
    const end = { endedAt: clock(), outcome: 'failed' as const, message: refusal.message };
    await write((tx) => updateLiveRun(scope, tx, runId, end));
    return refusal;
  } finally {
    clearInterval(beat);
  }
}

/** null: it was stopped. */
async function solveDraw(
  { allotment }: LoadedDraw,
  seed: string,
  hooks: { signal: AbortSignal; onProgress: (progress: SolveProgress) => void },
): Promise<{ given: Given; result: DrawResult } | null> {
  const built = buildProgram(allotment);
  const answer = await chooseSolver().solve(built.program, solveOptions(seed), hooks);
  if (answer.kind === 'stopped') return null;
  if (answer.kind !== 'found') throw new AppError('unavailable', DRAW_ERRORS.noAnswer);
  const given = readGiven(allotment, built, answer.columns);
  const fault = faultOf(allotment, given);
  if (fault) throw new AppError('internal', DRAW_ERRORS.failed, { log: `the solver broke a rule: ${fault}` });
  const { value, bound, gap, cutBy } = answer;
  return { given, result: { value, bound, gap, cutBy } };
}

/** Keeps the outcome if the run still stands: one that was stopped, or left for lost, changes nothing. */
async function keepResults(
  scope: ClubScope,
  made: { draw: DrawRow; runId: string; loaded: LoadedDraw; given: Given; result: DrawResult },
  now: number,
): Promise<void> {
  const { draw, runId, loaded, given, result } = made;
  const { members, stands, slots } = loaded;
  const told = tellResults({ ...loaded, given });
  await write(async (tx) => {
    await needDraw(scope, draw.id, MAY_BE_MADE, tx);
    if (!(await updateLiveRun(scope, tx, runId, { endedAt: clock(), outcome: 'made' }))) return;
    for (const { entry, points, turn } of members) await updateEntry(scope, tx, entry, { points, turn });
    const rows = members.flatMap(({ entry }, member) =>
      entry.slots.map((slot) => {
        const place = given[member]?.[slot] ?? null;
        const standId = place === null ? null : (stands[place % stands.length]?.id ?? null);
        const reasons = told[member]?.[slot] ?? [];
        return { drawId: draw.id, clubId: scope.club.id, memberId: entry.memberId, slot, standId, reasons };
      }),
    );
    await replaceResults(scope, tx, draw.id, rows);
    await updateDraw(scope, tx, draw.id, { state: 'drawn', drawnAt: now, result });
    const detail = { seed: draw.seed, slots: slots.length, given: placesOf(given, null).length, ...result };
    const summary = DRAW_AUDIT.made(drawName(draw));
    await noteDraw(scope, tx, { id: draw.id, verb: 'made', summary, detail }, now);
  });
}
