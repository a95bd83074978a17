import type { Position } from 'geojson';
import { fromLocal } from '@/core/geometry';
import type { ApproachThing, FeatureThing, ItemThing, ParkingThing, StandThing } from '../thing';

/** Made-up ground for tests. */
export const CENTRE = { lat: 38.6, lon: -83.2 };

export function spot(eastM: number, northM: number): Position {
  const { lat, lon } = fromLocal(CENTRE, { eastM, northM });
  return [lon, lat];
}

export const STAND: StandThing = {
  kind: 'stand',
  id: 'std_1',
  version: 3,
  name: 'Creek Bend',
  geometry: { type: 'Point', coordinates: spot(100, 200) },
  what: 'ladder',
  arcs: [{ fromDeg: 270, toDeg: 340, window: null }],
  closed: '',
};

export const PARKING: ParkingThing = {
  kind: 'parking',
  id: 'prk_1',
  version: 1,
  name: 'Gate',
  geometry: { type: 'Point', coordinates: spot(-300, -100) },
};

export const APPROACH: ApproachThing = {
  kind: 'approach',
  id: 'app_1',
  version: 2,
  name: 'Ditch',
  geometry: { type: 'LineString', coordinates: [spot(-300, -100), spot(-50, 0), spot(100, 200)] },
  standId: 'std_1',
  parkingId: 'prk_1',
  direction: 'both',
  vehicleToIndex: 0,
};

export const BED: FeatureThing = {
  kind: 'feature',
  id: 'ftr_1',
  version: 1,
  name: 'Laurel',
  geometry: { type: 'Polygon', coordinates: [[spot(0, 0), spot(100, 0), spot(100, 50), spot(0, 50), spot(0, 0)]] },
  what: 'bedding',
  months: [9, 10, 11, 12],
  crop: null,
};

export const WOOD: ItemThing = {
  kind: 'item',
  id: 'map_1',
  version: 1,
  name: '',
  geometry: {
    type: 'Polygon',
    coordinates: [[spot(-200, 0), spot(200, 0), spot(200, 400), spot(-200, 400), spot(-200, 0)]],
  },
  what: 'wood',
  props: {},
};

export const THINGS = [WOOD, BED, APPROACH, PARKING, STAND];
