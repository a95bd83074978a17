import type { DrawnShape } from '@/core/map-layers';
import type { ImportedThing } from '@/db/schema';
import { type DrawnGeometry, parseGeometry } from '@/features/ground/geometry-text';
import type { MapClub, MapThing } from '@/features/map/thing';
import { nameOf } from '@/features/map/words/things';
import { guessKind } from './guess-kind';
import { kindOf } from './kind-values';
import { type Measured, measure, NearIndex, sameWithinM } from './near';
import { THING_PROBLEMS } from './words/files';
import { REVIEW_ROW_WORDS } from './words/import';

/** Something that lies where a row of the file lies. */
export interface Twin {
  name: string;
  /** 'stand', 'parking', 'approach', 'feature' or 'item'. */
  family: string;
  apartM: number;
  /** Another row of the file; null: it is on the map already. */
  row: number | null;
}

export interface ReviewRow {
  /** Its place in the file, from 1. */
  row: number;
  name: string;
  notes: string;
  shape: DrawnShape | null;
  /** Guessed; empty: nothing tells. */
  kind: string;
  twins: Twin[];
  problem: string | null;
  remarks: string[];
  size: { points: number };
}

const SHAPES = { Point: 'point', LineString: 'line', Polygon: 'area' } as const;

export const shapeOf = (geometry: DrawnGeometry): DrawnShape => SHAPES[geometry.type];

const turned = ([lon = 0, lat = 0]: number[]) => [lat, lon];

/** With latitude and longitude the other way round. */
export function swapPlaces(geometry: DrawnGeometry): DrawnGeometry {
  if (geometry.type === 'Point') return { ...geometry, coordinates: turned(geometry.coordinates) };
  if (geometry.type === 'LineString') return { ...geometry, coordinates: geometry.coordinates.map(turned) };
  return { ...geometry, coordinates: geometry.coordinates.map((ring) => ring.map(turned)) };
}

export type Checked = { ok: true; geometry: DrawnGeometry } | { ok: false; message: string };

/** A row's shape as the club's ground can hold it, or why it cannot. */
export function checkRow(thing: ImportedThing, swapped: boolean, club: { lat: number; lon: number }): Checked {
  if (thing.problem || !thing.geometry) return { ok: false, message: thing.problem ?? THING_PROBLEMS.noPlace };
  const geometry = swapped ? swapPlaces(thing.geometry) : thing.geometry;
  const read = parseGeometry(shapeOf(geometry), JSON.stringify(geometry), club);
  return read.ok ? { ok: true, geometry: read.geometry } : { ok: false, message: read.message };
}

interface Placed {
  measured: Measured;
  name: string;
  family: string;
  row: number | null;
}

const pointCount = (geometry: DrawnGeometry): number =>
  geometry.type === 'Point'
    ? 1
    : geometry.type === 'LineString'
      ? geometry.coordinates.length
      : geometry.coordinates.flat().length;

const MOST_TWINS = 5;

/** What becomes of every row: its kind guessed, its twins on the map and in the file found, or why it cannot be taken. */
export function reviewThings(
  things: readonly ImportedThing[],
  swapped: boolean,
  on: { club: MapClub; things: readonly MapThing[] },
): ReviewRow[] {
  const { club } = on;
  const index = new NearIndex<Placed>();
  for (const thing of on.things) {
    const { geometry } = thing;
    if (geometry.type !== 'Point' && geometry.type !== 'LineString' && geometry.type !== 'Polygon') continue;
    index.add({ measured: measure(club, geometry), name: nameOf(thing), family: thing.kind, row: null });
  }
  return things.map((thing, i): ReviewRow => {
    const { name, notes, remarks } = thing;
    const base = { row: i + 1, name, notes, remarks };
    const checked = checkRow(thing, swapped, club);
    if (!checked.ok) {
      return { ...base, shape: null, kind: '', twins: [], problem: checked.message, size: { points: 0 } };
    }
    const { geometry } = checked;
    const shape = shapeOf(geometry);
    const kind = guessKind(thing, shape);
    const measured = measure(club, geometry);
    const twins: Twin[] = [];
    for (const other of index.around(measured)) {
      if (twins.length >= MOST_TWINS) break;
      const apartM = sameWithinM(measured, other.measured);
      if (apartM !== null) twins.push({ name: other.name, family: other.family, apartM, row: other.row });
    }
    const family = kindOf(kind)?.kind ?? '';
    index.add({ measured, name: name || REVIEW_ROW_WORDS.rowAsName(i + 1), family, row: i + 1 });
    twins.sort((a, b) => a.apartM - b.apartM);
    return {
      ...base,
      shape,
      kind,
      twins,
      problem: null,
      size: { points: pointCount(geometry) },
    };
  });
}
