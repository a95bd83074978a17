import { contours } from 'd3-contour';
import type { Position } from 'geojson';
import type { HeightGrid } from '@/core/terrain/height-grid';
import { ftToM, type Units } from '@/core/units';

/** Usual distances between lines of maps, in the club's unit, the closest first. */
const INTERVALS: Record<Units, number[]> = { us: [10, 20, 40, 80, 160, 320], metric: [2, 5, 10, 20, 50, 100] };
const MOST_LEVELS = 20;

export interface Contours {
  /** [lon, lat] lines, level by level. */
  lines: Position[][];
  /** In the club's unit: feet or metres. */
  interval: number;
  lowest: number;
  highest: number;
}

/** Where a piece of an outline runs along the edge of the grid it is no line of the ground. */
function cutAtEdge(ring: Position[], columns: number, rows: number): Position[][] {
  const near = (value: number, edge: number) => Math.abs(value - edge) < 1e-9;
  const edges = ([x = 0, y = 0]: Position) => [near(x, 0.5), near(x, columns - 0.5), near(y, 0.5), near(y, rows - 0.5)];
  const outside = ([x = 0, y = 0]: Position) => x < 0.5 || y < 0.5 || x > columns - 0.5 || y > rows - 0.5;
  const pieces: Position[][] = [];
  let piece: Position[] = [];
  for (const [i, point] of ring.entries()) {
    const last = ring[i - 1];
    const along = last && edges(point).some((on, k) => on && edges(last)[k]);
    if (outside(point) || along) {
      if (piece.length > 1) pieces.push(piece);
      piece = outside(point) ? [] : [point];
    } else piece.push(point);
  }
  if (piece.length > 1) pieces.push(piece);
  return pieces;
}

/** Lines of equal height, in whole steps of feet or metres, as few as tell the ground. */
export function traceContours(grid: HeightGrid, units: Units): Contours {
  const unitM = units === 'us' ? ftToM(1) : 1;
  const values = grid.heights.map((z) => z / unitM);
  const [lowest, highest] = [Math.min(...values), Math.max(...values)];
  const steps = INTERVALS[units];
  const interval = steps.find((step) => (highest - lowest) / step <= MOST_LEVELS) ?? steps.at(-1) ?? 100;
  const levels: number[] = [];
  for (let z = Math.ceil(lowest / interval) * interval; z <= highest; z += interval) levels.push(z);
  // A post stands in the middle of its cell.
  const place = ([x = 0, y = 0]: Position): Position => [
    Number((grid.westLon + (x - 0.5) * grid.stepDeg).toFixed(6)),
    Number((grid.southLat + (y - 0.5) * grid.stepDeg).toFixed(6)),
  ];
  const traced = contours().size([grid.columns, grid.rows]).smooth(true).thresholds(levels)(values);
  const lines = traced.flatMap(({ coordinates }) =>
    coordinates.flat().flatMap((ring) => cutAtEdge(ring, grid.columns, grid.rows).map((piece) => piece.map(place))),
  );
  return { lines, interval, lowest: Math.round(lowest), highest: Math.round(highest) };
}
