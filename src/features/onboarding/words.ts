import { LOST } from '@/ui/words/lost';

export const FIRST_STEPS_WORDS = {
  lost: LOST,
  title: 'First steps',
  doneOf: (done: number, all: number) => `${done} of ${all} done`,
  done: 'Done',
  toDo: 'To do',
  samplesThere: 'Sample stands are on the list',
  removing: 'Taking them away…',
  remove: 'Take the samples away',
  laying: 'Laying samples…',
  lay: 'See a list with three sample stands',
  hiding: 'Putting away…',
  hide: 'Put these steps away',
} as const;

export const ONBOARDING_AUDIT = {
  hidden: (member: string) => `${member} put the first steps away.`,
  parkingAdded: (parking: string) => `Added sample parking place ${parking}.`,
  standAdded: (stand: string) => `Added sample stand ${stand}.`,
} as const;

export const ONBOARDING_ERRORS = {
  samplesThere: 'The samples are there already: look at the list, or take them away.',
} as const;

export const FIRST_STEPS = {
  place: 'The place',
  placeWhy: 'Sun, forecast and clock are those of this point.',
  placeDoing: 'Look at it',
  stand: 'The first stand',
  standWhy: 'Where it stands, how high, and how far a shot carries.',
  standDoing: 'Add a stand',
  winds: 'Its good winds',
  windsWhy: 'The directions a wind may come from there. Without them every wind counts the same.',
  windsDoing: 'Set the winds',
  way: 'A way in',
  wayWhy: 'From the gate to the stand: your scent drifts along it, and the list says when to leave.',
  wayDoing: 'Draw a way in',
  others: 'The others',
  othersWhy: 'A stand is booked for all only when all book here.',
  othersDoing: 'Invite a member',
  sit: 'The first sit',
  sitWhy: 'Take the first of the list, and the rest see that it is taken.',
  sitDoing: 'Look at the list',
} as const;

export const SAMPLE_WORDS = {
  notes: 'Laid as a sample to show what a list looks like. Take it away when you have stands of your own.',
  ridgeLadder: 'Sample: ridge ladder',
  fieldBox: 'Sample: field box',
  creekClimber: 'Sample: creek climber',
  gate: 'Sample: gate',
  path: 'Sample path',
} as const;
