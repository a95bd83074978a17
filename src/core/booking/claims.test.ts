import { describe, expect, it } from 'vitest';
import { localToUtc } from '../day-time';
import { checkBooking } from './check-booking';
import { bookingCheck, otherSit, PLACE, rulesWith, STAND } from './example-booking';

const codes = (change: Parameters<typeof bookingCheck>[0]) => checkBooking(bookingCheck(change)).map((g) => g.code);
const atCreek = { standId: STAND.id, standName: STAND.name, standAt: STAND.at };

describe('a claim', () => {
  it('is free when nothing holds it', () => {
    expect(checkBooking(bookingCheck())).toEqual([]);
  });

  it('is refused where another has the stand in the same window, by name', () => {
    const [gate] = checkBooking(bookingCheck({ otherSits: [otherSit(atCreek)] }));
    expect(gate).toMatchObject({ code: 'taken' });
    expect(gate?.text).toBe('Creek Ladder is taken on Tue 10 Nov, morning: Odell Pruitt has it.');
    expect(codes({ otherSits: [otherSit({ ...atCreek, windows: ['evening'] })] })).toEqual([]);
    expect(
      codes({ windows: ['morning', 'evening'], otherSits: [otherSit({ ...atCreek, windows: ['evening'] })] }),
    ).toEqual(['taken']);
  });

  it('is one stand a member in each window', () => {
    const mine = otherSit({ memberId: 'mem_mae', memberName: 'Mae Tolliver' });
    expect(codes({ otherSits: [mine] })).toEqual(['member_busy']);
    expect(codes({ otherSits: [{ ...mine, windows: ['evening'] }] })).toEqual([]);
  });

  it('never stands in its own way when it is changed', () => {
    const own = otherSit({ ...atCreek, memberId: 'mem_mae', memberName: 'Mae Tolliver', day: '2026-11-09' });
    expect(codes({ otherSits: [own] })).toEqual(['resting']);
    expect(codes({ otherSits: [own], exceptSitId: own.sitId })).toEqual([]);
  });
});

describe('how far ahead', () => {
  it('counts days by the club day', () => {
    const rules = rulesWith({ claimAhead: { kind: 'days', days: 7 } });
    expect(codes({ rules, now: localToUtc('2026-11-03', '00:00', PLACE.zone) })).toEqual([]);
    const [gate] = checkBooking(bookingCheck({ rules, now: localToUtc('2026-11-02', '23:59', PLACE.zone) }));
    expect(gate).toMatchObject({ code: 'too_far_ahead', endsOn: '2026-11-03' });
  });

  // Posted club rule: only at the time of the hunt, not the night before, not in the morning for the evening, one at a time.
  const huntTime = rulesWith({ claimAhead: { kind: 'hunt_time', hours: 2 } });
  const at = (day: string, clock: string) => localToUtc(day, clock, PLACE.zone);

  it('at hunt time refuses 20:00 for the next dawn and 05:00 for the afternoon', () => {
    expect(codes({ rules: huntTime, now: at('2026-11-09', '20:00') })).toEqual(['too_far_ahead']);
    expect(codes({ rules: huntTime, windows: ['evening'], now: at('2026-11-10', '05:00') })).toEqual(['too_far_ahead']);
    expect(codes({ rules: huntTime, now: at('2026-11-10', '05:30') })).toEqual([]);
    expect(codes({ rules: huntTime, windows: ['evening'], now: at('2026-11-10', '12:30') })).toEqual([]);
  });

  it('at hunt time refuses a second stand while one is held', () => {
    const held = otherSit({ memberId: 'mem_mae', memberName: 'Mae Tolliver' });
    const [gate] = checkBooking(
      bookingCheck({ rules: huntTime, windows: ['evening'], now: at('2026-11-10', '10:30'), otherSits: [held] }),
    ).filter((g) => g.code === 'claim_limit');
    expect(gate?.text).toContain('Mae Tolliver holds Ridge Box (Tue 10 Nov)');
    expect(codes({ rules: huntTime, windows: ['evening'], now: at('2026-11-10', '12:30'), otherSits: [held] })).toEqual(
      [],
    );
  });

  it('refuses a window that is over, and one begun where there are no walk-up sits', () => {
    expect(codes({ now: at('2026-11-10', '11:00') })).toEqual(['window_over']);
    expect(codes({ now: at('2026-11-10', '08:00') })).toEqual([]);
    expect(codes({ now: at('2026-11-10', '08:00'), rules: rulesWith({ walkUpSits: false }) })).toEqual(['window_over']);
  });
});

describe('limits', () => {
  const mine = (day: string) => otherSit({ sitId: `sit_${day}`, memberId: 'mem_mae', memberName: 'Mae Tolliver', day });

  it('count live claims only, and say when the next is free', () => {
    const rules = rulesWith({ maxLiveClaims: 2 });
    const past = mine('2026-11-01');
    expect(codes({ rules, otherSits: [past, mine('2026-11-12')] })).toEqual([]);
    const [gate] = checkBooking(bookingCheck({ rules, otherSits: [past, mine('2026-11-14'), mine('2026-11-12')] }));
    expect(gate).toMatchObject({ code: 'claim_limit', endsOn: new Date(mine('2026-11-12').endAt).toISOString() });
  });

  it('hold for the stand and for the member over the season', () => {
    const rules = rulesWith({ mostSitsPerMemberSeason: 10 });
    const stand = { ...STAND, mostSitsSeason: 4 };
    expect(codes({ rules, stand, seasonCounts: { stand: 3, member: 9 } })).toEqual([]);
    const gates = checkBooking(bookingCheck({ rules, stand, seasonCounts: { stand: 4, member: 10 } }));
    expect(gates.map((g) => [g.code, g.endsOn])).toEqual([
      ['season_limit', '2027-07-01'],
      ['season_limit', '2027-07-01'],
    ]);
    expect(gates[0]?.text).toContain('Creek Ladder');
    expect(gates[1]?.text).toContain('Mae Tolliver');
  });
});
