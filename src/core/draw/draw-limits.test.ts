import { describe, expect, it } from 'vitest';
import { countGuestDays } from '../booking/guest-days';
import { drawLimits, smallestSets } from './draw-limits';

const none = { maxLiveClaims: null, claimAhead: { kind: 'days' as const, days: 14 }, mostSitsPerMemberSeason: null };
const weekend = [{ day: '2026-11-07' }, { day: '2026-11-07' }, { day: '2026-11-08' }];
const stand = { mostSitsSeason: null, seasonSits: [0, 0, 0] };
const member = { liveClaims: 0, seasonSits: [0, 0, 0], guestsOver: null };

describe('limits over the windows of a draw', () => {
  it('sets none where the club sets none', () => {
    expect(drawLimits({ rules: none, slots: weekend, stands: [stand, stand], members: [member] })).toEqual([]);
  });

  it('leaves a member what the claims he holds leave of the club’s most, and a stand what is left of its season', () => {
    const rules = { ...none, maxLiveClaims: 2, mostSitsPerMemberSeason: 5 };
    const held = { ...member, liveClaims: 1, seasonSits: [4, 4, 4] };
    const worn = { mostSitsSeason: 10, seasonSits: [9, 9, 9] };
    expect(drawLimits({ rules, slots: weekend, stands: [stand, worn], members: [held] })).toEqual([
      { member: 0, places: [0, 1, 2, 3, 4, 5], most: 1 },
      { member: 0, places: [0, 1, 2, 3, 4, 5], most: 1 },
      { member: null, places: [1, 3, 5], most: 1 },
    ]);
    const tooMany = drawLimits({ rules, slots: weekend, stands: [stand], members: [{ ...held, liveClaims: 3 }] });
    expect(tooMany[0]?.most).toBe(0);
  });

  it('counts each season for itself', () => {
    const rules = { ...none, mostSitsPerMemberSeason: 3 };
    const summer = [{ day: '2026-06-30' }, { day: '2026-07-01' }];
    const held = { ...member, seasonSits: [2, 0] };
    expect(drawLimits({ rules, slots: summer, stands: [{ ...stand, seasonSits: [0, 0] }], members: [held] })).toEqual([
      { member: 0, places: [0], most: 1 },
      { member: 0, places: [1], most: 3 },
    ]);
  });

  it('finds the smallest sets of windows that take too many guest days', () => {
    // Friday noon to Sunday counts as two days (club practice): Friday evening is free to those who stay.
    const windows = [
      { day: '2026-11-06', windows: ['evening' as const], guests: 1 },
      { day: '2026-11-07', windows: ['morning' as const], guests: 1 },
      { day: '2026-11-08', windows: ['morning' as const], guests: 1 },
    ];
    const over = (most: number) => (slots: readonly number[]) =>
      countGuestDays(windows.filter((_, at) => slots.includes(at))) > most;
    expect(smallestSets([0, 1, 2], over(2))).toEqual([]);
    expect(smallestSets([0, 1, 2], over(1))).toEqual([
      [0, 2],
      [1, 2],
    ]);
    const slots = windows.map(({ day }) => ({ day }));
    const limits = drawLimits({ rules: none, slots, stands: [stand], members: [{ ...member, guestsOver: over(1) }] });
    expect(limits).toEqual([
      { member: 0, places: [0, 2], most: 1 },
      { member: 0, places: [1, 2], most: 1 },
    ]);
  });
});
