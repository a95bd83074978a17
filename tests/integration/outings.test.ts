import { eq } from 'drizzle-orm';
import { beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { reader, write } from '@/db/client';
import { approaches, auditLog, parkings } from '@/db/schema';
import { cancelSit } from '@/features/bookings/cancel-sit';
import { changeSit } from '@/features/bookings/change-sit';
import { changeSitSchema } from '@/features/bookings/sit-schema';
import { lapseUnsigned } from '@/features/outings/lapse-unsigned';
import { moveBackBy } from '@/features/outings/move-back-by';
import { walkUpSchema } from '@/features/outings/outing-schema';
import { signOut } from '@/features/outings/sign-out';
import { walkUp } from '@/features/outings/walk-up';
import { newId } from '@/lib/ids';
import { setClock } from '@/server/clock';
import { book, bookingRows, refusal, SATURDAY, smallClub } from '../helpers/book';
import {
  addMember,
  addStand,
  makeClub,
  TEST_NOW,
  TEST_PLACE,
  type TestClub,
  type TestMember,
} from '../helpers/make-club';
import { goIn, HOUR, MINUTE, outingRows, windowAt } from '../helpers/outings';

let club: TestClub;
let ann: TestMember;
let bert: TestMember;
let oak: string;
let startAt: number;

async function setUp(rules: Parameters<typeof smallClub>[0] = {}) {
  ({ club, ann, bert, oak } = await smallClub(rules));
  ({ startAt } = windowAt(ann));
}

beforeAll(() => setClock(() => TEST_NOW));
beforeEach(() => setUp());

describe('signing in and out', () => {
  it('keeps who, when, back by and vehicle, once for two presses, and an audit row', async () => {
    const sit = await book(ann, oak);
    const first = await goIn(ann, sit.id, startAt - HOUR, { vehicle: 'grey truck' });
    const again = await goIn(ann, sit.id, startAt - HOUR + 5, { vehicle: 'grey truck' });
    expect(again.id).toBe(first.id);
    const [row, ...more] = (await outingRows(club.id)).outings;
    expect(more).toEqual([]);
    expect(row).toMatchObject({ vehicle: 'grey truck', signedInBy: ann.id, moves: 0, signedOutAt: null });
    expect(row?.backBy).toBe(Date.UTC(2026, 10, 7, 16, 30));
    expect(row?.firstBackBy).toBe(row?.backBy);
    const out = await signOut(ann.scope, { outingId: first.id }, startAt + HOUR);
    await signOut(ann.scope, { outingId: first.id }, startAt + 2 * HOUR);
    expect(out.signedOutAt).toBe(startAt + HOUR);
    expect((await outingRows(club.id)).outings[0]?.signedOutAt).toBe(startAt + HOUR);
    const written = await reader().select().from(auditLog).where(eq(auditLog.subjectId, first.id));
    expect(written.map((entry) => entry.action)).toEqual(['outing.signed_in', 'outing.signed_out']);
  });

  it('opens six hours before the window and ends with it', async () => {
    const sit = await book(ann, oak);
    expect((await refusal(goIn(ann, sit.id, startAt - 6 * HOUR - 1))).message).toContain('Signing in opens at');
    expect((await refusal(goIn(ann, sit.id, sit.endAt))).message).toContain('ended at');
    expect((await goIn(ann, sit.id, startAt - 6 * HOUR)).sitId).toBe(sit.id);
  });

  it('is for oneself, or for somebody by an officer', async () => {
    const sit = await book(ann, oak);
    const steward = await addMember(club, 'steward', { name: 'Cora Pike' });
    expect((await refusal(goIn(bert, sit.id, startAt))).code).toBe('forbidden');
    const outing = await goIn(steward, sit.id, startAt);
    expect(outing).toMatchObject({ memberId: ann.id, signedInBy: steward.id });
    expect((await refusal(signOut(bert.scope, { outingId: outing.id }, startAt + 1))).code).toBe('forbidden');
    expect((await signOut(steward.scope, { outingId: outing.id }, startAt + 1)).signedOutBy).toBe(steward.id);
  });

  it('lets nobody be in two places', async () => {
    const morning = await book(ann, oak);
    const elm = await addStand(club, { name: 'Elm Box' });
    const evening = await book(ann, elm, { windows: 'evening' });
    const outing = await goIn(ann, morning.id, startAt);
    const late = windowAt(ann, 'evening').startAt;
    expect((await refusal(goIn(ann, evening.id, late))).message).toContain('still signed in at Oak Ladder');
    await signOut(ann.scope, { outingId: outing.id }, late);
    expect((await goIn(ann, evening.id, late + 1)).standName).toBe('Elm Box');
  });

  it('takes a second outing of the same sit after the first', async () => {
    const sit = await book(ann, oak, { windows: 'all_day' });
    const first = await goIn(ann, sit.id, startAt);
    await signOut(ann.scope, { outingId: first.id }, startAt + 4 * HOUR);
    const second = await goIn(ann, sit.id, startAt + 8 * HOUR, { backBy: '19:00' });
    expect(second.id).not.toBe(first.id);
    expect((await outingRows(club.id)).outings).toHaveLength(2);
  });

  it('takes no way in of another stand, no way out only, and no parking of another club', async () => {
    const other = await makeClub();
    const elm = await addStand(club, { name: 'Elm Box' });
    const points = [
      [TEST_PLACE.lon, TEST_PLACE.lat],
      [TEST_PLACE.lon, TEST_PLACE.lat + 0.01],
    ];
    const way = async (standId: string, direction: 'in' | 'out' | 'both') => {
      const id = newId('approach');
      const row = { id, clubId: club.id, standId, name: `${direction} way`, direction, points };
      await write((tx) => tx.insert(approaches).values(row));
      return id;
    };
    const parkingId = newId('parking');
    await write((tx) =>
      tx.insert(parkings).values({ id: parkingId, clubId: other.id, name: 'Far gate', ...TEST_PLACE }),
    );
    const sit = await book(ann, oak);
    for (const approachId of [await way(elm, 'both'), await way(oak, 'out'), 'app_nothing']) {
      const refused = await refusal(goIn(ann, sit.id, startAt, { approachId }));
      expect(refused.more.fields).toHaveProperty('approachId');
    }
    expect((await refusal(goIn(ann, sit.id, startAt, { parkingId }))).more.fields).toHaveProperty('parkingId');
    const good = await goIn(ann, sit.id, startAt, { approachId: await way(oak, 'in') });
    expect(good.approachName).toBe('in way');
  });

  it('makes the sit stay on record: neither cancelled nor moved, in or out', async () => {
    const sit = await book(ann, oak);
    const elm = await addStand(club, { name: 'Elm Box' });
    const outing = await goIn(ann, sit.id, startAt);
    const move = () => {
      const { day, windows, weapon, approachId, guests, note, sequence } = sit;
      const values = { day, windows, weapon, approachId, guests, note, sequence, sitId: sit.id, standId: elm };
      return changeSit(ann.scope, changeSitSchema.parse(values), startAt + 1);
    };
    expect((await refusal(cancelSit(ann.scope, { sitId: sit.id, reason: '' }, startAt + 1))).message).toContain(
      'is signed in there',
    );
    expect((await refusal(move())).message).toContain('is signed in there');
    await signOut(ann.scope, { outingId: outing.id }, startAt + HOUR);
    expect((await refusal(cancelSit(ann.scope, { sitId: sit.id, reason: '' }, startAt + HOUR))).message).toContain(
      'has sat there',
    );
  });
});

describe('the back-by time', () => {
  it('moves on from the later of now and itself, keeps the first, and says why', async () => {
    const sit = await book(ann, oak);
    const { id, backBy } = await goIn(ann, sit.id, startAt);
    const once = await moveBackBy(ann.scope, { outingId: id, minutes: '60', tracking: true }, startAt + HOUR);
    expect(once).toMatchObject({ backBy: backBy + HOUR, firstBackBy: backBy, tracking: true, moves: 1 });
    const now = backBy + 3 * HOUR + 90_000;
    const twice = await moveBackBy(ann.scope, { outingId: id, minutes: '30', tracking: false }, now);
    expect(twice.backBy - now).toBeGreaterThanOrEqual(30 * MINUTE);
    expect(twice.backBy % (5 * MINUTE)).toBe(0);
    expect(twice).toMatchObject({ firstBackBy: backBy, tracking: false, moves: 2 });
    await signOut(ann.scope, { outingId: id }, now + 1);
    const after = refusal(moveBackBy(ann.scope, { outingId: id, minutes: '30', tracking: false }, now + 2));
    expect((await after).code).toBe('conflict');
  });
});

describe('walk-ups', () => {
  const ask = (standId: string, requestKey = crypto.randomUUID()) =>
    walkUpSchema.parse({ standId, weapon: 'bow', requestKey, backBy: '11:30' });

  it('book and sign in together, once for two presses, under all rules of booking', async () => {
    const input = ask(oak);
    const outing = await walkUp(ann.scope, input, startAt + HOUR);
    expect((await walkUp(ann.scope, input, startAt + HOUR)).id).toBe(outing.id);
    const made = await bookingRows(club.id);
    expect([made.sits.length, made.claims.length]).toEqual([1, 1]);
    expect(made.sits[0]).toMatchObject({ day: SATURDAY, windows: 'morning', memberId: ann.id });
    const taken = await refusal(walkUp(bert.scope, ask(oak), startAt + HOUR));
    expect(taken.message).toContain('Ann Roe has it');
    expect((await outingRows(club.id)).outings).toHaveLength(1);
  });

  it('leave no booking behind when signing in is refused', async () => {
    const input = { ...ask(oak), approachId: 'app_nothing' };
    await refusal(walkUp(ann.scope, input, startAt + HOUR));
    const other = { ...ask(oak), parkingId: 'prk_nothing' };
    expect((await refusal(walkUp(ann.scope, other, startAt + HOUR))).more.fields).toHaveProperty('parkingId');
    expect((await bookingRows(club.id)).sits).toEqual([]);
  });

  it('are not taken after the start where the club has none, nor when no window is near', async () => {
    await setUp({ walkUpSits: false });
    expect((await refusal(walkUp(ann.scope, ask(oak), startAt + HOUR))).message).toContain('no walk-up sits');
    const night = windowAt(ann, 'evening').endAt + HOUR;
    expect((await refusal(walkUp(ann.scope, ask(oak), night))).message).toContain('No window is near');
  });
});

describe('lapsing', () => {
  it('frees an unsigned stand once, with mail and audit, after the hold and not before', async () => {
    await setUp({ holdMinutes: 45 });
    const sit = await book(ann, oak);
    await lapseUnsigned(startAt + 45 * MINUTE - 1);
    expect((await bookingRows(club.id)).sits[0]?.status).toBe('booked');
    await Promise.all([lapseUnsigned(startAt + 45 * MINUTE), lapseUnsigned(startAt + 45 * MINUTE)]);
    const made = await bookingRows(club.id);
    expect(made.sits[0]).toMatchObject({ status: 'lapsed', sequence: 1 });
    expect(made.claims).toEqual([]);
    expect(made.audit.filter((entry) => entry.action === 'sit.lapsed')).toHaveLength(1);
    const mail = made.mail.filter((one) => one.kind === 'sit.lapsed');
    expect(mail).toHaveLength(1);
    expect(mail[0]?.message?.text).toContain('nobody signed in within 45 minutes');
    expect(mail[0]?.message?.calendar?.method).toBe('CANCEL');
    expect((await refusal(goIn(ann, sit.id, startAt + HOUR))).message).toContain('has lapsed');
    expect((await book(bert, oak, {}, startAt + HOUR)).memberName).toBe('Bert Hale');
  });

  it('leaves signed-in, signed-out, over and walk-up sits, and clubs without a hold, alone', async () => {
    await setUp({
      holdMinutes: 45,
      restDaysDefault: 0,
      spacingM: { bow: 0, crossbow: 0, muzzleloader: 0, shotgun: 0, rifle: 0 },
      passThroughM: 0,
    });
    const sit = await book(ann, oak);
    const { id } = await goIn(ann, sit.id, startAt + 10 * MINUTE);
    await signOut(ann.scope, { outingId: id }, startAt + 20 * MINUTE);
    const elm = await addStand(club, { name: 'Elm Box' });
    await book(bert, elm, {}, startAt + HOUR);
    await lapseUnsigned(startAt + HOUR + 44 * MINUTE);
    expect((await bookingRows(club.id)).sits.map((row) => row.status)).toEqual(['booked', 'booked']);
    await lapseUnsigned(sit.endAt);
    expect((await bookingRows(club.id)).sits.map((row) => row.status)).toEqual(['booked', 'booked']);
    const free = await smallClub();
    await book(free.ann, free.oak);
    await lapseUnsigned(startAt + 2 * HOUR);
    expect((await bookingRows(free.club.id)).sits[0]?.status).toBe('booked');
  });
});
