import type { WindowName } from '@/core/condition-types';

export const MONTH_NAMES = [
  'January',
  'February',
  'March',
  'April',
  'May',
  'June',
  'July',
  'August',
  'September',
  'October',
  'November',
  'December',
] as const;

export const WINDOW_TITLES: Record<WindowName, string> = { morning: 'Mornings', evening: 'Evenings' };

export const COVERAGE_WORDS = {
  title: 'Wind coverage',
  lead: 'Which winds of a season the stands cover, and which nobody can sit on.',
  leadOf: (source: string, from: string, to: string) =>
    `${source}: ${from} to ${to}, hour by hour, in the club’s window hours.`,
  noHours: 'No hours to count yet',
  again: 'Look again',
  outside: 'The hours known lie outside the club’s window hours.',
  /** Names a season of past hours; it is also what they are kept under. */
  past: (source: string, from: string) => `${source} past ${from}`,
  fetching: 'The hours of last season are being fetched. Look again soon.',
  noStands: 'No stands yet',
  noStandsText: 'Nothing is covered until a stand has good winds. Try one below.',
  windowNote: (hours: number, covered: string, calm: string) =>
    `${hours} hours. ${covered} of the wind is covered. Calm or variable for ${calm} of the hours: no arc covers those.`,
  byPoint: (window: WindowName) => `${WINDOW_TITLES[window]} by compass point`,
  byMonth: (window: WindowName) => `${WINDOW_TITLES[window]} by month`,
  openMonths: 'By month',
  month: 'Month',
  hours: 'Hours',
  covered: 'Covered',
  uncovered: 'Most uncovered',
  noneUncovered: 'none',
  byStand: 'By stand',
  byStandNote:
    'Hours with the wind in a good arc of the stand in a window it is hunted in, and their share of all wind. Alone: hours no other stand covers.',
  byStandCaption: 'Hours covered by each stand',
  stand: 'Stand',
  mornings: 'Mornings',
  evenings: 'Evenings',
  ofAll: 'Of all',
  alone: 'Alone',
} as const;

export const BARS_WORDS = {
  said: (covered: string, added: string, open: string) =>
    `: ${covered} covered${added && `, ${added} by the trial`}, ${open} uncovered`,
  legend: 'Solid: some stand has this wind in a good arc. Open: nobody.',
  legendTrial: 'Solid: some stand has this wind in a good arc. Hatched: only the trial has. Open: nobody.',
} as const;

export const TRIAL_WORDS = {
  title: 'Try a stand',
  note: 'See what a seat with these winds would add before anybody hangs it: turn the handles of the dial, type the winds, or drop it on the map. Nothing is saved.',
  winds: 'Its good winds',
  windsHint: 'NW-N, 310-20, SW; SE',
  hunted: 'Hunted in',
  both: 'Mornings and evenings',
  morning: 'Mornings',
  evening: 'Evenings',
  lat: 'Latitude',
  lon: 'Longitude',
  place: 'Place it on the map',
  away: 'Take it away',
  noWinds: 'Give it a wind: type one, or add an arc on the dial.',
  gain: (parts: string[]) =>
    `The trial alone covers ${parts.length > 0 ? parts.join(' and ') : 'nothing'} that no stand covers now.`,
  gainPart: (share: string, window: WindowName, hours: number) => `${share} of ${window}s (${hours} h)`,
  hours: (covered: number) => `It would have ${covered} hours of the season in its good winds.`,
  seat: (word: string, when: string, quiet: number, promise: number) =>
    `Where it stands, its seat would be ${word} on ${when}: quiet ${quiet}, promise ${promise}, before any way in is drawn.`,
  when: (sector: string, window: WindowName) => `${sector} ${window}s`,
  seatLooking: 'Looking at its seat…',
  seatFailed: 'Its seat could not be looked at.',
  tryAgain: 'Try again',
  withTrial: (window: WindowName) => `${WINDOW_TITLES[window]} with the trial`,
  addsByMonth: 'What the trial adds, by month',
  month: 'Month',
} as const;

export const DIAL_WORDS = {
  label: 'Good winds of the trial, and the winds nobody covers',
  hint: 'Petals: winds nobody covers. Drag the handles, or turn them with the arrow keys.',
  from: (arc: number) => `Arc ${arc}, from`,
  to: (arc: number) => `Arc ${arc}, to`,
  value: (sector: string, deg: number) => `${sector}, ${deg} degrees`,
  add: 'Add an arc',
  remove: (span: string) => `Take away ${span}`,
} as const;

export const TRIAL_MAP_WORDS = {
  loading: 'Unfolding the map',
  failed: 'The map could not be read',
  again: 'Try again',
  label: 'Map to place the trial stand on',
  name: 'Trial',
  seat: 'Trial seat: drag it, or move it with the arrow keys',
  caption:
    'Tap where the seat would be. Drag the seat, or the handles of its winds; the arrow keys move the seat when it is chosen. Its latitude and longitude may be typed as well.',
} as const;
