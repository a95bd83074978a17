import { beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { GET as momentRoute } from '@/app/api/clubs/[club]/map/moment/route';
import { GET as mapRoute } from '@/app/api/clubs/[club]/map/route';
import { saveDrawing } from '@/features/map/save-drawing';
import type { MapView } from '@/features/map/thing';
import { readMoment } from '@/features/moment/read-moment';
import { setClock } from '@/server/clock';
import { book } from '../helpers/book';
import { DRAWN } from '../helpers/drawn-things';
import { addMember, makeClub, TEST_NOW, type TestClub, type TestMember } from '../helpers/make-club';
import { inRequest } from '../helpers/request';
import { steady } from '../helpers/sits-club';

let club: TestClub;
let steward: TestMember;

beforeAll(() => setClock(() => TEST_NOW));
beforeEach(async () => {
  club = await makeClub();
  steward = await addMember(club, 'steward', { name: 'Sol Marsh' });
});

async function drawAll(): Promise<Record<string, string>> {
  const answer = await saveDrawing(steward.scope, { changes: DRAWN }, TEST_NOW);
  if (!answer.saved) throw new Error('The drawing was not saved.');
  return answer.ids;
}

describe('reading the map', () => {
  const read = async (who: TestMember, path: string, route: typeof mapRoute | typeof momentRoute) => {
    const request = new Request(`http://127.0.0.1/api/clubs/${club.slug}/${path}`);
    return inRequest(who.browser, () => route(request, { params: Promise.resolve({ club: club.slug }) }));
  };

  it('gives members all that is drawn, and guests nothing of it', async () => {
    await drawAll();
    const view: MapView = await (await read(steward, 'map', mapRoute)).json();
    expect(view.things.map(({ kind }) => kind)).toEqual(['item', 'feature', 'approach', 'parking', 'stand']);
    expect(view.may).toEqual({ stands: true, features: true, approaches: true });
    expect(view.imagery).toBeNull();
    // Near Atlanta magnetic north lies some five degrees west (NOAA's declination map; value from memory).
    expect(view.declinationDeg).toBeGreaterThan(-7);
    expect(view.declinationDeg).toBeLessThan(-4);
    const guest = await addMember(club, 'guest', { guestFrom: '2026-11-01', guestTo: '2026-11-30' });
    expect((await read(guest, 'map', mapRoute)).status).toBe(403);
  });

  it('lays a moment over it: scent from the core, the walk in pieces, and who sits', async () => {
    const ids = await drawAll();
    const sitter = await addMember(club, 'member', { name: 'Moss Hale' });
    const stand = ids['new-1'] ?? '';
    await book(sitter, stand, { day: '2026-11-06', windows: 'morning' });
    const ask = { stand, day: '2026-11-06', window: 'morning' as const, step: 2 };
    const view = await readMoment(steward.scope, ask, TEST_NOW, { forecast: steady(270) });
    expect(view.step).toBe(2);
    expect(view.wind?.speedMps).toBeGreaterThan(0);
    expect(view.bands.length).toBeGreaterThan(0);
    const levels = view.bands.map(({ level }) => level);
    expect(levels).toEqual(levels.toSorted((a, b) => a - b));
    expect(view.way?.stretches.length).toBeGreaterThan(5);
    for (const { chance } of view.way?.stretches ?? [])
      expect(chance).toBeLessThanOrEqual((view.way?.inChance ?? 0) + 1e-9);
    expect(view.sitters).toMatchObject([{ standName: 'Creek Bend', name: 'Moss Hale' }]);
    const status = async (query: string) => (await read(steward, `map/moment?${query}`, momentRoute)).status;
    expect(await status('stand=std_none&day=2026-11-06&window=morning')).toBe(404);
    expect(await status(`stand=${stand}&day=2026-13-06&window=morning`)).toBe(400);
  });
});
