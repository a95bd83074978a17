import type { BUMP_FIELDS, COUNT_FIELDS } from '../log-schema';

export const COUNT_WORDS: Record<(typeof COUNT_FIELDS)[number], string> = {
  antleredBucks: 'Antlered bucks',
  does: 'Does',
  fawns: 'Fawns',
  unknown: 'Unknown',
};

export const BUMP_WORDS: Record<(typeof BUMP_FIELDS)[number], string> = {
  bumpedIn: 'On the way in',
  bumpedSitting: 'From the seat',
  bumpedOut: 'On the way out',
};

export const LOG_FORM_WORDS = {
  kept: (day: string) => `Log of ${day}`,
  saved: (stand: string) => `Log of ${stand} saved`,
  backTitle: 'Your unsaved counts are back',
  backText: 'They were typed in this tab before and not saved.',
  startAfresh: 'Start afresh',
  seen: 'Deer seen',
  seenHint: 'Every deer, every sit. Unknown when you are not sure. None counts too.',
  from: 'From',
  to: 'To',
  bumped: 'Deer bumped',
  bumpedHint: 'That blew, ran or left because of you. It tells the club which stand to rest.',
  bumpedWhere: 'Where they were bumped',
  notes: 'Notes',
  save: 'Save log',
  saving: 'Saving…',
  back: 'Back without saving',
} as const;

export const SHOT_FORM_WORDS = {
  shot: 'Shot',
  time: 'Time of the shot',
  hit: 'Where it was hit',
  followUp: 'How it stands',
  followUpNotes: 'Where it stood, was last seen and was found',
  wait: 'Wait before you follow',
  waitShort: 'Wait 30 minutes',
  waitLong: 'Wait 4 to 6 hours',
  followFrom: (from: string) => `Follow from ${from}`,
  followBetween: (earliest: string, latest: string) => `Follow from ${earliest} at the earliest, better ${latest}`,
} as const;

export const LOG_FIELD_ERRORS = {
  whole: 'Give a whole number.',
  negative: 'There cannot be fewer than none.',
  most: (most: number) => `At most ${most}.`,
  time: 'Give a time.',
  long: (most: number) => `Keep it to ${most} characters.`,
  shot: 'Choose what came of it.',
  endFirst: 'The end comes after the start.',
  shotTime: 'Give the time of the shot.',
  hit: 'Choose where, or that you are not sure.',
  followUp: 'Choose how it stands.',
} as const;

export const LOG_ERRORS = {
  notYours: (member: string) => `This is ${member}'s sit: only they or an officer write its log.`,
  lapsed: 'This sit lapsed, unsigned: it has no log.',
  cancelled: 'This sit was cancelled: it has no log.',
  notBegun: 'This sit has not begun yet. Write its log afterwards.',
  beginsAt: (at: string) => `This sit begins at ${at}. Write its log afterwards.`,
  toCome: 'This is still to come.',
  /** `by`: null when nobody knows who. */
  changed: (by: string | null) =>
    `${by ?? 'Somebody'} saved this log after you opened it. What you typed is still here: open the log in another tab and compare.`,
} as const;

export const LOG_AUDIT = {
  written: (member: string, stand: string, when: string) => `Wrote the log of ${member}'s sit at ${stand}: ${when}.`,
  changed: (member: string, stand: string, when: string) => `Changed the log of ${member}'s sit at ${stand}: ${when}.`,
} as const;
