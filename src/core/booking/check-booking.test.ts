import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { WindowName } from '../condition-types';
import { addDays, localToUtc } from '../day-time';
import { checkBooking } from './check-booking';
import { bookingCheck, otherSit, PLACE, rulesWith, STAND } from './example-booking';

const windowsGen = fc.constantFrom<WindowName[]>(['morning'], ['evening'], ['morning', 'evening']);
const sitGen = fc
  .record({
    id: fc.integer({ min: 0, max: 1e9 }),
    stand: fc.integer({ min: 0, max: 3 }),
    member: fc.integer({ min: 0, max: 2 }),
    days: fc.integer({ min: -6, max: 6 }),
    windows: windowsGen,
  })
  .map(({ id, stand, member, days, windows }) =>
    otherSit({
      sitId: `sit_${id}`,
      standId: stand === 0 ? STAND.id : `std_${stand}`,
      standAt: { eastM: stand * 150, northM: 0 },
      memberId: member === 0 ? 'mem_mae' : `mem_${member}`,
      day: addDays('2026-11-10', days),
      windows,
    }),
  );

const rules = rulesWith({ maxLiveClaims: 2, passThroughM: 120 });
const stand = {
  ...STAND,
  approaches: [
    [{ eastM: 600, northM: 20 }, STAND.at],
    [{ eastM: -600, northM: 0 }, STAND.at],
  ],
};
const askGen = fc.record({ windows: windowsGen, hour: fc.integer({ min: 0, max: 200 }) });
const check = (ask: { windows: WindowName[]; hour: number }, otherSits: ReturnType<typeof otherSit>[]) =>
  checkBooking(
    bookingCheck({
      rules,
      stand,
      windows: ask.windows,
      now: localToUtc('2026-11-03', '06:00', PLACE.zone) + ask.hour * 3_600_000,
      otherSits,
    }),
  );

describe('checkBooking', () => {
  it('never drops a rule when a sit is added', () => {
    fc.assert(
      fc.property(askGen, fc.array(sitGen, { maxLength: 6 }), sitGen, (ask, sits, one) => {
        const before = new Set(check(ask, sits).map((g) => g.code));
        const after = new Set(check(ask, [...sits, one]).map((g) => g.code));
        for (const code of before) expect(after).toContain(code);
      }),
    );
  });

  it('does not depend on the order of the sits, and gives the same answer twice', () => {
    fc.assert(
      fc.property(askGen, fc.array(sitGen, { maxLength: 6 }), (ask, sits) => {
        const codes = check(ask, sits).map((g) => g.code);
        expect(check(ask, sits).map((g) => g.code)).toEqual(codes);
        expect(check(ask, [...sits].reverse()).map((g) => g.code)).toEqual(codes);
      }),
    );
  });

  it('asking for more windows never makes it easier', () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 200 }), fc.array(sitGen, { maxLength: 6 }), (hour, sits) => {
        const all = new Set(check({ windows: ['morning', 'evening'], hour }, sits).map((g) => g.code));
        for (const window of ['morning', 'evening'] as const) {
          for (const gate of check({ windows: [window], hour }, sits)) expect(all).toContain(gate.code);
        }
      }),
    );
  });

  it('writes whole sentences', () => {
    fc.assert(
      fc.property(askGen, fc.array(sitGen, { maxLength: 6 }), (ask, sits) => {
        for (const gate of check(ask, sits)) {
          expect(gate.text).toMatch(/^[A-Z].*\.$/);
          expect(gate.text).not.toMatch(/undefined|NaN|null/);
        }
      }),
    );
  });

  it('keeps one order: ground, season, person, claim, rest, neighbours, limits', () => {
    const gates = checkBooking(
      bookingCheck({
        stand: { ...STAND, closures: [{ fromDay: '2026-11-01', toDay: null, reason: 'tree down' }], mostSitsSeason: 1 },
        weapon: 'shotgun',
        guests: 3,
        rules: rulesWith({ claimAhead: { kind: 'days', days: 1 }, maxLiveClaims: 1 }),
        otherSits: [
          otherSit({ standId: STAND.id, standName: STAND.name, standAt: STAND.at }),
          otherSit({ standId: STAND.id, standName: STAND.name, standAt: STAND.at, day: '2026-11-09' }),
          otherSit({ memberId: 'mem_mae', standAt: { eastM: 80, northM: 0 } }),
        ],
        seasonCounts: { stand: 2, member: 0 },
      }),
    );
    expect(gates.map((g) => g.code)).toEqual([
      'closed',
      'weapon',
      'taken',
      'member_busy',
      'resting',
      'spacing',
      'too_far_ahead',
      'claim_limit',
      'season_limit',
      'guest_days',
    ]);
  });
});
