import { ydToM } from '../units';

/** Distances and shares at which a set-up counts as faulty. All practice; a club may set its own. */
export interface SetupSettings {
  /** An attraction nearer the seat than this pulls deer about it, m. */
  pullWithinM: number;
  /** Turn from where the seat faces past which a place lies behind it, degrees. */
  behindDeg: number;
  /** An attraction this near the walk counts as beside it, m. */
  besideM: number;
  /** The last of the walk, which must come near what the seat is there for, m. */
  seatMarginM: number;
  /** Chance of deer at a place at the time of walking from which it matters, 0-1. */
  leastUse: number;
  /** Turn from straight downwind inside which scent goes to a place, degrees. */
  scentDeg: number;
  /** Scrapes nearer one another than this share an opening, m. */
  openingM: number;
  /** A scrape this near a line of movement is on it, m. */
  onLineM: number;
  /** A bow shot at a scrape: nearest and farthest, m. */
  scrapeFromM: number;
  scrapeToM: number;
  /** Nearer the seat than this noise carries, m. */
  noiseM: number;
  /** Farther than this from every line of movement a place is off them all, m. */
  offLinesM: number;
  /** Beds nearer the walk than this are reached by its scent, m. */
  bedsWithinM: number;
  /** Share of the winds a stand is hunted on that may carry the walk to a bed, 0-1. */
  upwindShare: number;
  /** A way this near water crosses a line in it: no ground scent stays, m. */
  wadeM: number;
  /** Minutes of low sun in a window, or in a camera's day, that may pass. */
  sunMinutes: number;
  /** Months hunted, of five, in which they are passed before it counts. */
  sunMonths: number;
  /** Turn from the sun inside which a camera looks into it, degrees, and the sun's height up to which it does. */
  cameraTurnDeg: number;
  cameraSunDeg: number;
}

export const DEFAULT_SETUP: SetupSettings = {
  pullWithinM: ydToM(100),
  behindDeg: 135,
  besideM: ydToM(40),
  seatMarginM: ydToM(60),
  leastUse: 0.3,
  scentDeg: 30,
  openingM: ydToM(60),
  onLineM: ydToM(15),
  scrapeFromM: ydToM(15),
  scrapeToM: ydToM(30),
  noiseM: ydToM(7),
  offLinesM: ydToM(100),
  bedsWithinM: ydToM(200),
  upwindShare: 0.5,
  wadeM: ydToM(15),
  sunMinutes: 45,
  sunMonths: 3,
  cameraTurnDeg: 30,
  cameraSunDeg: 25,
};
