/** Texts of an opened row. */

export const DETAIL_WORDS = {
  failed: 'This stand could not be read',
  again: 'Try again',
  score: 'Sit score',
  quiet: 'quiet',
  promise: 'promise',
  figures: 'Quiet: in, sat and out with no deer alerted. Promise: deer in range in daylight. Quiet weighs more.',
  care: 'Take care',
  wayIn: 'Way in',
  why: 'Why this score',
  through: 'Through the sit',
  wind: 'Where the wind will be',
  change: 'What would change it',
  sure: 'How sure',
  howSure: { high: 'Sure.', fair: 'Fairly sure.', low: 'Not sure.', none: 'No forecast to be sure of.' },
  sureBecause: (text: string) => `${text}.`,
  sunrise: 'sunrise',
  sunset: 'sunset',
} as const;

export const HOLD_WORDS = {
  stays: 'it more likely stays than leaves',
  leavesAt: (time: string) => `it likeliest leaves at ${time}`,
  outFromStart: 'it may be out of it from the start',
  hold: (hold: { share: string; never: string; leaves: string; worstAt: string; worst: string }) =>
    `In a good arc for ${hold.share} of the sit; ${hold.never} that it never leaves, and ${hold.leaves}. Worst half hour: ${hold.worstAt}, ${hold.worst}.`,
} as const;

export const WAYS_WORDS = {
  none: 'No way in is drawn for this stand, so a middling walk is assumed. A steward can add one.',
  toward: (direction: string) => `Walk toward ${direction}`,
  fromParking: (parking: string | null, entry: string) => (parking ? ` from ${parking}, ${entry}` : `, ${entry}`),
  tooLate: 'It is too late to walk in by it unheard.',
  leaveBy: 'Leave by ',
  inBy: ', in by ',
  walk: (walk: { time: string; length: string | null; direction: string | null; bearing: string }) =>
    [
      `Walk ${walk.time}`,
      ...(walk.length ? [walk.length] : []),
      ...(walk.direction ? [`toward ${walk.direction}`, walk.bearing] : []),
    ].join(', '),
  bearing: (trueDeg: number | null, magneticDeg: number | null) =>
    magneticDeg === null ? `${trueDeg}° true` : `${trueDeg}° true (${magneticDeg}° by compass)`,
  chance: (into: string, out: string, worst: string | null) =>
    `Chance of alerting deer: walking in ${into}, walking out ${out}${worst ? `, most of it at ${worst}` : ''}.`,
  others: 'Other ways and times, and what they cost',
  wayAndTime: 'Way and time',
  inByHead: 'In by',
  cost: 'Cost',
  nameAndTime: (name: string, entry: string) => `${name}, ${entry}`,
  costs: (points: string | null, quiet: number, worst: string | null) =>
    `${points === null ? 'as good' : `${points} points`}, quiet ${quiet}${worst ? `; most at ${worst}` : ''}`,
  map: 'Show the map of the walk',
} as const;

export const REASON_WORDS = {
  none: 'Nothing speaks for or against it beyond the ordinary.',
  points: ' points: ',
  basis: (part: string, evidence: string) => `${part}; ${evidence}`,
  hiddenSightings: 'What was seen from it in past sits',
} as const;

export const HOURS_WORDS = {
  noWind: 'no wind given',
  windOf: (direction: string) => `${direction} wind`,
  variable: 'Variable',
} as const;

export const SHARE_SIT_WORDS = {
  share: 'Share this sit',
  link: 'Link to this sit',
  hint: 'Only members of the club can open it.',
} as const;

export const COMPARE_WORDS = {
  choose: 'Compare with',
  chooseOne: 'Choose a stand',
  title: 'Side by side',
  about: (window: string) => `${window}. The better figure of a line is set bold.`,
  failed: 'The two could not be read',
  reading: 'Reading both stands',
  both: (one: string, other: string) => `${one} and ${other}`,
  open: 'Open',
  yes: 'Yes',
  better: 'the better of the two',
} as const;

export const COMPARE_ROW_WORDS = {
  word: 'Word',
  score: 'Sit score',
  quiet: 'Quiet',
  promise: 'Promise',
  wind: 'Wind',
  winded: 'Chance of being winded',
  wayIn: 'Way in',
  alert: 'Chance of alerting deer, in and out',
  speaksFor: 'Speaks for it',
  speaksAgainst: 'Speaks against it',
  care: 'Take care',
  sure: 'How sure',
  notKnown: 'Not known',
  outAt: (time: string) => `Likeliest out of it at ${time}`,
  hold: (percent: string) => `In a good arc ${percent} of the sit`,
  noWay: 'None is drawn',
  leave: (leaveBy: string, inBy: string) => `Leave by ${leaveBy}, in by ${inBy}`,
  walking: (time: string) => `${time} of walking`,
  nothing: 'Nothing of weight',
  nothingSpecial: 'Nothing special',
  inAndOut: (into: string, out: string) => `${into} and ${out}`,
} as const;
