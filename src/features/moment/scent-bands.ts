import { contours } from 'd3-contour';
import type { MultiPolygon, Position } from 'geojson';
import { fromLocal, type LatLon } from '@/core/geometry';
import type { FieldGrid } from '@/core/scent/scent-field';

/** Relative scent index at the edge of each band. One is a person straight upwind 300 yards off in a light wind. */
export const SCENT_LEVELS = [0.25, 0.5, 1, 2, 4, 8] as const;

/** Six decimals are a hand's breadth. */
const round = (deg: number) => Math.round(deg * 1e6) / 1e6;

/** The ground at or over each level, as areas of longitude and latitude, the widest first. Levels nobody reaches are left out. */
export function scentBands(
  centre: LatLon,
  field: { grid: FieldGrid; values: Float64Array },
  levels: readonly number[] = SCENT_LEVELS,
): { level: number; area: MultiPolygon }[] {
  const { grid, values } = field;
  const placed = ([x = 0, y = 0]: Position): Position => {
    const p = { eastM: grid.origin.eastM + x * grid.cellM, northM: grid.origin.northM + y * grid.cellM };
    const { lat, lon } = fromLocal(centre, p);
    return [round(lon), round(lat)];
  };
  return contours()
    .size([grid.columns, grid.rows])
    .thresholds([...levels])([...values])
    .filter((shape) => shape.coordinates.length > 0)
    .map(({ value, coordinates }) => ({
      level: value,
      area: {
        type: 'MultiPolygon',
        coordinates: coordinates.map((part) => part.map((ring) => ring.map(placed))),
      },
    }));
}
