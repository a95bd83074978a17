import { eq } from 'drizzle-orm';
import { beforeAll, describe, expect, it } from 'vitest';
import { reader, write } from '@/db/client';
import { auditLog } from '@/db/schema';
import { listExported } from '@/features/exchange/export-ground';
import { readImport } from '@/features/exchange/read-import';
import { saveImport } from '@/features/exchange/save-import';
import { swapImport } from '@/features/exchange/swap-import';
import { takeUpload } from '@/features/exchange/take-upload';
import { undoImport } from '@/features/exchange/undo-import';
import { listApproaches, listFeatures, listParkings, listStands, updateStand } from '@/features/ground/data';
import {
  addMember,
  addStand,
  makeClub,
  TEST_NOW,
  TEST_PLACE,
  type TestClub,
  type TestMember,
} from '../helpers/make-club';
import { guessed, upload } from '../helpers/upload';

const { lat, lon } = TEST_PLACE;

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
