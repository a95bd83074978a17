import { eq } from 'drizzle-orm';
import { beforeAll, describe, expect, it } from 'vitest';
import { FEATURE_KINDS } from '@/core/ground-types';
import { MAP_LAYERS } from '@/core/map-layers';
import { reader } from '@/db/client';
import { auditLog, imports, stands } from '@/db/schema';
import { EXPORT_FORMATS, EXPORT_LAYERS } from '@/features/exchange/exchange-schema';
import { exportGround, listExported } from '@/features/exchange/export-ground';
import { fitsShape } from '@/features/exchange/kind-values';
import { readMapFile } from '@/features/exchange/read/read-file';
import { saveImport } from '@/features/exchange/save-import';
import { HAS_GDAL, runGdal } from '../helpers/gdal';
import { addMember, addStand, makeClub, TEST_NOW, TEST_PLACE, type TestMember } from '../helpers/make-club';
import { guessed, upload } from '../helpers/upload';

const { lat, lon } = TEST_PLACE;

/** Every kind there is, at places that need all their decimals. */
async function fullGround(): Promise<TestMember> {
  const club = await makeClub();
  const steward = await addMember(club, 'steward');
  const at = (i: number, j = 0) => [lon + i * 0.00123456789, lat + j * 0.00098765432 + i * 0.0001];
  const shapes = (i: number) => ({
    point: { type: 'Point', coordinates: at(i) },
    line: { type: 'LineString', coordinates: [at(i), at(i, 1), at(i, 2)] },
    area: { type: 'Polygon', coordinates: [[at(i), at(i + 0.5), at(i + 0.5, 1), at(i)]] },
  });
  const kinds = [
    'stand:ladder',
    'stand:box_blind',
    'parking',
    ...FEATURE_KINDS.map((k) => `feature:${k}`),
    ...MAP_LAYERS.map((k) => `item:${k}`),
  ];
  const features = kinds.flatMap((kind, i) =>
    (['point', 'line', 'area'] as const).flatMap((shape, j) =>
      fitsShape(kind, shape)
        ? [
            {
              type: 'Feature',
              properties: { name: `${kind} ${shape} ñ & <x>`, kind, notes: `"${i}"` },
              geometry: shapes(i * 3 + j)[shape],
            },
          ]
        : [],
    ),
  );
  const id = await upload(steward, 'full.geojson', JSON.stringify({ type: 'FeatureCollection', features }));
  const { view } = await guessed(steward, id);
  const rows = view.rows.map(({ row, kind }) => ({ row, kind }));
  await saveImport(steward.scope, { id, version: view.version, rows }, TEST_NOW);
  return steward;
}

type Places = number[] | Places[];
function farthestApart(a: Places, b: Places): number {
  expect(b.length).toBe(a.length);
  return Math.max(
    ...a.map((one, i) => {
      const other = b[i];
      return typeof one === 'number' ? Math.abs(one - Number(other)) : farthestApart(one, other as Places);
    }),
  );
}

describe('taking the ground out', () => {
  let steward: TestMember;
  beforeAll(async () => {
    steward = await fullGround();
  });

  it('writes down who took what', async () => {
    const file = await exportGround(steward.scope, { format: 'csv', layers: ['stands'] }, TEST_NOW);
    expect(file.name).toMatch(/^ground-club-.*\.csv$/);
    expect(String(file.body).trim().split('\r\n')).toHaveLength(3);
    const rows = await reader().select().from(auditLog).where(eq(auditLog.action, 'ground.exported'));
    expect(rows.at(-1)?.summary).toBe('Took 2 things of the ground out as CSV: stands.');
  });

  it.each(EXPORT_FORMATS)('comes back from %s as it went, whole', async (format) => {
    const { body } = await exportGround(steward.scope, { format, layers: [...EXPORT_LAYERS] }, TEST_NOW);
    const read = readMapFile(Buffer.from(body));
    if (!read.ok) throw new Error(read.message);
    const all = await listExported(steward.scope, reader());
    const expected = format === 'csv' ? all.filter(({ geometry }) => geometry.type === 'Point') : all;
    expect(read.things).toHaveLength(expected.length);
    for (const { name, kind, geometry } of expected) {
      const found = read.things.find((one) => one.name === name);
      expect(found?.told).toContain(kind);
      expect(found?.geometry?.type).toBe(geometry.type);
      expect(farthestApart(geometry.coordinates, found?.geometry?.coordinates ?? [])).toBeLessThan(1e-7);
    }
  });

  describe.skipIf(!HAS_GDAL)('beside GDAL (left out where gdal-bin is not installed)', () => {
    it.each(['gpx', 'kml', 'kmz', 'geojson', 'csv'] as const)('reads %s to the same places', async (format) => {
      const { body } = await exportGround(steward.scope, { format, layers: [...EXPORT_LAYERS] }, TEST_NOW);
      const all = await listExported(steward.scope, reader());
      const layers = format === 'gpx' ? ['waypoints', 'tracks'] : [''];
      const open = format === 'csv' ? ['-oo', 'X_POSSIBLE_NAMES=lon', '-oo', 'Y_POSSIBLE_NAMES=lat'] : [];
      const found = new Map<string, { type: string; coordinates: Places }>();
      // A folder of KML is a layer of its own: all of them are read, one after another.
      const names =
        format === 'kml' || format === 'kmz'
          ? runGdal('ogrinfo', ['-q', `in.${format}`], { [`in.${format}`]: body })
              .toString()
              .split('\n')
              .flatMap((line) => /^\d+: (.+?)( \(.*\))?$/.exec(line)?.[1] ?? [])
          : layers;
      for (const layer of names) {
        const args = ['-f', 'GeoJSON', '-lco', 'COORDINATE_PRECISION=12', 'out.json', `in.${format}`, ...open];
        const out = runGdal('ogr2ogr', layer ? [...args, layer] : args, { [`in.${format}`]: body }, 'out.json');
        const collection: {
          features: { properties: Record<string, string>; geometry: { type: string; coordinates: Places } }[];
        } = JSON.parse(out.toString());
        for (const { properties, geometry } of collection.features) {
          found.set(properties.name ?? properties.Name ?? '', geometry);
        }
      }
      const expected = format === 'csv' ? all.filter(({ geometry }) => geometry.type === 'Point') : all;
      expect(found.size).toBe(expected.length);
      for (const { name, geometry } of expected) {
        const theirs = found.get(name);
        const flat = (places: Places): number[][] =>
          typeof places[0] === 'number' ? [(places as number[]).slice(0, 2)] : (places as Places[]).flatMap(flat);
        expect(farthestApart(flat(geometry.coordinates), flat(theirs?.coordinates ?? []))).toBeLessThan(1e-7);
      }
    });

    const SOURCE = {
      points: [
        ['Ladder a', lon + 0.0112345678, lat + 0.0001234567],
        ['Scrape b', lon + 0.0198765432, lat + 0.0300000001],
      ] as const,
    };
    const source = JSON.stringify({
      type: 'FeatureCollection',
      features: SOURCE.points.map(([name, x, y]) => ({
        type: 'Feature',
        properties: { name, desc: 'From elsewhere' },
        geometry: { type: 'Point', coordinates: [x, y] },
      })),
    });

    it.each([
      ['GPX', 'out.gpx', []],
      ['KML', 'out.kml', []],
      ['LIBKML', 'out.kmz', []],
      ['GeoJSON', 'out.geojson', ['-lco', 'COORDINATE_PRECISION=10']],
      ['CSV', 'out.csv', ['-lco', 'GEOMETRY=AS_XY']],
    ] as const)('takes in what it writes as %s', async (driver, file, options) => {
      const args = [
        '-f',
        driver,
        ...(driver === 'GPX' ? ['-nlt', 'POINT', '-nln', 'waypoints', '-dsco', 'GPX_USE_EXTENSIONS=YES'] : []),
        ...options,
        file,
        'in.geojson',
      ];
      const body = runGdal('ogr2ogr', args, { 'in.geojson': source }, file);
      const id = await upload(steward, file, body);
      const [row] = await reader().select().from(imports).where(eq(imports.id, id));
      for (const [name, x, y] of SOURCE.points) {
        const found = row?.things.find((one) => one.name === name);
        expect(farthestApart([x, y], (found?.geometry?.coordinates ?? []) as Places)).toBeLessThan(1e-7);
      }
    });
  });

  it("never leaves another club's stands in a file", async () => {
    const other = await makeClub();
    await addStand(other, { name: 'Nobody else knows' });
    const { body } = await exportGround(steward.scope, { format: 'geojson', layers: [...EXPORT_LAYERS] }, TEST_NOW);
    expect(String(body)).not.toContain('Nobody else knows');
    expect(await reader().select().from(stands).where(eq(stands.clubId, other.id))).toHaveLength(1);
  });
});
