import type { Geometry, LineString, Point, Polygon, Position } from 'geojson';
import { z } from 'zod';
import type { LatLon } from '@/core/geometry';
import { degreesText, farFromClub, parseDegrees } from './place-text';
import { GEOMETRY_ERRORS } from './words/field-errors';

export const SHAPES = ['point', 'line', 'area'] as const;
export type Shape = (typeof SHAPES)[number];

export type DrawnGeometry = Point | LineString | Polygon;
export type ParsedLine = { ok: true; points: Position[] } | { ok: false; message: string };
export type ParsedGeometry = { ok: true; geometry: DrawnGeometry } | { ok: false; message: string };

export const MOST_POINTS = 1000;
const FEWEST: Record<Shape, number> = { point: 1, line: 2, area: 3 };
const TYPE_SHAPES: Record<DrawnGeometry['type'], Shape> = { Point: 'point', LineString: 'line', Polygon: 'area' };

const position = z
  .array(z.number())
  .min(2)
  .max(4)
  .transform((p): Position => p.slice(0, 2));
const drawn = z.discriminatedUnion('type', [
  z.object({ type: z.literal('Point'), coordinates: position }),
  z.object({ type: z.literal('LineString'), coordinates: z.array(position).min(2) }),
  z.object({ type: z.literal('Polygon'), coordinates: z.array(z.array(position).min(4)).min(1) }),
]);

const fail = (message: string) => ({ ok: false, message }) as const;
const same = (a: Position | undefined, b: Position | undefined) => a?.[0] === b?.[0] && a?.[1] === b?.[1];

/** Twice the signed area; above nought is anticlockwise. */
function turnOf(ring: Position[]): number {
  return ring.reduce((sum, [x = 0, y = 0], i) => {
    const [nextX = 0, nextY = 0] = ring[(i + 1) % ring.length] ?? [];
    return sum + x * nextY - nextX * y;
  }, 0);
}

/** Outer rings run anticlockwise and holes clockwise (RFC 7946, 3.1.6). */
function wound(rings: Position[][]): Position[][] {
  return rings.map((ring, i) => (turnOf(ring) < 0 === (i === 0) ? ring.toReversed() : ring));
}

/** One place to a line, 'latitude, longitude', as [lon, lat]. */
export function parsePoints(text: string, club: LatLon): ParsedLine {
  const points: Position[] = [];
  for (const [i, raw] of text.split('\n').entries()) {
    const line = raw.trim().replace(/[;,]$/, '');
    if (line === '') continue;
    const parts = line.split(line.includes(',') || line.includes(';') ? /\s*[,;]\s*/ : /\s+/);
    const lat = parseDegrees(parts[0] ?? '', 'lat');
    const lon = parseDegrees(parts[1] ?? '', 'lon');
    if (parts.length !== 2 || lat === null || lon === null) {
      return fail(GEOMETRY_ERRORS.line(i + 1));
    }
    const far = farFromClub(club, { lat, lon });
    if (far) return fail(GEOMETRY_ERRORS.lineFar(i + 1, far));
    points.push([lon, lat]);
  }
  if (points.length > MOST_POINTS) return fail(GEOMETRY_ERRORS.mostPoints(MOST_POINTS));
  return { ok: true, points };
}

function unwrap(value: unknown): unknown {
  const wrapper = z
    .object({ type: z.string(), geometry: z.unknown().optional(), features: z.array(z.unknown()).optional() })
    .safeParse(value).data;
  if (wrapper?.type === 'Feature') return wrapper.geometry;
  if (wrapper?.type === 'FeatureCollection' && wrapper.features?.length === 1) return unwrap(wrapper.features[0]);
  return value;
}

function parseGeoJson(text: string, club: LatLon): ParsedGeometry {
  let value: unknown;
  try {
    value = JSON.parse(text);
  } catch {
    return fail(GEOMETRY_ERRORS.brokenGeoJson);
  }
  const parsed = drawn.safeParse(unwrap(value));
  if (!parsed.success) return fail(GEOMETRY_ERRORS.oneGeoJson);
  const geometry = parsed.data;
  const points =
    geometry.type === 'Point'
      ? [geometry.coordinates]
      : geometry.type === 'LineString'
        ? geometry.coordinates
        : geometry.coordinates.flat();
  if (points.length > MOST_POINTS) return fail(GEOMETRY_ERRORS.mostPoints(MOST_POINTS));
  for (const [lon = 0, lat = 0] of points) {
    if (Math.abs(lat) > 90 || Math.abs(lon) > 180) return fail(GEOMETRY_ERRORS.outOfBounds);
    const far = farFromClub(club, { lat, lon });
    if (far) return fail(far);
  }
  if (geometry.type !== 'Polygon') return { ok: true, geometry };
  if (geometry.coordinates.some((ring) => !same(ring[0], ring.at(-1)))) return fail(GEOMETRY_ERRORS.openRing);
  return { ok: true, geometry: { ...geometry, coordinates: wound(geometry.coordinates) } };
}

/** A feature's geometry from lines of 'latitude, longitude' or from pasted GeoJSON; an area may leave its ring open. */
export function parseGeometry(shape: Shape, text: string, club: LatLon): ParsedGeometry {
  if (/^\s*[{[]/.test(text)) {
    const parsed = parseGeoJson(text, club);
    if (parsed.ok && TYPE_SHAPES[parsed.geometry.type] !== shape) {
      return fail(GEOMETRY_ERRORS.otherShape[TYPE_SHAPES[parsed.geometry.type]]);
    }
    return parsed;
  }
  const read = parsePoints(text, club);
  if (!read.ok) return read;
  const points = shape === 'area' && same(read.points[0], read.points.at(-1)) ? read.points.slice(0, -1) : read.points;
  const [first] = points;
  if (!first || points.length < FEWEST[shape]) {
    return fail(GEOMETRY_ERRORS.fewest[shape](FEWEST[shape]));
  }
  if (shape === 'point') {
    return points.length === 1
      ? { ok: true, geometry: { type: 'Point', coordinates: first } }
      : fail(GEOMETRY_ERRORS.onePlace);
  }
  if (shape === 'line') return { ok: true, geometry: { type: 'LineString', coordinates: points } };
  if (turnOf(points) === 0) return fail(GEOMETRY_ERRORS.flatArea);
  return { ok: true, geometry: { type: 'Polygon', coordinates: wound([[...points, first]]) } };
}

export function pointsText(points: Position[]): string {
  return points.map(([lon = 0, lat = 0]) => `${degreesText(lat)}, ${degreesText(lon)}`).join('\n');
}

/** What a form shows of a geometry: lines of places, or GeoJSON where there are holes or parts. */
export function geometryText(geometry: Geometry): { shape: Shape; text: string } {
  if (geometry.type === 'Point') return { shape: 'point', text: pointsText([geometry.coordinates]) };
  if (geometry.type === 'LineString') return { shape: 'line', text: pointsText(geometry.coordinates) };
  const [ring, ...holes] = geometry.type === 'Polygon' ? geometry.coordinates : [];
  if (ring && holes.length === 0) return { shape: 'area', text: pointsText(ring.slice(0, -1)) };
  return { shape: 'area', text: JSON.stringify(geometry) };
}
