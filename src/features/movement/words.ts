import type { WindowName } from '@/core/condition-types';
import type { TimeOfDay } from '@/core/ground-types';

export const MOVEMENT_WORDS = {
  title: 'Lines of movement',
  lead: (month: string) =>
    `What lies along each line deer travel in ${month}, who can sit on each leg, and where nobody can. Practice, from what is drawn on the ground.`,
  none: 'No travel line this month',
  noneText: 'A travel line joins bedding to food by way of crossings, scrapes and water.',
  draw: 'Draw one on the ground',
  onGround: 'Show on the ground',
  lineNote: (length: string, way: string | null) =>
    `${length}. ${way ?? 'It joins no bed to no food that is drawn: the deer’s way is not known.'}`,
  way: (from: string, to: string) => `Mornings from ${from} to ${to}, evenings the other way.`,
  legs: (line: string) => `Legs of ${line}`,
  leg: 'Leg',
  fromTo: (from: string, to: string) => `${from} to ${to}`,
  length: 'Length',
  stands: 'Stands on it',
  noStand: 'No stand',
  gapsTitle: 'Nobody reaches',
  gap: (length: string, between: string) => `${length} between ${between}`,
} as const;

/** When a stand serves a leg. */
export const WHEN_WORDS = {
  anyWind: 'any wind',
  both: (winds: string) => `mornings and evenings on ${winds}`,
  one: (window: WindowName, winds: string) => `${window === 'morning' ? 'mornings' : 'evenings'} on ${winds}`,
} as const;

const TIMES: Record<TimeOfDay, string> = {
  night: 'Dark',
  dawn: 'First light',
  morning: 'Morning',
  midday: 'Midday',
  afternoon: 'Afternoon',
  dusk: 'Last light',
};

export const TIME_WORDS = {
  names: TIMES,
  title: 'Deer by time of day',
  at: (time: string, percent: number) => `${time} ${percent} %`,
  toward: (place: string, times: string[]) => `To ${place}: ${times.join(', ')}`,
  either: (times: string[]) => `Either way: ${times.join(', ')}`,
} as const;

export const MOVEMENT_MAP_WORDS = {
  loading: 'Unfolding the map',
  failed: 'The map could not be read',
  again: 'Try again',
  label: 'Map of the lines of movement, by the numbers of the legs in the lists',
  line: 'Lines drawn',
  allLines: 'All of them',
  choose: 'Deer’s way',
  morning: 'In the morning',
  morningNote: 'First light and after',
  evening: 'In the evening',
  eveningNote: 'Afternoon to last light',
  legend:
    'Numbered: the legs of the lists, the arrow the deer’s way. Thick and whole: some stand reaches it. Broken: a gap nobody reaches. Dotted: from a stand to the nearest place it can shoot on a leg.',
} as const;
