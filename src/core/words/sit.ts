/** A share of 0-1 in whole per cent. */
export const percentText = (share: number) => `${Math.round(share * 100)} %`;

/** The line of a sit in a list: what the wind does, then the walk. */
export const SENTENCE_WORDS = {
  line: (wind: string, walk: string) => `${wind}; ${walk}`,
  noForecast: 'No forecast',
  variable: 'Wind light and variable',
  noGoodWinds: (sector: string) => `${sector} wind, no good winds set`,
  variableShare: (share: string) => `Wind light and variable, ${share} in its arcs`,
  wrongWind: (sector: string, share: string) => `${sector} is the wrong wind (${share})`,
  /** `until` null: through the sit. */
  holds: (sector: string, share: string, until: string | null) =>
    `${sector} holds ${share}${until === null ? '' : ` until ${until}`}`,
  noWay: 'no way in is drawn for it',
  walk: (way: string, inBy: string) => `walk in by ${way}, in by ${inBy}`,
  tooLate: (inBy: string) => `too late to walk in, it was to be in by ${inBy}`,
} as const;

const blows = (wind: string, gusts: string) => `wind to ${wind}, gusts to ${gusts}`;

export const CAUTION_WORDS = {
  stayDown: (wind: string, gusts: string) => `Stay on the ground: ${blows(wind, gusts)}`,
  raisedSeat: (wind: string, gusts: string) => `Raised seat: ${blows(wind, gusts)}`,
  thunder: (from: string, until: string) =>
    `Thunder from ${from}: be in a building or hard-topped car until 30 minutes after the last (${until})`,
  frostbite: (felt: string) => `Feels like ${felt}: bare skin may freeze within 30 minutes`,
  cold: (felt: string) => `Feels like ${felt}`,
  noForecast: 'No forecast: ranked by arcs, rest and the way in only',
  staleForecast: (hours: number) => `The forecast is ${hours} h old: check the wind yourself`,
  harness: 'Harness on and tied in from ground to ground',
} as const;

const within = (degrees: number) => `direction within about ${degrees}°`;

export const CONFIDENCE_WORDS = {
  none: 'No forecast',
  variable: 'Wind light and variable: direction unknown',
  gaps: (degrees: number) => `Forecast has gaps; ${within(degrees)}`,
  old: (hours: number, degrees: number) => `Forecast is ${hours} h old; ${within(degrees)}`,
  high: (degrees: number) => `Steady wind soon; ${within(degrees)}`,
  fair: (hours: number, degrees: number) => `Forecast ${hours} h ahead; ${within(degrees)}`,
  anywhere: (degrees: number) => `Wind may come from almost anywhere; ${within(degrees)}`,
  daysAhead: (days: number, degrees: number) => `${days} days ahead; ${within(degrees)}`,
} as const;

interface Turned {
  /** Against the clock; else it veers. */
  backs: boolean;
  to: string;
  after: string | null;
}
const ifWind = ({ backs, to, after }: Turned) =>
  `If the wind ${backs ? 'backs' : 'veers'} to ${to}${after === null ? '' : ` after ${after}`}`;

interface Marks {
  quiet: number;
  promise: number;
}

/** What would change a verdict. */
export const WHAT_IF_WORDS = {
  scent: (turned: Turned, place: string) => `${ifWind(turned)}, scent reaches ${place}`,
  leavesArcs: (turned: Turned) => `${ifWind(turned)}, it leaves the good winds of this stand`,
  otherWay: (way: string, quiet: number, now: number) => `By ${way} instead: quiet ${quiet}, not ${now}`,
  otherTime: (at: string, then: Marks, now: Marks) =>
    `In the seat by ${at} instead: quiet ${then.quiet}, not ${now.quiet}; promise ${then.promise}, not ${now.promise}`,
  rested: (score: number, now: number) => `Left alone two more days: score ${score}, not ${now}`,
} as const;

/** Beside one half hour of a sit. */
export const STEP_WORDS = {
  thunder: 'Thunder',
  drains: 'Cold air drains down the slope',
  rises: 'Warm air draws up the slope',
  turning: 'Slope air is turning',
  outOfArcs: 'More likely out of its good winds than in',
} as const;
