import type { Geometry } from 'geojson';
import { dayOf } from '@/core/day-time';
import { type ReadFrom, reader, write } from '@/db/client';
import { listMapItems, loadGround } from '@/features/ground/data';
import type { DrawnGeometry } from '@/features/ground/geometry-text';
import { LAYER_WORDS } from '@/features/map/words/things';
import { audit } from '@/server/audit';
import type { ClubScope } from '@/server/scope';
import type { ExportAsk, ExportFormat, ExportLayer } from './exchange-schema';
import { EXPORT_AUDIT, exportedApproach } from './words/export';
import type { Exported } from './write/exported';
import { writeCsv } from './write/write-csv';
import { writeGeoJson } from './write/write-geojson';
import { writeGpx } from './write/write-gpx';
import { writeKml, writeKmz } from './write/write-kml';

const TYPES: Record<ExportFormat, string> = {
  gpx: 'application/gpx+xml',
  kml: 'application/vnd.google-earth.kml+xml',
  kmz: 'application/vnd.google-earth.kmz',
  geojson: 'application/geo+json',
  csv: 'text/csv; charset=utf-8',
};

const WRITERS = { gpx: writeGpx, kml: writeKml, kmz: writeKmz, geojson: writeGeoJson, csv: writeCsv };

const drawn = (geometry: Geometry): geometry is DrawnGeometry =>
  geometry.type === 'Point' || geometry.type === 'LineString' || geometry.type === 'Polygon';

/** Everything on the ground that may leave, layer by layer. */
export async function listExported(scope: ClubScope, from: ReadFrom): Promise<Exported[]> {
  const { stands, parkings, approaches, features } = await loadGround(scope, from);
  const items = await listMapItems(scope, from);
  const point = (at: { lat: number; lon: number }): DrawnGeometry => ({ type: 'Point', coordinates: [at.lon, at.lat] });
  const standNames = new Map(stands.map(({ id, name }) => [id, name]));
  const one = (layer: ExportLayer, kind: string, row: { name: string; notes: string }, geometry: DrawnGeometry) => ({
    layer,
    kind,
    name: row.name,
    notes: row.notes,
    geometry,
  });
  return [
    ...stands.map((row) => one('stands', `stand:${row.kind}`, row, point(row))),
    ...parkings.map((row) => one('parking', 'parking', row, point(row))),
    ...approaches.map((row) => {
      const name = exportedApproach(row.name, standNames.get(row.standId) ?? null);
      return one('approaches', 'approach', { name, notes: row.notes }, { type: 'LineString', coordinates: row.points });
    }),
    ...features.flatMap((row) =>
      drawn(row.geometry) ? [one('features', `feature:${row.kind}`, row, row.geometry)] : [],
    ),
    ...items.map((row) =>
      one('land', `item:${row.layer}`, { ...row, name: row.name || LAYER_WORDS[row.layer] }, row.geometry),
    ),
  ];
}

export interface ExportedFile {
  name: string;
  type: string;
  body: string | Uint8Array;
}

/** The chosen layers as a file. That they were taken out is put on record: places of stands are secrets. */
export async function exportGround(scope: ClubScope, ask: ExportAsk, now: number): Promise<ExportedFile> {
  const { format } = ask;
  const layers = new Set(ask.layers);

  const things = await write(async (tx) => {
    const chosen = (await listExported(scope, tx)).filter(({ layer }) => layers.has(layer));
    const found = format === 'csv' ? chosen.filter(({ geometry }) => geometry.type === 'Point') : chosen;
    await audit(
      tx,
      {
        clubId: scope.club.id,
        actor: scope.actor,
        action: 'ground.exported',
        subjectType: 'ground',
        subjectId: scope.club.id,
        summary: EXPORT_AUDIT.taken(found.length, format, [...layers]),
      },
      now,
    );
    return found;
  });
  const body = WRITERS[format]({ club: scope.club.name, madeAt: now, things });
  return { name: `ground-${scope.club.slug}-${dayOf(now, scope.club.zone)}.${format}`, type: TYPES[format], body };
}

/** How many things each layer holds, and how many of them are points. */
export async function countLayers(
  scope: ClubScope,
  from: ReadFrom = reader(),
): Promise<Record<ExportLayer, { all: number; points: number }>> {
  const things = await listExported(scope, from);
  const count = (layer: ExportLayer) => {
    const own = things.filter((thing) => thing.layer === layer);
    return { all: own.length, points: own.filter(({ geometry }) => geometry.type === 'Point').length };
  };
  return {
    stands: count('stands'),
    parking: count('parking'),
    approaches: count('approaches'),
    features: count('features'),
    land: count('land'),
  };
}
