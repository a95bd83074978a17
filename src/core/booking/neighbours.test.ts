import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { pointAt } from '../geometry';
import { WEAPONS } from '../ground-types';
import { ydToM } from '../units';
import { checkBooking } from './check-booking';
import { bookingCheck, otherSit, rulesWith, STAND } from './example-booking';
import { clearApproaches } from './pass-through';
import { spacingBetweenM } from './rules';

const gatesAt = (yards: number, change: Parameters<typeof bookingCheck>[0] = {}) =>
  checkBooking(bookingCheck({ otherSits: [otherSit({ standAt: pointAt(STAND.at, 37, ydToM(yards)) })], ...change }));

describe('spacing', () => {
  it('refuses 299.9 yd and accepts 300.0 yd', () => {
    // 300 yd, the commonest posted rule, is 274.32 m exactly.
    const [gate] = gatesAt(299.9);
    expect(gate?.code).toBe('spacing');
    expect(gate?.text).toBe(
      'Creek Ladder is 299.9 yd from Ridge Box, where Odell Pruitt sits. The least distance between occupied stands is 300 yd.',
    );
    expect(gatesAt(300)).toEqual([]);
  });

  it.each([
    // 500 yd = 457.2 m; 1,000 ft = 304.8 m.
    [457.2, 500],
    [304.8, 1000 / 3],
  ])('of %d m is met at %d yd exactly', (metres, yards) => {
    const spacing = Object.fromEntries(WEAPONS.map((w) => [w, metres]));
    const rules = rulesWith({ spacingM: { ...rulesWith({}).spacingM, ...spacing } });
    expect(gatesAt(yards, { rules })).toEqual([]);
    expect(gatesAt(yards - 0.1, { rules }).map((g) => g.code)).toEqual(['spacing']);
  });

  it('takes the wider of two weapons, and the widest for one not said', () => {
    const rules = rulesWith({ spacingM: { bow: 100, crossbow: 120, muzzleloader: 200, shotgun: 300, rifle: 400 } });
    expect(spacingBetweenM(rules, 'bow', 'bow')).toBe(100);
    expect(spacingBetweenM(rules, 'bow', 'shotgun')).toBe(300);
    expect(spacingBetweenM(rules, 'bow', null)).toBe(400);
  });

  it('looks only at the same window of the same day', () => {
    const near = { standAt: { eastM: 50, northM: 0 } };
    const codes = (change: object) =>
      checkBooking(bookingCheck({ otherSits: [otherSit({ ...near, ...change })] })).map((g) => g.code);
    expect(codes({})).toEqual(['spacing']);
    expect(codes({ windows: ['evening'] })).toEqual([]);
    expect(codes({ day: '2026-11-11' })).toEqual([]);
  });

  it('is the same whichever way the ground is turned', () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 359 }), fc.integer({ min: 1, max: 600 }), (turn, yards) => {
        const turned = checkBooking(
          bookingCheck({ otherSits: [otherSit({ standAt: pointAt(STAND.at, turn, ydToM(yards)) })] }),
        );
        expect(turned.length).toBe(yards < 300 ? 1 : 0);
      }),
    );
  });
});

describe('walking through', () => {
  // Ridge Box lies 400 yd north of the Creek Ladder; one way in goes 60 yd past it, the other comes from the south.
  const ridge = otherSit({ standAt: { eastM: 0, northM: ydToM(400) } });
  const past = [{ eastM: ydToM(60), northM: ydToM(800) }, { eastM: ydToM(60), northM: ydToM(350) }, STAND.at];
  const south = [{ eastM: 0, northM: -500 }, STAND.at];

  it('within the distance of an occupied stand is refused when there is no other way', () => {
    const [gate] = checkBooking(bookingCheck({ stand: { ...STAND, approaches: [past] }, otherSits: [ridge] }));
    expect(gate?.code).toBe('pass_through');
    expect(gate?.text).toContain('within 100 yd of an occupied stand: Ridge Box (Odell Pruitt)');
  });

  it('is let through where one way is clear, no way is recorded, or nobody sits there', () => {
    const codes = (approaches: (typeof past)[], otherSits = [ridge]) =>
      checkBooking(bookingCheck({ stand: { ...STAND, approaches }, otherSits })).map((g) => g.code);
    expect(codes([past, south])).toEqual([]);
    expect(codes([])).toEqual([]);
    expect(codes([past], [])).toEqual([]);
    expect(codes([past], [{ ...ridge, windows: ['evening'] }])).toEqual([]);
  });

  it('says which ways are clear, at exactly the distance too', () => {
    expect(clearApproaches([past, south], [ridge.standAt], ydToM(100))).toEqual([false, true]);
    expect(clearApproaches([past], [ridge.standAt], ydToM(60))).toEqual([true]);
  });
});
