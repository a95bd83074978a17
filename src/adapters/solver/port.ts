import type { ZeroOneProgram } from '@/core/draw/build-program';

export interface SolveOptions {
  /** After so many seconds the best answer found is taken. */
  seconds: number;
  /** An answer this near the bound is good enough, as a share: 0.01 is one per cent. */
  gap: number;
  /** A whole number, 0 or more: the same one gives the same answer. */
  seed: number;
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
      /** The time ran out before the gap was reached. */
      timeUp: boolean;
    }
  /** The program cannot be kept, or it is no program. */
  | { kind: 'impossible'; status: number }
  | { kind: 'no_answer_in_time' };

/** Finds the best 0/1 answer away from the thread that serves requests. */
export interface Solver {
  solve(program: ZeroOneProgram, options: SolveOptions): Promise<SolveAnswer>;
}
