import { eq } from 'drizzle-orm';
import { beforeEach, describe, expect, it } from 'vitest';
import {
  acceptFindingAction,
  dismissFindingAction,
  reopenFindingAction,
} from '@/app/clubs/[club]/season/setup/actions';
import { saveSetupSettingsAction } from '@/app/clubs/[club]/season/setup/settings/actions';
import { completeRules, type WorkRule } from '@/core/booking/rules';
import { reader, write } from '@/db/client';
import { auditLog, chores, clubs, features } from '@/db/schema';
import { checkClub } from '@/features/setup/check-club';
import { readSetup } from '@/features/setup/reads';
import { getSetupSettings } from '@/features/setup/settings-data';
import { settingsToForm } from '@/features/setup/settings-schema';
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
    expect(rows).toMatchObject([
      { title: acts[0]?.text, place: `feature:${puddle}`, placeName: 'Puddle', assigneeId: null },
    ]);
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

  it('is worked out once while nothing it rests on changes, and anew when anything does', async () => {
    const first = await checkClub(steward.scope, TEST_NOW);
    const again = await checkClub(steward.scope, TEST_NOW + 60_000);
    expect(again.findings).toBe(first.findings);
    await addFeature(club, 'Oak', 'mast', { lat: TEST_PLACE.lat + 0.02, lon: TEST_PLACE.lon });
    expect((await checkClub(steward.scope, TEST_NOW)).findings).not.toBe(first.findings);
  });
});

describe('rules for work on the ground', () => {
  const water: WorkRule = { text: 'No new water holes.', source: 'Lease, paragraph 4', statedOn: '2026-08-01' };

  async function writeRules(workRules: Partial<ReturnType<typeof completeRules>['workRules']>) {
    const rules = completeRules(steward.scope.club.rules);
    rules.workRules = { ...rules.workRules, ...workRules };
    await write((tx) => tx.update(clubs).set({ rules }).where(eq(clubs.id, club.id)));
    Object.assign(steward.scope.club, { rules });
  }

  it('stand beside each finding with source and day, or are said to be missing', async () => {
    expect((await found()).rules).toEqual([
      { work: 'water', text: 'Water holes: the club has no rule written down.', isWritten: false },
      { work: 'cutting', text: 'Cutting and trimming: the club has no rule written down.', isWritten: false },
    ]);
    await writeRules({ water });
    const { rules, acts } = await found();
    const text = 'Water holes: No new water holes. Source: Lease, paragraph 4, stated on Sat 1 Aug 2026.';
    expect(rules[0]).toEqual({ work: 'water', text, isWritten: true });
    expect(acts[0]).toEqual({ text: 'Take away Puddle', rule: `${text} State law and the landowner decide.` });
  });

  it('go onto the chore that is made', async () => {
    await writeRules({ water });
    const { key, print } = await found();
    await answer(() => acceptFindingAction(club.slug, { key, print, act: 0 }));
    const [chore] = await reader().select().from(chores).where(eq(chores.clubId, club.id));
    expect(chore?.notes).toMatch(/^From the set-up check: Puddle lies behind/);
    expect(chore?.notes).toContain('No new water holes. Source: Lease, paragraph 4');
    expect(chore?.notes).toContain('State law and the landowner decide.');
  });
});

describe('distances of a club’s own', () => {
  const save = (settings: Record<string, string>, version = 0, who = steward) => {
    const form = settingsToForm({}, 'us', version);
    return answer(
      () => saveSetupSettingsAction(club.slug, { ...form, settings: { ...form.settings, ...settings } }),
      who,
    );
  };

  it('change what is found, and are on record with before and after', async () => {
    expect(await save({ pullWithinM: '50' })).toEqual({ ok: true, data: { changed: 1 } });
    const view = await look();
    // No longer about the seat, the water is what no stand has in shot.
    expect(view.open.map(({ code }) => code)).toEqual(['unhuntable']);
    expect(view.ownSettings).toBe(1);
    const [kept] = await reader().select().from(auditLog).where(eq(auditLog.clubId, club.id));
    expect(kept).toMatchObject({
      action: 'setup.settings_changed',
      summary: 'Changed the set-up check: An attraction pulls deer about a seat from within 100 yd → 50 yd.',
    });
    expect(await save({}, 1)).toEqual({ ok: true, data: { changed: 1 } });
    expect((await getSetupSettings(steward.scope)).own).toEqual({});
    expect((await look()).open.map(({ code }) => code)).toEqual(['off_shot']);
  });

  it('overwrite nobody unseen, and change nothing when nothing differs', async () => {
    expect(await save({})).toEqual({ ok: true, data: { changed: 0 } });
    expect(await save({ sunMinutes: '60' })).toMatchObject({ ok: true });
    expect(await save({ sunMinutes: '30' })).toMatchObject({ ok: false, error: { code: 'conflict' } });
    expect((await getSetupSettings(steward.scope)).own).toEqual({ sunMinutes: 60 });
  });

  it('are refused outside their bounds beside the field, and to members', async () => {
    expect(await save({ pullWithinM: '5' })).toMatchObject({
      ok: false,
      error: { code: 'invalid', fields: { 'settings.pullWithinM': expect.stringContaining('from 20 to 300 yd') } },
    });
    expect(await save({ sunMinutes: '60' }, 0, await addMember(club, 'member'))).toMatchObject({ ok: false });
    expect((await getSetupSettings(steward.scope)).version).toBe(0);
  });
});
