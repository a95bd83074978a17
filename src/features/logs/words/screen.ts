export const LOG_PAGE_WORDS = {
  title: 'Log',
  lead: 'What each sit saw, none included: it tells the club which stands are alive and which need rest.',
  addVisit: 'Write down a visit',
  figures: "The season's figures",
  waiting: 'Waiting for a log',
  nothingWaits: 'Nothing waits',
  nothingWaitsText: 'A sit is listed here from its start until its log is written.',
  written: 'Written',
  writtenNote: 'Open a log to read or change it. What it said before is kept.',
  club: "The club's logs",
  clubNote: "Officers see that a log exists. What it says is shown as the club's rule allows.",
  clubEmpty: 'No sit in the last two weeks',
  clubEmptyText: 'Sits of the club are listed here once they end.',
  visits: 'Other visits',
  visitsNote: 'Camera checks, work, walks and drives press on the deer as sits do.',
  visitsEmpty: 'No visit in the last month',
  visitsEmptyText: 'Write down what was done on the ground, so that the list of stands knows of it.',
} as const;

export const WAITING_WORDS = {
  when: (member: string | null, when: string, time: string) =>
    member === null ? `${when}, ${time}` : `${member}: ${when}, ${time}`,
  write: 'Write log',
  of: (stand: string) => ` of ${stand}`,
} as const;

export const LOG_LIST_WORDS = {
  own: 'Your logs of the last year, the latest first',
  club: 'Sits of the club in the last two weeks, the latest first',
  linkOf: (member: string, when: string) => `, log of ${member}, ${when}`,
  stand: 'Stand',
  when: 'When',
  member: 'Member',
  log: 'Log',
  deer: 'Deer',
  bumped: 'Bumped',
  shot: 'Shot',
  none: 'None',
  open: 'Follow-up open',
  written: 'Written',
  missing: 'Missing',
  kept: 'Kept by the club’s rule',
} as const;

export const LOG_HISTORY_WORDS = {
  caption: 'Each time the log was saved, the latest first',
  savedBy: 'Saved by',
  saved: (name: string, at: string) => `${name}, ${at}`,
  hours: 'Hours',
  deer: 'Deer',
  bumped: 'Bumped',
  shot: 'Shot',
  notes: 'Notes',
  none: 'None',
} as const;

export const SIT_LOG_PAGE_WORDS = {
  title: 'Log of a sit',
  over: (member: string | null, when: string) => (member === null ? when : `${member}, ${when}`),
  lead: (time: string) => `Sit from ${time}.`,
  back: 'Back to the logs',
  asSaved: 'As saved',
  asSavedEachTime: 'As saved, each time',
  asSavedNote: 'A change keeps what stood before.',
} as const;

export const LOG_REMINDER_MAIL = {
  subject: (stand: string, when: string) => `No log yet: ${stand}, ${when}`,
  hello: (name: string) => `Hello ${name},`,
  /** `guest`: whose sit it was; null: the reader's own. */
  opening: (stand: string, guest: string | null) =>
    `${guest === null ? 'Your sit' : `The sit of your guest ${guest}`} at ${stand} has no log yet. It takes twenty seconds, and a sit in which nothing was seen counts as much as any other.`,
  stand: 'Stand',
  when: 'When',
  clubTime: 'Club time',
  button: 'Write the log',
  footer: 'You get this once for each sit without a log.',
} as const;
