import { formatDay, formatMonth } from '@/core/day-time';

export const USE_WORDS = {
  note: 'A sit is one booking that stood and is over; an all-day sit is one sit and counts in both windows. Pressure is what sits, bumps, camera checks and work near the stand have left by the time the morning window begins: about 1 is one sit just over, half of it is left after a day and a half.',
  chart: 'Sits by week and pressure by day, stand by stand.',
  chartLabel: 'Chart: sits by week and pressure by day, stand by stand. The tables say the same.',
  key: (mostSits: number, mostPressure: number) =>
    `Bars: sits in a week, ${mostSits} at the full height. Line: pressure as the morning begins, ${mostPressure.toFixed(1)} at the full height.`,
  sits: (sits: number) => (sits === 1 ? '1 sit' : `${sits} sits`),
  month: formatMonth,
  sitsFile: 'Sits',
  pressureFile: 'Pressure',
  gone: (name: string) => `${name} (taken out of use)`,
} as const;

export const USE_TABLE_WORDS = {
  caption: 'Stands by use, the most used first',
  stand: 'Stand',
  sits: 'Sits',
  mornings: 'Mornings',
  evenings: 'Evenings',
  last: 'Last sat',
  mean: 'Mean pressure',
  peak: 'Most pressure',
  peakOn: (value: string, day: string) => `${value} on ${formatDay(day)}`,
  day: (day: string) => formatDay(day),
  none: 'None',
} as const;

export const WEEKS_TABLE_WORDS = {
  open: 'Sits week by week, as a table',
  caption: 'Sits of each stand by week. The thicker the line under a number, the more sits.',
  stand: 'Week from',
  week: (fromDay: string) => formatDay(fromDay).slice(4),
} as const;
