import type { Geometry } from 'geojson';
import { type DrawnShape, LAYER_SHAPES } from '@/core/map-layers';
import type { Tx } from '@/db/client';
import {
  insertFeature,
  insertMapItem,
  insertParking,
  insertStand,
  updateFeature,
  updateMapItem,
  updateParking,
  updateStand,
} from '@/features/ground/data';
import { type DrawnGeometry, parseGeometry } from '@/features/ground/geometry-text';
import { type GroundSubject, noteChange } from '@/features/ground/note-change';
import { NAME_MAX } from '@/features/ground/read-form';
import { changes, refuseTakenName } from '@/features/ground/refuse';
import { TAKEN_NAMES } from '@/features/ground/words/errors';
import { newId } from '@/lib/ids';
import { AppError, notFound } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import type { SetChange } from './drawing-schema';
import type { DrawnRows } from './drawn-rows';
import { drawnStandDefaults } from './new-stand';
import { MAP_AUDIT } from './words/audit';
import { MAP_ERRORS } from './words/errors';
import { LAYER_WORDS } from './words/things';

/** One saving under way. `ids`: what things drawn anew are called from now on. */
export interface Saving {
  scope: ClubScope;
  tx: Tx;
  now: number;
  rows: DrawnRows;
  removed: ReadonlySet<string>;
  ids: Record<string, string>;
}

type Of<K extends SetChange['kind']> = Extract<SetChange, { kind: K }>;

const SHAPES: Record<string, DrawnShape> = { Point: 'point', LineString: 'line', Polygon: 'area' };
const ALL_YEAR = [1, 2, 3, 4, 5, 6, 7, 8, 9, 10, 11, 12];

export function nameFor({ name }: SetChange, needed: string): string {
  const tidy = name.trim().replace(/\s+/g, ' ');
  if (tidy === '') throw new AppError('invalid', needed);
  if (tidy.length > NAME_MAX) throw new AppError('invalid', MAP_ERRORS.nameLong(tidy.slice(0, 20), NAME_MAX));
  return tidy;
}

/** The drawn geometry when it is one the club's ground can hold; undefined: none was sent, what is stored stays. */
export function geometryFor(saving: Saving, change: SetChange, name: string): DrawnGeometry | undefined {
  const { geometry } = change;
  if (!geometry) {
    if (change.version === 0) throw new AppError('invalid', MAP_ERRORS.drawnNowhere(name));
    return undefined;
  }
  if (geometry.type === 'Polygon' && geometry.coordinates.some((ring) => ring.length < 4)) {
    throw new AppError('invalid', MAP_ERRORS.fewCorners(name));
  }
  const read = parseGeometry(SHAPES[geometry.type] ?? 'area', JSON.stringify(geometry), saving.scope.club);
  if (!read.ok) throw new AppError('invalid', `${name}: ${read.message}`);
  return read.geometry;
}

function placeFor(
  saving: Saving,
  change: Of<'stand' | 'parking'>,
  name: string,
): { lat: number; lon: number } | undefined {
  const geometry = geometryFor(saving, change, name);
  if (geometry?.type !== 'Point') return undefined;
  const [lon = 0, lat = 0] = geometry.coordinates;
  return { lat, lon };
}

/** What is still there of one kind: names must differ from these. */
export function others<T extends { id: string; name: string }>(saving: Saving, rows: T[]): T[] {
  return rows.filter((row) => !saving.removed.has(row.id));
}

interface Kept {
  id: string;
  name: string;
}

/** Keeps the rows of the saving true, so that the next change is checked against this one. */
export function keep<T extends Kept>(rows: T[], row: T): void {
  const at = rows.findIndex((one) => one.id === row.id);
  if (at < 0) rows.push(row);
  else rows[at] = row;
}

/** The audit row of one change, with what differs where there was something before. */
export function noteSet(
  saving: Saving,
  note: { subject: GroundSubject; id: string; what: string; before: object | null; values: object },
): Promise<void> {
  const { scope, tx, now } = saving;
  const { subject, id, what, before, values } = note;
  if (!before) return noteChange(scope, tx, { subject, verb: 'added', id, summary: MAP_AUDIT.added(what) }, now);
  const detail = changes(before, values);
  return noteChange(scope, tx, { subject, verb: 'changed', id, summary: MAP_AUDIT.changed(what), detail }, now);
}

function rowOf<T extends Kept>(rows: T[], change: SetChange): T | null {
  if (change.version === 0) return null;
  const row = rows.find((one) => one.id === change.id);
  if (!row) throw notFound();
  return row;
}

export async function setStand(saving: Saving, change: Of<'stand'>): Promise<void> {
  const { scope, tx, rows, now } = saving;
  const name = nameFor(change, MAP_ERRORS.standNeedsName);
  const before = rowOf(rows.stands, change);
  refuseTakenName(others(saving, rows.stands), name, TAKEN_NAMES.stand, change.id);
  const values = { name, kind: change.what, arcs: change.arcs, ...placeFor(saving, change, name) };
  const id = before?.id ?? newId('stand');
  const note = { subject: 'stand' as const, id, what: MAP_AUDIT.stand(name), before, values };
  if (before) {
    const row = await updateStand(scope, tx, change, values);
    if (row) keep(rows.stands, row);
    return noteSet(saving, note);
  }
  const place = { lat: scope.club.lat, lon: scope.club.lon };
  const made = { ...drawnStandDefaults(change.what), ...place, ...values, id, createdAt: now };
  await insertStand(scope, tx, made);
  keep(rows.stands, { ...made, clubId: scope.club.id, version: 1, removedAt: null });
  saving.ids[change.id] = id;
  return noteSet(saving, note);
}

export async function setParking(saving: Saving, change: Of<'parking'>): Promise<void> {
  const { scope, tx, rows } = saving;
  const name = nameFor(change, MAP_ERRORS.parkingNeedsName);
  const before = rowOf(rows.parkings, change);
  refuseTakenName(others(saving, rows.parkings), name, TAKEN_NAMES.parking, change.id);
  const values = { name, ...placeFor(saving, change, name) };
  const id = before?.id ?? newId('parking');
  const note = { subject: 'parking' as const, id, what: MAP_AUDIT.parking(name), before, values };
  if (before) {
    const row = await updateParking(scope, tx, change, values);
    if (row) keep(rows.parkings, row);
    return noteSet(saving, note);
  }
  const made = { lat: scope.club.lat, lon: scope.club.lon, notes: '', ...values, id };
  await insertParking(scope, tx, made);
  keep(rows.parkings, { ...made, clubId: scope.club.id, version: 1, removedAt: null });
  saving.ids[change.id] = id;
  return noteSet(saving, note);
}

export async function setFeature(saving: Saving, change: Of<'feature'>): Promise<void> {
  const { scope, tx, rows } = saving;
  const name = nameFor(change, MAP_ERRORS.featureNeedsName);
  const before = rowOf(rows.features, change);
  refuseTakenName(others(saving, rows.features), name, TAKEN_NAMES.feature, change.id);
  const geometry = geometryFor(saving, change, name);
  const values = { name, kind: change.what, ...(geometry ? { geometry } : {}) };
  const id = before?.id ?? newId('feature');
  const note = { subject: 'feature' as const, id, what: MAP_AUDIT.feature(name), before, values };
  if (before) {
    const row = await updateFeature(scope, tx, change, values);
    if (row) keep(rows.features, row);
    return noteSet(saving, note);
  }
  const drawn: Geometry = geometry ?? { type: 'Point', coordinates: [scope.club.lon, scope.club.lat] };
  const made = { months: ALL_YEAR, use: null, rotation: [], notes: '', ...values, geometry: drawn, id };
  await insertFeature(scope, tx, made);
  keep(rows.features, { ...made, clubId: scope.club.id, version: 1, removedAt: null });
  saving.ids[change.id] = id;
  return noteSet(saving, note);
}

export async function setItem(saving: Saving, change: Of<'item'>): Promise<void> {
  const { scope, tx, rows } = saving;
  const layer = LAYER_WORDS[change.what];
  const name = change.name.trim() === '' ? '' : nameFor(change, layer);
  const before = rowOf(rows.items, change);
  const geometry = geometryFor(saving, change, name || layer);
  if (geometry && !LAYER_SHAPES[change.what].includes(SHAPES[geometry.type] ?? 'area')) {
    throw new AppError('invalid', MAP_ERRORS.wrongShape(name || layer, LAYER_SHAPES[change.what].join(' or ')));
  }
  const values = { name, layer: change.what, props: change.props, ...(geometry ? { geometry } : {}) };
  const id = before?.id ?? newId('mapItem');
  const what = `${layer.toLowerCase()}${name ? ` ${name}` : ''}`;
  const note = { subject: 'map_item' as const, id, what, before, values };
  if (before) {
    const row = await updateMapItem(scope, tx, change, values);
    if (row) keep(rows.items, row);
    return noteSet(saving, note);
  }
  if (geometry) await insertMapItem(scope, tx, { ...values, geometry, notes: '', id });
  saving.ids[change.id] = id;
  return noteSet(saving, note);
}
