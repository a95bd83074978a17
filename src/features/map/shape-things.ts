import { cropIn } from '@/core/map-layers';
import type { GroundRows } from '@/features/ground/data';
import type { MapItemRow } from '@/features/ground/map-items-data';
import { formatClosed } from '@/features/ground/view';
import type { ApproachThing, FeatureThing, ItemThing, MapThing, ParkingThing, StandThing } from './thing';

export function itemThing({ id, version, name, geometry, layer, props }: MapItemRow): ItemThing {
  return { kind: 'item', id, version, name, geometry, what: layer, props };
}

export function featureThing(row: GroundRows['features'][number], year: number): FeatureThing {
  const { id, version, name, geometry, kind, months, rotation } = row;
  const crop = kind === 'crop' ? cropIn(rotation, year) : null;
  return {
    kind: 'feature',
    id,
    version,
    name,
    geometry,
    what: kind,
    months: crop?.months ?? months,
    crop: crop?.crop ?? null,
  };
}

export function parkingThing({ id, version, name, lat, lon }: GroundRows['parkings'][number]): ParkingThing {
  return { kind: 'parking', id, version, name, geometry: { type: 'Point', coordinates: [lon, lat] } };
}

export function standThing(row: GroundRows['stands'][number], closed: string): StandThing {
  const { id, version, name, lat, lon, kind, arcs } = row;
  return {
    kind: 'stand',
    id,
    version,
    name,
    geometry: { type: 'Point', coordinates: [lon, lat] },
    what: kind,
    arcs,
    closed,
  };
}

export function approachThing(row: GroundRows['approaches'][number]): ApproachThing {
  const { id, version, name, points, standId, parkingId, direction, vehicleToIndex } = row;
  const geometry = { type: 'LineString' as const, coordinates: points };
  return { kind: 'approach', id, version, name, geometry, standId, parkingId, direction, vehicleToIndex };
}

/** Rows as things, land first and stands last: the order in which they are drawn. */
export function shapeThings(
  rows: GroundRows,
  items: MapItemRow[],
  at: { today: string; cropYear: number },
): MapThing[] {
  const closedOf = (id: string) =>
    formatClosed(
      rows.closures.filter((c) => c.standId === id),
      at.today,
    );
  return [
    ...items.map(itemThing),
    ...rows.features.map((row) => featureThing(row, at.cropYear)),
    ...rows.approaches.map(approachThing),
    ...rows.parkings.map(parkingThing),
    ...rows.stands.map((row) => standThing(row, closedOf(row.id))),
  ];
}
