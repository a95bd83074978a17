import { normalizeDeg, toRad, windFromVector, windVector } from './angles';
import { arcContains, arcWidthDeg, mergeArcs } from './arcs';
import { normalCdf } from './erf';
import type { Arc } from './ground-types';

const DEG = 180 / Math.PI;

/** Mean direction and resultant length of directions (Mardia & Jupp 2000, 2.2.4 and 2.3.3). */
export interface CircularMean {
  /** [0, 360); null when the directions cancel or there are none. */
  meanDeg: number | null;
  /** 0 (no one direction) to 1 (all the same). */
  r: number;
}

/** Mean of directions in degrees, each with a weight of 0 or more (all 1 when left out). */
export function circularMean(deg: readonly number[], weights?: readonly number[]): CircularMean {
  let cos = 0;
  let sin = 0;
  let total = 0;
  deg.forEach((d, i) => {
    const w = weights?.[i] ?? (weights ? 0 : 1);
    cos += w * Math.cos(toRad(d));
    sin += w * Math.sin(toRad(d));
    total += w;
  });
  if (total <= 0) return { meanDeg: null, r: 0 };
  const r = Math.min(1, Math.hypot(cos, sin) / total);
  return { meanDeg: r < 1e-12 ? null : normalizeDeg(Math.atan2(sin, cos) * DEG), r };
}

/** Circular standard deviation in degrees from a resultant length (Mardia & Jupp 2.3.11); Infinity at 0. */
export function circularSdDeg(r: number): number {
  if (r >= 1) return 0;
  return r <= 0 ? Number.POSITIVE_INFINITY : Math.sqrt(-2 * Math.log(r)) * DEG;
}

/** Yamartino (1984) one-pass standard deviation in degrees, 0 to 103.92 (180 / sqrt 3). */
export function yamartinoSdDeg(r: number): number {
  const held = Math.min(1, Math.max(0, r));
  const e = Math.sqrt(1 - held * held);
  return Math.asin(e) * (1 + (2 / Math.sqrt(3) - 1) * e ** 3) * DEG;
}

/** Mean wind of winds as vectors, so a strong wind counts for more than a light one; direction null when they cancel. */
export function meanWind(winds: readonly { fromDeg: number; speed: number }[]): {
  fromDeg: number | null;
  speed: number;
} {
  if (winds.length === 0) return { fromDeg: null, speed: 0 };
  let east = 0;
  let north = 0;
  for (const wind of winds) {
    const v = windVector(wind.fromDeg, wind.speed);
    east += v.east;
    north += v.north;
  }
  return windFromVector(east / winds.length, north / winds.length);
}

/** A spread beyond this is even round the circle to 1e-10: the first harmonic is exp(-sigma^2 / 2). */
const EVEN_SIGMA_DEG = 400;

/**
 * Chance (0-1) that a direction lies in an arc, for a wrapped normal about `meanDeg` with standard deviation `sigmaDeg`
 * (0 or more, Infinity allowed). A spread of 0 is the plain test of the arc, both ends in.
 */
export function wrappedNormalInArc(meanDeg: number, sigmaDeg: number, arc: Arc): number {
  const width = arcWidthDeg(arc);
  if (width >= 360) return 1;
  if (sigmaDeg <= 0) return arcContains(arc, meanDeg) ? 1 : 0;
  if (sigmaDeg > EVEN_SIGMA_DEG) return width / 360;
  const start = normalizeDeg(arc.fromDeg - meanDeg);
  const turns = Math.ceil((9 * sigmaDeg) / 360) + 1;
  let sum = 0;
  for (let k = -turns; k <= turns; k++) {
    const from = (start + 360 * k) / sigmaDeg;
    const to = from + width / sigmaDeg;
    // Taken from the nearer tail, so that small chances far out are not lost to rounding.
    sum += from > 0 ? normalCdf(-from) - normalCdf(-to) : normalCdf(to) - normalCdf(from);
  }
  return Math.min(1, Math.max(0, sum));
}

/** The same for a union of arcs; 0 for none. */
export function wrappedNormalInArcs(meanDeg: number, sigmaDeg: number, arcs: readonly Arc[]): number {
  const sum = mergeArcs(arcs).reduce((total, arc) => total + wrappedNormalInArc(meanDeg, sigmaDeg, arc), 0);
  return Math.min(1, sum);
}
