import type { Position } from 'geojson';
import { distanceM, distanceToShapeM, type LatLon, toLocal } from '@/core/geometry';
import type { LocalShape, Point } from '@/core/ground-types';
import type { DrawnGeometry } from '@/features/ground/geometry-text';

/** Two points nearer than this, and two lines nowhere further apart than this, are most likely one thing. */
export const SAME_POINT_M = 10;
export const SAME_LINE_M = 15;
/** Corners of a line that are compared at most. */
const MOST_SAMPLES = 60;

/** A shape made ready for measuring. */
export interface Measured {
  shape: LocalShape;
  points: Point[];
  west: number;
  east: number;
  south: number;
  north: number;
}

export function measure(centre: LatLon, geometry: DrawnGeometry): Measured {
  const local = ([lon = 0, lat = 0]: Position) => toLocal(centre, { lat, lon });
  const points =
    geometry.type === 'Point'
      ? [local(geometry.coordinates)]
      : (geometry.type === 'LineString' ? geometry.coordinates : geometry.coordinates.flat()).map(local);
  const shape: LocalShape =
    geometry.type === 'Point'
      ? { type: 'point', at: local(geometry.coordinates) }
      : geometry.type === 'LineString'
        ? { type: 'line', points }
        : { type: 'area', rings: geometry.coordinates.map((ring) => ring.slice(0, -1).map(local)) };
  let [west, east, south, north] = [Infinity, -Infinity, Infinity, -Infinity];
  for (const { eastM, northM } of points) {
    west = Math.min(west, eastM);
    east = Math.max(east, eastM);
    south = Math.min(south, northM);
    north = Math.max(north, northM);
  }
  return { shape, points, west, east, south, north };
}

const outline = (one: Measured): LocalShape[] =>
  one.shape.type === 'area'
    ? one.shape.rings.map((ring) => ({ type: 'line', points: [...ring, ...ring.slice(0, 1)] }))
    : [one.shape];

/** Farthest that a corner of one lies from the other's outline; Infinity as soon as it is past `most`. */
function farthest(from: Measured, to: Measured, most: number): number {
  const lines = outline(to);
  const step = Math.ceil(from.points.length / MOST_SAMPLES);
  let worst = 0;
  for (const [i, point] of from.points.entries()) {
    if (i % step !== 0) continue;
    worst = Math.max(worst, Math.min(...lines.map((line) => distanceToShapeM(point, line))));
    if (worst > most) return Infinity;
  }
  return worst;
}

/** How far apart two shapes of one kind are when they may be one thing; null when they are not. */
export function sameWithinM(a: Measured, b: Measured): number | null {
  if (a.shape.type !== b.shape.type) return null;
  if (a.shape.type === 'point' && b.shape.type === 'point') {
    const apart = distanceM(a.shape.at, b.shape.at);
    return apart <= SAME_POINT_M ? apart : null;
  }
  const boxes = [a.west - b.west, a.east - b.east, a.south - b.south, a.north - b.north];
  if (boxes.some((gap) => Math.abs(gap) > SAME_LINE_M)) return null;
  const apart = Math.max(farthest(a, b, SAME_LINE_M), farthest(b, a, SAME_LINE_M));
  return apart <= SAME_LINE_M ? apart : null;
}

/** Things in cells by their south-west corner, so that only what lies about is compared. */
export class NearIndex<T extends { measured: Measured }> {
  private readonly cells = new Map<string, T[]>();
  private readonly size = 50;

  private cell(value: number): number {
    return Math.floor(value / this.size);
  }

  add(one: T): void {
    const key = `${this.cell(one.measured.west)}:${this.cell(one.measured.south)}`;
    const cell = this.cells.get(key);
    if (cell) cell.push(one);
    else this.cells.set(key, [one]);
  }

  around(measured: Measured): T[] {
    const [column, row] = [this.cell(measured.west), this.cell(measured.south)];
    const found: T[] = [];
    for (let dx = -1; dx <= 1; dx++) {
      for (let dy = -1; dy <= 1; dy++) found.push(...(this.cells.get(`${column + dx}:${row + dy}`) ?? []));
    }
    return found;
  }
}
