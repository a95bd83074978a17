import { and, eq } from 'drizzle-orm';
import { beforeEach, describe, expect, it } from 'vitest';
import { reader, write } from '@/db/client';
import type { DrawSlot } from '@/db/schema';
import { drawResults, drawRuns, memberships, sits } from '@/db/schema';
import { enterDrawSchema } from '@/features/draws/draw-schema';
import { enterDraw } from '@/features/draws/enter-draw';
import { openDraw } from '@/features/draws/open-draw';
import { publishDraw } from '@/features/draws/publish-draw';
import { readRun } from '@/features/draws/read-run';
import { readDraw } from '@/features/draws/reads';
import { beginRun, runDraw, startDraw, stopRun, workOn } from '@/features/draws/run-draw';
import { LEASE_MS } from '@/features/draws/runs';
import { acceptSwap, offerSwap } from '@/features/draws/swap-sits';
import { setClock } from '@/server/clock';
import { book, refusal } from '../helpers/book';
import { addMember, addStand, makeClub, TEST_NOW, type TestClub, type TestMember } from '../helpers/make-club';
import { near } from '../helpers/sits-club';

const [SAT, SUN] = ['2026-11-14', '2026-11-15'];
const WEEKEND = [
  { day: SUN, windows: 'morning' as const },
  { day: SAT, windows: 'morning' as const },
  { day: SAT, windows: 'evening' as const },
];
const AFTER = TEST_NOW + 4 * 86_400_000;

let club: TestClub;
let admin: TestMember;
let ada: TestMember;
let ben: TestMember;
let creek: string;
let ridge: string;

beforeEach(async () => {
  setClock(() => TEST_NOW);
  club = await makeClub({ guestDaysPerSeason: 1 });
  admin = await addMember(club, 'admin', { name: 'Fay Admin' });
  ada = await addMember(club, 'member', { name: 'Ada' });
  ben = await addMember(club, 'member', { name: 'Ben' });
  creek = await addStand(club, { name: 'Creek', seats: 1, ...near(0) });
  ridge = await addStand(club, { name: 'Ridge', seats: 2, ...near(0.02) });
});

async function open(slots: DrawSlot[] = WEEKEND): Promise<string> {
  const closes = { closesDay: '2026-11-07', closesClock: '17:00', note: '' };
  const points = { pointsPerMiss: 1, resetOnGiven: true, workHoursPerPoint: 0 };
  return (await openDraw(admin.scope, { slots, standIds: [creek, ridge], ...closes, ...points }, TEST_NOW)).id;
}

const enter = (who: TestMember, drawId: string, more: Record<string, unknown> = {}) => {
  const wishes = { drawId, weapon: 'bow', slots: [0, 1, 2], choices: [creek, ridge], anyByScore: false, ...more };
  return enterDraw(who.scope, enterDrawSchema.parse(wishes), TEST_NOW);
};

const resultsOf = (drawId: string) => reader().select().from(drawResults).where(eq(drawResults.drawId, drawId));
const givenOf = async (drawId: string) => (await resultsOf(drawId)).filter(({ standId }) => standId !== null);
const bookedOf = (who: TestMember) =>
  reader()
    .select()
    .from(sits)
    .where(and(eq(sits.memberId, who.id), eq(sits.status, 'booked')));
const runsOf = (drawId: string) => reader().select().from(drawRuns).where(eq(drawRuns.drawId, drawId));
const make = async (drawId: string) => {
  setClock(() => AFTER);
  await runDraw(admin.scope, drawId, AFTER);
};

describe('a draw of several windows', () => {
  it('keeps them in the order of time and refuses two that share hours, or lie far apart', async () => {
    const drawId = await open();
    expect((await readDraw(ada.scope, drawId, TEST_NOW)).title).toBe(
      'Sat 14 Nov, morning and evening; Sun 15 Nov 2026, morning',
    );
    const twice = [...WEEKEND, { day: SAT, windows: 'all_day' as const }];
    expect((await refusal(open(twice))).more.fields).toHaveProperty(['slots.3.windows']);
    const far = [...WEEKEND, { day: '2026-11-21', windows: 'morning' as const }];
    expect((await refusal(open(far))).more.fields).toHaveProperty(['slots.3.day']);
  });

  it('rests a stand between its days, shares fairly, and books all of it', async () => {
    const drawId = await open();
    await enter(ada, drawId);
    await enter(ben, drawId, { slots: [0, 1] });
    await make(drawId);
    const given = await givenOf(drawId);
    // Two stands on Saturday morning and evening; both rest on Sunday, 3 full days being the club's rule.
    expect(given.map(({ slot }) => slot).sort()).toEqual([0, 0, 1, 1]);
    expect(given.filter(({ memberId }) => memberId === ben.id)).toHaveLength(2);
    const sunday = (await resultsOf(drawId)).find(({ slot, memberId }) => slot === 2 && memberId === ada.id);
    expect(sunday?.standId).toBeNull();
    expect(sunday?.reasons[1]).toMatch(
      /^The first choice, Creek, has to rest between the days: (it went to|the same member has it)/,
    );
    expect((await readDraw(admin.scope, drawId, AFTER)).results?.map(({ lines }) => lines.length)).toEqual([2, 2, 1]);
    expect(await publishDraw(admin.scope, drawId, AFTER)).toEqual({ booked: 4 });
    expect((await bookedOf(ada)).map(({ day, windows }) => `${day} ${windows}`).sort()).toEqual([
      `${SAT} evening`,
      `${SAT} morning`,
    ]);
  });

  it('gives nobody a second stand that a member without one could have', async () => {
    const drawId = await open([
      { day: SAT, windows: 'morning' },
      { day: SAT, windows: 'evening' },
    ]);
    await enter(ada, drawId, { slots: [0, 1], choices: [creek] });
    await enter(ben, drawId, { slots: [1], choices: [creek] });
    await make(drawId);
    const given = await givenOf(drawId);
    expect(given.map(({ memberId, slot }) => [memberId, slot]).sort()).toEqual(
      [
        [ada.id, 0],
        [ben.id, 1],
      ].sort(),
    );
  });

  it('holds to the live claims the club allows', async () => {
    const strict = await makeClub({ maxLiveClaims: 1 });
    [club, admin, ada] = [strict, await addMember(strict, 'admin'), await addMember(strict, 'member')];
    [creek, ridge] = [await addStand(club, near(0)), await addStand(club, near(0.02))];
    const drawId = await open();
    await enter(ada, drawId);
    await make(drawId);
    expect(await givenOf(drawId)).toHaveLength(1);
    expect(await publishDraw(admin.scope, drawId, AFTER)).toEqual({ booked: 1 });
  });

  it('counts one draw as one miss or one success, however many windows it has', async () => {
    const drawId = await open();
    await enter(ada, drawId, { choices: [creek] });
    await enter(ben, drawId, { slots: [2], choices: [creek] });
    await make(drawId);
    const held = new Set((await givenOf(drawId)).map(({ memberId }) => memberId));
    expect(held.size).toBe(1);
    await publishDraw(admin.scope, drawId, AFTER);
    const next = await openDraw(
      admin.scope,
      {
        slots: [{ day: '2026-11-28', windows: 'morning' }],
        standIds: [creek],
        closesDay: '2026-11-20',
        closesClock: '17:00',
        note: '',
        pointsPerMiss: 1,
        resetOnGiven: true,
        workHoursPerPoint: 0,
      },
      AFTER,
    );
    for (const who of [ada, ben]) {
      expect((await readDraw(who.scope, next.id, AFTER)).points).toBe(held.has(who.id) ? 0 : 1);
    }
  });
});

describe('what is told of a draw', () => {
  it('says to whoever left it to the score why nothing was left', async () => {
    const drawId = await open([{ day: SAT, windows: 'morning' }]);
    const cal = await addMember(club, 'member', { name: 'Cal' });
    for (const who of [ada, ben, cal]) await enter(who, drawId, { slots: [0], choices: [], anyByScore: true });
    await make(drawId);
    const without = (await resultsOf(drawId)).find(({ standId }) => standId === null);
    expect(without?.reasons).toEqual([
      '0 points, so 1 entry: number 3 of 3 in line, given no stand.',
      'Of the stands left to the score: 2 went to others.',
    ]);
  });

  it('keeps what the draw gave and adds the swap since', async () => {
    const drawId = await open([{ day: SAT, windows: 'morning' }]);
    for (const who of [ada, ben]) await enter(who, drawId, { slots: [0] });
    await make(drawId);
    await publishDraw(admin.scope, drawId, AFTER);
    const before = await resultsOf(drawId);
    await offerSwap(ben.scope, { drawId, memberId: ada.id, slot: 0 }, AFTER);
    await acceptSwap(ada.scope, { drawId, memberId: ben.id, slot: 0 }, AFTER);
    for (const was of before) {
      const now = (await resultsOf(drawId)).find(({ memberId }) => memberId === was.memberId);
      const [other, stand] = [was.memberId === ada.id ? 'Ben' : 'Ada', was.standId === creek ? 'Creek' : 'Ridge'];
      expect(now?.reasons).toEqual([...was.reasons, `Swapped since with ${other}, who has ${stand}.`]);
    }
  });
});

describe('guests in a draw', () => {
  const gus = { name: 'Gus', memberId: null };

  it('sit where there is a seat for them, on no more days than are left, and are on the sit', async () => {
    const drawId = await open();
    await enter(ada, drawId, { guests: [gus], slots: [0, 2] });
    await make(drawId);
    const given = await givenOf(drawId);
    // Ridge alone has two seats, and one guest day is left: Saturday or Sunday, not both.
    expect(given.map(({ standId }) => standId)).toEqual([ridge]);
    const told = (await resultsOf(drawId)).find(({ standId }) => standId === ridge);
    expect(told?.reasons[1]).toContain('Creek has 1 seat, and this sit needs 2.');
    await publishDraw(admin.scope, drawId, AFTER);
    expect((await bookedOf(ada)).map(({ guests }) => guests)).toEqual([[gus]]);
  });

  it('are refused at once when the club allows fewer, or nobody may bring them that day', async () => {
    const drawId = await open();
    const two = await refusal(enter(ada, drawId, { guests: [gus, { name: 'Gil', memberId: null }] }));
    expect(two.message).toBe('Sat 14 Nov, morning: The club allows at most 1 at once; 2 were named.');
    const late = { sponsorId: ada.id, guestFrom: '2026-11-15', guestTo: '2026-11-15' };
    const gil = await addMember(club, 'guest', { name: 'Gil', ...late });
    const invited = { name: 'Gil', memberId: gil.id };
    expect((await refusal(enter(ada, drawId, { guests: [invited] }))).message).toMatch(
      /^Sat 14 Nov, morning: Gil may not sit on/,
    );
    await enter(ada, drawId, { guests: [invited], slots: [2] });
    await write((tx) => tx.update(memberships).set({ removedAt: TEST_NOW }).where(eq(memberships.id, gil.id)));
    await enter(ben, drawId);
    await make(drawId);
    const adas = (await resultsOf(drawId)).filter(({ memberId }) => memberId === ada.id);
    expect(adas.map(({ standId }) => standId)).toEqual([null]);
    expect(adas[0]?.reasons[1]).toContain('A guest is no longer in the club');
  });

  it('come along when stands are swapped, if there is a seat', async () => {
    const drawId = await open([{ day: SAT, windows: 'morning' }]);
    await enter(ada, drawId, { slots: [0], guests: [gus] });
    await enter(ben, drawId, { slots: [0] });
    await make(drawId);
    const bens = (await resultsOf(drawId)).find(({ memberId }) => memberId === ben.id);
    expect(bens?.standId).toBe(creek);
    await publishDraw(admin.scope, drawId, AFTER);
    await offerSwap(ben.scope, { drawId, memberId: ada.id, slot: 0 }, AFTER);
    const full = await refusal(acceptSwap(ada.scope, { drawId, memberId: ben.id, slot: 0 }, AFTER));
    expect(full.message).toContain('Creek has 1 seat');
    expect((await bookedOf(ada)).map(({ standId }) => standId)).toEqual([ridge]);
    expect((await bookedOf(ben)).map(({ standId }) => standId)).toEqual([creek]);
  });
});

describe('the work on a draw', () => {
  const entered = async () => {
    const drawId = await open();
    await enter(ada, drawId);
    setClock(() => AFTER);
    return drawId;
  };

  it('is begun once, however often it is pressed', async () => {
    const drawId = await entered();
    const presses = await Promise.all([1, 2, 3].map(() => beginRun(admin.scope, drawId, AFTER)));
    expect(presses.filter(({ began }) => began)).toHaveLength(1);
    expect(new Set(presses.map(({ runId }) => runId)).size).toBe(1);
    expect(await readRun(admin.scope, drawId, AFTER)).toMatchObject({ atWork: true, message: null });
    expect((await refusal(runDraw(admin.scope, drawId, AFTER))).code).toBe('conflict');
    expect(await runsOf(drawId)).toHaveLength(1);
    const { runId } = presses[0] ?? { runId: '' };
    expect(await workOn(admin.scope, drawId, runId, AFTER)).toBeNull();
    expect(await runsOf(drawId)).toMatchObject([{ outcome: 'made' }]);
    expect((await readDraw(admin.scope, drawId, AFTER)).state).toBe('drawn');
  });

  it('can be stopped, and then leaves the draw as it was', async () => {
    const drawId = await entered();
    const { runId } = await beginRun(admin.scope, drawId, AFTER);
    await stopRun(admin.scope, drawId, AFTER);
    expect((await refusal(stopRun(admin.scope, drawId, AFTER))).code).toBe('conflict');
    expect(await workOn(admin.scope, drawId, runId, AFTER)).toBeNull();
    expect(await resultsOf(drawId)).toEqual([]);
    expect((await readDraw(admin.scope, drawId, AFTER)).state).toBe('open');
    await make(drawId);
    expect((await runsOf(drawId)).map(({ outcome }) => outcome).sort()).toEqual(['made', 'stopped']);
  });

  it('of a process that ended counts as lost, and can be done again', async () => {
    const drawId = await entered();
    const { runId } = await beginRun(admin.scope, drawId, AFTER);
    const later = AFTER + LEASE_MS + 1;
    expect(await readRun(admin.scope, drawId, later)).toMatchObject({
      atWork: false,
      message: 'The work ended before it was done. Make the draw again.',
    });
    setClock(() => later);
    await runDraw(admin.scope, drawId, later);
    expect((await runsOf(drawId)).map(({ outcome }) => outcome).sort()).toEqual(['lost', 'made']);
    const before = await resultsOf(drawId);
    // The process was only slow: what it brings now is no longer wanted.
    await workOn(admin.scope, drawId, runId, AFTER);
    expect(await resultsOf(drawId)).toEqual(before);
  });

  it('says plainly when nobody entered, and when no stand may be given', async () => {
    const empty = await open();
    setClock(() => AFTER);
    expect((await refusal(runDraw(admin.scope, empty, AFTER))).message).toBe('Nobody entered this draw. Call it off.');
    expect(await readRun(admin.scope, empty, AFTER)).toMatchObject({
      atWork: false,
      message: 'Nobody entered this draw. Call it off.',
    });
    setClock(() => TEST_NOW);
    const taken = await open([{ day: SAT, windows: 'morning' }]);
    await enter(ada, taken, { slots: [0], choices: [creek] });
    await book(ben, creek, { day: SAT });
    setClock(() => AFTER);
    const none = await refusal(runDraw(admin.scope, taken, AFTER));
    expect(none.message).toMatch(/^Nobody may be given any of the stands asked for\. .*Creek/);
  });

  it('goes on after the answer of the press', async () => {
    const drawId = await entered();
    expect(await startDraw(admin.scope, drawId, AFTER)).toMatchObject({ began: true });
    await expect.poll(async () => (await runsOf(drawId))[0]?.outcome, { timeout: 60_000 }).toBe('made');
  });
});
