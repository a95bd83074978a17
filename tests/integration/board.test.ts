import { beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { write } from '@/db/client';
import { approaches, parkings } from '@/db/schema';
import { readWalkUp } from '@/features/board/read-walk-up';
import { readBoard } from '@/features/board/reads';
import { cancelSitsOf } from '@/features/bookings/cancel-sits-of';
import { moveBackBy } from '@/features/outings/move-back-by';
import { signOut } from '@/features/outings/sign-out';
import { tellOverdue } from '@/features/outings/tell-overdue';
import { newId } from '@/lib/ids';
import { setClock } from '@/server/clock';
import { systemScopeById } from '@/server/scope';
import { book, smallClub } from '../helpers/book';
import { addMember, addStand, TEST_NOW, TEST_PLACE, type TestClub, type TestMember } from '../helpers/make-club';
import { goIn, HOUR, MINUTE, windowAt } from '../helpers/outings';

let club: TestClub;
let ann: TestMember;
let bert: TestMember;
let oak: string;
let startAt: number;

const stateOf = async (who: TestMember, now: number) => {
  const board = await readBoard(who.scope, now);
  return [...board.onGround, ...board.days.flatMap((day) => day.sits)].map((sit) => sit.stateText);
};

beforeAll(() => setClock(() => TEST_NOW));
beforeEach(async () => {
  ({ club, ann, bert, oak } = await smallClub({ restDaysDefault: 0 }));
  ({ startAt } = windowAt(ann));
});

describe('the board', () => {
  it('says due, late, in, overdue and out as the hours pass, and never signed in of an empty sit', async () => {
    const sit = await book(ann, oak);
    expect(await stateOf(bert, startAt - HOUR)).toEqual(['Due']);
    expect(await stateOf(bert, startAt)).toEqual(['Late: not signed in']);
    expect(await stateOf(bert, sit.endAt)).toEqual(['Never signed in']);
    const outing = await goIn(ann, sit.id, startAt + 1);
    expect(await stateOf(bert, outing.backBy + HOUR - 1)).toEqual(['In']);
    expect(await stateOf(bert, outing.backBy + HOUR)).toEqual(['Overdue']);
    await signOut(ann.scope, { outingId: outing.id }, outing.backBy + 2 * HOUR);
    expect(await stateOf(bert, outing.backBy + 3 * HOUR)).toEqual(['Out, 1:30 PM']);
  });

  it('keeps whoever is on the ground in sight past midnight and when the sit is cancelled under them', async () => {
    const sit = await book(ann, oak, { windows: 'evening' });
    await goIn(ann, sit.id, windowAt(ann, 'evening').startAt, { backBy: '18:30' });
    const scope = await systemScopeById(club.id);
    await write((tx) => cancelSitsOf(tx, scope, ann.id, 'closed', sit.startAt + 1));
    const board = await readBoard(bert.scope, sit.endAt + 30 * HOUR);
    expect(board.onGround).toMatchObject([{ memberName: 'Ann Roe', state: 'overdue', standName: 'Oak Ladder' }]);
    expect(board.days.flatMap((day) => day.sits)).toEqual([]);
  });

  it('puts the most overdue first and says first and moved time, the last sign and who was told', async () => {
    const elm = await addStand(club, { name: 'Elm Box' });
    const first = await goIn(ann, (await book(ann, oak)).id, startAt, { backBy: '12:00', vehicle: 'grey truck' });
    await goIn(bert, (await book(bert, elm)).id, startAt, { backBy: '11:00' });
    await moveBackBy(ann.scope, { outingId: first.id, minutes: '60', tracking: true }, startAt + HOUR);
    const now = first.backBy + HOUR + 20 * MINUTE;
    await tellOverdue(now);
    const { onGround } = await readBoard(ann.scope, now);
    expect(onGround.map((sit) => [sit.memberName, sit.state])).toEqual([
      ['Bert Hale', 'overdue'],
      ['Ann Roe', 'in'],
    ]);
    expect(onGround[1]).toMatchObject({
      backByText: '1:00 PM (first said 12:00 PM; tracking a deer)',
      vehicle: 'grey truck',
      told: [],
    });
    expect(onGround[0]?.told).toEqual([
      'Member told at 1:20 PM',
      'Officers not told: there is no other at 1:20 PM',
      'Safety contact not told: none has agreed at 1:20 PM',
    ]);
  });

  it('offers signing to the member and officers only, filled in from the sit, the way and the last vehicle', async () => {
    const parkingId = newId('parking');
    const points = [
      [TEST_PLACE.lon, TEST_PLACE.lat],
      [TEST_PLACE.lon, TEST_PLACE.lat + 0.01],
    ];
    await write(async (tx) => {
      await tx.insert(parkings).values({ id: parkingId, clubId: club.id, name: 'North gate', ...TEST_PLACE });
      const way = { clubId: club.id, standId: oak, parkingId, direction: 'both' as const, points };
      await tx.insert(approaches).values({ ...way, id: newId('approach'), name: 'Creek way' });
    });
    const before = await goIn(ann, (await book(ann, oak)).id, startAt, { vehicle: 'grey truck' });
    await signOut(ann.scope, { outingId: before.id }, startAt + HOUR);
    const sit = await book(ann, oak, { windows: 'evening' });
    const at = windowAt(ann, 'evening').startAt;
    const roles = ['steward', 'admin', 'landowner', 'member', 'guest'] as const;
    const dated = { guestFrom: '2026-11-01', guestTo: '2026-11-30', sponsorId: ann.id };
    const others = await Promise.all(roles.map((role) => addMember(club, role, role === 'guest' ? dated : {})));
    const offered = async (who: TestMember) => {
      const sits = (await readBoard(who.scope, at)).days.flatMap((day) => day.sits);
      return sits.find((one) => one.id === sit.id)?.signIn ?? null;
    };
    expect(await offered(ann)).toMatchObject({
      waysIn: [{ name: 'Creek way' }],
      parkingId,
      vehicle: 'grey truck',
      backBy: expect.stringMatching(/^18:\d[05]$/),
    });
    expect(await Promise.all(others.map(async (who) => (await offered(who)) !== null))).toEqual([
      true,
      true,
      false,
      false,
      false,
    ]);
    expect(await offered(bert)).toBeNull();
  });

  it('carries no position, address or secret, whoever reads it', async () => {
    await goIn(ann, (await book(ann, oak)).id, startAt);
    for (const role of ['landowner', 'admin'] as const) {
      const who = await addMember(club, role);
      const text = JSON.stringify(await readBoard(who.scope, startAt + HOUR));
      expect(text).toContain('Oak Ladder');
      expect(text).not.toMatch(/@|34\.1|-84|example/);
    }
  });
});

describe('a walk-up', () => {
  it('is offered to whoever has no sit in the window at hand, with the stands no rule closes', async () => {
    const elm = await addStand(club, { name: 'Elm Box' });
    const near = startAt + HOUR;
    expect((await readBoard(ann.scope, near)).walkUp).toBe('Sat 7 Nov, morning, 6:31 AM to 11:00 AM');
    await book(ann, oak, { windows: 'all_day' });
    expect((await readBoard(ann.scope, near)).walkUp).toBeNull();
    const options = await readWalkUp(bert.scope, near);
    expect(options.stands.map((stand) => stand.id)).toEqual([elm]);
    expect((await readBoard(bert.scope, windowAt(ann, 'evening').endAt + HOUR)).walkUp).toBeNull();
    const owner = await addMember(club, 'landowner');
    expect((await readBoard(owner.scope, near)).walkUp).toBeNull();
  });
});
