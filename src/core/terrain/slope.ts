import { normalizeDeg, toRad } from '../angles';

/** Heights in metres about a place, north row first, each row from west to east. */
export type HeightWindow = readonly [number, number, number, number, number, number, number, number, number];

export interface Slope {
  /** Rise in 100 along the ground, >= 0. */
  percent: number;
  /** True bearing straight downhill, [0, 360): where cold air drains to. null: level ground has none. */
  downhillDeg: number | null;
}

/** Flatter than this drains nowhere in particular. Our choice: less than the noise of heights 90 m apart. */
const LEVEL_PERCENT = 0.5;

/**
 * Steepness and downhill direction from three by three heights, `eastM` and `northM` metres apart, by weighted central
 * differences (Horn, "Hill shading and the reflectance map", Proc. IEEE 69, 1981). Exact on a plane.
 */
export function slopeOf(z: HeightWindow, eastM: number, northM: number): Slope {
  const [nw, n, ne, w, , e, sw, s, se] = z;
  const east = (ne + 2 * e + se - (nw + 2 * w + sw)) / (8 * eastM);
  const north = (nw + 2 * n + ne - (sw + 2 * s + se)) / (8 * northM);
  const percent = 100 * Math.hypot(east, north);
  const downhillDeg = percent < LEVEL_PERCENT ? null : normalizeDeg(Math.atan2(-east, -north) / toRad(1));
  return { percent, downhillDeg };
}
