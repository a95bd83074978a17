import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { WindowName } from '../condition-types';
import { addDays } from '../day-time';
import { checkBooking } from './check-booking';
import { bookingCheck, rulesWith } from './example-booking';
import { countGuestDays, guestDaysLeft } from './guest-days';

const hunt = (day: string, windows: WindowName[], guests = 1) => ({ sitId: `sit_${day}`, day, windows, guests });
/** Friday 6 November 2026, noon, to Sunday. */
const WEEKEND = [
  hunt('2026-11-06', ['evening']),
  hunt('2026-11-07', ['morning', 'evening']),
  hunt('2026-11-08', ['morning']),
];

describe('guest days', () => {
  it('are 2 from Friday noon to Sunday, and 3 of 5 are left', () => {
    // Posted club rule: 5 guest days a member a season, Friday noon to Sunday counts as two.
    expect(countGuestDays(WEEKEND)).toBe(2);
    expect(guestDaysLeft({ guestDaysPerSeason: 5 }, WEEKEND)).toBe(3);
    expect(guestDaysLeft({ guestDaysPerSeason: null }, WEEKEND)).toBeNull();
  });

  it('are 3 when the Friday begins in the morning, and 1 for an evening alone', () => {
    expect(countGuestDays([hunt('2026-11-06', ['morning']), ...WEEKEND])).toBe(3);
    expect(countGuestDays([hunt('2026-11-06', ['evening'])])).toBe(1);
    expect(countGuestDays([hunt('2026-11-06', ['morning'], 2)])).toBe(2);
    expect(countGuestDays([hunt('2026-11-06', ['morning'], 0)])).toBe(0);
  });

  it('never fall when a hunt is added', () => {
    const anyHunt = fc
      .record({
        n: fc.integer({ min: 0, max: 9 }),
        w: fc.constantFrom('m', 'e', 'me'),
        guests: fc.integer({ min: 0, max: 3 }),
      })
      .map(({ n, w, guests }) => {
        const windows: WindowName[] = w === 'm' ? ['morning'] : w === 'e' ? ['evening'] : ['morning', 'evening'];
        return hunt(addDays('2026-11-01', n), windows, guests);
      });
    fc.assert(
      fc.property(fc.array(anyHunt, { maxLength: 10 }), anyHunt, (hunts, one) => {
        expect(countGuestDays([...hunts, one])).toBeGreaterThanOrEqual(countGuestDays(hunts));
      }),
    );
  });

  it('run out, with the count in the refusal', () => {
    const used = [hunt('2026-10-03', ['morning']), hunt('2026-10-10', ['morning']), hunt('2026-10-17', ['morning'])];
    const guestHunts = [...used, hunt('2026-10-24', ['morning'])];
    expect(checkBooking(bookingCheck({ guests: 1, guestHunts }))).toEqual([]);
    const [gate] = checkBooking(
      bookingCheck({ guests: 1, guestHunts: [...guestHunts, hunt('2026-10-31', ['morning'])] }),
    );
    expect(gate).toMatchObject({ code: 'guest_days' });
    expect(gate?.text).toBe('Mae Tolliver has used 5 of 5 guest days this season; this needs 1 more.');
    expect(
      checkBooking(bookingCheck({ guests: 0, guestHunts: [...guestHunts, hunt('2026-10-31', ['morning'])] })),
    ).toEqual([]);
  });

  it('do not count the sit being changed', () => {
    const guestHunts = [1, 2, 3, 4, 5].map((n) => hunt(`2026-10-0${n}`, ['morning']));
    expect(checkBooking(bookingCheck({ guests: 1, guestHunts, exceptSitId: 'sit_2026-10-05' }))).toEqual([]);
  });

  it('keep to the most at once', () => {
    expect(checkBooking(bookingCheck({ guests: 2 })).map((g) => g.code)).toEqual(['guest_days']);
    expect(checkBooking(bookingCheck({ guests: 2, rules: rulesWith({ guestsAtOnce: 2 }) }))).toEqual([]);
    const [gate] = checkBooking(bookingCheck({ guests: 1, rules: rulesWith({ guestsAtOnce: 0 }) }));
    expect(gate?.text).toContain('no guests');
  });
});
