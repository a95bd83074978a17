import type { Position } from 'geojson';
import type { DrawnGeometry } from '@/features/ground/geometry-text';

function cornersOf(geometry: DrawnGeometry): Position[] {
  if (geometry.type === 'Point') return [geometry.coordinates];
  return geometry.type === 'LineString' ? geometry.coordinates : (geometry.coordinates[0] ?? []).slice(0, -1);
}

const same = (a: Position | undefined, b: Position | undefined) => a?.[0] === b?.[0] && a?.[1] === b?.[1];

/** The corner that was moved or added last, where it is just one; null when the whole was moved or a corner taken out. */
export function touchedCorner(before: DrawnGeometry, after: DrawnGeometry): Position | null {
  const known = cornersOf(before);
  const fresh = cornersOf(after).filter((corner) => !known.some((other) => same(corner, other)));
  return fresh.length === 1 ? (fresh[0] ?? null) : null;
}

/** A line or an area without one of its corners; null when too few would be left. Holes stay. */
export function withoutCorner(geometry: DrawnGeometry, corner: Position): DrawnGeometry | null {
  const left = cornersOf(geometry).filter((other) => !same(other, corner));
  const [first] = left;
  if (geometry.type === 'LineString') return left.length < 2 ? null : { type: 'LineString', coordinates: left };
  if (geometry.type !== 'Polygon' || !first || left.length < 3) return null;
  return { type: 'Polygon', coordinates: [[...left, first], ...geometry.coordinates.slice(1)] };
}
