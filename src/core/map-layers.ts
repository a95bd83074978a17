/** What a club draws on its map beside stands, approaches, parking places and features. Plain data: nothing of it is scored. */

export const MAP_LAYERS = [
  'boundary',
  'wood',
  'field',
  'crop',
  'swamp',
  'water',
  'road',
  'trail',
  'closed_area',
  'no_shoot',
  'camera',
  'hazard',
  'gate',
  'signal',
] as const;
export type MapLayer = (typeof MAP_LAYERS)[number];

export type DrawnShape = 'point' | 'line' | 'area';

/** How each layer may be drawn, the usual way first. */
export const LAYER_SHAPES: Record<MapLayer, readonly DrawnShape[]> = {
  boundary: ['area', 'line'],
  wood: ['area'],
  field: ['area'],
  crop: ['area'],
  swamp: ['area'],
  water: ['area', 'line', 'point'],
  road: ['line'],
  trail: ['line'],
  closed_area: ['area'],
  no_shoot: ['point'],
  camera: ['point'],
  hazard: ['point', 'area'],
  gate: ['point'],
  signal: ['point'],
};

/** Directions, clockwise from true north, in which nobody may shoot from a place, and how far. */
export interface NoShootSector {
  fromDeg: number;
  toDeg: number;
  reachM: number;
}

export interface MapItemProps {
  /** Year in which timber was cut. */
  cutYear?: number;
  sector?: NoShootSector;
  /** Direction a camera looks, clockwise from true north. */
  facingDeg?: number;
}

/** What stands in a field in one year, and the months in which deer use it then. */
export interface CropYear {
  year: number;
  crop: string;
  months: number[];
}

/** The year whose crop stands or lies on a field on a day (YYYY-MM-DD): waste grain of the last harvest counts until March is over. */
export function cropYearOf(day: string): number {
  const year = Number(day.slice(0, 4));
  return Number(day.slice(5, 7)) < 4 ? year - 1 : year;
}

/** The crop of a year; null where none is written down. */
export function cropIn(rotation: readonly CropYear[], year: number): CropYear | null {
  return rotation.find((one) => one.year === year) ?? null;
}
