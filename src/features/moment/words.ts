import type { WindowName } from '@/core/condition-types';

export const GROUND_MAP_WORDS = {
  unfolding: 'Unfolding the map',
  noStandsTitle: 'No stands yet',
  noStands: 'Draw a stand first: a moment is looked at from its seat.',
  moment: 'For a moment',
} as const;

export const MOMENT_WINDOWS: Record<WindowName, string> = { morning: 'Morning', evening: 'Evening' };

export const MOMENT_WORDS = {
  stand: 'Stand',
  day: 'Day',
  window: 'Window',
  dayBefore: '‹ Day before',
  dayAfter: 'Day after ›',
  halfHour: (from: string) => `Half hour from ${from || 'the start'}`,
  orChoose: 'Or choose the time',
  failed: 'This moment could not be read',
  again: 'Try again',
  working: 'Working it out',
  noForecastTitle: 'No forecast',
  noForecast: (day: string) => `Scent is not drawn for ${day}: the forecast does not reach it.`,
  legend:
    'Clay shading is where your scent would lie, the deeper the stronger: an index for comparing, no promise. The walk is thicker where it costs more. The dashed line points at the sun.',
} as const;

export const MOMENT_FACT_WORDS = {
  wind: 'Wind',
  scent: 'Scent',
  sun: 'Sun',
  walk: 'Walk in',
  sitters: 'Who sits',
  noWind: 'No forecast reaches this half hour',
  noDirection: 'From no one direction',
  from: (direction: string, degrees: number) => `From ${direction}, ${degrees}°`,
  atSeat: (from: string, speed: string) => `${from}, ${speed} at the seat`,
  winded: (share: string, most: string | null) =>
    `${share} to be winded in this half hour${most ? `, most at ${most}` : ''}`,
  notKnown: 'Not known',
  nobody: 'Nobody has booked this window',
  sits: (who: string, stand: string) => `${who} at ${stand}`,
} as const;

export const MOMENT_SUN_WORDS = {
  night: 'Down: night',
  twilight: (direction: string) => `Down: twilight in the ${direction}`,
  up: (direction: string, degrees: number, inEyes: boolean) =>
    `In the ${direction}, ${degrees}° up${inEyes ? ', in your eyes' : ''}`,
} as const;

export const MOMENT_COST_WORDS = {
  noWay: 'No way in is drawn for this stand.',
  way: (name: string, chance: string) => `${name}: ${chance} to alert deer walking in.`,
  even: 'No piece of it costs more than another.',
  run: (from: string, to: string, chance: string, worst: string | null) =>
    `${from} to ${to} in: ${chance}${worst ? `, at ${worst}` : ''}`,
} as const;

export const MOMENT_ERRORS = { day: 'Choose a day.' } as const;
