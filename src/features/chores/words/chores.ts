import { LOST } from '@/ui/words/lost';

export const CHORES_PAGE_WORDS = {
  title: 'Chores',
  lead: 'What the ground and the stands need, who does it, and the hours it has taken.',
  add: 'Add a chore',
  setDay: 'Set a work day',
  toDo: 'To do',
  nothing: 'Nothing to do',
  nothingText: 'A chore stands here until somebody marks it done.',
  workDays: 'Work days',
  workDaysNote: 'They stand in the calendar feeds too.',
  noWorkDay: 'None is set',
  noWorkDayText: 'Members see a work day here, and say whether they come.',
  inspections: 'Inspections',
  inspectionsNote: "Two years on a main strap is usual practice and no standard: the maker's instructions come first.",
  noStand: 'No stands yet',
  noStandText: 'Add stands, and each is listed here with its last look.',
  hours: 'Hours',
  hoursNote: (since: string) => `Credited for chores and work days since ${since}.`,
  hoursCaption: 'Hours by member',
  member: 'Member',
  doneLately: 'Done lately',
} as const;

export const CHORE_PAGE_WORDS = {
  title: 'Chore',
  add: 'Add a chore',
  done: (done: string) => `Done ${done}.`,
  back: 'Back to the chores',
  takeOutTitle: 'Take it out',
  takeOut: 'Take out',
  takeOutQuestion: 'Take this chore out?',
  takeOutText: 'It is gone from the list. The audit log keeps that it was there.',
  takenOut: 'The chore is taken out',
} as const;

export const CHORE_LIST_WORDS = {
  nobody: 'Nobody has it yet',
  due: (day: string) => `due ${day}`,
  over: 'Past its day',
  soon: 'Due soon',
  yours: 'Yours',
  take: 'Take it',
  taking: 'Taking…',
  of: (title: string) => `: ${title}`,
  taken: 'It is yours',
  lost: LOST,
  done: (day: string, doer: string | null, hours: string) => `${day}, ${doer ?? 'a former member'}, ${hours} h`,
} as const;

export const CHORE_FORM_WORDS = {
  added: 'Chore added',
  changed: 'Chore changed',
  stands: 'Stands',
  features: 'Features',
  parking: 'Parking',
  what: 'What is to be done',
  who: 'Who',
  whoever: 'Whoever takes it',
  noPlace: 'No one place',
  due: 'Due',
  notes: 'Notes',
  save: 'Save chore',
  add: 'Add chore',
  saving: 'Saving…',
  back: 'Back without saving',
} as const;

export const FINISH_WORDS = {
  title: (chore: string) => `Done: ${chore}`,
  text: 'The hours are credited.',
  textAtPlace:
    'The hours are credited. Work at a place is also written down as a visit, so that the list of stands knows of it.',
  mark: 'Mark done',
  of: (chore: string) => `: ${chore}`,
  done: 'Done',
  doneOn: 'Done on',
  hours: 'Hours',
  saving: 'Saving…',
} as const;

export const REMOVE_WORDS = { lost: LOST } as const;

export const CHORE_FIELD_ERRORS = {
  long: (most: number) => `Keep it to ${most} characters.`,
  notes: (most: number) => `Keep the notes to ${most} characters.`,
  title: 'Say what is to be done.',
  place: 'Choose a place of the list.',
  /** How errors of a number name the field. */
  hours: 'Hours',
} as const;

export const CHORE_ERRORS = {
  assignee: 'This person is no member who does chores. Choose another.',
  placeGone: 'This place is no longer there. Choose another.',
  done: 'This chore is done: it stays on record as it is.',
  doneAlready: 'This chore is done already.',
  hoursStay: 'This chore is done: its hours stay on record.',
  taken: (member: string | null) => `${member ?? 'Somebody'} has this chore.`,
  markedDone: (member: string | null) => `${member ?? 'Somebody'} has marked this chore done.`,
  others: (member: string | null) => `This is ${member ?? 'another member'}'s chore.`,
  toCome: 'This day is still to come.',
  old: 'Choose a day within the last year.',
} as const;

/** A place given by its position, in the list of chores. */
export const BY_POSITION = 'By position';

export const CHORE_AUDIT = {
  added: (chore: string) => `Added a chore: ${chore}.`,
  changed: (chore: string) => `Changed the chore ${chore}.`,
  taken: (member: string, chore: string) => `${member} took the chore ${chore}.`,
  removed: (chore: string) => `Took out the chore ${chore}.`,
  done: (chore: string, member: string, hours: number) => `${chore}: done by ${member}, ${hours} h.`,
} as const;

export const UPKEEP_MAIL = {
  hello: (name: string) => `Hello ${name},`,
  button: 'Open the chores',
  stands: {
    subject: (due: number) => `Stands to look after: ${due} due`,
    opening: "These come due or are over. The maker's instructions come before any usual time.",
    strapOver: (stand: string, day: string, why: string) => `${stand}: main strap, over since ${day} (${why})`,
    strapSoon: (stand: string, day: string, why: string) => `${stand}: main strap, good to ${day} (${why})`,
    look: (stand: string, day: string) => `${stand}: next look by ${day}`,
    footer: 'You get this as an officer.',
  },
  chore: {
    subject: (day: string, chore: string) => `Chore due ${day}: ${chore}`,
    opening: (day: string) => `You have taken on a chore that is due ${day}.`,
    line: (chore: string, place: string) => (place === '' ? chore : `${chore}, ${place}`),
    footer: 'You get this because the chore is yours.',
  },
} as const;
