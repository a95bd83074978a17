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

export const CLOSURE_WORDS = {
  nothing: 'Nothing was closed.',
  closed: 'Closed',
  standId: 'What is closed',
  theWholeGround: 'The whole ground',
  fromDay: 'First closed day',
  toDay: 'Last closed day',
  toDayHint: 'A stand may be left without one: closed until opened again',
  reason: 'Reason',
  reasonHint: 'Members read it',
  close: 'Close',
  closing: 'Closing…',
  bookedTitle: 'Sits are booked on these days',
  closeAllSame: 'Close all the same',
  keep: 'Do not close',
  bookedText:
    'They stay booked until the member or an admin cancels them. No new sit can be booked. These members are told by mail, and so are the officers:',
} as const;
