import type { NoFigure } from '../indices';

/** Why there is no figure. */
export const NO_FIGURE_WORDS: Record<NoFigure, string> = {
  no_hours: 'no hours sat',
  no_sits: 'no sits logged',
  no_deer: 'no deer seen',
  no_bucks: 'no bucks seen',
  no_does: 'no does seen',
};

export const INTERVAL_WORDS = {
  number: (low: string, high: string) => `${low} to ${high}`,
  percent: (low: string, high: string) => `${low} to ${high} %`,
} as const;
