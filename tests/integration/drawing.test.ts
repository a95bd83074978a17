import { eq } from 'drizzle-orm';
import { beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { saveDrawingAction } from '@/app/clubs/[club]/ground/actions';
import { reader } from '@/db/client';
import { auditLog } from '@/db/schema';
import type { DrawingChange } from '@/features/map/drawing-schema';
import { loadDrawn } from '@/features/map/drawn-rows';
import { setClock } from '@/server/clock';
import type { ActionResult } from '@/server/doors';
import { DRAWN, newBed, newStand, newWay, newWood, point, spot } from '../helpers/drawn-things';
import { addMember, makeClub, TEST_NOW, type TestClub, type TestMember } from '../helpers/make-club';
import { inRequest } from '../helpers/request';

let club: TestClub;
let steward: TestMember;
let other: TestMember;

beforeAll(() => setClock(() => TEST_NOW));
beforeEach(async () => {
  club = await makeClub();
  steward = await addMember(club, 'steward', { name: 'Sol Marsh' });
  other = await addMember(club, 'admin', { name: 'Ada Fenn' });
});

const save = (who: TestMember, ...changes: DrawingChange[]) =>
  inRequest(who.browser, () => saveDrawingAction(club.slug, { changes }));
const stored = () => loadDrawn(steward.scope, reader());

function saved(result: Awaited<ReturnType<typeof save>>) {
  if (!result.ok || !result.data.saved) throw new Error(JSON.stringify(result));
  return result.data;
}

function refused<T>(result: ActionResult<T>) {
  if (result.ok) throw new Error('This should have been refused.');
  return result.error;
}

const drawAll = async () => saved(await save(steward, ...DRAWN)).ids;

describe('saving a drawing', () => {
  it('saves things that name one another, whatever their order, each with an audit row', async () => {
    const ids = await drawAll();
    const rows = await stored();
    const [way] = rows.approaches;
    expect(way).toMatchObject({ standId: ids['new-1'], parkingId: ids['new-2'], vehicleToIndex: 2 });
    // Tied to the parking place and the stand, which the line did not reach.
    expect(way?.points[0]).toEqual(spot(-300, -100));
    expect(way?.points.at(-1)).toEqual(spot(100, 200));
    expect(rows.stands[0]).toMatchObject({
      name: 'Creek Bend',
      kind: 'ladder',
      arcs: [{ fromDeg: 270, toDeg: 330, window: null }],
    });
    expect(rows.stands[0]?.shotRangeM.bow).toBeCloseTo(27.4, 1);
    expect(rows.items[0]).toMatchObject({ layer: 'wood', props: { cutYear: 2018 }, version: 1 });
    const told = await reader().select().from(auditLog).where(eq(auditLog.clubId, club.id));
    expect(told.map(({ summary }) => summary).toSorted()).toEqual([
      'Added approach Ditch to Creek Bend on the map.',
      'Added feature Laurel on the map.',
      'Added parking place Gate on the map.',
      'Added stand Creek Bend on the map.',
      'Added wood on the map.',
    ]);
  });

  it('leaves a geometry that was not drawn as it is stored, to the last digit', async () => {
    const ids = await drawAll();
    const before = (await stored()).items[0];
    saved(
      await save(steward, {
        op: 'set',
        kind: 'item',
        id: ids['new-4'] ?? '',
        version: 1,
        name: 'North Wood',
        what: 'wood',
        props: {},
      }),
    );
    const [wood] = (await stored()).items;
    expect(wood).toMatchObject({ name: 'North Wood', version: 2, props: {} });
    expect(wood?.geometry).toEqual(before?.geometry);
  });

  it('writes nothing while others were quicker, and says who and what', async () => {
    const ids = await drawAll();
    const id = ids['new-1'] ?? '';
    const { geometry: _, ...stand } = { ...newStand, id, version: 1 };
    saved(await save(other, { ...stand, name: 'Creek Corner' }));
    const answer = await save(steward, { ...stand, name: 'Mine' }, { ...newBed, id: 'new-9', name: 'Cedars' });
    expect(answer).toEqual({
      ok: true,
      data: { saved: false, conflicts: [{ id, kind: 'stand', name: 'Creek Corner', who: 'Ada Fenn', gone: false }] },
    });
    const rows = await stored();
    expect(rows.stands.map(({ name }) => name)).toEqual(['Creek Corner']);
    expect(rows.features.map(({ name }) => name)).toEqual(['Laurel']);
    saved(await save(steward, { ...stand, version: 2, name: 'Mine' }));
    expect((await stored()).stands[0]).toMatchObject({ name: 'Mine', version: 3 });
  });

  it('tells of what others removed, and takes a removal twice as one', async () => {
    const ids = await drawAll();
    const gone: DrawingChange = { op: 'remove', kind: 'item', id: ids['new-4'] ?? '', version: 1 };
    saved(await save(other, gone));
    saved(await save(steward, gone));
    const change: DrawingChange = {
      op: 'set',
      kind: 'item',
      id: ids['new-4'] ?? '',
      version: 1,
      name: 'x',
      what: 'wood',
      props: {},
    };
    expect(await save(steward, change)).toMatchObject({
      ok: true,
      data: { saved: false, conflicts: [{ gone: true, who: 'Ada Fenn' }] },
    });
  });

  it('removes a stand with its approaches, and a parking place once nothing begins there', async () => {
    const ids = await drawAll();
    const parking: DrawingChange = { op: 'remove', kind: 'parking', id: ids['new-2'] ?? '', version: 1 };
    expect(refused(await save(steward, parking)).message).toMatch(/Ditch/);
    saved(await save(steward, parking, { op: 'remove', kind: 'stand', id: ids['new-1'] ?? '', version: 1 }));
    const rows = await stored();
    expect([rows.stands, rows.approaches, rows.parkings]).toEqual([[], [], []]);
  });

  it.each<[string, DrawingChange, RegExp]>([
    ['a name that is taken', { ...newStand, id: 'new-8', name: 'CREEK BEND' }, /already a stand called Creek Bend/],
    ['no name', { ...newStand, id: 'new-8', name: ' ' }, /name/],
    [
      'ground far away',
      { ...newBed, id: 'new-8', name: 'Far', geometry: { type: 'Point', coordinates: [-84, 39] } },
      /Far: .*100 km/,
    ],
    [
      'latitude and longitude swapped',
      { ...newBed, id: 'new-8', name: 'Turned', geometry: { type: 'Point', coordinates: [34.117, -84] } },
      /swap/,
    ],
    [
      'an area of no size',
      { ...newWood, id: 'new-8', geometry: { type: 'Polygon', coordinates: [[spot(0, 0), spot(9, 9), spot(3, 3)]] } },
      /three corners/,
    ],
    ['a road drawn as a point', { ...newWood, id: 'new-8', what: 'road', geometry: point(0, 0) }, /drawn as line/],
    ['a way to nowhere', { ...newWay, id: 'new-8', standId: 'std_none', parkingId: null }, /leads to no stand/],
    [
      'a way from a parking place that is gone',
      { ...newWay, id: 'new-8', name: 'B', parkingId: 'prk_none' },
      /parking place is gone|leads to no stand/,
    ],
    [
      'nothing drawn',
      { op: 'set', kind: 'feature', id: 'new-8', version: 0, name: 'Nowhere', what: 'scrape' },
      /drawn nowhere/,
    ],
  ])('refuses %s, and keeps nothing of the rest', async (_, change, message) => {
    await drawAll();
    const before = await stored();
    const good: DrawingChange = { ...newBed, id: 'new-7', name: 'Good' };
    expect(refused(await save(steward, good, change)).message).toMatch(message);
    expect(await stored()).toEqual(before);
  });

  it("refuses things of another club as it refuses things that are not there, and members' drawings", async () => {
    const ids = await drawAll();
    const mine = club;
    club = await makeClub();
    const stranger = await addMember(club, 'steward');
    const theirs: DrawingChange = {
      op: 'set',
      kind: 'item',
      id: ids['new-4'] ?? '',
      version: 1,
      name: 'x',
      what: 'wood',
      props: {},
    };
    expect(await save(stranger, theirs)).toMatchObject({
      ok: true,
      data: { saved: false, conflicts: [{ gone: true, name: 'x', who: 'Somebody' }] },
    });
    club = mine;
    const member = await addMember(club, 'member');
    expect(refused(await save(member, { ...newBed, id: 'new-8' })).code).toBe('forbidden');
  });

  it('tells in the audit log what differs, before and after', async () => {
    const ids = await drawAll();
    const { geometry: _, ...stand } = { ...newStand, id: ids['new-1'] ?? '', version: 1 };
    saved(await save(steward, { ...stand, arcs: [] }));
    const rows = await reader().select().from(auditLog).where(eq(auditLog.subjectId, stand.id));
    expect(rows.find(({ action }) => action === 'stand.changed')?.detail).toEqual({
      before: { arcs: [{ fromDeg: 270, toDeg: 330, window: null }] },
      after: { arcs: [] },
    });
  });
});
