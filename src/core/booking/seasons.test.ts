import { describe, expect, it } from 'vitest';
import { checkBooking } from './check-booking';
import { bookingCheck, rulesWith, STAND } from './example-booking';
import { huntingYear } from './hunting-year';
import type { LegalLightRule, Season } from './rules';
import { legalLightRuleOf } from './seasons';

const SEASONS: Season[] = [
  {
    id: 'a',
    name: 'Archery',
    weapons: ['bow'],
    fromDay: '2026-09-12',
    toDay: '2026-11-13',
    legalLightName: 'Half hour',
  },
  { id: 'g', name: 'Gun', weapons: ['rifle', 'bow'], fromDay: '2026-11-14', toDay: '2026-11-29', legalLightName: null },
];
const rules = rulesWith({ seasons: SEASONS });
const gates = (day: string, weapon: 'bow' | 'rifle' | null) =>
  checkBooking(bookingCheck({ rules: { ...rules, claimAhead: { kind: 'days', days: 365 } }, day, weapon }));

describe('seasons', () => {
  it('are open every day when none is set', () => {
    expect(checkBooking(bookingCheck({ rules: rulesWith({ seasons: [] }) }))).toEqual([]);
  });

  it('hold on their first and last day, by weapon', () => {
    expect(gates('2026-11-13', 'bow')).toEqual([]);
    expect(gates('2026-11-14', 'rifle')).toEqual([]);
    expect(gates('2026-11-29', null)).toEqual([]);
    const [gate] = gates('2026-11-13', 'rifle');
    expect(gate).toMatchObject({ code: 'out_of_season', endsOn: '2026-11-14' });
    expect(gate?.text).toBe(
      'Fri 13 Nov is in Archery, which does not take the rifle. The next opens on Sat 14 Nov 2026.',
    );
  });

  it('say when none is left', () => {
    const [gate] = gates('2026-11-30', 'rifle');
    expect(gate).toMatchObject({ code: 'out_of_season', endsOn: null });
    expect(gate?.text).toContain('No later season is set');
  });

  it('give the legal-light rule of the day', () => {
    const half: LegalLightRule = {
      name: 'Half hour',
      minutesBeforeSunrise: 30,
      minutesAfterSunset: 30,
      source: 'Digest p. 12',
      statedOn: '2026-08-01',
    };
    const sunset = { ...half, name: 'To sunset', minutesAfterSunset: 0 };
    expect(legalLightRuleOf({ seasons: SEASONS, legalLight: [sunset, half] }, '2026-10-01', 'bow')).toBe(half);
    expect(legalLightRuleOf({ seasons: SEASONS, legalLight: [sunset, half] }, '2026-11-20', 'rifle')).toBeNull();
    expect(legalLightRuleOf({ seasons: SEASONS, legalLight: [sunset] }, '2026-11-20', 'rifle')).toBe(sunset);
    expect(legalLightRuleOf({ seasons: [], legalLight: [] }, '2026-11-20', null)).toBeNull();
  });

  it('are counted from July to June', () => {
    expect(huntingYear('2026-11-07')).toEqual({ fromDay: '2026-07-01', toDay: '2027-06-30' });
    expect(huntingYear('2027-01-07')).toEqual({ fromDay: '2026-07-01', toDay: '2027-06-30' });
    expect(huntingYear('2027-06-30').toDay).toBe('2027-06-30');
    expect(huntingYear('2027-07-01').fromDay).toBe('2027-07-01');
  });
});

describe('the stand', () => {
  const codes = (change: Parameters<typeof bookingCheck>[0]) => checkBooking(bookingCheck(change)).map((g) => g.code);

  it('takes only its weapons', () => {
    expect(codes({ weapon: 'shotgun' })).toEqual(['weapon']);
    expect(codes({ weapon: 'shotgun', stand: { ...STAND, weapons: [] } })).toEqual(['weapon']);
    expect(codes({ weapon: null })).toEqual([]);
  });

  it('is closed on both ends of a closure, until the first open day', () => {
    const closures = [
      { fromDay: '2026-11-08', toDay: '2026-11-10', reason: 'strap to be replaced' },
      { fromDay: '2026-11-11', toDay: '2026-11-12', reason: 'logging' },
    ];
    const [gate] = checkBooking(bookingCheck({ stand: { ...STAND, closures } }));
    expect(gate).toEqual({
      code: 'closed',
      text: 'Creek Ladder is closed until Thu 12 Nov: strap to be replaced.',
      endsOn: '2026-11-13',
    });
    expect(codes({ stand: { ...STAND, closures }, day: '2026-11-13' })).toEqual([]);
    const forGood = [{ fromDay: '2026-11-08', toDay: null, reason: '' }];
    expect(checkBooking(bookingCheck({ stand: { ...STAND, closures: forGood } }))[0]).toMatchObject({ endsOn: null });
  });

  it('cannot be had on a closed day of the ground', () => {
    const closedDays = [{ fromDay: '2026-11-10', toDay: '2026-11-10', reason: 'landowner drives cattle' }];
    expect(checkBooking(bookingCheck({ closedDays }))[0]).toMatchObject({
      code: 'closed_day',
      endsOn: '2026-11-11',
    });
  });

  it('may be kept for named members, and is for nobody who does not hunt', () => {
    expect(codes({ stand: { ...STAND, allowedMemberIds: ['mem_odell'] } })).toEqual(['not_permitted']);
    expect(codes({ stand: { ...STAND, allowedMemberIds: ['mem_mae'] } })).toEqual([]);
    expect(codes({ member: { id: 'mem_lo', name: 'Wes Arnett', role: 'landowner' } })).toEqual(['not_permitted']);
  });
});
