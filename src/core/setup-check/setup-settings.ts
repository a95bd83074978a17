import { ydToM } from '../units';

/** Distances and shares by which a set-up counts as faulty and lines of movement are read. All practice; a club may set its own. */
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
  /** A feature this near a line of movement is a stop on it, m. */
  stopWithinM: number;
  /** A stretch of a line that no stand reaches counts as a gap from this length, m. */
  gapFromM: number;
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
  stopWithinM: ydToM(65),
  gapFromM: ydToM(100),
};

export interface SettingBounds {
  /** What it measures: metres, degrees, a share 0-1, minutes, or months of the five hunted. */
  of: 'distance' | 'turn' | 'share' | 'minutes' | 'months';
  least: number;
  most: number;
}

const far = (least: number, most: number): SettingBounds => ({
  of: 'distance',
  least: ydToM(least),
  most: ydToM(most),
});
const turn = (least: number, most: number): SettingBounds => ({ of: 'turn', least, most });

/** Between what a club may set each. Our choice: wide enough for any ground, narrow enough to keep a slip of the hand out. */
export const SETUP_BOUNDS: Record<keyof SetupSettings, SettingBounds> = {
  pullWithinM: far(20, 300),
  behindDeg: turn(90, 180),
  besideM: far(5, 200),
  seatMarginM: far(0, 200),
  leastUse: { of: 'share', least: 0.05, most: 1 },
  scentDeg: turn(5, 90),
  openingM: far(5, 300),
  onLineM: far(2, 100),
  scrapeFromM: far(0, 100),
  scrapeToM: far(5, 150),
  noiseM: far(0, 50),
  offLinesM: far(20, 500),
  bedsWithinM: far(20, 600),
  upwindShare: { of: 'share', least: 0.05, most: 1 },
  wadeM: far(0, 50),
  sunMinutes: { of: 'minutes', least: 5, most: 240 },
  sunMonths: { of: 'months', least: 1, most: 5 },
  cameraTurnDeg: turn(5, 90),
  cameraSunDeg: turn(5, 60),
  stopWithinM: far(5, 300),
  gapFromM: far(20, 1000),
};
export const SETUP_KEYS = Object.keys(SETUP_BOUNDS) as (keyof SetupSettings)[];

/** A club's own settings with the default of each it left. */
export function completeSetup(saved: Partial<SetupSettings>): SetupSettings {
  return { ...DEFAULT_SETUP, ...saved };
}
