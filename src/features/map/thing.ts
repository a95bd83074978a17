import type { Geometry } from 'geojson';
import type { FeatureKind, GoodWindArc, StandKind } from '@/core/ground-types';
import type { MapItemProps, MapLayer } from '@/core/map-layers';

/** One thing on the map, alike whether it is stored or only drawn so far. */
interface Base {
  id: string;
  /** 0: not saved yet. */
  version: number;
  /** Empty for land without a name. */
  name: string;
  geometry: Geometry;
}

export interface StandThing extends Base {
  kind: 'stand';
  what: StandKind;
  arcs: GoodWindArc[];
  /** Empty when it is open. */
  closed: string;
}

export interface ParkingThing extends Base {
  kind: 'parking';
}

export interface ApproachThing extends Base {
  kind: 'approach';
  /** Of a stand, saved or drawn. */
  standId: string;
  parkingId: string | null;
  direction: 'in' | 'out' | 'both';
  vehicleToIndex: number;
}

export interface FeatureThing extends Base {
  kind: 'feature';
  what: FeatureKind;
  months: number[];
  /** What the field holds this year; null: no field, or not written down. */
  crop: string | null;
}

export interface ItemThing extends Base {
  kind: 'item';
  what: MapLayer;
  props: MapItemProps;
}

export type MapThing = StandThing | ParkingThing | ApproachThing | FeatureThing | ItemThing;
export type ThingKind = MapThing['kind'];
export const THING_KINDS = ['stand', 'parking', 'approach', 'feature', 'item'] as const satisfies readonly ThingKind[];

/** What the map of a club is drawn from. */
export interface MapView {
  club: { slug: string; name: string; lat: number; lon: number; units: 'us' | 'metric' };
  things: MapThing[];
  /** Degrees that magnetic north lies east of true north; null: no model covers the day. */
  declinationDeg: number | null;
  /** The year the map is of. */
  year: number;
  /** Tiles under the drawing; null: none are set up. */
  imagery: { url: string; attribution: string } | null;
  may: { stands: boolean; features: boolean; approaches: boolean };
  madeAt: number;
}

export type MapClub = MapView['club'];
