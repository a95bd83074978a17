import type { SettingBounds, SetupSettings } from '@/core/setup-check/setup-settings';

export const SETTING_LABELS: Record<keyof SetupSettings, string> = {
  pullWithinM: 'An attraction pulls deer about a seat from within',
  behindDeg: 'A place lies behind the seat past a turn of',
  besideM: 'A place is beside a walk within',
  seatMarginM: 'The end of a walk left out, as it must come near the stand',
  leastUse: 'Deer count as there when they are so often',
  scentDeg: 'Scent goes to a place within a turn from downwind of',
  bedsWithinM: 'Beds are reached from a walk within',
  upwindShare: 'A walk is upwind of beds on so many of the winds hunted',
  wadeM: 'A line is crossed in the water, without a track, within',
  openingM: 'Places share an opening within',
  onLineM: 'A scrape is on a line within',
  scrapeFromM: 'A bow shot at a scrape: nearest',
  scrapeToM: 'A bow shot at a scrape: farthest',
  noiseM: 'Noise from the seat carries',
  offLinesM: 'A place is off every line of movement beyond',
  stopWithinM: 'A place is a stop on a line within',
  gapFromM: 'A stretch of a line nobody reaches is a gap from',
  sunMinutes: 'Low sun in the eyes troubles from',
  sunMonths: 'It counts when it does so in so many months hunted',
  cameraTurnDeg: 'The sun is in a camera’s picture within a turn of',
  cameraSunDeg: 'It is low, for a camera, up to a height of',
};

export const SETTING_GROUPS: { title: string; keys: (keyof SetupSettings)[] }[] = [
  { title: 'What draws deer', keys: ['pullWithinM', 'behindDeg', 'scentDeg', 'leastUse', 'offLinesM'] },
  { title: 'Walks', keys: ['besideM', 'seatMarginM', 'bedsWithinM', 'upwindShare', 'wadeM'] },
  { title: 'Scrapes', keys: ['openingM', 'onLineM', 'scrapeFromM', 'scrapeToM', 'noiseM'] },
  { title: 'Lines of movement', keys: ['stopWithinM', 'gapFromM'] },
  { title: 'Sun', keys: ['sunMinutes', 'sunMonths', 'cameraTurnDeg', 'cameraSunDeg'] },
];

export const UNIT_WORDS: Record<SettingBounds['of'], string> = {
  distance: '',
  turn: '°',
  share: '%',
  minutes: 'minutes',
  months: 'of 5 months',
};

export const SETTING_WORDS = {
  title: 'Distances and shares of the set-up check',
  lead: 'By these the check counts a place as near, behind or in the sun, and lines of movement find their stops and gaps. All are practice: no study set them. Change one when your ground teaches you better.',
  hint: (standard: string, least: string, most: string, unit: string) =>
    `Practice: ${standard}${unit}. From ${least} to ${most}.`,
  blank: 'Leave one blank for what comes with Windrest.',
  reset: 'All as they came',
  save: 'Save',
  saving: 'Saving…',
  back: 'Back to the check',
  saved: (labels: number) => (labels === 1 ? 'Saved: one was different' : `Saved: ${labels} were different`),
  same: 'Nothing was different',
  outOfBounds: (label: string, least: string, most: string, unit: string) =>
    `${label}: type a number from ${least} to ${most}${unit}.`,
  whole: (label: string, least: string, most: string) => `${label}: type a whole number from ${least} to ${most}.`,
  order: 'The farthest shot is not nearer than the nearest.',
  long: 'Keep it to 20 characters.',
  conflict:
    'Somebody saved other distances while you had this page open. What you typed is still here: open the page in another tab, then make your change again.',
  audit: (changes: string) => `Changed the set-up check: ${changes}.`,
  change: (label: string, before: string, after: string) => `${label} ${before} → ${after}`,
} as const;
