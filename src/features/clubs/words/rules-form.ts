/** Written after a number. */
export const COUNT_WORDS = { minutes: 'minutes', hours: 'hours', days: 'days' } as const;

export const RULES_HOURS_WORDS = {
  beforeSunrise: 'before sunrise',
  afterSunrise: 'after sunrise',
  beforeSunset: 'before sunset',
  afterSunset: 'after sunset',
  windowHours: 'Window hours',
  windowHoursNote:
    'When a morning and an evening begin and end for booking and the board. Sits already booked keep their hours.',
  morning: 'Morning',
  startsMinutes: 'Starts, minutes',
  sideOfSunrise: 'Side of sunrise',
  endsAt: 'Ends at',
  evening: 'Evening',
  startsAt: 'Starts at',
  endsMinutes: 'Ends, minutes',
  sideOfSunset: 'Side of sunset',
} as const;

export const RULES_BOOKING_WORDS = {
  days: 'By days',
  daysNote: 'A sit may be booked so many days before.',
  huntTime: 'Only at hunt time',
  huntTimeNote: 'Within so many hours of the start, one stand at a time.',
  booking: 'Booking',
  howFarAhead: 'How far ahead',
  daysAhead: 'Days ahead',
  hoursBeforeWindow: 'Hours before the window',
  sitsBookedOnce: 'Sits booked at once',
  sitsBookedOnceHint: 'Most that a member may hold. Blank: no limit.',
  hold: 'Hold',
  holdHint: 'Minutes after the window began at which a sit nobody signed in for lapses. Blank: never.',
  walkUp: 'A free stand may be taken after its window has begun',
  backByAllowance: 'Back-by allowance',
  backByAllowanceHint: 'After the back-by time, before a person counts as overdue.',
  limits: 'Rest, limits and guests',
  restStand: 'Rest of a stand',
  restStandHint: 'Full days unused between sits, where the stand sets none of its own.',
  sitsASeason: 'Sits a season',
  sitsASeasonHint: 'Most a member may have. Blank: no limit.',
  guestDaysSeason: 'Guest days a season',
  guestDaysSeasonHint: 'Most days a member may bring guests. Blank: no limit.',
  guestsAtOnce: 'Guests at once',
  guestsAtOnceHint: '0: members bring none.',
} as const;

export const RULES_DISTANCES_WORDS = {
  distances: 'Distances',
  distancesNote: 'Least distance between two occupied stands; of two weapons the wider counts. 0: none.',
  spacing: (weapon: string) => `Spacing, ${weapon}`,
  walkingThrough: 'Walking through',
  walkingThroughHint: 'No way in may pass an occupied stand nearer than this. 0: none.',
} as const;

export const RULES_WORDS = {
  nothing: 'Nothing was different',
  saved: (changed: string) => `Saved: ${changed}`,
  draftTitle: 'Your unsaved entries are back',
  draftDrop: 'Start afresh',
  draftText: 'They were typed in this tab before and not saved.',
  save: 'Save the rules',
  saving: 'Saving…',
  back: 'Back without saving',
} as const;

export const RULES_QUOTAS_WORDS = {
  any: 'Any deer',
  antlered: 'Antlered deer',
  antlerless: 'Antlerless deer',
  club: 'The whole club',
  member: 'Each member, guests counted on their sponsor',
  memberGuests: 'All guests of a member together',
  title: 'Harvest quotas',
  note: 'Most deer a season, 1 July to 30 June. A quota that is met is said before booking; it refuses nothing.',
  deer: 'Deer',
  per: 'For',
  atMost: 'At most',
  remove: 'Take this quota out',
  add: 'Add a quota',
  deerUnit: 'deer',
} as const;

export const STATE_RULE_WORDS = {
  title: "The state's rules for deer",
  note: "Bag limits, tags, reporting: as your state's digest gives them, with where they stand and the day you read them. Shown on the harvest page; state law decides. Leave all three blank for none.",
  rule: 'The rules',
} as const;

export const STATED_WORDS = {
  rule: 'The rule',
  source: 'Source',
  statedOn: 'Stated on',
} as const;

export const RULES_LEGAL_LIGHT_WORDS = {
  title: 'Legal light',
  note: "Write the rule down as your state's digest gives it, with where it stands and the day you read it. Windrest declares nothing legal: it shows this rule, its source and its day. State law decides.",
  name: 'Name of the rule',
  nameHint: 'Such as the game it is for. Seasons refer to it by this name.',
  opensBeforeSunrise: 'Opens before sunrise',
  closesAfterSunset: 'Closes after sunset',
  source: 'Source',
  sourceHint: 'Where it is written, with the page.',
  statedOn: 'Stated on',
  statedOnHint: 'The day an officer read it there.',
  remove: 'Take this rule out',
  add: 'Add a legal-light rule',
} as const;

export const RULES_OVERDUE_WORDS = {
  overdue: 'Overdue',
  overdueNote: 'Minutes after a person counts as overdue. Each is told once by e-mail.',
  member: 'Tell the member',
  officers: 'Tell the officers',
  contact: 'Tell the safety contact',
  contactHint: 'Only one who has said yes.',
  showsPlace: "The safety contact's page shows the stand's position",
  showsPlaceHint: 'Off: it names stand, way in and parking only.',
} as const;

export const RULES_SEASONS_WORDS = {
  title: 'Seasons',
  note: 'The dates your club hunts, by weapon. With none set, every day is open for booking.',
  name: 'Name of the season',
  weapons: 'Weapons',
  firstDay: 'First day',
  lastDay: 'Last day',
  light: 'Legal-light rule',
  onlyLight: 'The only one',
  noLight: 'None named',
  remove: 'Take this season out',
  add: 'Add a season',
} as const;

export const RULES_SHARING_WORDS = {
  allNote: 'Counts stand in the tables as soon as they are written.',
  officersNote: 'A member sees their own.',
  afterSeasonNote:
    'Until the last season of the year is over each sees their own; officers see only that a log exists.',
  title: 'Who sees what',
  sightings: 'Sightings are seen by',
  calendar: "The club's calendar shows",
  orange: 'Orange',
  orangeNote:
    'What the club asks its hunters to wear, with where it is written. Shown as a caution; state law decides. Leave all three blank for none.',
} as const;
