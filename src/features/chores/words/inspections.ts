import type { InspectionItem, InspectionResult, ITEM_ANSWERS } from '@/core/upkeep/inspection';

export const ITEM_WORDS: Record<InspectionItem, { label: string; hint: string }> = {
  tree: { label: 'Tree', hint: 'Alive, sound, has not outgrown the stand' },
  straps: { label: 'Straps, chains and cables', hint: 'Dated; not faded, chewed or grown in' },
  ratchets: { label: 'Ratchets', hint: 'Hold under load, let go when asked' },
  bolts: { label: 'Bolts, welds, rust', hint: 'Tight, whole, no flaking' },
  seat: { label: 'Seat', hint: 'Whole and dry' },
  ladder: { label: 'Ladder joints', hint: 'Pinned; stands firm' },
  platform: { label: 'Platform', hint: 'Level, carries weight, no give' },
  lifeline: { label: 'Lifeline', hint: 'There, dated, from the ground to the seat' },
  steps: { label: 'Steps', hint: 'None loose or missing' },
  blind: { label: 'Roof, door, floor', hint: 'Tight; no wasps' },
  noise: { label: 'Noise', hint: 'Nothing creaks or knocks' },
  name_tag: { label: 'Name tag', hint: 'There and readable' },
  lanes: { label: 'Shooting lanes', hint: 'Clear' },
  path: { label: 'Path', hint: 'Quiet underfoot, marked' },
  weight_label: { label: 'Weight label', hint: 'There and readable' },
  haul_rope: { label: 'Haul rope', hint: 'There and sound' },
};

export const ANSWER_WORDS: Record<(typeof ITEM_ANSWERS)[number], string> = {
  good: 'Good',
  fix: 'Fix',
  unsafe: 'Unsafe',
  none: 'Has none',
};

export const RESULT_WORDS: Record<InspectionResult, string> = {
  pass: 'Pass',
  fix_first: 'Fix first',
  closed: 'Closed',
};

export const RESULT_NOTES: Record<InspectionResult, string> = {
  pass: 'Nothing to mend.',
  fix_first: 'A chore is made to mend it. The stand stays open: say in the notes what to mind.',
  closed: 'Shut at once. Members booked there are told by mail, and a chore is made.',
};

export const INSPECTION_FORM_WORDS = {
  day: 'Day of the look',
  strap: 'Main strap fitted on',
  years: "Maker's years",
  yearsHint: 'As its instructions say. Blank: two years, which is usual practice and no standard.',
  result: 'Result',
  notes: 'Notes',
  notesHint: 'What was found. Needed when the stand does not pass; its first line stands beside the closure.',
  next: 'Next look due',
  save: 'Save inspection',
  saving: 'Saving…',
  back: 'Back without saving',
  saved: (stand: string) => `${stand} inspected`,
  told: (sits: number) => `${sits} booked ${sits === 1 ? 'sit' : 'sits'}: members told by mail.`,
  chore: 'A chore was made to mend it.',
  reopen: 'Open the stand again',
  reopenHint: (day: string, reason: string) => `Closed by the inspection of ${day}. ${reason}.`,
  opened: 'The stand is open again.',
} as const;

export const UPKEEP_TABLE_WORDS = {
  caption: 'Inspections and straps, what is due first',
  stand: 'Stand',
  result: 'Result',
  last: 'Last look',
  next: 'Next due',
  strap: 'Main strap',
  over: 'Over',
  soon: 'Soon',
  never: 'Never looked at',
  lastBy: (day: string, member: string) => `${day}, ${member}`,
  now: 'Now',
  noStrap: 'Has none',
} as const;

export const STRAP_WORDS = {
  noDate: 'No date',
  byMaker: (years: string) => `maker's ${years} y`,
  usual: 'usual 2 y',
  over: (day: string, why: string) => `Over since ${day} (${why})`,
  good: (day: string, why: string) => `Good to ${day} (${why})`,
} as const;

export const STAND_UPKEEP_WORDS = {
  title: 'Inspections',
  titleOf: (stand: string) => `Inspections of ${stand}`,
  inspect: 'Inspect it now',
  stand: 'The stand',
  closed: 'Closed by an inspection',
  closedText: 'It stays closed until a steward opens it again under Closed days.',
  passedText: 'It has passed since. It stays closed until it is opened again.',
  last: 'Last result',
  next: 'Next look due',
  strap: 'Main strap',
  history: 'History',
  empty: 'Nobody has looked it over yet',
  emptyText: 'The list takes some ten minutes at the stand.',
  found: (found: { label: string; answer: string }[]) =>
    found.map(({ label, answer }) => `${label}: ${answer.toLowerCase()}`).join('; '),
} as const;

export const INSPECT_PAGE_WORDS = {
  title: 'Inspect a stand',
  titleOf: (stand: string) => `Inspect ${stand}`,
  harness: 'Harness on from ground to ground',
  harnessText:
    "Look the straps and the tree over from below before you climb. The maker's instructions come before this list.",
} as const;

export const INSPECTION_FIELD_ERRORS = {
  long: (most: number) => `Keep it to ${most} characters.`,
  notesLong: (most: number) => `Keep the notes to ${most} characters.`,
  /** By the mildest result that the answers allow. */
  tooMild: {
    pass: '',
    fix_first: 'Something is marked to fix: the stand cannot pass yet.',
    closed: 'Something is marked unsafe: the result must be closed.',
  } satisfies Record<InspectionResult, string>,
  answer: 'Choose one.',
  next: 'The next look comes after this one.',
  strap: 'The strap was fitted on or before the day of this look.',
  /** How errors of a number name the field. */
  years: 'Years',
  result: 'Choose a result.',
  notes: 'Say what is wrong.',
} as const;

export const INSPECTION_ERRORS = {
  toCome: 'This day is still to come.',
  old: 'Choose a day within the last year.',
  otherKind: (stand: string) => `${stand} has become another kind of stand. Reload the page.`,
} as const;

/** What an inspection writes elsewhere. */
export const INSPECTION_LEAVES = {
  closure: (reason: string) => `Inspection: ${reason}`,
  chore: (stand: string) => `Mend ${stand}`,
  audit: (stand: string, result: InspectionResult, reason: string) =>
    `Inspected ${stand}: ${RESULT_WORDS[result].toLowerCase()}${reason === '' ? '' : `, ${reason}`}.`,
} as const;

export const STAND_CLOSED_MAIL = {
  subject: (stand: string, when: string) => `Stand closed: ${stand}, ${when}`,
  hello: (name: string) => `Hello ${name},`,
  opening: (stand: string) =>
    `${stand} was closed by an inspection, and you are booked there. Do not climb or sit there until a steward opens it again.`,
  stand: 'Stand',
  sit: 'Your sit',
  why: 'Why',
  button: 'Move or cancel the sit',
  footer: 'You get this because the sit is yours.',
} as const;
