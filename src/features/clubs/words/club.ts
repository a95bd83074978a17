export const NAV_WORDS = {
  sit: 'Sit',
  week: 'Week',
  board: 'Board',
  log: 'Log',
  mySits: 'My sits',
  season: 'Season',
  draws: 'Draws',
  chores: 'Chores',
  stands: 'Stands',
  ground: 'Ground',
  closedDays: 'Closed days',
  calendar: 'Calendar',
  notices: 'Notices',
  club: 'Club',
} as const;

export const CLUB_SWITCH_WORDS = {
  change: (club: string) => `${club}: change club`,
} as const;

export const CLUB_TABS_WORDS = {
  label: 'About the club',
} as const;

export const PLACE_WORDS = {
  noPosition: 'This browser cannot tell where it is. Type the numbers.',
  looking: 'Looking for your position…',
  filled: (metres: number) => `Filled in, to about ${metres} m.`,
  positionRefused: 'The position was not given. Type the numbers.',
  name: 'Name',
  nameClub: 'Name of the club',
  slug: 'Address',
  slugHint: 'Stands in every link of the club and cannot be changed later: small letters, digits and dashes.',
  place: 'Place',
  placeNote: 'About the middle of the ground. Sunrise, weather and distances are worked out from here.',
  lat: 'Latitude',
  latHint: 'Degrees north, such as 34.117',
  lon: 'Longitude',
  lonHint: 'Degrees east; west is minus, such as -84',
  here: 'Use where I am now',
  zone: 'Time zone',
  zoneHint: 'Proposed from the place. Every clock of the club is read in it.',
  zonePlaceholder: 'Choose a zone',
  units: 'Units',
  us: 'Yards, feet, °F',
  usNote: '12-hour clock',
  metric: 'Metres, °C',
  metricNote: '24-hour clock',
  nothing: 'Nothing was different',
  saved: (changed: string) => `Saved: ${changed}`,
  save: 'Save',
  saving: 'Saving…',
  back: 'Back without saving',
} as const;

export const START_CLUB_WORDS = {
  start: 'Start the club',
} as const;
