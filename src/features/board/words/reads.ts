import type { OverdueStepRow } from '@/features/outings/overdue-data';

/** What the board's read says in words. */

const WHO: Record<OverdueStepRow['step'], string> = {
  member: 'Member',
  officers: 'Officers',
  contact: 'Safety contact',
};

const OUTCOMES: Record<OverdueStepRow['outcome'], string> = {
  mailed: 'told',
  nobody: 'not told: there is no other',
  no_consent: 'not told: none has agreed',
  off: 'not told: switched off',
};

export const BOARD_READ_WORDS = {
  today: 'Today',
  tomorrow: 'Tomorrow',
  told: (step: OverdueStepRow['step'], outcome: OverdueStepRow['outcome'], clock: string) =>
    `${WHO[step]} ${OUTCOMES[outcome]} at ${clock}`,
  since: (state: string, at: string) => `${state}, ${at}`,
  walkUp: (window: string, span: string) => `${window}, ${span}`,
} as const;
