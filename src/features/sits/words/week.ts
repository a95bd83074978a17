import type { WeekShow } from '../week-cells';

/** Texts of the Week screen. */

export const WEEK_PAGE_WORDS = {
  title: 'Week',
  lead: 'Every stand in every window the forecast reaches.',
  nextWindow: 'The next window',
  show: 'Show',
  weapon: 'Weapon',
  anyWeapon: 'Any weapon',
  noStandsTitle: 'No stands yet',
  noStands: 'The week fills itself once the club has stands.',
} as const;

export const WEEK_SHOW_LABELS: Record<WeekShow, string> = { all: 'All stands', open: 'Open stands', mine: 'My sits' };

export const WEEK_TABLE_WORDS = {
  region: 'Stands and windows',
  caption: 'Every stand in every window the forecast reaches',
  stand: 'Stand',
  ofDay: (day: string) => ` of ${day}`,
  showAll: (count: number) => `Show all ${count} stands`,
  yourSit: 'Your sit',
  notOpen: 'not open',
  legend:
    "Beside the word stands the sit score. The strip is the compass from north to north: shading is where the wind is expected from, the bar the stand's good arcs.",
} as const;

export const WEEK_DAYS_WORDS = {
  list: 'The list',
  listOf: (day: string, window: string) => ` of ${day}, ${window}`,
  noSit: 'No sit of yours.',
  noneOpen: 'No stand is open.',
  yours: (stand: string) => `${stand} (your sit)`,
  more: (count: number) => `and ${count} more in the list`,
} as const;

/** What the strip of a cell shows. */
export const WEEK_CELL_WORDS = {
  notOpen: (why: string) => `not open: ${why}`,
  noForecast: 'no forecast',
  noWinds: 'no good winds set',
  hold: (percent: number) => `wind in its arcs ${percent} % of the sit`,
} as const;
