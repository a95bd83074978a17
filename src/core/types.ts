/**
 * The shapes every stage of the scoring core shares. SI units; the unit is in the name. Directions are degrees clockwise
 * from true north and a wind direction is where the wind comes FROM. Instants are UTC milliseconds. Positions are local
 * metres east and north of the club's centre (see geometry.ts).
 */

export type Evidence = 'standard' | 'study' | 'practice' | 'club log' | 'our choice';

export type WindowName = 'morning' | 'evening';
export const WINDOW_NAMES = ['morning', 'evening'] as const satisfies readonly WindowName[];

export interface Point {
  eastM: number;
  northM: number;
}

export type LocalShape =
  | { type: 'point'; at: Point }
  | { type: 'line'; points: Point[] }
  /** One outer ring and any number of holes; rings need not repeat their first point. */
  | { type: 'area'; rings: Point[][] };

/** Clockwise span of directions the wind may come from. `to - from` of 360 is the full circle; equal ends hold one direction. */
export interface Arc {
  fromDeg: number;
  toDeg: number;
}

export interface GoodWindArc extends Arc {
  /** null: the arc is good in both windows. */
  window: WindowName | null;
}

export const STAND_KINDS = [
  'ladder',
  'hang_on',
  'climber',
  'tripod',
  'box_blind',
  'ground_blind',
  'natural_cover',
] as const;
export type StandKind = (typeof STAND_KINDS)[number];

export const FEATURE_KINDS = [
  'bedding',
  'food_plot',
  'crop',
  'mast',
  'water',
  'scrape',
  'rub_line',
  'travel_line',
  'crossing',
  'sanctuary',
] as const;
export type FeatureKind = (typeof FEATURE_KINDS)[number];

export const SHELTER_CLASSES = ['open', 'edge', 'open_wood', 'dense_wood'] as const;
export type ShelterClass = (typeof SHELTER_CLASSES)[number];

export const SUITABILITIES = ['prime', 'usable', 'avoid'] as const;
export type Suitability = (typeof SUITABILITIES)[number];

export const WEAPONS = ['bow', 'crossbow', 'muzzleloader', 'shotgun', 'rifle'] as const;
export type Weapon = (typeof WEAPONS)[number];

export type ShotSide = 'left' | 'right' | 'either';

export interface ScoredStand {
  id: string;
  name: string;
  kind: StandKind;
  at: Point;
  /** Seat above ground, 0-15 m. */
  seatHeightM: number;
  /** Direction the seat faces; null: faces no one way. */
  facingDeg: number | null;
  shotSide: ShotSide;
  /** Longest shot by weapon the steward allows, metres; a weapon not named is not allowed here. */
  shotRangeM: Partial<Record<Weapon, number>>;
  shelter: ShelterClass;
  arcs: GoodWindArc[];
  suitability: Record<WindowName, Suitability>;
  restDays: number;
  /** Direction in which cold air drains away from the stand; null: flat or unknown, no slope drift is modelled. */
  drainBearingDeg: number | null;
  /** Slope at the stand in percent; null: unknown (the core assumes a gentle hill when a drain bearing is given). */
  slopePercent: number | null;
  /** Points of quiet (0-100) added by what the club's log has taught; left out: none. */
  quietShift?: number;
}

/** Share (0-1) of deer that use a kind of place at each time of day; see whereabouts.ts. */
export const TIMES_OF_DAY = ['night', 'dawn', 'morning', 'midday', 'afternoon', 'dusk'] as const;
export type TimeOfDay = (typeof TIMES_OF_DAY)[number];
export type UseTable = Record<TimeOfDay, number>;

export interface ScoredFeature {
  id: string;
  name: string;
  kind: FeatureKind;
  shape: LocalShape;
  /** Months 1-12 in which deer use it. */
  months: number[];
  /** A steward's own table in place of the kind's default. */
  use: Partial<UseTable> | null;
}

export interface ScoredApproach {
  id: string;
  name: string;
  standId: string;
  parkingName: string | null;
  direction: 'in' | 'out' | 'both';
  /** From the parking place to the stand. */
  points: Point[];
  /** Points up to and including this index are driven; 0: all on foot. */
  vehicleToIndex: number;
}

/** One hour of weather at the club's place. null: not given. */
export interface WeatherHour {
  at: number;
  /** null with a speed above zero is a variable wind; speed 0 is calm whatever stands here. 10 m wind. */
  windFromDeg: number | null;
  windSpeedMps: number | null;
  gustMps: number | null;
  tempC: number | null;
  pressureHpa: number | null;
  precipMm: number | null;
  /** 0-100. */
  cloudPercent: number | null;
  /** Downward shortwave, W/m2. */
  radiationWm2: number | null;
  thunder: boolean;
}

export interface EnsembleMember {
  id: string;
  /** Same instants as the forecast's hours, one for one. */
  hours: { at: number; windFromDeg: number | null; windSpeedMps: number | null }[];
}

export interface Forecast {
  /** When the weather service made it. */
  issuedAt: number;
  /** When this app got it. */
  fetchedAt: number;
  source: string;
  hours: WeatherHour[];
  members: EnsembleMember[];
}

export const PRESSURE_KINDS = ['sit', 'bump', 'camera_check', 'work', 'walk_through', 'drive'] as const;
export type PressureKind = (typeof PRESSURE_KINDS)[number];

export interface PressureEvent {
  at: number;
  kind: PressureKind;
  place: Point;
  standId: string | null;
  /** Deer bumped during it, when known. */
  bumped: number;
}

/** Deer seen from a stand in past sits, for shrinking its rate to the club's mean. */
export interface StandSightings {
  standId: string;
  sits: number;
  hours: number;
  deer: number;
}

/** One window of one day at the club: what the list ranks. */
export interface SitWindow {
  /** YYYY-MM-DD in the club's zone. */
  day: string;
  window: WindowName;
  startAt: number;
  endAt: number;
}

/** Something that forbids the sit outright. */
export interface Gate {
  code:
    | 'closed'
    | 'resting'
    | 'breaks_later_rest'
    | 'taken'
    | 'out_of_season'
    | 'closed_day'
    | 'too_far_ahead'
    | 'claim_limit'
    | 'season_limit'
    | 'spacing'
    | 'weapon'
    | 'not_permitted'
    | 'window_over'
    | 'guest_days'
    | 'member_busy'
    | 'pass_through';
  /** The rule and who or what holds it, for people. */
  text: string;
  /** First instant or day on which it no longer holds, when that is known. */
  endsOn: string | null;
}

export type Word = 'Quiet' | 'Touchy' | 'Loud';

export interface Reason {
  code: string;
  text: string;
  /** Change in sit score (points of 0-100) against the same sit without this. */
  change: number;
  part: 'quiet' | 'promise';
  evidence: Evidence;
}

/** A half hour of the sit. Probabilities 0-1. */
export interface TimelineStep {
  at: number;
  /** Share of the wind in a good arc; null: no forecast. */
  arcHold: number | null;
  /** 72 shares of 5 degrees each, from north clockwise, that sum to 1; null: no forecast. */
  directionShares: number[] | null;
  meanFromDeg: number | null;
  windSpeedMps: number | null;
  gustMps: number | null;
  windedChance: number | null;
  /** Feature most reached by scent in this step. */
  windedFeatureId: string | null;
  sunInEyes: boolean;
  precipMm: number | null;
  tempC: number | null;
  note: string | null;
}

export interface ApproachOption {
  approachId: string;
  approachName: string;
  parkingName: string | null;
  entry: 'before_light' | 'after_daybreak_30' | 'after_daybreak_60' | 'midday' | 'afternoon';
  leaveBy: number;
  inBy: number;
  walkSeconds: number;
  /** Chance that somebody's deer are alerted by walking in, and by walking out. */
  inChance: number;
  outChance: number;
  /** Quiet (0-100) of the whole sit by this way and time. */
  quiet: number;
  score: number;
  /** What costs most on the way: a feature's name and its share. */
  worst: { featureId: string; featureName: string; chance: number } | null;
}

export interface Caution {
  code:
    | 'wind_raised'
    | 'wind_stay_down'
    | 'thunder'
    | 'cold'
    | 'harness'
    | 'orange'
    | 'no_forecast'
    | 'stale_forecast'
    | 'quota_met';
  text: string;
  level: 'note' | 'caution' | 'stop';
}

export interface ArcHoldSummary {
  /** Expected share of the sit with the wind in a good arc. */
  shareOfTime: number;
  /** Chance that it never leaves. */
  neverLeaves: number;
  /** Likeliest half hour in which it first leaves; null: it more likely stays. */
  likeliestLeavingAt: number | null;
  worstAt: number;
  worstShare: number;
}

export interface Confidence {
  level: 'high' | 'fair' | 'low' | 'none';
  text: string;
  leadHours: number | null;
  /** Circular standard deviation of direction over the sit, degrees. */
  spreadDeg: number | null;
  forecastAgeHours: number | null;
}

export interface Counterfactual {
  code: string;
  text: string;
}

export interface Verdict {
  standId: string;
  day: string;
  window: WindowName;
  status: 'open' | 'blocked';
  gates: Gate[];
  /** 0-100. */
  quiet: number;
  promise: number;
  score: number;
  word: Word;
  arcHold: ArcHoldSummary | null;
  /** Chance that deer wind the seat at least once; null: no forecast. */
  windedChance: number | null;
  scentByFeature: { featureId: string; featureName: string; chance: number }[];
  approach: ApproachOption | null;
  approachAlternatives: ApproachOption[];
  /** Pressure left near the stand, 0 (none) upwards. */
  pressure: number;
  /** Mean direction of the wind over the sit; null: none, or no forecast. */
  meanFromDeg?: number | null;
  /** 72 shares of the wind over the whole sit, as in TimelineStep; null: no forecast. */
  directionShares?: number[] | null;
  reasons: Reason[];
  counterfactuals: Counterfactual[];
  cautions: Caution[];
  confidence: Confidence;
  timeline: TimelineStep[];
}
