import { formatDay } from '@/core/day-time';

export const PERIOD_WORDS = {
  season: (name: string, fromDay: string) => `${name} from ${formatDay(fromDay, true)}`,
  days: (fromDay: string, toDay: string) => `${formatDay(fromDay, true)} to ${formatDay(toDay, true)}`,
  noDay: 'Give a day of this century.',
  turnedRound: 'The first day lies after the last, so the whole season is shown. Turn them round.',
  tooLong: (days: number) => `A report holds ${days} days at most, so it ends there.`,
} as const;

export const PERIOD_FORM_WORDS = {
  season: 'Season',
  from: 'From',
  to: 'To',
  daysHint: 'Leave empty for the whole season.',
  show: 'Show',
} as const;
