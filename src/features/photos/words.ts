import { LOST } from '@/ui/words/lost';

export const PHOTOS_WORDS = {
  title: 'Photos',
  note: 'Kept without their position. Only members of the club see them.',
  none: 'No photos yet.',
} as const;

export const PHOTO_WORDS = {
  unnamed: (number: number, by: string) => `Photo ${number} by ${by}`,
  facts: (takenAt: string | null, by: string) => (takenAt === null ? `by ${by}` : `taken ${takenAt}, by ${by}`),
  open: (photo: string) => `Open ${photo}`,
  caption: 'What it shows',
  save: 'Save',
  saving: 'Saving…',
  remove: 'Remove',
  removeTitle: 'Remove this photo?',
  removeConfirm: 'Remove the photo',
  removeText: 'It is gone for everyone and cannot be brought back.',
  lost: LOST,
} as const;

export const ADD_PHOTOS_WORDS = {
  tooBig: (megabytes: number) => `A photo may be ${megabytes} MB at most.`,
  refused: (file: string, why: string) => `${file}: ${why}`,
  added: (photos: number) => (photos === 1 ? 'The photo is added' : `${photos} photos are added`),
  chooseFirst: 'Choose one photo or several first.',
  add: 'Add photos',
  addHint: 'Off the phone or a trail camera; several at once',
  keepTime: 'Keep the time each was taken',
  progress: (at: number, of: number, file: string) => `Photo ${at} of ${of}: ${file}`,
  send: 'Send',
  sending: 'Sending…',
} as const;

export const PHOTO_ERRORS = {
  mayNotAdd: (subject: string) => `You may look at photos of ${subject}, but not add any.`,
  tooBig: (megabytes: number) => `A photo may be ${megabytes} MB at most: save it smaller and try again.`,
  tooMany: (most: number, subject: string) => `There are ${most} photos of ${subject} already: remove one first.`,
  noPhoto: 'This is no photo that can be read: choose a JPEG, PNG, WebP or HEIC.',
  empty: 'The file is empty: choose another.',
  tooManyPixels: 'The photo has too many pixels: save it smaller and try again.',
  notYours: 'Only whoever added a photo, or a steward, may change or remove it.',
  caption: (most: number) => `Keep it to ${most} characters.`,
} as const;

/** What a photo is of, where that has no name of its own. */
export const sitAsSubject = (stand: string) => `the sit at ${stand}`;

export const PHOTO_AUDIT = {
  added: (subject: string) => `Added a photo of ${subject}.`,
  removed: (subject: string) => `Removed a photo of ${subject}.`,
} as const;
