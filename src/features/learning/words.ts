import { LOST } from '@/ui/words/lost';

/** '+4', '-3', '0'. */
export const signed = (points: number) => (points > 0 ? `+${points}` : String(points));

export const LEARNING_PAGE_WORDS = {
  title: 'Learning',
  heading: 'Learning from the log',
  lead: 'Is a quiet of 70 really seven clean sits in ten? What is thought of each sit is kept as its window begins, and held against its log.',
  empty: 'Nothing to compare yet',
  emptyText:
    'Once sits have begun and their logs are written, they are counted here. A sit is clean when no deer was bumped.',
  log: 'Go to the log',
  said: 'Said and come',
  saidNote:
    'A sit is clean when its log says no deer was bumped: in, sitting or out. Deer bumped unseen are in no log.',
  score: 'The score of it',
  scoreNote: 'Mean square of what was said less what came, in its parts (Murphy 1973).',
  stands: 'What the log asks of each stand',
  standsNote: (mostPoints: number, leastSits: number) =>
    `Points of quiet to add to the sums, held back for few sits, never more than ${mostPoints} either way, for stands with ${leastSits} sits or more. Nothing counts until an admin applies it. Where the interval holds 0 it may be chance.`,
  noStands: (leastSits: number) => `No stand has ${leastSits} sits with a log yet.`,
  history: 'Applied and undone',
} as const;

export const PROPOSALS_WORDS = {
  caption: 'Proposed adjustments by stand',
  stand: 'Stand',
  clean: 'Clean of sits',
  cleanOf: (clean: number, sits: number) => `${clean} of ${sits}`,
  said: 'Said',
  asks: 'Asks for',
  unsure: ' (unsure)',
  interval: '95 % interval',
  intervalOf: (low: number, high: number) => `${signed(low)} to ${signed(high)}`,
  counts: 'Counts now',
  nothing: 'nothing',
  answer: 'Answer',
  asSums: 'As the sums say',
  applied: 'Applied',
} as const;

export const APPLY_WORDS = {
  apply: 'Apply',
  applyTo: (stand: string) => ` to ${stand}`,
  title: (points: number, stand: string) => `Apply ${signed(points)} points to ${stand}`,
  text: 'From now on the list adds these points to the quiet of every sit there, and says so among its reasons. It can be undone at any time.',
  applied: (points: number, stand: string) => `${stand} counts ${signed(points)} points`,
  lost: LOST,
} as const;

export const UNDO_WORDS = {
  undo: 'Undo',
  undoFor: (stand: string) => ` for ${stand}`,
  title: (stand: string) => `Undo what is applied to ${stand}`,
  confirm: 'Undo it',
  text: 'The list goes by the sums alone again. The record keeps that it was applied.',
  undone: (stand: string) => `${stand} counts by the sums alone`,
  lost: LOST,
} as const;

export const RELIABILITY_WORDS = {
  caption: 'Predicted quiet against clean sits',
  quiet: 'Quiet said',
  quietOf: (from: number, to: number) => `${from} to ${to}`,
  sits: 'Sits',
  said: 'Said, on average',
  clean: 'Went clean',
  cleanOf: (clean: number, share: string) => `${clean}, ${share}`,
  interval: '95 % interval',
  intervalOf: (low: string, high: string) => `${low} to ${high}`,
} as const;

export const BRIER_WORDS = {
  sits: 'Sits',
  sitsOf: (sits: number) => `${sits} with a prediction and a log`,
  score: 'Brier score',
  scoreOf: (score: string) => `${score}: 0 is perfect, always saying 50 gives 0.250`,
  reliability: 'Reliability',
  reliabilityOf: (off: string) => `${off}: how far off what was said is; less is better`,
  resolution: 'Resolution',
  resolutionOf: (apart: string) => `${apart}: how well it tells sits apart; more is better`,
  uncertainty: 'Uncertainty',
  uncertaintyOf: (of: string) => `${of}, of the outcome itself`,
  within: 'Within rows',
  withinOf: (add: string) => `${add}: what predictions that differ inside a row add`,
} as const;

interface Adjustment {
  points: number;
  low: number;
  high: number;
  sits: number;
  /** null: a former admin. */
  by: string | null;
  on: string;
  ended: { by: string | null; on: string } | null;
}

/** One line of the record of adjustments. */
export function adjustmentText({ points, low, high, sits, by, on, ended }: Adjustment): string {
  const applied = `${signed(points)} points (${signed(low)} to ${signed(high)}) from ${sits} sits, applied by ${by ?? 'an admin'}, ${on}.`;
  return ended === null ? applied : `${applied} Ended by ${ended.by ?? 'an admin'}, ${ended.on}.`;
}

export const ADJUSTMENT_ERRORS = {
  fewSits: (stand: string) => `${stand} has too few sits with a log to learn from.`,
  moreSits: 'More sits were logged since you opened this page. Look at the proposal again.',
  nothing: (stand: string) => `${stand} goes as the sums say: there is nothing to apply.`,
  notApplied: (stand: string) => `Nothing is applied to ${stand}.`,
} as const;

export const ADJUSTMENT_AUDIT = {
  applied: (stand: string, points: number, sits: number) =>
    `${stand} counts ${points} points of quiet from its log of ${sits} sits.`,
  undone: (stand: string) => `${stand} counts by the sums alone again.`,
} as const;
