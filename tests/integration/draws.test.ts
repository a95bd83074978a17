import { and, eq } from 'drizzle-orm';
import { beforeEach, describe, expect, it, vi } from 'vitest';
import {
  acceptSwapAction,
  enterDrawAction,
  giveBackAction,
  offerSwapAction,
  openDrawAction,
  publishDrawAction,
  runDrawAction,
} from '@/app/clubs/[club]/draws/actions';
import { addDays } from '@/core/day-time';
import { reader } from '@/db/client';
import { auditLog, claims, drawResults, draws, sits } from '@/db/schema';
import { bookSit } from '@/features/bookings/book-sit';
import { readRun } from '@/features/draws/read-run';
import { readDraw } from '@/features/draws/reads';
import { newRequestKey } from '@/lib/request-key';
import { setClock } from '@/server/clock';
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

const DAY = '2026-11-10';
const AFTER = TEST_NOW + 4 * 86_400_000;

let club: TestClub;
let admin: TestMember;
let ada: TestMember;
let ben: TestMember;
let cal: TestMember;
let creek: string;
let creekOver: string;
let ridge: string;

const as = <T>(who: TestMember, run: () => Promise<T>) => inRequest(who.browser, run);

async function data<T>(
  who: TestMember,
  run: () => Promise<{ ok: true; data: T } | { ok: false; error: { message: string } }>,
) {
  const answer = await as(who, run);
  if (!answer.ok) throw new Error(answer.error.message);
  return answer.data;
}

async function open(): Promise<string> {
  const values = {
    slots: [{ day: DAY, windows: 'morning' as const }],
    standIds: [creek, creekOver, ridge],
    closesDay: addDays(DAY, -3),
    closesClock: '17:00',
    pointsPerMiss: 1,
    resetOnGiven: true,
    workHoursPerPoint: 4,
    note: '',
  };
  return (await data(admin, () => openDrawAction(club.slug, values))).id;
}

const enter = (who: TestMember, drawId: string, choices: string[]) =>
  data(who, () => enterDrawAction(club.slug, { drawId, weapon: 'bow', slots: [0], choices, anyByScore: false }));

/** Creek and Creek Over lie 100 m apart: under the club's 300 yd only one of them is used. */
beforeEach(async () => {
  setClock(() => TEST_NOW);
  club = await makeClub();
  admin = await addMember(club, 'admin', { name: 'Fay Admin' });
  ada = await addMember(club, 'member', { name: 'Ada' });
  ben = await addMember(club, 'member', { name: 'Ben' });
  cal = await addMember(club, 'member', { name: 'Cal' });
  creek = await addStand(club, { name: 'Creek', lat: TEST_PLACE.lat, lon: TEST_PLACE.lon });
  creekOver = await addStand(club, { name: 'Creek Over', lat: TEST_PLACE.lat + 0.0009, lon: TEST_PLACE.lon });
  ridge = await addStand(club, { name: 'Ridge', lat: TEST_PLACE.lat + 0.02, lon: TEST_PLACE.lon });
});

/** The work goes on after the press: waits for its end as the page does. */
async function makeIt(drawId: string): Promise<void> {
  await data(admin, () => runDrawAction(club.slug, { drawId }));
  await vi.waitUntil(async () => (await readRun(admin.scope, drawId))?.atWork === false, { timeout: 60_000 });
}

/** Opened, entered by all three for the same stands, closed and made. */
async function make(): Promise<string> {
  const drawId = await open();
  await enter(ada, drawId, [creek, creekOver, ridge]);
  await enter(ben, drawId, [creek, creekOver, ridge]);
  await enter(cal, drawId, [creek, creekOver]);
  setClock(() => AFTER);
  await makeIt(drawId);
  return drawId;
}

const resultsOf = (drawId: string) =>
  reader().select().from(drawResults).where(eq(drawResults.drawId, drawId)).orderBy(drawResults.memberId);
const booked = () =>
  reader()
    .select()
    .from(sits)
    .where(and(eq(sits.clubId, club.id), eq(sits.status, 'booked')));

describe('a draw', () => {
  it('takes wishes until it closes, then shares out what the rules allow and says why', async () => {
    const early = await open();
    expect(await as(admin, () => runDrawAction(club.slug, { drawId: early }))).toMatchObject({ ok: false });
    const drawId = await make();
    const late = await as(ada, () =>
      enterDrawAction(club.slug, { drawId, weapon: 'bow', slots: [0], choices: [ridge], anyByScore: false }),
    );
    expect(late.ok).toBe(false);
    const given = (await resultsOf(drawId)).flatMap((entry) => entry.standId ?? []);
    expect(given).toHaveLength(2);
    expect(given).toContain(ridge);
    expect(given.filter((id) => id === creek || id === creekOver)).toHaveLength(1);
    expect((await readDraw(ada.scope, drawId, AFTER)).results).toBeNull();
    const { results, resultText } = await readDraw(admin.scope, drawId, AFTER);
    expect(resultText).toContain('best answer');
    const lines = results?.[0]?.lines;
    expect(lines?.map((line) => line.turn)).toEqual([1, 2, 3]);
    const without = lines?.find((line) => line.stand === null);
    expect(without?.reasons[0]).toMatch(/^0 points, so 1 entry: number \d of 3 in line, given no stand\.$/);
    expect(without?.reasons[1]).toMatch(/^The first choice, Creek, (went to|is too near)/);
    expect(await booked()).toEqual([]);
  });

  it('comes out the same when it is made again', async () => {
    const drawId = await make();
    const before = await resultsOf(drawId);
    await makeIt(drawId);
    expect(await resultsOf(drawId)).toEqual(before);
  });

  it('books all of it at once, with claims and mail, and counts points from then on', async () => {
    const drawId = await make();
    expect(await data(admin, () => publishDrawAction(club.slug, { drawId }))).toEqual({ booked: 2 });
    const rows = await booked();
    expect(rows.map((sit) => [sit.day, sit.windows])).toEqual([
      [DAY, 'morning'],
      [DAY, 'morning'],
    ]);
    expect(await reader().select().from(claims).where(eq(claims.clubId, club.id))).toHaveLength(2);
    expect(await as(admin, () => publishDrawAction(club.slug, { drawId }))).toMatchObject({ ok: false });
    const missed = (await resultsOf(drawId)).find((entry) => entry.standId === null);
    const who = [ada, ben, cal].find((member) => member.id === missed?.memberId) ?? ada;
    setClock(() => AFTER + 1);
    const next = (
      await data(admin, () =>
        openDrawAction(club.slug, {
          slots: [{ day: addDays(DAY, 7), windows: 'evening' }],
          standIds: [creek],
          closesDay: addDays(DAY, 3),
          closesClock: '17:00',
          pointsPerMiss: 2,
          resetOnGiven: true,
          workHoursPerPoint: 0,
          note: '',
        }),
      )
    ).id;
    expect((await readDraw(who.scope, next, AFTER)).points).toBe(2);
    const log = await reader().select().from(auditLog).where(eq(auditLog.clubId, club.id));
    expect(log.map((row) => row.action)).toEqual(
      expect.arrayContaining(['draw.opened', 'draw.made', 'draw.published']),
    );
  });

  it('books nothing when one of the sits is refused, and says whose', async () => {
    const drawId = await make();
    const sit = { standId: ridge, day: DAY, windows: 'morning' as const, weapon: 'bow' as const };
    await bookSit(
      admin.scope,
      { ...sit, approachId: null, guests: [], note: '', memberId: admin.id, requestKey: newRequestKey() },
      AFTER,
    );
    const answer = await as(admin, () => publishDrawAction(club.slug, { drawId }));
    expect(answer).toMatchObject({ ok: false, error: { code: 'conflict' } });
    expect(answer.ok ? '' : answer.error.message).toMatch(/^Nothing was booked: .* cannot have Ridge any more/);
    expect(await booked()).toHaveLength(1);
    expect(await reader().select().from(draws).where(eq(draws.id, drawId))).toMatchObject([{ state: 'drawn' }]);
  });

  it('lets two members swap when both agree, and one give a stand back', async () => {
    const drawId = await make();
    await data(admin, () => publishDrawAction(club.slug, { drawId }));
    const entries = (await resultsOf(drawId)).filter((entry) => entry.standId !== null);
    const people = entries.map((entry) => [ada, ben, cal].find((member) => member.id === entry.memberId) ?? ada);
    const [one = ada, two = ben] = people;
    const take = () => acceptSwapAction(club.slug, { drawId, memberId: one.id, slot: 0 });
    expect(await as(two, take)).toMatchObject({ ok: false });
    await data(one, () => offerSwapAction(club.slug, { drawId, memberId: two.id, slot: 0 }));
    await data(two, take);
    const after = await resultsOf(drawId);
    expect(after.find((entry) => entry.memberId === one.id)?.standId).toBe(entries[1]?.standId);
    expect(after.find((entry) => entry.memberId === two.id)?.standId).toBe(entries[0]?.standId);
    const held = await booked();
    expect(held.map((sit) => [sit.memberId, sit.standId]).sort()).toEqual(
      [
        [one.id, entries[1]?.standId],
        [two.id, entries[0]?.standId],
      ].sort(),
    );
    const mine = held.find((sit) => sit.memberId === one.id);
    await data(one, () => giveBackAction(club.slug, { sitId: mine?.id ?? '' }));
    const { results } = await readDraw(two.scope, drawId, AFTER);
    expect(results?.[0]?.lines.find((line) => line.memberId === one.id)?.gone).toBe(true);
  });
});
