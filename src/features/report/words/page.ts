export const REPORT_PAGE_WORDS = {
  title: 'Season report',
  titleOf: (label: string) => `Season report ${label}`,
  lead: 'Who sat where and when, what it cost the ground, and who had the good sits. Every figure is a count of what is on record.',
  emptyTitle: 'No sit has ended in these days',
  emptyText: 'Sits are counted here once they are over. Choose another season, or book the first one.',
  book: 'Book a sit',
  contents: 'Parts of the report',
  keptTitle: 'Logs of others are kept from you',
  keptForOfficers:
    'The club keeps what was seen for its officers, so bumps and deer an hour are of your own sits and your guests’ only.',
  keptUntilOver:
    'The club keeps what was seen until the season is over, so bumps and deer an hour are of your own sits and your guests’ only.',
  csv: 'CSV',
  csvOf: (part: string) => `${part} as CSV`,
} as const;

/** Headings of the parts; the list of contents says the same. */
export const PART_TITLES = {
  use: 'Sits and pressure by stand',
  rests: 'Rests kept',
  unused: 'Stands left alone',
  members: 'Who had the good sits',
  bumps: 'Bumps and clean sits',
  deer: 'Deer an hour',
  harvest: 'Harvest against quota',
  hours: 'Work hours',
} as const;

const count = (n: number, one: string, many: string) => `${n} ${n === 1 ? one : many}`;

export const HEADLINE_WORDS = {
  title: 'The season in short',
  sits: 'Sits',
  sitsOf: (sits: number, used: number, stands: number, members: number) =>
    `${count(sits, 'sit', 'sits')} on ${used} of ${count(stands, 'stand', 'stands')}, by ${count(members, 'member', 'members')} with their guests`,
  unproven: 'Not known',
  unprovenOf: (sits: number) =>
    sits === 1
      ? '1 booked sit has neither a sign-in nor a log'
      : `${sits} booked sits have neither a sign-in nor a log`,
  rests: 'Rests',
  restsOf: (kept: number, times: number) =>
    times === 0
      ? 'no stand was sat a second time'
      : `kept ${kept} of the ${count(times, 'time', 'times')} a stand was sat again`,
  unused: 'Left alone',
  unusedOf: (never: number, oneWindow: number) =>
    `${never === 0 ? 'every stand was sat' : `nobody sat ${count(never, 'stand', 'stands')}`}${oneWindow === 0 ? '' : `; ${oneWindow} in one window only`}`,
  fair: 'Good sits',
  fairOf: (words: string, value: number, luck: string) =>
    `${words} among those who sat (Gini ${value.toFixed(2)})${luck && `; ${luck}`}`,
  luck: {
    by_lot: 'luck and who sat how often explain it',
    less_even: 'fewer hands than luck and who sat how often explain',
    more_even: 'more evenly than luck would have done it',
  },
  fairNone: 'none to share out yet',
  bumps: 'Bumps',
  bumpsOf: (bumped: number, sits: number, share: string, interval: string) =>
    `deer bumped in ${bumped} of ${count(sits, 'logged sit', 'logged sits')}: ${share} (95 % interval ${interval})`,
  bumpsNone: 'no log yet',
  deer: 'Deer an hour',
  deerOf: (figure: string, interval: string, seen: number, hours: number) =>
    `${figure} (95 % interval ${interval}): ${seen} deer in ${hours.toFixed(1)} hours`,
  deerNone: 'no hours logged yet',
  harvest: 'Harvest',
  harvestOf: (antlered: number, antlerless: number) => `${antlered} antlered and ${antlerless} antlerless deer`,
  hours: 'Work',
  hoursOf: (hours: string, members: number) => `${hours} hours credited to ${count(members, 'member', 'members')}`,
} as const;
