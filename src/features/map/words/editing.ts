export const ADD_WORDS = {
  title: 'Add to the map',
  add: 'Add',
  as: 'As',
  draw: 'Draw it',
  here: 'Where I stand',
  type: 'Or type where it is',
  addTyped: 'Add it there',
} as const;

export const ARC_WORDS = {
  goodWinds: 'Good winds',
  morningOnly: 'Morning only',
  eveningOnly: 'Evening only',
  hint: 'Where the wind may come from: NW-N, or 310-20',
  hand: 'Set winds by hand on the map',
  handles: 'Or drag the round handles beside the stand.',
} as const;

export const CONFLICT_WORDS = {
  keep: 'Keep it',
  keepNote: (who: string) => `As ${who} left it.`,
  remove: 'Remove it all the same',
  removeNote: 'Their change goes with it.',
  addAnew: 'Add mine anew',
  addAnewNote: 'What you drew is kept.',
  leave: 'Leave it removed',
  leaveNote: 'What you drew is dropped.',
  both: 'Keep both',
  bothNote: 'Mine is added beside it, to be put right by hand.',
  mine: 'Put mine over theirs',
  mineNote: 'Their change is lost.',
  theirs: 'Keep theirs',
  theirsNote: 'What you drew of it is dropped.',
  title: 'Somebody saved before you',
  text: 'Nothing of yours is saved or lost yet. Choose for each.',
  saving: 'Saving…',
  save: 'Go on and save',
  back: 'Back to the drawing',
} as const;

export const DRAW_WORDS = {
  finish: 'Finish',
  undoPoint: 'Take back a point',
  cancel: 'Cancel',
} as const;

export const HERE_WORDS = {
  noPosition: 'This device tells no position: draw it, or type the numbers.',
  refused: 'The position could not be had: allow it, draw it, or type the numbers.',
  found: (within: string) => `You stand within ${within} of the mark`,
  finding: 'Finding where you stand…',
  add: (what: string) => `Add the ${what} here`,
  lookAgain: 'Look again',
  cancel: 'Cancel',
  loose: 'That is loose. Wait under open sky and look again, or move the mark by hand afterwards.',
  sure: 'The circle on the map is how sure your phone is.',
} as const;

export const MEASURE_WORDS = {
  measure: 'Measure',
  lead: 'Measure.',
  how: 'Tap places on the map, or choose two.',
  done: 'Done',
  from: 'From',
  aPlace: 'A place',
  to: 'To',
  together: (length: string) => `Together ${length}`,
  closed: (size: string) => `Closed: ${size}`,
  undoPoint: 'Take back a point',
  beginAgain: 'Begin again',
} as const;

export const THING_WORDS = {
  split: 'Split',
  chosen: (name: string) => `Chosen: ${name}`,
  letGo: 'Let go of it',
  move: 'Move',
  reshape: 'Reshape or move',
  remove: 'Remove',
  facts: 'Facts and places in numbers',
  put: 'Put it there',
  all: 'All that is kept of it',
} as const;

export const THING_FIELD_WORDS = {
  name: 'Name',
  giveName: 'Give it a name.',
  kind: 'Kind',
  leadsTo: 'Leads to',
  fromParkingPlace: 'From parking place',
  none: 'None',
  walked: 'Walked',
  timberCutIn: 'Timber cut in',
  timberCutInHint: 'The year',
  looksToward: 'Looks toward',
  looksTowardHint: 'From true north, clockwise',
  from: 'From',
  to: 'To',
  reach: 'Reach',
} as const;

export const SAVE_DRAWING_WORDS = {
  lost: 'The server could not be reached. What you drew is still here: try again.',
  savedOne: 'One change is saved',
  saved: (count: number) => `${count} changes are saved`,
} as const;
