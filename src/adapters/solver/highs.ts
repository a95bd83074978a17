import { Worker } from 'node:worker_threads';
import { z } from 'zod';
import type { Program } from '@/core/draw/build-program';
import type { SolveAnswer, SolveHooks, SolveOptions, SolveProgress, Solver } from './port';
import { WORKER_CODE } from './worker-code';

/** Model states of HiGHS (its modelStatus constants): the last stands for a limit of nodes. */
const OPTIMAL = 7;
const TIME_LIMIT = 13;
const SOLUTION_LIMIT = 16;

/** Beyond its own time limit a worker gets this long to load and to answer before it is stopped. */
const GRACE_MS = 15_000;

const WHOLE_WITHIN = 1e-6;

const number = z.number().nullable();
const answerSchema = z.object({
  status: z.number(),
  /** null: none was found. */
  columns: z.array(z.number()).nullable(),
  value: number,
  bound: number,
});
const messageSchema = z.union([
  z.object({ wasmModule: z.instanceof(WebAssembly.Module) }),
  z.object({ answer: answerSchema }),
  z.object({ progress: z.object({ seconds: z.number(), value: number, bound: number }) }),
]);
type Answer = z.output<typeof answerSchema>;
type Ended = { kind: 'answered'; answer: Answer } | { kind: 'no_answer_in_time' } | { kind: 'stopped' };

/** The compiled solver, once a worker has made it. */
let wasmModule: WebAssembly.Module | undefined;

function modelOf({ gain, whole, rows }: Program) {
  const starts = [0];
  for (const row of rows) starts.push((starts.at(-1) ?? 0) + row.columns.length);
  return {
    numCols: gain.length,
    numRows: rows.length,
    sense: -1,
    colCost: gain,
    colLower: gain.map(() => 0),
    colUpper: gain.map(() => 1),
    integrality: whole.map((one) => (one ? 1 : 0)),
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

function runWorker(program: Program, options: SolveOptions, hooks: SolveHooks): Promise<Ended> {
  const { seconds, gap, mostNodes, seed } = options;
  const settings = {
    time_limit: seconds,
    mip_rel_gap: gap,
    mip_abs_gap: 0,
    mip_max_nodes: mostNodes,
    // Draws have no symmetry worth the search, and starting over costs more here than it saves (npm run bench:draw).
    mip_detect_symmetry: false,
    mip_allow_restart: false,
    mip_min_logging_interval: 0.5,
    random_seed: seed % 2147483647,
    output_flag: false,
  };
  if (hooks.signal?.aborted) return Promise.resolve({ kind: 'stopped' });
  return new Promise((resolve, reject) => {
    const workerData = { model: modelOf(program), options: settings, wasmModule };
    // Without the process's own flags: a loader of sources would be set up in every worker too.
    const worker = new Worker(WORKER_CODE, { eval: true, execArgv: [], workerData });
    const timer = setTimeout(() => settle(() => resolve({ kind: 'no_answer_in_time' })), seconds * 1000 + GRACE_MS);
    const stop = () => settle(() => resolve({ kind: 'stopped' }));
    const settle = (done: () => void) => {
      clearTimeout(timer);
      hooks.signal?.removeEventListener('abort', stop);
      void worker.terminate();
      done();
    };
    hooks.signal?.addEventListener('abort', stop, { once: true });
    worker.on('message', (message) => {
      const read = messageSchema.safeParse(message);
      if (!read.success) return settle(() => reject(read.error));
      const { data } = read;
      if ('wasmModule' in data) wasmModule = data.wasmModule;
      else if ('progress' in data) hooks.onProgress?.(data.progress satisfies SolveProgress);
      else settle(() => resolve({ kind: 'answered', answer: data.answer }));
    });
    worker.once('error', (error) => settle(() => reject(error)));
    worker.once('exit', () => settle(() => resolve({ kind: 'no_answer_in_time' })));
  });
}

const isWhole = (columns: readonly number[]) =>
  columns.every((share) => Math.abs(share - Math.round(share)) <= WHOLE_WITHIN);

/** HiGHS in a worker thread, one for each answer. */
export const highsSolver: Solver = {
  async solve(program, options, hooks = {}): Promise<SolveAnswer> {
    if (program.gain.length === 0) {
      return { kind: 'found', columns: [], value: 0, bound: 0, gap: 0, cutBy: null };
    }
    const ended = await runWorker(program, options, hooks);
    if (ended.kind !== 'answered') return ended;
    const { status, columns, value } = ended.answer;
    const cutBy = ({ [TIME_LIMIT]: 'time', [SOLUTION_LIMIT]: 'nodes' } as const)[status] ?? null;
    if (columns === null || value === null) {
      return cutBy ? { kind: 'no_answer_in_time' } : { kind: 'impossible', status };
    }
    if (status !== OPTIMAL && !cutBy) return { kind: 'impossible', status };
    if (!isWhole(columns)) {
      return highsSolver.solve({ ...program, whole: program.whole.map(() => true) }, options, hooks);
    }
    const all = program.gain.reduce((sum, gain) => sum + Math.max(0, gain), 0);
    const bound = Math.max(ended.answer.bound ?? all, value);
    const left = value > 0 ? (bound - value) / value : 0;
    return {
      kind: 'found',
      columns: columns.map((share) => Math.round(share)),
      value,
      bound,
      gap: left < 1e-9 ? 0 : left,
      cutBy,
    };
  },
};
