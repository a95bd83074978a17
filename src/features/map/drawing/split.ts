import { difference } from '@turf/difference';
import { featureCollection, polygon } from '@turf/helpers';
import { intersect } from '@turf/intersect';
import type { LineString, MultiPolygon, Polygon, Position } from 'geojson';
import { distanceM, fromLocal, type LatLon, nearestOnSegment } from '@/core/geometry';
import type { Point } from '@/core/ground-types';
import { SPLIT_WORDS } from '../words/drawing';
import { localOf, ringAreaM2 } from './measure';

/** Pieces smaller than this are slips of the hand, m2. */
const LEAST_PIECE_M2 = 1;

export type Split<T> = { ok: true; parts: T[] } | { ok: false; message: string };

/** A line in two at the spot of it nearest to a place. */
export function splitLine(centre: LatLon, line: LineString, at: Position): Split<LineString> {
  const spot = localOf(centre, at);
  const points = line.coordinates.map((p) => localOf(centre, p));
  let best: { i: number; p: Point; d: number } | null = null;
  for (let i = 1; i < points.length; i++) {
    const p = nearestOnSegment(spot, points[i - 1] as Point, points[i] as Point);
    const d = distanceM(spot, p);
    if (!best || d < best.d) best = { i, p, d };
  }
  const [first, last] = [points[0], points.at(-1)];
  if (!best || !first || !last || distanceM(best.p, first) < 0.5 || distanceM(best.p, last) < 0.5) {
    return { ok: false, message: SPLIT_WORDS.spot };
  }
  const { lat, lon } = fromLocal(centre, best.p);
  const cut: Position = [lon, lat];
  const near = (i: number) => distanceM(points[i] as Point, (best as { p: Point }).p) < 0.5;
  const before = line.coordinates.slice(0, near(best.i - 1) ? best.i - 1 : best.i);
  const after = line.coordinates.slice(near(best.i) ? best.i + 1 : best.i);
  return {
    ok: true,
    parts: [
      { type: 'LineString', coordinates: [...before, cut] },
      { type: 'LineString', coordinates: [cut, ...after] },
    ],
  };
}

/** The ground on one side of a cut, whose ends run on straight and close far behind the area. */
function sideOf(centre: LatLon, cut: readonly Position[], reachM: number): Position[] | null {
  const points = cut.map((p) => localOf(centre, p));
  const [first, second, beforeLast, last] = [points[0], points[1], points.at(-2), points.at(-1)];
  if (!first || !second || !beforeLast || !last) return null;
  const runOn = (from: Point, to: Point): Point | null => {
    const d = distanceM(from, to);
    if (d < 0.01) return null;
    const k = reachM / d;
    return { eastM: to.eastM + (to.eastM - from.eastM) * k, northM: to.northM + (to.northM - from.northM) * k };
  };
  const [start, end] = [runOn(second, first), runOn(beforeLast, last)];
  if (!start || !end) return null;
  const angleOf = (p: Point) => Math.atan2(p.northM, p.eastM);
  const round: Point[] = [];
  const from = angleOf(end);
  let turn = angleOf(start) - from;
  while (turn <= 0) turn += 2 * Math.PI;
  const far = 4 * reachM;
  for (let i = 0; i <= 16; i++) {
    const angle = from + (turn * i) / 16;
    round.push({ eastM: far * Math.cos(angle), northM: far * Math.sin(angle) });
  }
  const ring = [start, ...points, end, ...round, start];
  return ring.map((p) => {
    const { lat, lon } = fromLocal(centre, p);
    return [lon, lat];
  });
}

function partsOf(geometry: Polygon | MultiPolygon | undefined): Polygon[] {
  if (!geometry) return [];
  const all = geometry.type === 'Polygon' ? [geometry.coordinates] : geometry.coordinates;
  return all.map((coordinates) => ({ type: 'Polygon', coordinates }));
}

/** An area in pieces along a line drawn across it; holes go with the piece they lie in. */
export function splitArea(centre: LatLon, area: Polygon, cut: readonly Position[]): Split<Polygon> {
  const about = [...(area.coordinates[0] ?? []), ...cut].map((p) => localOf(centre, p));
  const reachM = 2 * Math.max(100, ...about.map((p) => Math.hypot(p.eastM, p.northM)));
  const side = sideOf(centre, cut, reachM);
  if (!side) return { ok: false, message: SPLIT_WORDS.cutPoints };
  const [whole, half] = [polygon(area.coordinates), polygon([side])];
  const parts = [intersect(featureCollection([whole, half])), difference(featureCollection([whole, half]))]
    .flatMap((feature) => partsOf(feature?.geometry))
    .filter((part) => ringAreaM2(centre, part.coordinates[0] ?? []) > LEAST_PIECE_M2);
  if (parts.length < 2) return { ok: false, message: SPLIT_WORDS.across };
  return { ok: true, parts };
}
