export const HARVEST_PAGE_WORDS = {
  title: 'Harvest',
  titleOf: (season: string) => `Harvest ${season}`,
  write: 'Write a harvest sheet',
  csv: 'Sheets as CSV',
  season: 'Season',
  show: 'Show',
  quotas: 'Quotas',
  quotasNote: "The club's own. They caution before a booking and refuse nothing.",
  noQuota: 'The club has set no quota',
  noQuotaText: 'A quota may hold for the club, for each member, or for the guests of a member.',
  setQuotas: 'Set quotas in the rules',
  law: 'State law decides',
  noLaw: "The club has not written the state's rules for deer down. Look them up before you hunt.",
  lawSource: (source: string, day: string) => `As the club wrote it down from ${source} on ${day}.`,
  sheets: 'Sheets',
  noSheet: 'No deer is written down for this season',
  noSheetText: 'Each deer gets a sheet: sex, age, dressed weight, antlers or milk.',
  byMember: 'By member',
  bySexAndAge: 'By sex and age',
  bySexAndAgeNote: 'Dressed weights only: live weights are never mixed in.',
} as const;

export const SHEETS_TABLE_WORDS = {
  caption: 'Harvest sheets of the season, the latest first',
  deer: 'Deer',
  hunter: 'Taken by',
  when: 'When',
  where: 'Where',
  age: 'Age',
  dressed: 'Dressed',
  antlers: 'Antlers',
} as const;

export const QUOTA_TABLE_WORDS = {
  caption: "Quotas of the season with the club's and your own count",
  quota: 'Quota',
  taken: 'Taken',
  takenOf: (taken: number, most: number) => `${taken} of ${most}`,
  left: 'Left',
  state: 'State',
  met: 'Met',
  open: 'Open',
} as const;

export const MEMBER_COUNT_WORDS = {
  caption: "Deer on each member's count, guests' deer on their sponsor's",
  member: 'Member',
  antlered: 'Antlered',
  antlerless: 'Antlerless',
  byGuests: 'Of these by guests',
} as const;

export const WEIGHTS_TABLE_WORDS = {
  caption: 'Deer by sex and age',
  sex: 'Sex',
  age: 'Age',
  notEstimated: 'Not estimated',
  deer: 'Deer',
  dressed: 'Mean dressed weight',
  weighed: 'Weighed dressed',
  noMilk: 'No grown doe was looked at for milk.',
  milk: (yes: number, looked: number, share: string, interval: string) =>
    `In milk: ${yes} of ${looked} grown does looked at, ${share} (95 % interval ${interval}).`,
} as const;

/** Columns of the file of sheets, in its order. */
export const HARVEST_FILE_HEADINGS = [
  'day',
  'club time',
  'on the count of',
  'guest',
  'sex',
  'antlered',
  'age',
  'age method',
  'dressed weight (kg)',
  'live weight (kg)',
  'points left',
  'points right',
  'inside spread (mm)',
  'main beam left (mm)',
  'main beam right (mm)',
  'in milk',
  'stand',
  'place',
  'weapon',
  'notes',
];

export const HARVEST_FILE_WORDS = { yes: 'yes', no: 'no' } as const;

export const QUOTA_ERRORS = {
  day: 'Write a day as YYYY-MM-DD.',
  others: 'Only who books for others looks at their quotas.',
} as const;
