import { distanceM } from '../geometry';
import type { Point } from '../ground-types';

/** The part of a line between two distances along it, metres from its first point: both ends and every corner between. */
export function stretchOf(points: Point[], fromM: number, toM: number): Point[] {
  const out: Point[] = [];
  let gone = 0;
  for (let i = 1; i < points.length; i++) {
    const [a, b] = [points[i - 1] as Point, points[i] as Point];
    const length = distanceM(a, b);
    const place = (alongM: number): Point => {
      const share = length > 0 ? (alongM - gone) / length : 0;
      return { eastM: a.eastM + (b.eastM - a.eastM) * share, northM: a.northM + (b.northM - a.northM) * share };
    };
    const [start, end] = [Math.max(fromM, gone), Math.min(toM, gone + length)];
    if (start <= end && (length > 0 || out.length === 0)) {
      if (out.length === 0) out.push(place(start));
      if (end > start) out.push(place(end));
    }
    gone += length;
  }
  return out;
}
