import { insideRings, lengthM } from '../geometry';
import type { LocalShape, Point } from '../ground-types';
import type { ScentSettings } from '../settings';

/** Places deer may stand in a feature; weights sum to 1. */
export interface SampledFeature {
  points: Point[];
  weights: number[];
}

const even = (points: Point[]): SampledFeature => ({ points, weights: points.map(() => 1 / points.length) });
const finitePoint = (p: Point): boolean => Number.isFinite(p.eastM) && Number.isFinite(p.northM);

/**
 * A feature as a bounded number of points: itself; even pieces of a line, one at the middle of each; an even grid inside an
 * area (holes left out). A shape with no usable point gives none.
 */
export function sampleFeature(shape: LocalShape, s: ScentSettings): SampledFeature {
  if (shape.type === 'point') return even([shape.at].filter(finitePoint));
  if (shape.type === 'line') return sampleLine(shape.points.filter(finitePoint), s);
  return sampleArea(
    shape.rings.map((ring) => ring.filter(finitePoint)),
    s,
  );
}

function sampleLine(points: Point[], s: ScentSettings): SampledFeature {
  const total = lengthM(points);
  if (points.length < 2 || total === 0) return even(points.slice(0, 1));
  const n = Math.max(1, Math.min(s.mostSamples, Math.round(total / s.sampleSpacingM)));
  const out: Point[] = [];
  let behind = 0;
  for (let i = 1; i < points.length; i++) {
    const [a, b] = [points[i - 1] as Point, points[i] as Point];
    const piece = lengthM([a, b]);
    while (out.length < n && (out.length + 0.5) * (total / n) <= behind + piece && piece > 0) {
      const share = ((out.length + 0.5) * (total / n) - behind) / piece;
      out.push({ eastM: a.eastM + share * (b.eastM - a.eastM), northM: a.northM + share * (b.northM - a.northM) });
    }
    behind += piece;
  }
  return even(out.length > 0 ? out : points.slice(0, 1));
}

/**
 * The grid lies along the line from the ring's centre to its farthest corner, so that turning the world turns it too.
 */
function sampleArea(rings: Point[][], s: ScentSettings): SampledFeature {
  const outer = rings[0] ?? [];
  if (outer.length === 0) return even([]);
  const centre = ringCentre(outer);
  const axis = outer.reduce(
    (far, p) => (reachOf(p, centre) > reachOf(far, centre) * (1 + 1e-9) ? p : far),
    outer[0] as Point,
  );
  const reach = reachOf(axis, centre);
  if (reach === 0) return even([centre]);
  const along = { eastM: (axis.eastM - centre.eastM) / reach, northM: (axis.northM - centre.northM) / reach };
  const gridAt = (i: number, j: number, step: number): Point => ({
    eastM: centre.eastM + step * (i * along.eastM - j * along.northM),
    northM: centre.northM + step * (i * along.northM + j * along.eastM),
  });
  for (let step = Math.max(s.sampleSpacingM, (2 * reach) / 24); ; step *= 1.2) {
    const half = Math.ceil(reach / step);
    const inside: Point[] = [];
    for (let i = -half; i <= half; i++) {
      for (let j = -half; j <= half; j++) {
        const p = gridAt(i, j, step);
        if (insideRings(p, rings)) inside.push(p);
      }
    }
    if (inside.length > 0 && inside.length <= s.mostSamples) return even(inside);
    // Thinner than the grid, or grown past it: the centre stands for all.
    if (inside.length === 0) return even([centre]);
  }
}

const reachOf = (p: Point, centre: Point): number => Math.hypot(p.eastM - centre.eastM, p.northM - centre.northM);

/** Centroid of a ring by the shoelace sum; the mean of its corners when it has no area. */
function ringCentre(ring: Point[]): Point {
  const o = ring[0] as Point;
  let area = 0;
  let east = 0;
  let north = 0;
  for (let i = 0; i < ring.length; i++) {
    const [a, b] = [ring[i] as Point, ring[(i + 1) % ring.length] as Point];
    const cross = (a.eastM - o.eastM) * (b.northM - o.northM) - (b.eastM - o.eastM) * (a.northM - o.northM);
    area += cross;
    east += (a.eastM + b.eastM - 2 * o.eastM) * cross;
    north += (a.northM + b.northM - 2 * o.northM) * cross;
  }
  if (Math.abs(area) < 1e-9) {
    const n = ring.length;
    return {
      eastM: ring.reduce((sum, p) => sum + p.eastM, 0) / n,
      northM: ring.reduce((sum, p) => sum + p.northM, 0) / n,
    };
  }
  return { eastM: o.eastM + east / (3 * area), northM: o.northM + north / (3 * area) };
}
