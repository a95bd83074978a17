import { formatDay } from '@/core/day-time';

const HOW = {
  by_another: 'booked by somebody else for them',
  at_the_gate: 'booked after its window had begun',
  ahead: 'booked ahead',
} as const;

export const RESTS_WORDS = {
  note: 'Full days a stand lay unused between two days sat, held against the rest it has today. A rest made longer since shows its earlier gaps as broken.',
  empty: 'No stand was sat on two days, so there is no rest to look at.',
  caption: 'Rests of the stands that were sat',
  stand: 'Stand',
  rule: 'Rest',
  ruleOf: (days: number) => (days === 1 ? '1 day' : `${days} days`),
  again: 'Sat again',
  kept: 'Rest kept',
  keptOf: (kept: number, times: number) => `${kept} of ${times}`,
  least: 'Shortest gap',
  leastOf: (days: number) => (days === 1 ? '1 full day' : `${days} full days`),
  never: 'Not sat again',
  broken: 'Sits inside a rest',
  allKept: 'Every rest was kept.',
  line: (stand: string, day: string, rested: number, after: string) =>
    `${stand}, ${formatDay(day, true)}: ${rested === 1 ? '1 full day' : `${rested} full days`} after ${formatDay(after)}.`,
  who: (names: string, how: readonly (keyof typeof HOW)[]) => `${names}; ${how.map((one) => HOW[one]).join(', ')}.`,
} as const;

export const UNUSED_AS = {
  never: 'Nobody sat it',
  mornings_only: 'Mornings only',
  evenings_only: 'Evenings only',
} as const;

export const UNUSED_WORDS = {
  note: 'Stands in use that nobody sat, and those sat in one window though the steward rates the other one usable or better.',
  none: 'Every stand was sat in each window it is good for.',
  caption: 'Stands nobody sat, or sat in one window only',
  stand: 'Stand',
  what: 'Use',
  whatOf: (what: keyof typeof UNUSED_AS, sits: number) =>
    what === 'never' ? UNUSED_AS.never : `${UNUSED_AS[what]} (${sits === 1 ? '1 sit' : `${sits} sits`})`,
  last: 'Last sat',
  lastOf: (day: string) => formatDay(day, true),
  noSit: 'No sit on record',
  why: 'To know',
  closed: (days: number) => (days === 1 ? 'Closed on 1 day.' : `Closed on ${days} days.`),
  drawn: (day: string) => `On the map since ${formatDay(day)}.`,
} as const;
