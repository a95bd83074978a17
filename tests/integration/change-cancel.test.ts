import { beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { cancelSit } from '@/features/bookings/cancel-sit';
import { changeSit } from '@/features/bookings/change-sit';
import type { BookSitInput } from '@/features/bookings/sit-schema';
import { setClock } from '@/server/clock';
import { book, bookingRows, refusal, smallClub, wanted } from '../helpers/book';
import { addMember, addStand, makeClub, TEST_NOW, type TestClub, type TestMember } from '../helpers/make-club';

let club: TestClub;
let ann: TestMember;
let bert: TestMember;
let oak: string;

const rows = () => bookingRows(club.id);

beforeAll(() => setClock(() => TEST_NOW));
beforeEach(async () => {
  ({ club, ann, bert, oak } = await smallClub());
});

describe('changing', () => {
  const change = (
    who: TestMember,
    sit: { id: string; sequence: number },
    more: Partial<BookSitInput>,
    now = TEST_NOW,
  ) => {
    const { requestKey: _, memberId: __, ...chosen } = wanted(oak, more);
    return changeSit(who.scope, { ...chosen, sitId: sit.id, sequence: sit.sequence }, now);
  };

  it('moves the claims, raises the sequence and tells the member', async () => {
    const elm = await addStand(club, { name: 'Elm Box' });
    const sit = await book(ann, oak);
    const after = await change(ann, sit, { standId: elm, windows: 'evening' });
    expect(after).toMatchObject({ id: sit.id, standName: 'Elm Box', windows: 'evening', sequence: 1 });
    expect(after.startAt).toBeGreaterThan(sit.startAt);
    const made = await rows();
    expect(made.claims.map((claim) => [claim.standId, claim.window])).toEqual([[elm, 'evening']]);
    expect(made.audit.map((row) => row.action)).toEqual(['sit.booked', 'sit.changed']);
    expect(made.mail.at(-1)?.message?.calendar?.content).toContain('SEQUENCE:1');
    await book(bert, oak);
  });

  it('is not in its own way, and writes nothing when nothing changed', async () => {
    const sit = await book(ann, oak);
    expect(await change(ann, sit, {})).toMatchObject({ sequence: 0 });
    expect(await change(ann, sit, { day: '2026-11-08', note: 'later' })).toMatchObject({
      sequence: 1,
      day: '2026-11-08',
    });
    expect((await rows()).audit).toHaveLength(2);
  });

  it('checks every rule again for a move, and none for a note', async () => {
    const elm = await addStand(club, { name: 'Elm Box' });
    const sit = await book(ann, oak);
    await book(bert, elm);
    expect((await refusal(change(ann, sit, { standId: elm }))).message).toContain('Bert Hale has it');
    const begun = sit.startAt + 60_000;
    expect(await change(ann, sit, { note: 'in' }, begun)).toMatchObject({ note: 'in', startAt: sit.startAt });
  });

  it('refuses a stale form, a sit that has ended, and the sit of somebody else', async () => {
    const sit = await book(ann, oak);
    await change(ann, sit, { note: 'first' });
    expect((await refusal(change(ann, sit, { note: 'second' }))).message).toContain('changed after you opened it');
    expect((await refusal(change(bert, sit, { note: 'mine' }))).code).toBe('forbidden');
    expect((await refusal(change(ann, { ...sit, sequence: 1 }, { note: 'late' }, sit.endAt))).message).toContain(
      'ended at',
    );
    const stranger = await addMember(await makeClub(), 'admin');
    expect((await refusal(change(stranger, sit, { note: 'x' }))).code).toBe('not_found');
  });
});

describe('cancelling', () => {
  it('frees the claims, keeps the record and tells the calendar', async () => {
    const sit = await book(ann, oak);
    await cancelSit(ann.scope, { sitId: sit.id, reason: 'work' }, TEST_NOW + 1);
    const made = await rows();
    expect(made.claims).toEqual([]);
    expect(made.sits[0]).toMatchObject({ status: 'cancelled', cancelReason: 'work', sequence: 1 });
    expect(made.mail.at(-1)?.message?.calendar?.method).toBe('CANCEL');
    expect(made.mail.at(-1)?.message?.calendar?.content).toContain('STATUS:CANCELLED');
    await book(bert, oak);
  });

  it('changes nothing the second time', async () => {
    const sit = await book(ann, oak);
    await cancelSit(ann.scope, { sitId: sit.id, reason: '' }, TEST_NOW + 1);
    await cancelSit(ann.scope, { sitId: sit.id, reason: 'again' }, TEST_NOW + 2);
    const made = await rows();
    expect(made.sits[0]).toMatchObject({ cancelReason: null, cancelledAt: TEST_NOW + 1, sequence: 1 });
    expect(made.audit).toHaveLength(2);
  });

  it('asks an admin for a reason, and refuses others, ended sits and other clubs', async () => {
    const admin = await addMember(club, 'admin', { name: 'Cora Pike' });
    const sit = await book(ann, oak);
    const bare = { sitId: sit.id, reason: '' };
    expect((await refusal(cancelSit(bert.scope, bare, TEST_NOW))).code).toBe('forbidden');
    expect((await refusal(cancelSit(admin.scope, bare, TEST_NOW))).more.fields).toHaveProperty('reason');
    expect((await refusal(cancelSit(ann.scope, bare, sit.endAt))).message).toContain('stays on record');
    const stranger = await addMember(await makeClub(), 'admin');
    expect((await refusal(cancelSit(stranger.scope, bare, TEST_NOW))).code).toBe('not_found');
    await cancelSit(admin.scope, { sitId: sit.id, reason: 'storm damage' }, TEST_NOW);
    const { mail } = await rows();
    expect(mail.at(-1)?.toEmail).toBe(ann.email);
    expect(mail.at(-1)?.message?.text).toContain(
      'Cora Pike cancelled your sit at Oak Ladder. The reason given: storm damage',
    );
  });
});
