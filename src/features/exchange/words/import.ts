import type { DrawnShape } from '@/core/map-layers';
import { LOST } from '@/ui/words/lost';
import type { Fate } from '../fate';

export const IMPORT_PAGE_WORDS = {
  title: 'Bring in a file',
  over: 'Ground',
  lead: 'From a handheld, a phone or a map program. You look over every row before anything is added.',
  before: 'Files read before',
} as const;

export const UPLOAD_WORDS = {
  choose: 'Choose a file first; an empty one has nothing to add.',
  file: 'File',
  hint: (megabytes: number) => `GPX, KML, KMZ, GeoJSON, or a CSV table with lat and lon columns; up to ${megabytes} MB`,
  notRead: 'This file was not read',
  sending: 'Sending the file',
  reading: 'Reading the file',
  sendingShort: 'Sending…',
  readingShort: 'Reading…',
  read: 'Read the file',
} as const;

const added = (things: number) => (things === 1 ? 'One thing added' : `${things} things added`);

export const IMPORT_LIST_WORDS = {
  caption: 'Files read before',
  file: 'File',
  read: 'Read',
  by: 'By',
  outcome: 'What came of it',
  waits: 'Waits to be looked over',
  saved: (things: number) => added(things),
  undone: (things: number) => `${added(things)}, then undone`,
} as const;

export const REVIEW_PAGE_WORDS = {
  title: 'Look over a file',
  over: 'Bring in a file',
  leads: {
    read: 'Nothing is added yet. Tick what you want, and say what it is.',
    saved: 'What this file added is on the ground.',
    undone: 'What this file added was taken away again.',
  },
  ground: 'Go to the ground',
  things: (things: number) => (things === 1 ? 'One thing' : `${things} things`),
  names: (names: string[], more: number) => `${names.join(', ')}${more > 0 ? ` and ${more} more` : ''}`,
} as const;

export const FATE_WORDS: Record<Fate, string> = {
  ready: 'Will be added',
  choose: 'Kind not known',
  twin: 'There already',
  cannot: 'Cannot be taken',
};

export const FATE_SENTENCES = {
  cannot: (problem: string) => `Cannot be taken: ${problem}`,
  onMap: (name: string, distance: string) => `${name} is there already, ${distance} away.`,
  inFile: (row: number, name: string, distance: string) => `Row ${row}, ${name}, is the same, ${distance} away.`,
  choose: 'Choose what it is.',
  chooseNear: (near: string) => `Choose what it is. ${near}`,
  ready: 'Will be added.',
} as const;

export const REVIEW_WORDS = {
  lost: 'The server could not be reached. Your choices are still here: try again.',
  swappedTitle: 'Latitude and longitude look swapped',
  swappedText: 'As they stand the places lie far from the club; the other way round they lie on it.',
  swap: 'Swap them',
  swapping: 'Swapping…',
  counts: (counts: { label: string; count: number }[]) =>
    counts.map(({ label, count }) => `${label}: ${count}`).join(' · '),
  show: 'Show',
  allRows: 'All rows',
  tickAll: 'Tick all that can be added',
  tickNone: 'Tick none',
  caption: (file: string) => `Rows of ${file}`,
  rows: (rows: number) => `${rows} rows`,
  notAdded: 'Nothing was added',
  adding: 'Adding…',
  added: (things: number) => `${things} added to the ground`,
  nothingTicked: 'Nothing is ticked',
  add: (things: number) => `Add ${things} to the ground`,
} as const;

export const REVIEW_ROW_WORDS = {
  shapes: { point: 'Point', line: 'Line', area: 'Area' } satisfies Record<DrawnShape, string>,
  row: (row: number) => `Row ${row}`,
  /** In 'row 7, is the same'. */
  rowAsName: (row: number) => `row ${row}`,
  addRow: (name: string, row: number) => `Add ${name}, row ${row}`,
  kindOf: (name: string, row: number) => `What ${name}, row ${row}, is`,
  points: (points: number) => `, ${points} points`,
  choose: 'Choose',
  add: 'Add',
  name: 'Name',
  shape: 'Shape',
  kind: 'What it is',
  fate: 'What becomes of it',
} as const;

const FILL = {
  point: { one: 'the one point', all: (count: number) => `all ${count} points` },
  line: { one: 'the one line', all: (count: number) => `all ${count} lines` },
  area: { one: 'the one area', all: (count: number) => `all ${count} areas` },
} satisfies Record<DrawnShape, { one: string; all: (count: number) => string }>;

export const FILL_WORDS = {
  label: (shape: DrawnShape, count: number) =>
    `Take ${count === 1 ? FILL[shape].one : FILL[shape].all(count)} without a kind as`,
  choose: 'Choose',
  set: { point: 'Set points', line: 'Set lines', area: 'Set areas' } satisfies Record<DrawnShape, string>,
} as const;

export const UNDO_WORDS = {
  undo: 'Undo the import',
  title: 'Undo this import?',
  text: (things: number) =>
    `Takes away the ${things} things this file added. What has been changed, booked or built upon since stays where it is.`,
  undone: (things: number) => `${things} taken away again`,
  kept: (names: string[]) => `Kept, because changed or used since: ${names.join(', ')}`,
  lost: LOST,
} as const;

export const IMPORT_ERRORS = {
  noRow: 'Choose at least one row to add.',
  twice: 'One row was chosen twice: open the file again.',
  unknown: (row: number) => `Row ${row} is not in the file, or its kind is not known.`,
  role: (club: string) => `Your role in ${club} does not allow you to add all of these.`,
  cannot: (row: number, problem: string) => `Row ${row} cannot be taken: ${problem}`,
  shape: (row: number, kind: string) =>
    `Row ${row} is no ${kind.toLowerCase()}: it has the wrong shape. Choose another kind.`,
  changedSince: 'Somebody has worked on this file since you opened it: look at it again.',
  noStand: (row: number, name: string) =>
    `Row ${row}${name === '' ? '' : `, ${name},`} leads to no stand: none lies near its ends. Take it as a trail, or add its stand as well.`,
} as const;

/** What a thing without a name is called. */
export const PLAIN_NAMES = {
  stand: 'Stand',
  parking: 'Parking',
  approach: 'Approach',
  approachFrom: (parking: string) => `From ${parking}`,
} as const;

export const IMPORT_AUDIT = {
  added: (name: string, file: string) => `Added ${name} from ${file}.`,
  saved: (made: number, all: number, file: string) => `Added ${made} of ${all} things from ${file} to the ground.`,
  undone: (removed: number, file: string, kept: string[]) =>
    `Took away ${removed} things that came from ${file}.${kept.length > 0 ? ` Kept what was changed or used since: ${kept.join(', ')}.`.slice(0, 400) : ''}`,
} as const;
