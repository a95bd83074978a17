import { describe, expect, it } from 'vitest';
import type { HarvestQuota } from './harvest-types';
import { type CountedDeer, metText, quotaStates, quotaText } from './quotas';

const ONE_BUCK: HarvestQuota = { deer: 'antlered', per: 'member', most: 1 };
const GUEST_DOE: HarvestQuota = { deer: 'antlerless', per: 'member_guests', most: 1 };
const CLUB_FOUR: HarvestQuota = { deer: 'any', per: 'club', most: 4 };
const ALL = [ONE_BUCK, GUEST_DOE, CLUB_FOUR];

const deer = (memberId: string, more: Partial<CountedDeer> = {}): CountedDeer => ({
  memberId,
  byGuest: false,
  antlered: false,
  ...more,
});

describe('quotaStates', () => {
  it('counts a guest on the sponsor, and on nobody else', () => {
    const taken = [deer('ann', { byGuest: true, antlered: true }), deer('bert')];
    const [buck, guests, club] = quotaStates(ALL, taken, 'ann');
    expect(buck).toMatchObject({ taken: 1, left: 0, met: true });
    expect(guests).toMatchObject({ taken: 0, met: false });
    expect(club).toMatchObject({ taken: 2, left: 2, met: false });
    expect(quotaStates(ALL, taken, 'bert')[0]).toMatchObject({ taken: 0, met: false });
  });

  it('keeps antlered and antlerless apart, and "any" takes both', () => {
    const taken = [deer('ann', { antlered: true }), deer('ann'), deer('ann')];
    expect(quotaStates([ONE_BUCK], taken, 'ann')[0]?.taken).toBe(1);
    expect(quotaStates([{ deer: 'antlerless', per: 'member', most: 3 }], taken, 'ann')[0]).toMatchObject({
      taken: 2,
      left: 1,
    });
    expect(quotaStates([{ deer: 'any', per: 'member', most: 3 }], taken, 'ann')[0]?.met).toBe(true);
  });

  it('counts only guests where the quota is for guests', () => {
    const taken = [deer('ann'), deer('ann', { byGuest: true })];
    expect(quotaStates([GUEST_DOE], taken, 'ann')[0]).toMatchObject({ taken: 1, met: true });
  });

  it('shows the club alone when there is no member, never below none left', () => {
    const taken = Array.from({ length: 6 }, () => deer('ann'));
    expect(quotaStates(ALL, taken, null)).toEqual([{ quota: CLUB_FOUR, taken: 6, left: 0, met: true }]);
    expect(quotaStates([{ ...CLUB_FOUR, most: 0 }], [], null)[0]?.met).toBe(true);
  });
});

it('says a quota, and that it is met, in words', () => {
  expect(quotaText(ONE_BUCK)).toBe('At most 1 antlered deer a member, guests counted on their sponsor');
  const [state] = quotaStates([ONE_BUCK], [deer('ann', { antlered: true })], 'ann');
  if (!state) throw new Error('no state');
  expect(metText(state, 'own')).toBe('Your limit of 1 antlered deer this season is met (1 taken).');
  expect(metText(state, { name: 'Ann Roe', guest: false })).toBe(
    "Ann Roe's limit of 1 antlered deer this season is met (1 taken).",
  );
  expect(metText(state, { name: 'Gil', guest: true })).toContain('The deer of Gil count on their sponsor, whose limit');
  expect(metText(state, 'sponsor')).toContain('Your deer count on your sponsor, whose limit of 1 antlered deer');
});
