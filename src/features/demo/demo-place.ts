import type { Position } from 'geojson';
import { fromLocal, type LatLon } from '@/core/geometry';
import type { Point } from '@/core/ground-types';

/** A made-up place in hill country; no real ground is meant. */
export const DEMO_PLACE = { lat: 41.118, lon: -77.286, zone: 'America/New_York' };

/** [east, north] of the club's centre in metres: what the demo's ground is written in. */
export type Spot = readonly [number, number];

/** About a centimetre on the ground. */
const round = (degrees: number) => Math.round(degrees * 1e7) / 1e7;

export function pointOf([eastM, northM]: Spot): Point {
  return { eastM, northM };
}

export function latLonOf(spot: Spot, centre: LatLon = DEMO_PLACE): LatLon {
  const { lat, lon } = fromLocal(centre, pointOf(spot));
  return { lat: round(lat), lon: round(lon) };
}

export function positionOf(spot: Spot, centre: LatLon = DEMO_PLACE): Position {
  const { lat, lon } = latLonOf(spot, centre);
  return [lon, lat];
}

/** Of the demo club's address. */
export const DEMO_SLUG = 'tansy-fork';
