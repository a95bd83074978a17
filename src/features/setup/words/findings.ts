import type { FindingCode, SetupEffect, SetupTrial } from '@/core/setup-check/setup-types';

export const CODE_WORDS: Record<FindingCode, string> = {
  off_shot: 'Off the shot',
  beside_approach: 'Beside the walk',
  unhuntable: 'No wind for it',
  crowded_scrapes: 'Too many scrapes',
  off_lines: 'Off the line',
  approach_crosses: 'Walk crosses a line',
  approach_upwind: 'Walk upwind of beds',
  seat_sun: 'Seat in the sun',
  camera_sun: 'Camera in the sun',
};

const mended: Record<SetupTrial['change'], string> = {
  without_features: 'Without it',
  without_approach: 'By its other ways',
  facing: 'Turned',
};

const findings = (count: number) => (count === 1 ? 'one finding' : `${count} findings`);

export const SETUP_WORDS = {
  title: 'Set-up check',
  lead: 'What draws deer should draw them past the shot, and nowhere near the walk. Here is where it does not.',
  settings: 'Distances and shares',
  askFirst: 'Ask before you cut, dig or bait',
  askFirstText:
    'Mock scrapes, water, bait and cutting may be limited by the state or the landowner. Nothing here says that a piece of work is allowed.',
  weighing: 'Looking over the ground and weighing each finding on a usual wind',
  nothingYet: 'Nothing to check yet',
  nothingYetText: 'Draw stands, ways in and what deer use first.',
  toGround: 'Go to the ground',
  count: (count: number) => (count === 1 ? 'One finding' : `${count} findings`),
  windsOf: (source: string, from: string, to: string) => `${source}, ${from} to ${to}`,
  windsFrom: (source: string) => `Usual winds: ${source}.`,
  windsUnknown: 'No season of hours is known: every wind counts the same.',
  practice: (own: number) =>
    own === 0
      ? 'All rules are practice, at the distances that come with Windrest.'
      : `All rules are practice; ${own === 1 ? 'one distance or share is' : `${own} distances and shares are`} the club’s own.`,
  camerasBlind: (blind: number, all: number) =>
    `${blind} of ${all} cameras have no direction written down and are not checked.`,
  nothingFound: 'Nothing found',
  nothingFoundText: 'Every attraction is in shot on some wind, the walks keep clear, and nobody looks into the sun.',
  filterStand: 'Stand',
  filterKind: 'What',
  show: 'Show',
  everyStand: 'The whole ground',
  everyKind: 'Everything',
  nothingOfKind: 'Nothing of this kind at this stand.',
  noStand: 'Cameras and the rest of the ground',
  group: (count: number, gain: number) =>
    [findings(count), gain > 0 && (count === 1 ? `costs ${gain}` : `the worst costs ${gain}`)]
      .filter(Boolean)
      .join(', '),
  answered: 'Answered',
  answeredNote: 'They come back when the ground they rest on changes.',
  changedOn: { before: 'Stands and features are changed on the ', link: 'ground', after: '.' },
} as const;

export const FINDING_WORDS = {
  effect: (
    change: SetupTrial['change'],
    { measure }: Pick<SetupEffect, 'measure'>,
    from: number,
    to: number,
    when: string,
  ) => `${mended[change]}, ${measure} ${from} → ${to} on ${when}`,
  gain: (measure: SetupEffect['measure'], from: number, to: number) => `${measure} ${from} → ${to}`,
  when: (sector: string, window: SetupEffect['window']) => `${sector} ${window}s`,
  could: 'What could be done',
  also: (names: string) => `It touches ${names} too.`,
  evidence: (evidence: string) => `Evidence: ${evidence}.`,
  onGround: 'Show on the ground',
  choreBy: (by: string, on: string) => `${by} made a chore of it, ${on}.`,
  leftBy: (by: string, on: string, reason: string) => `${by} left it, ${on}: ${reason}`,
  openChores: 'Open the chores',
} as const;

export const WORK_NOTE_WORDS = {
  rule: (work: string, rule: string, source: string, on: string) =>
    `${work}: ${rule} Source: ${source}, stated on ${on}.`,
  none: (work: string) => `${work}: the club has no rule written down.`,
  decide: 'State law and the landowner decide.',
  write: 'Write it down',
  whoWrites: 'An admin types it under Club, Rules.',
} as const;

export const MAP_WORDS = {
  open: 'Show them on the map',
  loading: 'Unfolding the map',
  label: 'Map of the findings, by the numbers of the list',
  failed: 'The map could not be read',
  again: 'Try again',
} as const;
