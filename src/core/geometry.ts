import { normalizeDeg, toRad } from './angles';
import type { LocalShape, Point } from './ground-types';

/** WGS 84 semi-major axis and first eccentricity squared (NGA.STND.0036). */
const SEMI_MAJOR_M = 6378137;
const ECC2 = 0.00669437999014;

/** Metres in one degree of latitude and longitude at a latitude (meridian and prime-vertical radii of curvature). */
function metresPerDegree(lat: number): { perLat: number; perLon: number } {
  const sin = Math.sin(toRad(lat));
  const w2 = 1 - ECC2 * sin * sin;
  const meridian = (SEMI_MAJOR_M * (1 - ECC2)) / w2 ** 1.5;
  const normal = SEMI_MAJOR_M / Math.sqrt(w2);
  return { perLat: toRad(meridian), perLon: toRad(normal * Math.cos(toRad(lat))) };
}

export interface LatLon {
  lat: number;
  lon: number;
}

/** Position to local metres about a centre. Good to 0.1 % within 5 km of the centre below 50 degrees of latitude, a club's ground. */
export function toLocal(centre: LatLon, at: LatLon): Point {
  const { perLat, perLon } = metresPerDegree(centre.lat);
  const dLon = ((at.lon - centre.lon + 540) % 360) - 180;
  return { eastM: dLon * perLon, northM: (at.lat - centre.lat) * perLat };
}

/** Inverse of toLocal. */
export function fromLocal(centre: LatLon, p: Point): LatLon {
  const { perLat, perLon } = metresPerDegree(centre.lat);
  return { lat: centre.lat + p.northM / perLat, lon: ((centre.lon + p.eastM / perLon + 540) % 360) - 180 };
}

export function distanceM(a: Point, b: Point): number {
  return Math.hypot(b.eastM - a.eastM, b.northM - a.northM);
}

/** True bearing from a to b, [0, 360); 0 when they are the same point. */
export function bearingDeg(a: Point, b: Point): number {
  return normalizeDeg(Math.atan2(b.eastM - a.eastM, b.northM - a.northM) / toRad(1));
}

/** The point at a distance and true bearing. */
export function pointAt(from: Point, bearing: number, distance: number): Point {
  return {
    eastM: from.eastM + distance * Math.sin(toRad(bearing)),
    northM: from.northM + distance * Math.cos(toRad(bearing)),
  };
}

/** Nearest point of a segment to p. */
export function nearestOnSegment(p: Point, a: Point, b: Point): Point {
  const dx = b.eastM - a.eastM;
  const dy = b.northM - a.northM;
  const len2 = dx * dx + dy * dy;
  if (len2 === 0) return a;
  const t = Math.max(0, Math.min(1, ((p.eastM - a.eastM) * dx + (p.northM - a.northM) * dy) / len2));
  return { eastM: a.eastM + t * dx, northM: a.northM + t * dy };
}

/** Even-odd rule over all rings, so holes are outside. */
export function insideRings(p: Point, rings: Point[][]): boolean {
  let inside = false;
  for (const ring of rings) {
    for (let i = 0, j = ring.length - 1; i < ring.length; j = i++) {
      const a = ring[i] as Point;
      const b = ring[j] as Point;
      if (a.northM > p.northM !== b.northM > p.northM) {
        const cut = a.eastM + ((p.northM - a.northM) / (b.northM - a.northM)) * (b.eastM - a.eastM);
        if (p.eastM < cut) inside = !inside;
      }
    }
  }
  return inside;
}

/** Nearest point of a shape to p: p itself when it lies inside an area. */
export function nearestOnShape(p: Point, shape: LocalShape): Point {
  if (shape.type === 'point') return shape.at;
  if (shape.type === 'area' && insideRings(p, shape.rings)) return p;
  const lines = shape.type === 'line' ? [shape.points] : shape.rings.map((r) => [...r, r[0] as Point]);
  let best: Point = (lines[0] as Point[])[0] as Point;
  let bestM = distanceM(p, best);
  for (const line of lines) {
    for (let i = 1; i < line.length; i++) {
      const q = nearestOnSegment(p, line[i - 1] as Point, line[i] as Point);
      const d = distanceM(p, q);
      if (d < bestM) {
        best = q;
        bestM = d;
      }
    }
  }
  return best;
}

/** Distance from p to a shape in metres, 0 inside an area. */
export function distanceToShapeM(p: Point, shape: LocalShape): number {
  return distanceM(p, nearestOnShape(p, shape));
}

/** Length of a line in metres. */
export function lengthM(points: Point[]): number {
  let sum = 0;
  for (let i = 1; i < points.length; i++) sum += distanceM(points[i - 1] as Point, points[i] as Point);
  return sum;
}
