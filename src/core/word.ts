import type { Word } from './verdict-types';

/** The word for a quiet of 0-100: Quiet from 70, Touchy from 40, Loud below. */
export function wordFor(quiet: number): Word {
  if (quiet >= 70) return 'Quiet';
  return quiet >= 40 ? 'Touchy' : 'Loud';
}
