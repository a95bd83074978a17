import { describe, expect, it } from 'vitest';
import { readGateSheet } from '@/features/board/gate-sheet/read-gate-sheet';
import { closeDays } from '@/features/bookings/close-days';
import { listApproachesOf } from '@/features/ground/approaches-data';
import { refreshAllForecasts } from '@/features/weather/refresh-all';
import { book, SATURDAY } from '../helpers/book';
import { addMember, TEST_NOW } from '../helpers/make-club';
import { goIn, windowAt } from '../helpers/outings';
import { eachSitsClub } from '../helpers/sits-club';

const made = eachSitsClub();

describe('the gate sheet', () => {
  it('says who sits where, by which way and back by when, and marks the stand on the sketch', async () => {
    const { ann, west } = made;
    const [way] = await listApproachesOf(ann.scope, west);
    await book(ann, west, { approachId: way?.id ?? null });
    const sheet = await readGateSheet(ann.scope, SATURDAY, TEST_NOW);
    expect(sheet.sits).toMatchObject([
      { standName: 'West Oak', who: 'Ann Roe', windowText: 'morning', wayIn: 'Creek way', parking: 'Creek way lot' },
    ]);
    expect(sheet.sits[0]?.backBy).toMatch(/^11:\d\d AM$/);
    const marks = sheet.ground?.stands.map(({ number, name, state }) => [number, name, state]);
    expect(marks).toEqual([
      [1, 'East Oak', 'free'],
      [2, 'West Oak', 'booked'],
    ]);
    expect(sheet.sits[0]?.standNumber).toBe(2);
    expect(sheet.ground?.sketch.stands).toHaveLength(2);
  });

  it('gives the time a person on the ground has said', async () => {
    const { ann, west } = made;
    const sit = await book(ann, west);
    await goIn(ann, sit.id, windowAt(ann).startAt, { backBy: '13:45' });
    const sheet = await readGateSheet(ann.scope, SATURDAY, windowAt(ann).startAt + 60_000);
    expect(sheet.sits[0]?.backBy).toBe('1:45 PM');
  });

  it('lists what is closed on that day and not what closes later', async () => {
    const { club, ann, west, east } = made;
    const steward = await addMember(club, 'steward');
    const closure = { toDay: null, reason: 'Strap chewed' };
    await closeDays(steward.scope, { ...closure, standId: west, fromDay: SATURDAY }, TEST_NOW);
    await closeDays(steward.scope, { ...closure, standId: east, fromDay: '2026-11-08' }, TEST_NOW);
    const sheet = await readGateSheet(ann.scope, SATURDAY, TEST_NOW);
    expect(sheet.closed).toEqual(['West Oak: Strap chewed (until opened again)']);
    expect(sheet.ground?.stands.map(({ state }) => state)).toEqual(['free', 'closed']);
  });

  it('shows no place to a guest or a landowner', async () => {
    const { club, ann } = made;
    const landowner = await addMember(club, 'landowner');
    const dates = { sponsorId: ann.id, guestFrom: '2026-11-01', guestTo: '2026-11-30' };
    const guest = await addMember(club, 'guest', dates);
    for (const who of [landowner, guest]) {
      const sheet = await readGateSheet(who.scope, SATURDAY, TEST_NOW);
      expect(sheet.ground).toBeNull();
      expect(JSON.stringify(sheet)).not.toMatch(/"(lat|lon)"/);
    }
  });

  it('has the sun, and the wind of each hour where a forecast reaches', async () => {
    const { ann } = made;
    await refreshAllForecasts(TEST_NOW);
    const sheet = await readGateSheet(ann.scope, SATURDAY, TEST_NOW);
    expect(sheet.sun).toMatch(/^Up 7:0\d AM, down 5:3\d PM\./);
    expect(sheet.winds.length).toBeGreaterThan(10);
    expect(sheet.winds[0]?.wind).toMatch(/mph|calm/);
    const far = await readGateSheet(ann.scope, '2027-03-01', TEST_NOW);
    expect([far.winds, far.forecastText]).toEqual([[], 'No forecast reaches this day.']);
  });
});
