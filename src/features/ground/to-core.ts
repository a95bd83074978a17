import type { Geometry, Position } from 'geojson';
import type { BookingStand } from '@/core/booking/booking-types';
import type { ClosedDays, ClubRules } from '@/core/booking/rules';
import { type LatLon, toLocal } from '@/core/geometry';
import {
  type LocalShape,
  type Point,
  type ScoredApproach,
  type ScoredFeature,
  type ScoredStand,
  WEAPONS,
} from '@/core/ground-types';
import type { GroundRows } from './data';

/** What the core needs to know of a club. */
export interface CoreClub extends LatLon {
  rules: Pick<ClubRules, 'restDaysDefault'>;
}

export interface CoreGround {
  stands: ScoredStand[];
  approaches: ScoredApproach[];
  features: ScoredFeature[];
}

/** A closure of the whole ground with no end is kept to the last day that any sum of days can follow. */
const LAST_DAY = '9998-12-31';

function localPoint(centre: LatLon, [lon = 0, lat = 0]: Position): Point {
  return toLocal(centre, { lat, lon });
}

/** GeoJSON closes a ring by naming its first point again. */
function localRing(centre: LatLon, ring: Position[]): Point[] {
  const [first, last] = [ring[0], ring.at(-1)];
  const closed = ring.length > 1 && first?.[0] === last?.[0] && first?.[1] === last?.[1];
  return (closed ? ring.slice(0, -1) : ring).map((p) => localPoint(centre, p));
}

/** A geometry in local metres; one of several parts gives several shapes. */
export function localShapes(centre: LatLon, geometry: Geometry): LocalShape[] {
  const line = (points: Position[]): LocalShape => ({ type: 'line', points: points.map((p) => localPoint(centre, p)) });
  const area = (rings: Position[][]): LocalShape => ({ type: 'area', rings: rings.map((r) => localRing(centre, r)) });
  switch (geometry.type) {
    case 'Point':
      return [{ type: 'point', at: localPoint(centre, geometry.coordinates) }];
    case 'MultiPoint':
      return geometry.coordinates.map((p) => ({ type: 'point', at: localPoint(centre, p) }));
    case 'LineString':
      return [line(geometry.coordinates)];
    case 'MultiLineString':
      return geometry.coordinates.map(line);
    case 'Polygon':
      return [area(geometry.coordinates)];
    case 'MultiPolygon':
      return geometry.coordinates.map(area);
    case 'GeometryCollection':
      return geometry.geometries.flatMap((g) => localShapes(centre, g));
  }
}

function approachPoints(centre: LatLon, row: GroundRows['approaches'][number]): Point[] {
  return row.points.map((p) => localPoint(centre, p));
}

/** Rows as the scoring core takes them, in metres about the club's centre. */
export function groundToCore(
  club: CoreClub,
  rows: Pick<GroundRows, 'stands' | 'approaches' | 'features' | 'parkings'>,
): CoreGround {
  const parkingNames = new Map(rows.parkings.map((p) => [p.id, p.name]));
  const standIds = new Set(rows.stands.map((s) => s.id));
  return {
    stands: rows.stands.map((s) => ({
      id: s.id,
      name: s.name,
      kind: s.kind,
      at: toLocal(club, s),
      seatHeightM: s.seatHeightM,
      facingDeg: s.facingDeg,
      shotSide: s.shotSide,
      shotRangeM: s.shotRangeM,
      shelter: s.shelter,
      arcs: s.arcs,
      suitability: { morning: s.morning, evening: s.evening },
      restDays: s.restDays ?? club.rules.restDaysDefault,
      drainBearingDeg: s.drainBearingDeg,
      slopePercent: s.slopePercent,
    })),
    approaches: rows.approaches
      .filter((a) => standIds.has(a.standId))
      .map((a) => ({
        id: a.id,
        name: a.name,
        standId: a.standId,
        parkingName: (a.parkingId && parkingNames.get(a.parkingId)) || null,
        direction: a.direction,
        points: approachPoints(club, a),
        vehicleToIndex: a.vehicleToIndex,
      })),
    features: rows.features.flatMap((f) =>
      localShapes(club, f.geometry).map((shape) => ({
        id: f.id,
        name: f.name,
        kind: f.kind,
        shape,
        months: f.months,
        use: f.use,
      })),
    ),
  };
}

/** Rows as the booking rules take them. */
export function groundToBooking(
  centre: LatLon,
  rows: Pick<GroundRows, 'stands' | 'approaches' | 'closures'>,
): BookingStand[] {
  return rows.stands.map((s) => ({
    id: s.id,
    name: s.name,
    at: toLocal(centre, s),
    restDays: s.restDays,
    mostSitsSeason: s.mostSitsSeason,
    weapons: WEAPONS.filter((w) => s.shotRangeM[w] !== undefined),
    closures: rows.closures.filter((c) => c.standId === s.id),
    allowedMemberIds: s.allowedMemberIds,
    approaches: rows.approaches.filter((a) => a.standId === s.id).map((a) => approachPoints(centre, a)),
  }));
}

/** Closures of the whole ground, for the club's rules. */
export function closedDaysOf(rows: Pick<GroundRows, 'closures'>): ClosedDays[] {
  return rows.closures
    .filter((c) => c.standId === null)
    .map(({ fromDay, toDay, reason }) => ({ fromDay, toDay: toDay ?? LAST_DAY, reason }));
}
