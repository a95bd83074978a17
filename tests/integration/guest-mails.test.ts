import { eq } from 'drizzle-orm';
import { beforeEach, describe, expect, it } from 'vitest';
import { changeUnitsAction } from '@/app/(account)/account/actions';
import { reader, write } from '@/db/client';
import { memberships, outbox } from '@/db/schema';
import { cancelSit } from '@/features/bookings/cancel-sit';
import { changeSit } from '@/features/bookings/change-sit';
import type { SitDetail } from '@/features/bookings/data';
import { lapseUnsigned } from '@/features/outings/lapse-unsigned';
import { setClock } from '@/server/clock';
import { book, SATURDAY } from '../helpers/book';
import { addMember, addStand, makeClub, TEST_NOW, type TestClub, type TestMember } from '../helpers/make-club';
import { inRequest } from '../helpers/request';

let club: TestClub;
let ann: TestMember;
let admin: TestMember;
let gil: TestMember;
let oak: string;
let ash: string;

beforeEach(async () => {
  setClock(() => TEST_NOW);
  const rules = { guestsAtOnce: 3, guestDaysPerSeason: null, restDaysDefault: 0, holdMinutes: 60 };
  club = await makeClub({ ...rules, spacingM: { bow: 0, crossbow: 0, muzzleloader: 0, shotgun: 0, rifle: 0 } });
  ann = await addMember(club, 'member', { name: 'Ann Roe' });
  admin = await addMember(club, 'admin', { name: 'Ida Kern' });
  const days = { sponsorId: ann.id, guestFrom: '2026-11-01', guestTo: '2026-11-30' };
  gil = await addMember(club, 'guest', { name: 'Gil Pace', ...days });
  oak = await addStand(club, { name: 'Oak Box', seats: 4 });
  ash = await addStand(club, { name: 'Ash Box', seats: 4 });
});

const asGuest = (who: TestMember) => ({ name: who.name, memberId: who.id });
const stranger = { name: 'Sol Gray', memberId: null };

const mailTo = async (who: TestMember) => {
  const rows = await reader().select().from(outbox).where(eq(outbox.clubId, club.id));
  return rows.filter(({ toEmail }) => toEmail === who.email);
};
const last = async (who: TestMember) => (await mailTo(who)).at(-1);
const kinds = async (who: TestMember) => (await mailTo(who)).map(({ kind }) => kind);

const changed = (sit: SitDetail, more: Partial<Parameters<typeof changeSit>[1]>) => {
  const { standId, day, windows, weapon, approachId, guests, note } = sit;
  return { sitId: sit.id, sequence: sit.sequence, standId, day, windows, weapon, approachId, guests, note, ...more };
};

describe('a guest with an account', () => {
  it('is told of a sit they come along on, in their own units and with an entry for the calendar', async () => {
    await inRequest(gil.browser, () => changeUnitsAction({ units: 'metric' }));
    await book(ann, oak, { guests: [asGuest(gil), stranger], note: 'Bring the blue rope' });
    expect(await kinds(gil)).toEqual(['sit.guest_booked']);
    const mail = await last(gil);
    expect(mail?.subject).toBe('You come along: Oak Box, Sat 7 Nov, morning');
    expect(mail?.message?.text).toContain('Ann Roe takes you along to Oak Box as a guest.');
    expect(mail?.message?.text).toMatch(/^Club time: \d\d:\d\d to \d\d:\d\d \(America\/New York\)$/m);
    expect(mail?.message?.text).not.toContain('blue rope');
    expect(mail?.message?.calendar?.method).toBe('REQUEST');
    expect(mail?.message?.calendar?.content).toContain(gil.email);
    expect(mail?.message?.calendar?.content).not.toContain('blue rope');
  });

  it('is told who acted where that was not the host', async () => {
    const sit = await book(admin, oak, { memberId: ann.id, guests: [asGuest(gil)] });
    expect((await last(gil))?.message?.text).toContain('Ida Kern booked Oak Box for Ann Roe, with you as a guest.');
    await cancelSit(admin.scope, { sitId: sit.id, reason: 'The road is washed out' }, TEST_NOW);
    const mail = await last(gil);
    expect(mail?.message?.text).toContain('Ida Kern cancelled the sit of Ann Roe at Oak Box');
    expect(mail?.message?.text).toContain('The road is washed out');
    expect(mail?.message?.calendar?.method).toBe('CANCEL');
  });

  it('is told of a change that moves the sit, and of none that leaves it where it was', async () => {
    const first = await book(ann, oak, { guests: [asGuest(gil)] });
    const noted = await changeSit(ann.scope, changed(first, { note: 'Quiet boots' }), TEST_NOW);
    expect(await kinds(gil)).toEqual(['sit.guest_booked']);
    await changeSit(ann.scope, changed(noted, { standId: ash }), TEST_NOW);
    expect(await kinds(gil)).toEqual(['sit.guest_booked', 'sit.guest_changed']);
    expect((await last(gil))?.message?.text).toContain('Stand: Ash Box');
  });

  it('is told when they are named later on, and when they are left out', async () => {
    const alone = await book(ann, oak);
    const along = await changeSit(ann.scope, changed(alone, { guests: [asGuest(gil)] }), TEST_NOW);
    expect(await kinds(gil)).toEqual(['sit.guest_booked']);
    await changeSit(ann.scope, changed(along, { guests: [] }), TEST_NOW);
    expect(await kinds(gil)).toEqual(['sit.guest_booked', 'sit.guest_left_out']);
    const mail = await last(gil);
    expect(mail?.message?.text).toContain('Ann Roe goes to Oak Box without you');
    expect(mail?.message?.calendar).toMatchObject({ method: 'CANCEL' });
  });

  it('is told when the sit lapses', async () => {
    const sit = await book(ann, oak, { guests: [asGuest(gil)] });
    await lapseUnsigned(sit.startAt + 61 * 60_000);
    expect(await kinds(gil)).toEqual(['sit.guest_booked', 'sit.guest_lapsed']);
  });

  it('gets one mail of a sit of their own, as any member', async () => {
    await book(gil, oak);
    expect(await kinds(gil)).toEqual(['sit.booked']);
  });

  it('is told nothing once they have left the club', async () => {
    const sit = await book(ann, oak, { guests: [asGuest(gil)] });
    await write((tx) => tx.update(memberships).set({ removedAt: TEST_NOW }).where(eq(memberships.id, gil.id)));
    await cancelSit(ann.scope, { sitId: sit.id, reason: '' }, TEST_NOW);
    expect(await kinds(gil)).toEqual(['sit.guest_booked']);
    expect(sit.day).toBe(SATURDAY);
  });
});
