import type { StabilityClass } from '../air/stability-types';
import { apartDeg, downwindDeg } from '../angles';
import { bearingDeg, distanceM } from '../geometry';
import type { Point } from '../ground-types';
import type { ScentSettings } from '../settings';
import { extraScatterDeg } from '../wind/scatter';
import type { ScenarioSet } from '../wind/scenario-types';
import { sweptPlume } from './plume';
import { referenceStrength } from './saturate';

export interface FieldGrid {
  /** South-west corner; cells are taken at their middle, rows run north. */
  origin: Point;
  cellM: number;
  columns: number;
  rows: number;
}

/**
 * Relative scent index over a grid for one step of a set of seat wind: mean over scenarios, 1 at the settings' reference.
 * Row by row from the south. A wind of no direction is spread round the circle. No forecast: null.
 */
export function scentField(
  source: { at: Point; heightM: number },
  set: ScenarioSet,
  t: number,
  stability: StabilityClass,
  grid: FieldGrid,
  s: ScentSettings,
): Float64Array | null {
  if (!set.known[t] || set.scenarios.length === 0) return null;
  const widening = Math.hypot(extraScatterDeg(stability, set.scatterDeg[t] ?? 0), set.bundleDeg[t] ?? 0);
  const reference = referenceStrength(s);
  const field = new Float64Array(grid.columns * grid.rows);
  for (let row = 0; row < grid.rows; row++) {
    for (let column = 0; column < grid.columns; column++) {
      const p = {
        eastM: grid.origin.eastM + (column + 0.5) * grid.cellM,
        northM: grid.origin.northM + (row + 0.5) * grid.cellM,
      };
      const d = distanceM(source.at, p);
      if (d > s.reachM) continue;
      const bearing = bearingDeg(source.at, p);
      let sum = 0;
      for (const { weight, steps } of set.scenarios) {
        const step = steps[t];
        if (!step) continue;
        const speed = Math.max(s.leastSpeedMps, step.speedMps);
        sum += (weight / speed) * strengthAt(step.fromDeg, bearing, d, stability, source.heightM, widening, s);
      }
      field[row * grid.columns + column] = sum / reference;
    }
  }
  return field;
}

function strengthAt(
  fromDeg: number | null,
  bearing: number,
  d: number,
  c: StabilityClass,
  heightM: number,
  widening: number,
  s: ScentSettings,
): number {
  const strength = (offDeg: number): number =>
    sweptPlume(c, { distanceM: d, offDeg, zM: s.noseHeightM }, heightM, widening);
  if (fromDeg !== null) return strength(apartDeg(downwindDeg(fromDeg), bearing));
  let sum = 0;
  for (let off = -90; off < 90; off += 3) sum += strength(off);
  return sum / 120;
}
