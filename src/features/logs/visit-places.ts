import type { Geometry, Position } from 'geojson';
import type { LatLon } from '@/core/geometry';
import type { Tx } from '@/db/client';
import { getFeature, listFeatures } from '@/features/ground/features-data';
import { getParking, listParkings } from '@/features/ground/parkings-data';
import { getStand, listStands } from '@/features/ground/stands-data';
import type { ClubScope } from '@/server/scope';
import type { VisitPlace } from './visit-schema';
import { OWN_PLACE } from './words/visits';

export interface PlaceChoices {
  stands: { value: string; label: string }[];
  parkings: { value: string; label: string }[];
  features: { value: string; label: string }[];
}

const middle = (points: Position[]): Position => points[Math.floor(points.length / 2)] ?? [];

/** One point to stand for a feature: the point itself, the middle point of a line, the mean corner of an area. */
export function pointOf(geometry: Geometry): LatLon | null {
  if (geometry.type === 'Point') return latLon(geometry.coordinates);
  if (geometry.type === 'LineString') return latLon(middle(geometry.coordinates));
  if (geometry.type !== 'Polygon') return null;
  const ring = (geometry.coordinates[0] ?? []).slice(0, -1);
  if (ring.length === 0) return null;
  const mean = (axis: 0 | 1) => ring.reduce((sum, corner) => sum + (corner[axis] ?? 0), 0) / ring.length;
  return { lat: mean(1), lon: mean(0) };
}

function latLon([lon, lat]: Position): LatLon | null {
  return lat === undefined || lon === undefined ? null : { lat, lon };
}

export interface ResolvedPlace extends LatLon {
  standId: string | null;
  name: string;
}

/** Where a visit was; null when the place is no longer there. */
export async function resolvePlace(scope: ClubScope, place: VisitPlace, tx: Tx): Promise<ResolvedPlace | null> {
  if (place.of === 'point') return { lat: place.lat, lon: place.lon, standId: null, name: OWN_PLACE };
  if (place.of === 'stand') {
    const stand = await getStand(scope, place.id, tx);
    return stand && { lat: stand.lat, lon: stand.lon, standId: stand.id, name: stand.name };
  }
  if (place.of === 'parking') {
    const parking = await getParking(scope, place.id, tx);
    return parking && { lat: parking.lat, lon: parking.lon, standId: null, name: parking.name };
  }
  const feature = await getFeature(scope, place.id, tx);
  const at = feature && pointOf(feature.geometry);
  return at && { ...at, standId: null, name: feature.name };
}

export async function listPlaceChoices(scope: ClubScope): Promise<PlaceChoices> {
  const [stands, parkings, features] = await Promise.all([listStands(scope), listParkings(scope), listFeatures(scope)]);
  const choice = (of: string) => (row: { id: string; name: string }) => ({ value: `${of}:${row.id}`, label: row.name });
  return {
    stands: stands.map(choice('stand')),
    parkings: parkings.map(choice('parking')),
    features: features.filter((feature) => pointOf(feature.geometry)).map(choice('feature')),
  };
}
