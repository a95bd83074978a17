import { describe, expect, it } from 'vitest';
import { countGuestDays } from '@/core/booking/guest-days';
import { guestMemberGates } from './guest-member-gates';
import { type GuestParty, guestHunts, guestKey, guestsTogether } from './guest-parties';

const party = (day: string, windows: GuestParty['windows'], ...people: string[]): GuestParty => ({
  day,
  windows,
  people,
});

describe('guests of one host', () => {
  it('adds guests at two stands in one window and counts one guest in both windows once', () => {
    const hunts = guestHunts([
      party('2026-11-07', ['morning'], 'a'),
      party('2026-11-07', ['morning', 'evening'], 'b'),
      party('2026-11-08', ['morning'], 'a'),
    ]);
    expect(countGuestDays(hunts)).toBe(3);
    expect(
      countGuestDays(guestHunts([party('2026-11-07', ['morning'], 'a'), party('2026-11-07', ['evening'], 'a')])),
    ).toBe(1);
  });

  it('knows the same guest by account or by name', () => {
    expect(guestKey({ name: ' Ann ', memberId: null })).toBe(guestKey({ name: 'ann', memberId: null }));
    expect(guestKey({ name: 'Ann', memberId: 'mbr_1' })).toBe('mbr_1');
  });

  it('counts who is there together, without anyone twice', () => {
    const others = [party('2026-11-07', ['morning'], 'a'), party('2026-11-07', ['evening'], 'c')];
    expect(guestsTogether(others, party('2026-11-07', ['morning'], 'a'))).toBe(1);
    expect(guestsTogether(others, party('2026-11-07', ['morning'], 'b'))).toBe(2);
    expect(guestsTogether(others, party('2026-11-08', ['morning'], 'b'))).toBe(1);
    expect(guestsTogether(others, party('2026-11-07', ['morning']))).toBe(0);
  });
});

describe('a guest with an account', () => {
  const guest = {
    name: 'Gil',
    role: 'guest' as const,
    guestFrom: '2026-11-06',
    guestTo: '2026-11-08',
    sponsorId: 'mbr_1',
  };

  it('sits on the first and last day of the invitation and not beside them', () => {
    expect(guestMemberGates(guest, '2026-11-06')).toEqual([]);
    expect(guestMemberGates(guest, '2026-11-08')).toEqual([]);
    expect(guestMemberGates(guest, '2026-11-05')[0]).toMatchObject({ code: 'not_permitted', endsOn: '2026-11-06' });
    expect(guestMemberGates(guest, '2026-11-09')[0]).toMatchObject({ code: 'not_permitted', endsOn: null });
  });

  it('needs a member who answers for them; a member needs none', () => {
    expect(guestMemberGates({ ...guest, sponsorId: null }, '2026-11-07')[0]?.text).toContain('answers for them');
    expect(guestMemberGates({ ...guest, role: 'member', sponsorId: null, guestFrom: null }, '2027-01-01')).toEqual([]);
  });
});
