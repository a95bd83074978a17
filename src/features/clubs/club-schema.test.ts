import { describe, expect, it } from 'vitest';
import { createClubSchema } from './club-schema';
import { changeMemberSchema, inviteSchema } from './member-schema';

const CLUB = {
  name: 'Spring Hollow',
  slug: 'spring-hollow',
  lat: '34.117',
  lon: '−84',
  zone: 'America/New_York',
  units: 'us' as const,
};
const problems = (parsed: { success: boolean; error?: { issues: { path: PropertyKey[] }[] } }) =>
  parsed.error?.issues.map((issue) => issue.path.join('.')) ?? [];

describe('createClubSchema', () => {
  it('reads the place as numbers, with any minus sign', () => {
    expect(createClubSchema.parse(CLUB)).toEqual({ ...CLUB, lat: 34.117, lon: -84 });
  });

  it.each([
    [{ name: ' ' }, 'name'],
    [{ slug: 'new' }, 'slug'],
    [{ slug: 'Spring Hollow' }, 'slug'],
    [{ slug: 'a' }, 'slug'],
    [{ lat: '-84', lon: '34.117' }, 'lat'],
    [{ lon: '' }, 'lon'],
    [{ zone: 'Eastern' }, 'zone'],
  ])('refuses %j beside its field', (change, path) => {
    expect(problems(createClubSchema.safeParse({ ...CLUB, ...change }))).toEqual([path]);
  });
});

describe('inviteSchema', () => {
  const guest = {
    name: 'Ida Cole',
    email: ' Ida@Example.test ',
    role: 'guest' as const,
    sponsorId: 'mbr_1',
    guestFrom: '2026-11-07',
    guestTo: '2026-11-08',
  };

  it('keeps a guest whole, and nothing of a guest for other roles', () => {
    expect(inviteSchema.parse(guest)).toEqual({ ...guest, email: 'ida@example.test' });
    expect(inviteSchema.parse({ ...guest, role: 'member' })).toMatchObject({
      role: 'member',
      sponsorId: null,
      guestFrom: null,
      guestTo: null,
    });
  });

  it.each([
    [{ sponsorId: '' }, 'sponsorId'],
    [{ guestFrom: '' }, 'guestFrom'],
    [{ guestTo: '2026-11-06' }, 'guestTo'],
    [{ guestTo: '2026-02-30' }, 'guestTo'],
  ])('asks a guest for %j', (change, path) => {
    expect(problems(inviteSchema.safeParse({ ...guest, ...change }))).toEqual([path]);
    expect(problems(changeMemberSchema.safeParse({ memberId: 'mbr_2', ...guest, ...change }))).toEqual([path]);
  });
});
