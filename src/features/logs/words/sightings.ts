import { formatMonth } from '@/core/day-time';

export const SEASON_WORDS = {
  tabs: 'About the season',
  report: 'Report',
  sightings: 'Sightings',
  harvest: 'Harvest',
  setup: 'Set-up check',
  coverage: 'Wind coverage',
  movement: 'Movement',
  learning: 'Learning',
} as const;

export const SIGHTINGS_PAGE_WORDS = {
  title: 'Sightings',
  titleOf: (year: string) => `Sightings ${year}`,
  lead: 'What members count from their stands. An index to compare stands and years by, not a census.',
  tables: 'Tables as CSV',
  logs: 'Logs as CSV',
  season: 'Season',
  whose: 'Whose sits',
  wholeClub: 'The whole club',
  own: 'Mine and my guests’',
  show: 'Show',
  keptTitle: 'Only your own sits are counted here',
  keptForOfficers: 'The club keeps sightings for its officers.',
  keptUntilOver: 'The club keeps sightings until the season is over.',
  empty: 'No log yet',
  emptyText: 'Once sits have logs, deer an hour are worked out here by stand, window and month.',
  write: 'Write a log',
  soFar: 'The season so far',
  soFarNote:
    'Sums over sums: deer over hours sat, sits without a deer too. In brackets the 95 % interval, as if each deer came alone; deer come in groups, so the truth is less sure.',
  unit: 'deer an hour',
  hours: (hours: number) => `${hours.toFixed(0)} h`,
  byStand: 'By stand',
  byStandChart: 'Deer an hour by stand.',
  byStandCaption: 'Figures by stand, the most deer an hour first',
  stand: 'Stand',
  byWindow: 'By window',
  byWindowCaption: 'Figures by window of the day',
  window: 'Window',
  byMonth: 'By month',
  byMonthChart: 'Deer an hour by month.',
  byMonthCaption: 'Figures by month',
  month: 'Month',
  logList: 'Logs',
} as const;

/** 'Nov 2026' of '2026-11'. */
export function monthText(month: string): string {
  return `${formatMonth(`${month}-01`)} ${month.slice(0, 4)}`;
}

interface Seen {
  all: number;
  bucks: number;
  does: number;
  fawns: number;
  unknown: number;
}

const missing = (sits: number) =>
  sits === 0 ? 'none is missing' : `${sits} ${sits === 1 ? 'sit has' : 'sits have'} none yet`;

export const SEASON_FIGURE_WORDS = {
  logs: 'Logs',
  logsOf: (sits: number, zeroSits: number, unlogged: number) =>
    `${sits}, ${zeroSits} of them without a deer; ${missing(unlogged)}`,
  hours: 'Hours sat',
  seen: 'Deer seen',
  seenOf: ({ all, bucks, does, fawns, unknown }: Seen) =>
    `${all}: ${bucks} antlered bucks, ${does} does, ${fawns} fawns, ${unknown} unknown`,
  deerPerHour: 'Deer an hour',
  bucksPerHour: 'Bucks an hour',
  doesPerBuck: 'Does per buck',
  fawnsPerDoe: 'Fawns per doe',
  unknown: 'Not made out',
  bumped: 'Sits with a bump',
} as const;

export const INDEX_TABLE_WORDS = {
  sits: 'Sits',
  hours: 'Hours',
  deer: 'Deer/h',
  bucks: 'Bucks/h',
  does: 'Does/h',
  fawns: 'Fawns/h',
  doesPerBuck: 'Does per buck',
  fawnsPerDoe: 'Fawns per doe',
  unknown: 'Unknown',
  bumped: 'Sits with a bump',
} as const;

export const ALL_LOGS_WORDS = {
  caption: 'Logs of the season, the latest first',
  find: 'Find a log',
  stand: 'Stand',
  when: 'When',
  member: 'Member',
  deer: 'Deer',
  bumped: 'Bumped',
  shot: 'Shot',
  notes: 'Notes',
  none: 'None',
} as const;

/** Columns of the file of logs, in its order. */
export const LOG_FILE_HEADINGS = [
  'day',
  'window',
  'stand',
  'member',
  'from (club time)',
  'to (club time)',
  'hours',
  'antlered bucks',
  'does',
  'fawns',
  'unknown',
  'bumped in',
  'bumped from the seat',
  'bumped out',
  'bumped where',
  'shot',
  'hit',
  'follow-up',
  'notes',
];

const FIGURES = [
  'deer/h',
  'bucks/h',
  'does/h',
  'fawns/h',
  'unknown/h',
  'does per buck',
  'fawns per doe',
  'unknown share',
  'bumped share',
];

/** Columns of the file of tables, in its order. */
export const TABLE_FILE_HEADINGS = [
  'group',
  'name',
  'sits',
  'sits without deer',
  'hours',
  'deer',
  'antlered bucks',
  'does',
  'fawns',
  'unknown',
  'sits with a bump',
  ...FIGURES.flatMap((name) => [name, `${name}, 95 % from`, `${name}, 95 % to`]),
];

export const TABLE_FILE_GROUPS = {
  season: 'season',
  all: 'all',
  stand: 'stand',
  window: 'window',
  month: 'month',
} as const;

export const SIGHTINGS_AUDIT = {
  exported: (year: string, own: boolean) =>
    `Took ${own ? 'their own' : "the club's"} sightings of ${year} out as a file.`,
} as const;
