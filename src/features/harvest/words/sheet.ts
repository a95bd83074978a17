import { mmToIn, type Units } from '@/core/units';

export const DEER_FORM_WORDS = {
  deer: 'Deer',
  age: 'Estimated age',
  notEstimated: 'Not estimated',
  method: 'Estimated by',
  chooseMethod: 'Choose how',
  dressed: 'Dressed weight',
  dressedHint: 'Field dressed. Never the live weight.',
  live: 'Live weight',
  liveHint: 'Only if weighed whole.',
  antlers: 'Antlers',
  pointsLeft: 'Points, left',
  pointsRight: 'Points, right',
  mainBeamLeft: 'Main beam, left',
  mainBeamRight: 'Main beam, right',
  insideSpread: 'Inside spread',
  milk: 'Milk',
  notLookedAt: 'Not looked at',
  inMilk: 'In milk',
  dry: 'Dry',
} as const;

export const TAKEN_FORM_WORDS = {
  hunter: 'Taken by',
  hunterHint: "A guest's deer counts on the member who answers for them.",
  guest: 'Guest without an account',
  guestHint: "The guest's name, if it was their deer. It counts on the member above.",
  day: 'Day',
  time: 'Time',
  weapon: 'Weapon',
  stand: 'Stand',
  noStand: 'Not from a stand',
  place: 'Place in words',
  notes: 'Notes',
} as const;

export const HARVEST_FORM_WORDS = {
  saved: 'Harvest sheet saved',
  met: 'A quota is met',
  backTitle: 'Your unsaved sheet is back',
  backText: 'It was typed in this tab before and not saved.',
  startAfresh: 'Start afresh',
  save: 'Save sheet',
  saving: 'Saving…',
  back: 'Back without saving',
} as const;

export const HUNTER_CHOICE = {
  you: (name: string) => `${name} (you)`,
  guest: (name: string) => `${name} (guest)`,
  goneStand: 'A stand',
} as const;

/** '17.5 in', '44.5 cm' */
export const lengthWords = (mm: number, units: Units) =>
  units === 'us' ? `${Number(mmToIn(mm).toFixed(2))} in` : `${Number((mm / 10).toFixed(1))} cm`;

export const NEW_SHEET_WORDS = {
  title: 'New harvest sheet',
  lead: "For the club's own record. Tag and report the deer as state law asks.",
} as const;

export const SHEET_WORDS = {
  title: 'Harvest sheet',
  /** In 'Remove this sheet?'. */
  thisSheet: 'this sheet',
  removeText: 'The deer no longer counts toward any quota. The audit log keeps that it was written.',
  change: 'Change the sheet',
  guestOf: (guest: string, member: string) => `${guest}, guest of ${member}`,
  points: (left: number | null, right: number | null) => `${left ?? '?'} and ${right ?? '?'} points`,
  spread: (length: string) => `inside spread ${length}`,
  hunter: 'Taken by',
  when: 'When',
  where: 'Where',
  weapon: 'Weapon',
  age: 'Age',
  ageBy: (age: string, method: string) => `${age} (${method.toLowerCase()})`,
  notEstimated: 'Not estimated',
  dressed: 'Dressed weight',
  live: 'Live weight',
  antlers: 'Antlers',
  beams: 'Main beams, left and right',
  inMilk: 'In milk',
  notLookedAt: 'Not looked at',
  yes: 'Yes',
  no: 'No',
  notes: 'Notes',
} as const;

export const HARVEST_FIELD_ERRORS = {
  long: (most: number) => `Keep it to ${most} characters.`,
  notes: (most: number) => `Keep the notes to ${most} characters.`,
  reload: 'Reload the page and try again.',
  hunter: 'Choose who took it.',
  weapon: 'Choose a weapon.',
  deer: 'Choose what it was.',
  time: 'Give a time.',
  method: 'Say how the age was estimated.',
  swapped: 'A dressed deer weighs less than it did alive: are the two swapped?',
} as const;

/** How errors of a number name its field. */
export const HARVEST_NUMBERS = {
  points: 'Points',
  spread: 'Inside spread',
  beam: 'Main beam',
  dressed: 'Dressed weight',
  live: 'Live weight',
} as const;

export const HARVEST_ERRORS = {
  toCome: 'This is still to come.',
  notInClub: 'This person is not in the club. Choose another.',
  notYours: (hunter: string) => `Only ${hunter}, who answers for them, or an officer writes their sheet.`,
  guestTwice: (hunter: string) => `${hunter} is a guest already: leave this blank.`,
  noSponsor: (hunter: string) => `${hunter} has no sponsor. Choose the member who answers.`,
  stand: 'This stand is not in use. Choose another, or name the place.',
  sentBefore: 'This form was sent before by somebody else. Reload the page and try again.',
  othersCount: (member: string) => `This deer is on ${member}'s count: only they or an officer change it.`,
} as const;

export const HARVEST_AUDIT = {
  added: (hunter: string, deer: string) => `Harvest of ${hunter}: ${deer}.`,
  changed: (hunter: string, deer: string) => `Changed the harvest sheet of ${hunter}: ${deer}.`,
  removed: (deer: string, member: string) => `Took out a harvest sheet: ${deer}, on the count of ${member}.`,
  exported: (sheets: number, season: string) => `Took ${sheets} harvest sheets of ${season} out as a file.`,
} as const;
