import { eq } from 'drizzle-orm';
import fc from 'fast-check';
import { beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { GET as touchedRoute } from '@/app/api/clubs/[club]/closures/touched/route';
import { closeAction, openAgainAction } from '@/app/clubs/[club]/closures/actions';
import { addFeatureAction, addParkingAction, removeParkingAction } from '@/app/clubs/[club]/ground/actions';
import {
  addApproachAction,
  changeApproachAction,
  removeApproachAction,
} from '@/app/clubs/[club]/stands/[stand]/approaches/actions';
import { addStandAction, changeStandAction, removeStandAction } from '@/app/clubs/[club]/stands/actions';
import { reader, write } from '@/db/client';
import { auditLog, closures, sits, stands } from '@/db/schema';
import { emptyApproachForm } from '@/features/ground/approach-schema';
import { getStand, listStands, loadGround } from '@/features/ground/data';
import { emptyFeatureForm } from '@/features/ground/feature-schema';
import { readClosures, readStandList } from '@/features/ground/reads';
import { emptyStandForm, standFormOf } from '@/features/ground/stand-form';
import { newId } from '@/lib/ids';
import { now, setClock } from '@/server/clock';
import type { ActionResult } from '@/server/doors';
import {
  addMember,
  addStand,
  makeClub,
  TEST_NOW,
  TEST_PLACE,
  type TestClub,
  type TestMember,
} from '../helpers/make-club';
import { inRequest } from '../helpers/request';

let club: TestClub;
let admin: TestMember;
let steward: TestMember;
let member: TestMember;
let landowner: TestMember;

beforeAll(() => setClock(() => TEST_NOW));
beforeEach(async () => {
  club = await makeClub();
  admin = await addMember(club, 'admin', { name: 'Ada Fenn' });
  steward = await addMember(club, 'steward', { name: 'Sol Marsh' });
  member = await addMember(club, 'member', { name: 'Moss Hale' });
  landowner = await addMember(club, 'landowner');
});

const as = <T>(who: TestMember, work: () => Promise<T>) => inRequest(who.browser, work);

function done<T>(result: ActionResult<T>): T {
  if (!result.ok) throw new Error(`${result.error.code}: ${JSON.stringify(result.error)}`);
  return result.data;
}

function refused<T>(result: ActionResult<T>) {
  if (result.ok) throw new Error('This should have been refused.');
  return result.error;
}

const standForm = (name: string) => ({
  ...emptyStandForm(),
  name,
  lat: String(TEST_PLACE.lat),
  lon: String(TEST_PLACE.lon),
  seatHeight: '16',
  shotRange: { ...emptyStandForm().shotRange, bow: '30' },
  arcsBoth: 'NW-N',
});

const auditOf = (subjectId: string) => reader().select().from(auditLog).where(eq(auditLog.subjectId, subjectId));

async function bookedSit(standId: string, day = '2026-11-07', approachId: string | null = null): Promise<string> {
  const id = newId('sit');
  const startAt = Date.parse(`${day}T11:00:00Z`);
  await write((tx) =>
    tx.insert(sits).values({
      id,
      clubId: club.id,
      standId,
      memberId: member.id,
      day,
      windows: 'morning',
      startAt,
      endAt: startAt + 4 * 3_600_000,
      weapon: 'bow',
      approachId,
      guests: [],
      status: 'booked',
      requestKey: id,
      bookedBy: member.userId,
      createdAt: TEST_NOW,
      updatedAt: TEST_NOW,
    }),
  );
  return id;
}

describe('stands', () => {
  it('are added with an audit row, and their names are one of a kind', async () => {
    const { id } = done(await as(steward, () => addStandAction(club.slug, standForm('Creek Bend'))));
    const stand = await getStand(steward.scope, id);
    expect(stand).toMatchObject({ name: 'Creek Bend', version: 1, arcs: [{ fromDeg: 303.75, toDeg: 11.25 }] });
    expect(await auditOf(id)).toMatchObject([{ action: 'stand.added', actorName: 'Sol Marsh', clubId: club.id }]);
    const twice = refused(await as(admin, () => addStandAction(club.slug, standForm('creek  BEND'))));
    expect(twice.code).toBe('conflict');
    expect(twice.fields?.name).toMatch(/already a stand called Creek Bend/);
    expect(await listStands(steward.scope)).toHaveLength(1);
  });

  it('a save over a newer version is refused and names who was quicker', async () => {
    const { id } = done(await as(steward, () => addStandAction(club.slug, standForm('Oak Flat'))));
    const change = (who: TestMember, notes: string) =>
      as(who, () => changeStandAction(club.slug, { ...standForm('Oak Flat'), notes, id, version: 1 }));
    done(await change(admin, 'new strap'));
    const late = refused(await change(steward, 'old strap'));
    expect(late).toMatchObject({ code: 'conflict', message: expect.stringMatching(/^Ada Fenn changed Oak Flat/) });
    const stand = await getStand(steward.scope, id);
    expect(stand).toMatchObject({ notes: 'new strap', version: 2 });
    const changed = (await auditOf(id)).filter((row) => row.action === 'stand.changed');
    expect(changed).toMatchObject([{ detail: { before: { notes: '' }, after: { notes: 'new strap' } } }]);
    if (stand) expect(standFormOf(stand, 'us')).toMatchObject({ seatHeight: '16', arcsBoth: 'NW-N' });
  });

  it('of another club cannot be read, changed or removed', async () => {
    const other = await makeClub();
    const theirs = await addStand(other);
    expect(await getStand(admin.scope, theirs)).toBe(null);
    const changed = await as(admin, () =>
      changeStandAction(club.slug, { ...standForm('Mine'), id: theirs, version: 1 }),
    );
    expect(refused(changed).code).toBe('not_found');
    const removed = await as(admin, () => removeStandAction(club.slug, { id: theirs, version: 1 }));
    expect(refused(removed).code).toBe('not_found');
    const way = { ...emptyApproachForm(), name: 'Path', points: '34.117, -84.0', standId: theirs };
    expect(refused(await as(admin, () => addApproachAction(club.slug, way))).code).toBe('not_found');
    const closed = { standId: theirs, fromDay: '2026-11-05', toDay: '', reason: 'mine now' };
    expect(refused(await as(admin, () => closeAction(club.slug, closed))).code).toBe('not_found');
    // The other club's slug does not open for a stranger either.
    const stranger = await as(admin, () => removeStandAction(other.slug, { id: theirs, version: 1 }));
    expect(refused(stranger).code).toBe('not_found');
    const [row] = await reader().select().from(stands).where(eq(stands.id, theirs));
    expect(row).toMatchObject({ version: 1, removedAt: null });
  });

  it('only name members of the club', async () => {
    const stranger = await addMember(await makeClub());
    const named = (ids: string[]) => ({ ...standForm('Kept'), whoMayHunt: 'named' as const, allowedMemberIds: ids });
    const bad = refused(await as(steward, () => addStandAction(club.slug, named([member.id, stranger.id]))));
    expect(Object.keys(bad.fields ?? {})).toEqual(['allowedMemberIds']);
    const { id } = done(await as(steward, () => addStandAction(club.slug, named([member.id]))));
    expect((await getStand(steward.scope, id))?.allowedMemberIds).toEqual([member.id]);
  });

  it('are not removed while booked, and take their approaches and closures along after', async () => {
    const id = await addStand(club, { name: 'Pine Saddle' });
    done(
      await as(steward, () =>
        addApproachAction(club.slug, { ...emptyApproachForm(), name: 'Path', points: '34.117, -84.0', standId: id }),
      ),
    );
    done(
      await as(steward, () =>
        closeAction(club.slug, { standId: id, fromDay: '2026-12-01', toDay: '', reason: 'strap' }),
      ),
    );
    const sitId = await bookedSit(id);
    const kept = refused(await as(admin, () => removeStandAction(club.slug, { id, version: 1 })));
    expect(kept).toMatchObject({ code: 'conflict' });
    expect(kept.message).toContain('Sat 7 Nov morning (Moss Hale)');
    await write((tx) => tx.update(sits).set({ status: 'cancelled' }).where(eq(sits.id, sitId)));
    done(await as(admin, () => removeStandAction(club.slug, { id, version: 1 })));
    const ground = await loadGround(admin.scope);
    expect([ground.stands, ground.approaches, ground.closures]).toEqual([[], [], []]);
    expect((await auditOf(id)).map((row) => row.action)).toEqual(['stand.removed']);
  });

  it('are written by stewards only', async () => {
    for (const who of [member, landowner]) {
      expect(refused(await as(who, () => addStandAction(club.slug, standForm('No')))).code).toBe('forbidden');
    }
    expect(await listStands(admin.scope)).toEqual([]);
  });
});

describe('approaches and parking places', () => {
  it('hang together: a parking place in use and a way that is booked stay', async () => {
    const standId = await addStand(club, { lat: TEST_PLACE.lat, lon: TEST_PLACE.lon });
    const gate = { name: 'Creek Gate', lat: '34.112', lon: '-84.003', notes: '' };
    const parking = done(await as(steward, () => addParkingAction(club.slug, gate)));
    const form = { ...emptyApproachForm(), name: 'Creek path', parkingId: parking.id };
    const way = done(await as(steward, () => addApproachAction(club.slug, { ...form, standId })));
    const ground = await loadGround(steward.scope);
    expect(ground.approaches[0]?.points).toEqual([
      [-84.003, 34.112],
      [TEST_PLACE.lon, TEST_PLACE.lat],
    ]);
    const inUse = refused(await as(steward, () => removeParkingAction(club.slug, { id: parking.id, version: 1 })));
    expect(inUse.message).toContain('Creek path');
    await bookedSit(standId, '2026-11-07', way.id);
    const booked = refused(await as(steward, () => removeApproachAction(club.slug, { id: way.id, version: 1 })));
    expect(booked.message).toContain('Moss Hale');
    const changed = { ...form, parkingId: '', points: '34.113, -84.001', id: way.id, version: 1 };
    done(await as(steward, () => changeApproachAction(club.slug, changed)));
    done(await as(steward, () => removeParkingAction(club.slug, { id: parking.id, version: 1 })));
    const stale = refused(await as(admin, () => changeApproachAction(club.slug, changed)));
    expect(stale.message).toMatch(/^Sol Marsh changed Creek path/);
    expect((await auditOf(way.id)).map((row) => row.action).sort()).toEqual(['approach.added', 'approach.changed']);
  });
});

describe('closures', () => {
  it('show the booked sits they fall on, before and after', async () => {
    const standId = await addStand(club, { name: 'Beech Point' });
    const sitId = await bookedSit(standId);
    const ask = (query: string, who = landowner) =>
      as(who, () =>
        touchedRoute(new Request(`http://test/api/clubs/${club.slug}/closures/touched?${query}`), {
          params: Promise.resolve({ club: club.slug }),
        }),
      );
    const before = await ask('fromDay=2026-11-06&toDay=2026-11-08');
    expect(await before.json()).toMatchObject([{ id: sitId, memberName: 'Moss Hale', standName: 'Beech Point' }]);
    expect(await (await ask('fromDay=2026-11-08&toDay=2026-11-09')).json()).toEqual([]);
    expect((await ask('fromDay=soon')).status).toBe(400);
    expect((await ask('fromDay=2026-11-08', member)).status).toBe(403);
    const days = { standId: '', fromDay: '2026-11-06', toDay: '2026-11-08', reason: 'Timber cut.' };
    const closed = done(await as(landowner, () => closeAction(club.slug, days)));
    expect(closed.touched.map((sit) => sit.id)).toEqual([sitId]);
    expect(await reader().select().from(sits).where(eq(sits.id, sitId))).toMatchObject([{ status: 'booked' }]);
    const { lines } = await readClosures(landowner.scope, now());
    expect(lines).toMatchObject([{ standName: null, reason: 'Timber cut', now: false }]);
    expect(lines[0]?.touched).toContain('Moss Hale');
    expect(await auditOf(closed.id)).toMatchObject([{ action: 'closure.added' }]);
  });

  it('a landowner closes days, never a stand, nor opens one', async () => {
    const standId = await addStand(club, { name: 'Ridge' });
    const form = { standId, fromDay: '2026-11-04', toDay: '', reason: 'ladder' };
    expect(refused(await as(landowner, () => closeAction(club.slug, form))).code).toBe('forbidden');
    const { id } = done(await as(steward, () => closeAction(club.slug, form)));
    expect((await readStandList(member.scope, now()))[0]?.closed).toBe('Closed until opened again: ladder');
    expect(refused(await as(landowner, () => openAgainAction(club.slug, { id }))).code).toBe('forbidden');
    expect((await readClosures(landowner.scope, now())).lines).toEqual([]);
  });

  it('opening again keeps the days that are past on record', async () => {
    const standId = await addStand(club);
    const begun = { standId, fromDay: '2026-11-01', toDay: '', reason: 'ladder' };
    const { id } = done(await as(steward, () => closeAction(club.slug, begun)));
    const later = { standId, fromDay: '2026-12-01', toDay: '2026-12-02', reason: 'logging' };
    const coming = done(await as(steward, () => closeAction(club.slug, later)));
    done(await as(steward, () => openAgainAction(club.slug, { id })));
    done(await as(steward, () => openAgainAction(club.slug, { id: coming.id })));
    const rows = await reader().select().from(closures).where(eq(closures.clubId, club.id));
    // The tests' now is the morning of 4 Nov 2026 at the club.
    expect(rows.find((row) => row.id === id)).toMatchObject({ toDay: '2026-11-03', removedAt: null });
    expect(rows.find((row) => row.id === coming.id)?.removedAt).toBe(TEST_NOW);
    expect(refused(await as(steward, () => openAgainAction(club.slug, { id }))).message).toMatch(/already over/);
    const past = { ...later, fromDay: '2026-11-01', toDay: '2026-11-03' };
    expect(refused(await as(steward, () => closeAction(club.slug, past))).fields?.toDay).toMatch(/past/);
  });
});

describe('bad bodies', () => {
  it('are refused in plain words and leave nothing behind', async () => {
    const good = { stand: standForm('X'), feature: { ...emptyFeatureForm(), name: 'X', places: '34.1, -84' } };
    // One field at a time is made anything at all; what can still be read may be saved, nothing may break.
    const spoil = <T extends object>(form: T) =>
      fc
        .tuple(fc.constantFrom(...Object.keys(form)), fc.anything())
        .map(([key, value]) => JSON.parse(JSON.stringify({ ...form, [key]: value ?? null })));
    const codes = new Set<string>();
    await fc.assert(
      fc.asyncProperty(spoil(good.stand), spoil(good.feature), async (stand, feature) => {
        for (const result of [
          await as(steward, () => addStandAction(club.slug, stand)),
          await as(steward, () => addFeatureAction(club.slug, feature)),
        ]) {
          if (result.ok) continue;
          codes.add(result.error.code);
          expect(result.error.message).not.toBe('');
        }
      }),
      { numRuns: 200 },
    );
    codes.delete('conflict');
    expect([...codes]).toEqual(['invalid']);
    const added = (await listStands(steward.scope)).length + (await loadGround(steward.scope)).features.length;
    const rows = await reader().select().from(auditLog).where(eq(auditLog.clubId, club.id));
    expect(rows).toHaveLength(added);
  });
});
