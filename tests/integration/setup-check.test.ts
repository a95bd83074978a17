import { eq } from 'drizzle-orm';
import { beforeEach, describe, expect, it } from 'vitest';
import {
  acceptFindingAction,
  dismissFindingAction,
  reopenFindingAction,
} from '@/app/clubs/[club]/season/setup/actions';
import { reader, write } from '@/db/client';
import { auditLog, chores, features } from '@/db/schema';
import { readSetup } from '@/features/setup/reads';
import { setClock } from '@/server/clock';
import { addFeature } from '../helpers/add-ground';
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
let steward: TestMember;
let puddle: string;

/** A stand that looks north, with water 60 yd behind it. */
beforeEach(async () => {
  setClock(() => TEST_NOW);
  club = await makeClub();
  steward = await addMember(club, 'steward', { name: 'Ada Steward' });
  await addStand(club, { name: 'Oak Ladder', lat: TEST_PLACE.lat, facingDeg: 0, shotRangeM: { bow: 27 } });
  puddle = await addFeature(club, 'Puddle', 'water', { lat: TEST_PLACE.lat - 0.0005, lon: TEST_PLACE.lon });
});

const look = () => readSetup(steward.scope, TEST_NOW);

async function found() {
  const finding = (await look()).open.find(({ code }) => code === 'off_shot');
  if (!finding) throw new Error('Nothing lies off the shot.');
  return finding;
}

const answer = <T>(run: () => Promise<T>, who = steward) => inRequest(who.browser, run);

describe('the set-up check of a club', () => {
  it('finds what lies behind a seat, weighed on a usual wind of a season of hours', async () => {
    const { open, windsFrom } = await look();
    expect(open.map(({ code, text }) => [code, text])).toEqual([
      ['off_shot', 'Puddle lies behind the seat of Oak Ladder, 61 yd S of it'],
    ]);
    expect(windsFrom).toMatch(/past hours, 2025-09-01 to 2026-01-31$/);
  });

  it('makes a chore with its place, once', async () => {
    const { key, print, acts } = await found();
    expect(await answer(() => acceptFindingAction(club.slug, { key, print, act: 0 }))).toMatchObject({ ok: true });
    const rows = await reader().select().from(chores).where(eq(chores.clubId, club.id));
    expect(rows).toMatchObject([{ title: acts[0], place: `feature:${puddle}`, placeName: 'Puddle', assigneeId: null }]);
    const view = await look();
    expect(view.open).toEqual([]);
    expect(view.answered[0]?.answer).toMatchObject({ kind: 'chore', choreId: rows[0]?.id, by: 'Ada Steward' });
    const again = await answer(() => acceptFindingAction(club.slug, { key, print, act: 0 }));
    expect(again).toMatchObject({ ok: false, error: { code: 'conflict' } });
    expect(await reader().select().from(chores).where(eq(chores.clubId, club.id))).toHaveLength(1);
  });

  it('keeps a reason, and brings the finding back only when the ground has changed', async () => {
    const { key, print } = await found();
    const blank = await answer(() => dismissFindingAction(club.slug, { key, print, reason: ' ' }));
    expect(blank).toMatchObject({ ok: false, error: { code: 'invalid', fields: { reason: expect.any(String) } } });
    const reason = 'It dries up in August.';
    expect(await answer(() => dismissFindingAction(club.slug, { key, print, reason }))).toMatchObject({ ok: true });
    expect((await look()).answered[0]?.answer).toMatchObject({ kind: 'dismissed', reason });
    await addFeature(club, 'Far water', 'bedding', { lat: TEST_PLACE.lat + 0.01, lon: TEST_PLACE.lon });
    expect((await look()).open.map(({ code }) => code)).not.toContain('off_shot');

    const geometry = { type: 'Point' as const, coordinates: [TEST_PLACE.lon, TEST_PLACE.lat - 0.0006] };
    await write((tx) => tx.update(features).set({ geometry }).where(eq(features.id, puddle)));
    const back = await found();
    expect(back.key).toBe(key);
    const stale = await answer(() => acceptFindingAction(club.slug, { key, print, act: 0 }));
    expect(stale).toMatchObject({ ok: false, error: { code: 'conflict', message: /has changed/ } });
  });

  it('takes a finding up again, and leaves every answer in the record', async () => {
    const { key, print } = await found();
    await answer(() => dismissFindingAction(club.slug, { key, print, reason: 'Leave it.' }));
    expect(await answer(() => reopenFindingAction(club.slug, { key }))).toMatchObject({ ok: true });
    expect((await found()).key).toBe(key);
    const kept = await reader().select().from(auditLog).where(eq(auditLog.clubId, club.id));
    expect(kept.map(({ action }) => action)).toEqual(['finding.dismissed', 'finding.reopened']);
  });

  it('is answered by stewards of the club alone', async () => {
    const { key, print } = await found();
    const member = await addMember(club, 'member');
    const stranger = await addMember(await makeClub(), 'admin');
    for (const who of [member, stranger]) {
      const refused = await answer(() => acceptFindingAction(club.slug, { key, print, act: 0 }), who);
      expect(refused).toMatchObject({ ok: false });
    }
    expect(await reader().select().from(chores).where(eq(chores.clubId, club.id))).toEqual([]);
  });
});
