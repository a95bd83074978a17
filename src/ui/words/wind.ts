/** What the wind graphics say to a reader who does not see them. */

export const STRIP_WORDS = {
  noArcs: 'no good arcs set',
  arcs: (names: string) => `the good arcs ${names}`,
  and: ' and ',
  noForecast: (arcs: string, any: boolean) => `No wind forecast; ${arcs}${any ? ' are set' : ''}`,
  mostly: (name: string, turn: string) => `Wind mostly ${name}${turn}`,
  unsettled: 'Wind from no settled direction',
  only: (wind: string, arcs: string) => `${wind}; ${arcs}`,
  share: (wind: string, share: string, arcs: string) => `${wind}, ${share} in ${arcs}`,
  veering: (to: string) => `, veering to ${to}`,
  backing: (to: string) => `, backing to ${to}`,
} as const;

export const STRIP_PAGE_WORDS = {
  utc: (clock: string) => `${clock} UTC`,
  time: 'Time',
  windFrom: 'Wind from',
  inArcs: 'In the good arcs',
  inArcsShort: 'in arcs',
  unsettled: 'no settled direction',
  noForecast: 'no forecast',
} as const;

export const BARB_WORDS = {
  calm: 'Calm',
  variable: 'Variable',
  wind: (from: string, knots: number) => `${from} wind, ${knots} kt`,
} as const;

export const COMPASS_WORDS = {
  everyWay: 'Faces every way',
  faces: (direction: string, degrees: number) => `Faces ${direction}, ${degrees}°`,
} as const;

export const ROSE_WORDS = {
  none: 'No wind on record',
  calm: (share: string) => `Calm ${share}`,
  from: (shares: string, calm: string | null) => `Wind from ${shares}${calm ? `; calm ${calm}` : ''}`,
} as const;

export const TIMELINE_WORDS = {
  hold: (first: string, firstAt: string, low: string, lowAt: string) =>
    `Arc hold ${first} at ${firstAt}, lowest ${low} at ${lowAt}`,
  noForecast: 'No wind forecast',
  winded: (share: string, at: string) => `chance of being winded at most ${share} a half hour, at ${at}`,
  sun: (times: string) => `sun in the eyes ${times}`,
  rain: (times: string) => `rain ${times}`,
  keyArcs: 'wind in the good arcs',
  keyWinded: 'chance of being winded',
  keySun: 'sun in the eyes',
  keyRain: 'rain',
  asTable: 'The same as a table',
  time: 'Time',
  inArcs: 'In arcs',
  windedHead: 'Winded',
  notes: 'Notes',
  rainMm: (mm: number | null) => `rain ${mm} mm`,
} as const;
