import { LOST } from '@/ui/words/lost';

export const WORK_DAY_PAGE_WORDS = {
  title: 'Work day',
  setTitle: 'Set a work day',
  setLead: "It appears on the Chores page and in every member's calendar feed.",
  lead: (day: string, time: string) => `${day}, ${time}`,
  calledOff: 'This work day was called off.',
  back: 'Back to the chores',
  hours: 'Hours',
  hoursNote: 'Blank: was not there.',
  change: 'Change',
  callOff: 'Call it off',
  callOffQuestion: 'Call this work day off?',
  callOffText: 'Calendar feeds show it as cancelled.',
  callOffDone: 'The work day is called off',
} as const;

export const WORK_DAY_LIST_WORDS = {
  meet: (place: string) => `meet at ${place}`,
  credited: (hours: number) => `${hours} h credited`,
  coming: (names: string[]) => `Coming: ${names.length === 0 ? 'Nobody has said so yet' : names.join(', ')}`,
  come: 'I come',
  notCome: 'I cannot come',
  of: (title: string, day: string) => `: ${title}, ${day}`,
  comes: 'You are on the list',
  comesNot: 'You are off the list',
  saving: 'Saving…',
  lost: LOST,
} as const;

export const WORK_DAY_FORM_WORDS = {
  set: 'Work day set',
  changed: 'Work day changed',
  name: 'Name',
  day: 'Day',
  from: 'From',
  to: 'To',
  meet: 'Meet at',
  notes: 'Notes',
  save: 'Save work day',
  add: 'Set work day',
  saving: 'Saving…',
  back: 'Back without saving',
} as const;

/** The name a new one starts with. */
export const NEW_WORK_DAY = 'Work day';

export const CREDIT_FORM_WORDS = {
  credited: (members: number) => `Hours of ${members} credited`,
  saidToCome: 'Said to come',
  credit: 'Credit hours',
  saving: 'Saving…',
} as const;

export const WORK_DAY_FIELD_ERRORS = {
  long: (most: number) => `Keep it to ${most} characters.`,
  notes: (most: number) => `Keep the notes to ${most} characters.`,
  name: 'Give it a name.',
  nameLong: (most: number) => `Keep the name to ${most} characters.`,
  time: 'Give a time.',
  endFirst: 'It ends after it begins, on the same day.',
  /** How errors of a number name the field. */
  hours: 'Hours',
} as const;

export const WORK_DAY_ERRORS = {
  day: 'Choose a day within the last year or the next two.',
  calledOff: 'This work day was called off.',
  over: 'This work day is over. An officer credits the hours.',
  toCome: 'This work day is still to come.',
  noMember: 'Somebody on the list is no longer a member. Reload the page.',
} as const;

export const WORK_DAY_AUDIT = {
  set: (day: string) => `Set a work day: ${day}.`,
  changed: (before: string, after: string) => `Changed the work day ${before}: now ${after}.`,
  calledOff: (day: string) => `Called off ${day}.`,
  credited: (day: string, members: number) =>
    `Credited the hours of ${day} to ${members} ${members === 1 ? 'member' : 'members'}.`,
} as const;
