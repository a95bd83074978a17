import type { PressureKind } from '@/core/condition-types';
import { LOST } from '@/ui/words/lost';

export const VISIT_WORDS: Record<PressureKind, string> = {
  camera_check: 'Camera check',
  work: 'Work',
  walk_through: 'Walk-through',
  drive: 'Drive',
  bump: 'Deer bumped, on no errand',
  sit: 'Sit',
};

export const VISIT_PAGE_WORDS = {
  title: 'Write down a visit',
  lead: 'Anything but a sit. It lowers what the list expects of the stands near by, for a few days.',
} as const;

export const VISIT_FORM_WORDS = {
  kept: (kind: PressureKind, day: string, clock: string) => `${VISIT_WORDS[kind]}, ${day} ${clock}`,
  saved: 'Visit written down',
  stands: 'Stands',
  features: 'Features',
  parking: 'Parking',
  what: 'What',
  day: 'Day',
  time: 'Time',
  choosePlace: 'Choose a place',
  bumped: 'Deer bumped',
  notes: 'Notes',
  save: 'Save visit',
  saving: 'Saving…',
  back: 'Back without saving',
} as const;

export const PLACE_CHOICE_WORDS = {
  where: 'Where',
  byPosition: 'Another place, by its position',
  lat: 'Latitude',
  lon: 'Longitude',
} as const;

export const VISIT_LIST_WORDS = {
  caption: 'Visits of the last month, the latest first',
  what: 'What',
  where: 'Where',
  when: 'When',
  who: 'Who',
  bumped: 'Bumped',
  notes: 'Notes',
  takeOut: 'Take out',
  takeOutOf: (kind: string, where: string, when: string) => ` ${kind}, ${where}, ${when}`,
  deer: (count: number) => (count > 0 ? `${count} deer` : 'None'),
  confirmTitle: 'Take this visit out?',
  confirm: 'Take it out',
  confirmText: 'It no longer counts as pressure. The audit log keeps that it was written.',
  takenOut: 'The visit is taken out',
  lost: LOST,
  from: (distance: string, stand: string) => `${distance} from ${stand}`,
  onTheGround: 'On the ground',
  hasLeft: 'Somebody who has left',
} as const;

export const VISIT_ERRORS = {
  kind: 'Choose what was done.',
  long: (most: number) => `Keep it to ${most} characters.`,
  whole: 'Give a whole number.',
  negative: 'There cannot be fewer than none.',
  most: (most: number) => `At most ${most}.`,
  notes: 'Keep the notes to 500 characters.',
  time: 'Give a time.',
  where: 'Choose where it was.',
  toCome: 'This is still to come. Write a visit down afterwards.',
  old: 'This is more than a year ago: choose a later day.',
  gone: 'This place is no longer there. Choose another.',
  notYours: 'Only who wrote this visit down, or an officer, can take it out.',
} as const;

export const OWN_PLACE = 'a place of its own';

export const VISIT_AUDIT = {
  added: (kind: PressureKind, place: string, at: string) => `${VISIT_WORDS[kind]} at ${place}, ${at}.`,
  removed: (kind: PressureKind, at: string) => `Took out a visit: ${VISIT_WORDS[kind].toLowerCase()}, ${at}.`,
} as const;
