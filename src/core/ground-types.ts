import type { WindowName } from './condition-types';

/**
 * What stands on the ground, as every stage of the scoring core reads it. SI units; the unit is in the name. Directions are
 * degrees clockwise from true north. Positions are local metres east and north of the club's centre (see geometry.ts).
 */

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
