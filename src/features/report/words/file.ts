/** Columns of the files, in their order. */
export const FILE_HEADINGS = {
  use: ['stand', 'sits', 'mornings', 'evenings', 'last sat', 'mean pressure', 'most pressure', 'most pressure on'],
  week: (fromDay: string) => `sits in week from ${fromDay}`,
  pressure: ['day', 'stand', 'pressure as the morning begins'],
  rests: ['stand', 'rest (full days)', 'sat again', 'rest kept', 'shortest gap (full days)', 'sits inside a rest'],
  unused: ['stand', 'use', 'sits', 'last sat', 'days closed', 'on the map since'],
  members: ['member', 'sits', 'judged', 'good sits', 'share of own sits', 'share of all good sits'],
  bumps: ['group', 'name', 'wind from', 'logged sits', 'with a bump', 'clean', 'share', '95 % from', '95 % to'],
  harvest: ['quota', 'taken', 'most', 'left', 'met'],
  hours: ['member', 'work days (h)', 'chores (h)', 'all (h)'],
} as const;

export const FILE_GROUPS = {
  all: 'all',
  stand: 'stand',
  wind: 'wind',
  arc: 'good arc',
  inArc: 'inside',
  outOfArc: 'outside',
  month: 'month',
  yes: 'yes',
  no: 'no',
} as const;

export const REPORT_AUDIT = {
  exported: (part: string, label: string) => `Took a part of the season report ${label} out as a file: ${part}.`,
} as const;
