/** The ground as a whole, inside a sentence. */
export const WHOLE_GROUND = 'the whole ground';

/** The days of a closure, for a list. */
export const CLOSED_DAYS_WORDS = {
  untilOpened: (from: string) => `${from} until opened again`,
  days: (from: string, to: string) => `${from} to ${to}`,
  closes: (from: string, reason: string) => `Closes ${from}: ${reason}`,
  closedUntilOpened: (reason: string) => `Closed until opened again: ${reason}`,
  closedUntil: (to: string, reason: string) => `Closed until ${to}: ${reason}`,
} as const;

export const CLOSURE_LIST_WORDS = {
  closed: 'Closed',
  days: 'Days',
  reason: 'Reason',
  booked: 'Booked all the same',
  change: 'Change',
  theWholeGround: 'The whole ground',
  now: 'Now',
  nobody: 'Nobody',
} as const;
