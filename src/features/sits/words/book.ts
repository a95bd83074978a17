/** Texts of the form that books a stand. */

export const BOOK_FORM_WORDS = {
  book: (stand: string) => `Book ${stand}`,
  moveTo: (stand: string) => `Move to ${stand}`,
  about: (window: string, sentence: string) => `${window}. ${sentence}.`,
  howLong: 'How long',
  thisWindow: (window: string) => `This ${window}`,
  span: (from: string, to: string) => `${from} to ${to}`,
  allDay: 'All day',
  allDayNote: 'Morning and evening',
  forWhom: 'For',
  myself: 'Myself',
  weapon: 'Weapon',
  wayIn: 'Way in',
  wayHint: (leaveBy: string, inBy: string, way: string) => `Leave by ${leaveBy}, in by ${inBy} by ${way}.`,
  notSaid: 'Not said',
  note: 'Note',
  care: 'Take care',
  bookSit: 'Book this sit',
  booking: 'Booking',
  moveSit: 'Move my sit here',
  moving: 'Moving',
  notNow: 'Not now',
  booked: 'Sit booked',
  moved: 'Sit moved',
  saved: (stand: string, when: string) => `${stand}, ${when}`,
} as const;

export const GUEST_WORDS = {
  guests: 'Guests',
  guest: (number: number) => `Guest ${number}`,
  remove: 'Remove',
  removeWhich: (number: number) => ` guest ${number}`,
  add: 'Add a guest',
} as const;
