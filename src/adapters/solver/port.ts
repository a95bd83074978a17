import type { Program } from '@/core/draw/build-program';

export interface SolveOptions {
  /** An answer this near the bound is good enough, as a share: 0.01 is one per cent. */
  gap: number;
  /** So many branches are looked at; then the best answer found is taken, the same on every machine. */
  mostNodes: number;
  /** The same on a machine too slow for that: what is found by then hangs on the machine. */
  seconds: number;
  /** A whole number, 0 or more: the same one gives the same answer. */
  seed: number;
}

/** How far a solver has come. */
export interface SolveProgress {
  seconds: number;
  /** null: none is found yet. */
  value: number | null;
  /** No answer can be worth more; null: not known yet. */
  bound: number | null;
}

export interface SolveHooks {
  onProgress?: (progress: SolveProgress) => void;
  /** Ends the work at once. */
  signal?: AbortSignal;
}

export type SolveAnswer =
  | {
      kind: 'found';
      /** 0 or 1 for each column. */
      columns: number[];
      value: number;
      /** No answer can be worth more. */
      bound: number;
      /** How far the answer may be from the best, as a share of it; 0: proved the best. */
      gap: number;
      /** What ended the work before the gap was reached. */
      cutBy: 'time' | 'nodes' | null;
    }
  /** The program cannot be kept, or it is no program. */
  | { kind: 'impossible'; status: number }
  | { kind: 'no_answer_in_time' }
  | { kind: 'stopped' };

/** Finds the best answer away from the thread that serves requests. */
export interface Solver {
  solve(program: Program, options: SolveOptions, hooks?: SolveHooks): Promise<SolveAnswer>;
}
