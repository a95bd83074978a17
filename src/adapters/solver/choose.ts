import { highsSolver } from './highs';
import type { Solver } from './port';

/** It runs on this machine: there is nothing to fake. */
export function chooseSolver(): Solver {
  return highsSolver;
}
