import type { Position } from 'geojson';
import { fromLocal } from '@/core/geometry';
import type { DrawingChange, SetChange } from '@/features/map/drawing-schema';
import { TEST_PLACE } from './make-club';

type New<K extends SetChange['kind']> = Extract<SetChange, { kind: K }>;

/** A place so many metres east and north of the test club's centre. */
export const spot = (eastM: number, northM: number): Position => {
  const { lat, lon } = fromLocal(TEST_PLACE, { eastM, northM });
  return [lon, lat];
};
export const point = (eastM: number, northM: number) => ({ type: 'Point' as const, coordinates: spot(eastM, northM) });

export const newStand: New<'stand'> = {
  op: 'set',
  kind: 'stand',
  id: 'new-1',
  version: 0,
  name: 'Creek Bend',
  geometry: point(100, 200),
  what: 'ladder',
  arcs: [{ fromDeg: 270, toDeg: 330, window: null }],
};
export const newParking: New<'parking'> = {
  op: 'set',
  kind: 'parking',
  id: 'new-2',
  version: 0,
  name: 'Gate',
  geometry: point(-300, -100),
};
export const newWay: New<'approach'> = {
  op: 'set',
  kind: 'approach',
  id: 'new-3',
  version: 0,
  name: 'Ditch',
  geometry: { type: 'LineString', coordinates: [spot(-250, -100), spot(0, 0), spot(60, 150)] },
  standId: 'new-1',
  parkingId: 'new-2',
  direction: 'both',
  vehicleToIndex: 1,
};
export const newWood: New<'item'> = {
  op: 'set',
  kind: 'item',
  id: 'new-4',
  version: 0,
  name: '',
  geometry: { type: 'Polygon', coordinates: [[spot(0, 0), spot(50, 0), spot(50, 80), spot(0, 0)]] },
  what: 'wood',
  props: { cutYear: 2018 },
};
export const newBed: New<'feature'> = {
  op: 'set',
  kind: 'feature',
  id: 'new-5',
  version: 0,
  name: 'Laurel',
  geometry: point(220, 260),
  what: 'bedding',
};

/** Ways name stands that come after them: the order of a drawing is no matter. */
export const DRAWN: DrawingChange[] = [newWay, newStand, newWood, newParking, newBed];
