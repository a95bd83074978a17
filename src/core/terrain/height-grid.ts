import { fromLocal, type LatLon, toLocal } from '../geometry';
import { type HeightWindow, type Slope, slopeOf } from './slope';

/** Heights at posts evenly spaced in degrees, row by row from the south-west. */
export interface HeightGrid {
  southLat: number;
  westLon: number;
  stepDeg: number;
  rows: number;
  columns: number;
  /** Metres. */
  heights: number[];
}

/** Height at a place inside the grid, between its four posts (bilinear); null outside. */
export function heightAt(grid: HeightGrid, at: LatLon): number | null {
  const x = (at.lon - grid.westLon) / grid.stepDeg;
  const y = (at.lat - grid.southLat) / grid.stepDeg;
  if (!(x >= 0 && y >= 0 && x <= grid.columns - 1 && y <= grid.rows - 1)) return null;
  const column = Math.min(Math.floor(x), grid.columns - 2);
  const row = Math.min(Math.floor(y), grid.rows - 2);
  const z = (dy: number, dx: number) => grid.heights[(row + dy) * grid.columns + column + dx] ?? Number.NaN;
  const [fx, fy] = [x - column, y - row];
  const south = z(0, 0) * (1 - fx) + z(0, 1) * fx;
  const north = z(1, 0) * (1 - fx) + z(1, 1) * fx;
  return south * (1 - fy) + north * fy;
}

/** Slope at a place from heights `reachM` metres about it; null where the grid does not reach. */
export function slopeAt(grid: HeightGrid, at: LatLon, reachM: number): Slope | null {
  const window: number[] = [];
  for (const northM of [reachM, 0, -reachM]) {
    for (const eastM of [-reachM, 0, reachM]) {
      const z = heightAt(grid, fromLocal(at, { eastM, northM }));
      if (z === null || !Number.isFinite(z)) return null;
      window.push(z);
    }
  }
  const [a = 0, b = 0, c = 0, d = 0, e = 0, f = 0, g = 0, h = 0, i = 0] = window;
  const z: HeightWindow = [a, b, c, d, e, f, g, h, i];
  return slopeOf(z, reachM, reachM);
}

/** Metres between posts at a latitude, to the east and to the north. */
export function postSpacingM(grid: HeightGrid, lat: number): { eastM: number; northM: number } {
  return toLocal({ lat, lon: 0 }, { lat: lat + grid.stepDeg, lon: grid.stepDeg });
}
