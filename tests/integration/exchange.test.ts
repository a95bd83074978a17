import { eq } from 'drizzle-orm';
import { beforeAll, describe, expect, it } from 'vitest';
import { MAP_LAYERS } from '@/core/map-layers';
import { FEATURE_KINDS } from '@/core/types';
import { reader, write } from '@/db/client';
import { auditLog, imports, stands } from '@/db/schema';
import { EXPORT_FORMATS, EXPORT_LAYERS } from '@/features/exchange/exchange-schema';
import { exportGround, listExported } from '@/features/exchange/export-ground';
import { readMapFile } from '@/features/exchange/read/read-file';
import { readImport } from '@/features/exchange/read-import';
import { saveImport } from '@/features/exchange/save-import';
import { swapImport } from '@/features/exchange/swap-import';
import { takeUpload } from '@/features/exchange/take-upload';
import { undoImport } from '@/features/exchange/undo-import';
import { listApproaches, listFeatures, listParkings, listStands, updateStand } from '@/features/ground/data';
import { HAS_GDAL, runGdal } from '../helpers/gdal';
import {
  addMember,
  addStand,
  makeClub,
  TEST_NOW,
  TEST_PLACE,
  type TestClub,
  type TestMember,
} from '../helpers/make-club';

const { lat, lon } = TEST_PLACE;

async function upload(member: TestMember, name: string, body: string | Buffer): Promise<string> {
  const request = new Request('http://127.0.0.1/', {
    method: 'POST',
    body: typeof body === 'string' ? body : new Uint8Array(body),
  });
  return (await takeUpload(member.scope, { name, request }, TEST_NOW)).id;
}

/** The rows of a file that would be added as they are guessed. */
async function guessed(member: TestMember, id: string) {
  const view = await readImport(member.scope, id);
  const rows = view.rows.filter((row) => row.kind !== '' && row.twins.length === 0 && row.problem === null);
  return { view, rows: rows.map(({ row, kind }) => ({ row, kind })) };
}

const WALK = `<gpx xmlns="http://www.topografix.com/GPX/1/1" version="1.1" creator="t">
<wpt lat="${lat}" lon="${lon}"><name>Ladder one</name></wpt>
<wpt lat="${lat + 0.005}" lon="${lon}"><name>Parking</name></wpt>
<wpt lat="${lat + 0.001}" lon="${lon + 0.001}"><name>North scrape</name></wpt>
<trk><name>Walk in</name><trkseg><trkpt lat="${lat}" lon="${lon}"/><trkpt lat="${lat + 0.002}" lon="${lon + 0.001}"/><trkpt lat="${lat + 0.005}" lon="${lon}"/></trkseg></trk>
</gpx>`;

describe('taking a file in', () => {
  let club: TestClub;
  let steward: TestMember;
  beforeAll(async () => {
    club = await makeClub();
    steward = await addMember(club, 'steward');
  });

  it('adds what was chosen, ties a walk to its ends, and says who did it', async () => {
    const id = await upload(steward, 'walk.gpx', WALK);
    const { view, rows } = await guessed(steward, id);
    expect(view.rows.map(({ kind }) => kind).sort()).toEqual(['approach', 'feature:scrape', 'parking', 'stand:ladder']);
    expect(await saveImport(steward.scope, { id, version: view.version, rows }, TEST_NOW)).toEqual({ added: 4 });
    const [stand] = await listStands(steward.scope);
    const [parking] = await listParkings(steward.scope);
    const [way] = await listApproaches(steward.scope);
    expect(way).toMatchObject({ standId: stand?.id, parkingId: parking?.id, name: 'Walk in' });
    // Drawn from the stand, and turned about.
    expect(way?.points.at(-1)).toEqual([lon, lat]);
    const log = await reader().select().from(auditLog).where(eq(auditLog.subjectId, id));
    expect(log.map(({ action, summary }) => [action, summary])).toEqual([
      ['import.saved', 'Added 4 of 4 things from walk.gpx to the ground.'],
    ]);
  });

  it('finds everything there already when the same file comes again', async () => {
    const id = await upload(steward, 'walk.gpx', WALK);
    const { view, rows } = await guessed(steward, id);
    expect(rows).toEqual([]);
    expect(view.rows.every(({ twins }) => twins.some((twin) => twin.row === null))).toBe(true);
  });

  it('adds nothing at all when one row cannot be', async () => {
    const far = `name,lat,lon,kind\nOne,${lat},${lon + 0.01},stand\nTwo,12,12,stand\n`;
    const id = await upload(steward, 'far.csv', far);
    const before = (await listStands(steward.scope)).length;
    const rows = [1, 2].map((row) => ({ row, kind: 'stand:ladder' }));
    await expect(saveImport(steward.scope, { id, version: 1, rows }, TEST_NOW)).rejects.toThrow(
      'Row 2 cannot be taken',
    );
    expect(await listStands(steward.scope)).toHaveLength(before);
    expect((await readImport(steward.scope, id)).state).toBe('read');
  });

  it('refuses a way that leads to no stand, whole', async () => {
    const text = JSON.stringify({
      type: 'FeatureCollection',
      features: [
        { type: 'Feature', properties: { name: 'Bed' }, geometry: { type: 'Point', coordinates: [lon, lat + 0.03] } },
        {
          type: 'Feature',
          properties: { name: 'Lost' },
          geometry: {
            type: 'LineString',
            coordinates: [
              [lon + 0.05, lat],
              [lon + 0.06, lat],
            ],
          },
        },
      ],
    });
    const id = await upload(steward, 'lost.geojson', text);
    const rows = [
      { row: 1, kind: 'feature:bedding' },
      { row: 2, kind: 'approach' },
    ];
    await expect(saveImport(steward.scope, { id, version: 1, rows }, TEST_NOW)).rejects.toThrow(
      'Row 2, Lost, leads to no stand',
    );
    expect((await listFeatures(steward.scope)).map(({ name }) => name)).toEqual(['North scrape']);
  });

  it('takes swapped places once they are turned about', async () => {
    const id = await upload(steward, 'swapped.csv', `name,lat,lon\nScrape s,${lon + 0.02},${lat + 0.02}\n`);
    const view = await readImport(steward.scope, id);
    expect(view.looksSwapped).toBe(true);
    expect(view.rows[0]?.problem).toContain('swap');
    await swapImport(steward.scope, { id, version: view.version });
    const after = await guessed(steward, id);
    expect(after.view.looksSwapped).toBe(false);
    await saveImport(steward.scope, { id, version: after.view.version, rows: after.rows }, TEST_NOW);
    const made = (await listFeatures(steward.scope)).find(({ name }) => name === 'Scrape s');
    expect(made?.geometry).toEqual({ type: 'Point', coordinates: [lon + 0.02, lat + 0.02] });
  });

  it('is not added twice, by two people at once either', async () => {
    const id = await upload(steward, 'twice.csv', `name,lat,lon\nScrape t,${lat + 0.04},${lon}\n`);
    const input = { id, version: 1, rows: [{ row: 1, kind: 'feature:scrape' }] };
    const both = await Promise.allSettled([
      saveImport(steward.scope, input, TEST_NOW),
      saveImport(steward.scope, input, TEST_NOW),
    ]);
    expect(both.map(({ status }) => status).sort()).toEqual(['fulfilled', 'rejected']);
    expect((await listFeatures(steward.scope)).filter(({ name }) => name.startsWith('Scrape t'))).toHaveLength(1);
  });

  it('refuses what is too big while it still comes', async () => {
    let sent = 0;
    const body = new ReadableStream({
      pull(controller) {
        sent += 1;
        controller.enqueue(new Uint8Array(1024 * 1024).fill(32));
      },
    });
    const request = new Request('http://127.0.0.1/', { method: 'POST', body, duplex: 'half' } as RequestInit);
    await expect(takeUpload(steward.scope, { name: 'endless', request }, TEST_NOW)).rejects.toThrow('over 50 MB');
    expect(sent).toBeLessThan(60);
  });

  it('belongs to its club alone', async () => {
    const id = await upload(steward, 'own.csv', `name,lat,lon\nA,${lat},${lon}\n`);
    const other = await addMember(await makeClub(), 'admin');
    await expect(readImport(other.scope, id)).rejects.toMatchObject({ code: 'not_found' });
    const input = { id, version: 1, rows: [{ row: 1, kind: 'stand:ladder' }] };
    await expect(saveImport(other.scope, input, TEST_NOW)).rejects.toMatchObject({ code: 'not_found' });
  });
});

describe('undoing', () => {
  it('takes all of it away again, and keeps what was changed since by name', async () => {
    const club = await makeClub();
    const steward = await addMember(club, 'steward');
    const id = await upload(steward, 'walk.gpx', WALK);
    const { view, rows } = await guessed(steward, id);
    await saveImport(steward.scope, { id, version: view.version, rows }, TEST_NOW);
    const [stand] = await listStands(steward.scope);
    if (!stand) throw new Error('No stand was added.');
    await write((tx) => updateStand(steward.scope, tx, { id: stand.id, version: 1 }, { name: 'Renamed' }));
    const { version } = await readImport(steward.scope, id);
    expect(await undoImport(steward.scope, { id, version }, TEST_NOW)).toEqual({ removed: 3, kept: ['Renamed'] });
    expect((await listStands(steward.scope)).map(({ name }) => name)).toEqual(['Renamed']);
    expect([
      await listApproaches(steward.scope),
      await listFeatures(steward.scope),
      await listParkings(steward.scope),
    ]).toEqual([[], [], []]);
    await expect(undoImport(steward.scope, { id, version: version + 1 }, TEST_NOW)).rejects.toMatchObject({
      code: 'conflict',
    });
  });

  it('brings the ground back to what it was', async () => {
    const club = await makeClub();
    const steward = await addMember(club, 'steward');
    await addStand(club);
    const ground = () => listExported(steward.scope, reader());
    const before = await ground();
    const id = await upload(steward, 'walk.gpx', WALK);
    const { view, rows } = await guessed(steward, id);
    await saveImport(steward.scope, { id, version: view.version, rows }, TEST_NOW);
    expect(await ground()).not.toEqual(before);
    await undoImport(steward.scope, { id, version: view.version + 1 }, TEST_NOW);
    expect(await ground()).toEqual(before);
  });
});

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
  const { fitsShape } = await import('@/features/exchange/kind-values');
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
