import simplify from '@turf/simplify';
import type { Geometry, LineString, Point, Polygon, Position } from 'geojson';
import type { ImportedThing } from '@/db/schema';
import { MOST_POINTS } from '@/features/ground/geometry-text';
import { NAME_MAX, NOTES_MAX } from '@/features/ground/read-form';
import { FILE_PROBLEMS, THING_PROBLEMS, THING_REMARKS } from '../words/files';
import { FileProblem } from './file-problem';
import { MOST_PLACES, MOST_THINGS } from './limits';
import type { RawThing } from './raw-thing';

type Shape = Point | LineString | Polygon;

/** Metres that a corner may lie off the thinned line, tried one after another. */
const THIN_M = [1, 2, 5, 10, 20];
const M_PER_DEGREE = 111_320;

/** Shapes of several parts become several things. */
function partsOf(geometry: Geometry): Shape[] {
  switch (geometry.type) {
    case 'MultiPoint':
      return geometry.coordinates.map((coordinates) => ({ type: 'Point', coordinates }));
    case 'MultiLineString':
      return geometry.coordinates.map((coordinates) => ({ type: 'LineString', coordinates }));
    case 'MultiPolygon':
      return geometry.coordinates.map((coordinates) => ({ type: 'Polygon', coordinates }));
    case 'GeometryCollection':
      return geometry.geometries.flatMap(partsOf);
    default:
      return [geometry];
  }
}

function placesOf(shape: Shape): Position[] {
  if (shape.type === 'Point') return [shape.coordinates];
  return shape.type === 'LineString' ? shape.coordinates : shape.coordinates.flat();
}

const isNumber = (value: unknown): value is number => typeof value === 'number' && Number.isFinite(value);

function findWrong(shape: Shape): string | null {
  const places = placesOf(shape);
  if (places.length === 0) return THING_PROBLEMS.noPlaces;
  for (const [i, [lon, lat]] of places.entries()) {
    if (!isNumber(lon) || !isNumber(lat)) return THING_PROBLEMS.noNumbers(i + 1);
    if (Math.abs(lon) > 180 || Math.abs(lat) > 180) {
      return THING_PROBLEMS.noDegrees(i + 1, lon, lat);
    }
  }
  if (shape.type === 'LineString' && places.length < 2) return THING_PROBLEMS.shortLine;
  if (shape.type === 'Polygon' && shape.coordinates.some((ring) => ring.length < 4)) return THING_PROBLEMS.shortArea;
  return null;
}

const flat = ([lon = 0, lat = 0]: Position): Position => [lon, lat];
const same = (a: Position, b: Position) => a[0] === b[0] && a[1] === b[1];
const withoutTwins = (line: Position[]) => line.filter((p, i) => i === 0 || !same(p, line[i - 1] ?? []));

function flatten(shape: Shape): Shape {
  if (shape.type === 'Point') return { type: 'Point', coordinates: flat(shape.coordinates) };
  if (shape.type === 'LineString')
    return { type: 'LineString', coordinates: withoutTwins(shape.coordinates.map(flat)) };
  return { type: 'Polygon', coordinates: shape.coordinates.map((ring) => withoutTwins(ring.map(flat))) };
}

/** Thins with degrees of longitude shrunk to the size of those of latitude, so that the tolerance is the same all round. */
function thin(shape: LineString | Polygon, toleranceM: number): LineString | Polygon {
  const shrink = Math.cos(((placesOf(shape)[0]?.[1] ?? 0) * Math.PI) / 180) || 1;
  const turn = (line: Position[], by: number) => line.map(([lon = 0, lat = 0]) => [lon * by, lat]);
  const options = { tolerance: toleranceM / M_PER_DEGREE, highQuality: true };
  if (shape.type === 'LineString') {
    const thinned = simplify({ ...shape, coordinates: turn(shape.coordinates, shrink) }, options);
    return { ...shape, coordinates: turn(thinned.coordinates, 1 / shrink) };
  }
  const thinned = simplify({ ...shape, coordinates: shape.coordinates.map((ring) => turn(ring, shrink)) }, options);
  return { ...shape, coordinates: thinned.coordinates.map((ring) => turn(ring, 1 / shrink)) };
}

function shorten(shape: Shape): { shape: Shape; remark: string | null } | null {
  const before = placesOf(shape).length;
  if (shape.type === 'Point' || before <= MOST_POINTS) return { shape, remark: null };
  for (const tolerance of THIN_M) {
    const thinned = thin(shape, tolerance);
    const after = placesOf(thinned).length;
    if (after <= MOST_POINTS) {
      return {
        shape: thinned,
        remark: THING_REMARKS.thinned(before, after, tolerance),
      };
    }
  }
  return null;
}

function tidyText(text: string, most: number): string {
  const tidy = text.replace(/(?![\t\n\r])\p{Cc}/gu, ' ').trim();
  return tidy.length > most ? `${tidy.slice(0, most - 1)}…` : tidy;
}

function toThing(raw: RawThing, part: Shape | null, suffix: string): ImportedThing {
  const name = raw.name.replace(/\s+/g, ' ').trim();
  const thing: ImportedThing = {
    name: tidyText(`${name.slice(0, NAME_MAX * 2)}${name ? suffix : ''}`, NAME_MAX),
    notes: tidyText(raw.notes, NOTES_MAX),
    told: tidyText(raw.told, 100),
    geometry: null,
    problem: raw.problem ?? null,
    remarks: [],
  };
  if (name.length + suffix.length > NAME_MAX) thing.remarks.push(THING_REMARKS.shortName);
  if (raw.notes.trim().length > NOTES_MAX) thing.remarks.push(THING_REMARKS.shortNotes);
  if (thing.problem || !part) return { ...thing, problem: thing.problem ?? THING_PROBLEMS.noPlace };
  const wrong = findWrong(part);
  if (wrong) return { ...thing, problem: wrong };
  const fitted = shorten(flatten(part));
  if (!fitted) {
    return {
      ...thing,
      problem: THING_PROBLEMS.tooLong(placesOf(part).length, MOST_POINTS),
    };
  }
  if (fitted.remark) thing.remarks.push(fitted.remark);
  return { ...thing, geometry: fitted.shape };
}

/** Everything of a file as things of one part each, flat, finite and short enough, or with why they cannot be. */
export function toThings(raws: RawThing[]): { things: ImportedThing[]; heights: boolean } {
  const things: ImportedThing[] = [];
  let places = 0;
  let heights = false;
  for (const raw of raws) {
    const parts = raw.geometry && !raw.problem ? partsOf(raw.geometry) : [null];
    for (const [i, part] of (parts.length > 0 ? parts : [null]).entries()) {
      if (part) {
        const own = placesOf(part);
        places += own.length;
        heights ||= own.some((p) => p.length > 2);
      }
      if (places > MOST_PLACES) throw new FileProblem(FILE_PROBLEMS.points(MOST_PLACES));
      things.push(toThing(raw, part, parts.length > 1 ? ` ${i + 1}` : ''));
      if (things.length > MOST_THINGS) throw new FileProblem(FILE_PROBLEMS.things(MOST_THINGS));
    }
  }
  return { things, heights };
}
