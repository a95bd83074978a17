import type { Position } from 'geojson';
import type { LatLon } from '@/core/geometry';
import { listMapItems, loadGround } from '@/features/ground/data';
import type { ClubScope } from '@/server/scope';
import { shapeThings } from './shape-things';

/** Every place that something of the club is drawn at. */
export async function readPlaces(scope: ClubScope): Promise<LatLon[]> {
  const [rows, items] = [await loadGround(scope), await listMapItems(scope)];
  return shapeThings(rows, items, { today: '', cropYear: 0 }).flatMap(({ geometry }) => {
    const positions: Position[] =
      geometry.type === 'Point'
        ? [geometry.coordinates]
        : geometry.type === 'LineString'
          ? geometry.coordinates
          : geometry.type === 'Polygon'
            ? geometry.coordinates.flat()
            : [];
    return positions.map(([lon = 0, lat = 0]) => ({ lat, lon }));
  });
}
