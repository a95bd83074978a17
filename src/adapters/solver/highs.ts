import { Worker } from 'node:worker_threads';
import { z } from 'zod';
import type { ZeroOneProgram } from '@/core/draw/build-program';
import type { SolveAnswer, SolveOptions, Solver } from './port';
import { WORKER_CODE } from './worker-code';

/** Model states of HiGHS (its modelStatus constants). */
const OPTIMAL = 7;
const TIME_LIMIT = 13;

/** Beyond its own time limit a worker gets this long to load and to answer before it is stopped. */
const GRACE_MS = 15_000;

const messageSchema = z.object({
  status: z.number(),
  /** null: none was found. */
  columns: z.array(z.number()).nullable(),
  value: z.number().nullable(),
  bound: z.number().nullable(),
});
type Message = z.output<typeof messageSchema>;

function modelOf({ gain, rows }: ZeroOneProgram) {
  const starts = [0];
  for (const row of rows) starts.push((starts.at(-1) ?? 0) + row.columns.length);
  return {
    numCols: gain.length,
    numRows: rows.length,
    sense: -1,
    colCost: gain,
    colLower: gain.map(() => 0),
    colUpper: gain.map(() => 1),
    integrality: gain.map(() => 1),
    rowLower: rows.map(() => Number.NEGATIVE_INFINITY),
    rowUpper: rows.map((row) => row.most),
    matrix: {
      format: 'csr',
      numRows: rows.length,
      numCols: gain.length,
      starts,
      indices: rows.flatMap((row) => row.columns),
      values: rows.flatMap((row) => row.values),
    },
  };
}

function runWorker(program: ZeroOneProgram, { seconds, gap, seed }: SolveOptions): Promise<Message | null> {
  const options = {
    time_limit: seconds,
    mip_rel_gap: gap,
    mip_abs_gap: 0,
    random_seed: seed % 2147483647,
    output_flag: false,
  };
  return new Promise((resolve, reject) => {
    const worker = new Worker(WORKER_CODE, { eval: true, workerData: { model: modelOf(program), options } });
    const timer = setTimeout(() => settle(() => resolve(null)), seconds * 1000 + GRACE_MS);
    const settle = (done: () => void) => {
      clearTimeout(timer);
      worker.terminate();
      done();
    };
    worker.once('message', (message) => {
      const read = messageSchema.safeParse(message);
      settle(() => (read.success ? resolve(read.data) : reject(read.error)));
    });
    worker.once('error', (error) => settle(() => reject(error)));
    worker.once('exit', () => settle(() => resolve(null)));
  });
}

/** HiGHS in a worker thread, one for each answer. */
export const highsSolver: Solver = {
  async solve(program, options): Promise<SolveAnswer> {
    if (program.gain.length === 0) {
      return { kind: 'found', columns: [], value: 0, bound: 0, gap: 0, timeUp: false };
    }
    const answer = await runWorker(program, options);
    if (!answer) return { kind: 'no_answer_in_time' };
    const { status, value } = answer;
    const timeUp = status === TIME_LIMIT;
    if (answer.columns === null || value === null) {
      return timeUp ? { kind: 'no_answer_in_time' } : { kind: 'impossible', status };
    }
    if (status !== OPTIMAL && !timeUp) return { kind: 'impossible', status };
    const all = program.gain.reduce((sum, gain) => sum + Math.max(0, gain), 0);
    const bound = Math.max(answer.bound ?? all, value);
    const left = value > 0 ? (bound - value) / value : 0;
    const columns = answer.columns.map((share) => Math.round(share));
    return { kind: 'found', columns, value, bound, gap: left < 1e-9 ? 0 : left, timeUp };
  },
};
