import type { Geometry, Position } from 'geojson';
import type { MapThing } from '../thing';

/** Corners and sides of what is drawn already, as flat numbers: looked through at every move of the pointer. */
export interface SnapIndex {
  /** lon, lat, lon, lat... */
  corners: Float64Array;
  /** lon, lat, lon, lat of each side. */
  sides: Float64Array;
}

function linesOf(geometry: Geometry): Position[][] {
  switch (geometry.type) {
    case 'Point':
      return [[geometry.coordinates]];
    case 'MultiPoint':
      return geometry.coordinates.map((p) => [p]);
    case 'LineString':
      return [geometry.coordinates];
    case 'MultiLineString':
    case 'Polygon':
      return geometry.coordinates;
    case 'MultiPolygon':
      return geometry.coordinates.flat();
    case 'GeometryCollection':
      return geometry.geometries.flatMap(linesOf);
  }
}

export function snapIndex(things: readonly MapThing[]): SnapIndex {
  const corners: number[] = [];
  const sides: number[] = [];
  for (const thing of things) {
    for (const line of linesOf(thing.geometry)) {
      line.forEach(([lon = 0, lat = 0], i) => {
        corners.push(lon, lat);
        const next = line[i + 1];
        if (next) sides.push(lon, lat, next[0] ?? 0, next[1] ?? 0);
      });
    }
  }
  return { corners: Float64Array.from(corners), sides: Float64Array.from(sides) };
}

/**
 * The corner within reach of a place, or else the nearest spot of a side within reach; null for open ground. `reach` is in
 * degrees of longitude and latitude: the same few pixels each way.
 */
export function snapTo(
  index: SnapIndex,
  [lon = 0, lat = 0]: Position,
  reach: { lon: number; lat: number },
): Position | null {
  const { corners, sides } = index;
  let best = 1;
  let found: Position | null = null;
  for (let i = 0; i < corners.length; i += 2) {
    const dx = ((corners[i] as number) - lon) / reach.lon;
    const dy = ((corners[i + 1] as number) - lat) / reach.lat;
    const d = dx * dx + dy * dy;
    if (d < best) {
      best = d;
      found = [corners[i] as number, corners[i + 1] as number];
    }
  }
  if (found) return found;
  for (let i = 0; i < sides.length; i += 4) {
    const [ax, ay, bx, by] = [sides[i], sides[i + 1], sides[i + 2], sides[i + 3]] as [number, number, number, number];
    const [px, py] = [(lon - ax) / reach.lon, (lat - ay) / reach.lat];
    const [dx, dy] = [(bx - ax) / reach.lon, (by - ay) / reach.lat];
    const length = dx * dx + dy * dy;
    if (length === 0) continue;
    const t = Math.max(0, Math.min(1, (px * dx + py * dy) / length));
    const d = (px - t * dx) ** 2 + (py - t * dy) ** 2;
    if (d < best) {
      best = d;
      found = [ax + t * (bx - ax), ay + t * (by - ay)];
    }
  }
  return found;
}
