import { describe, expect, it } from 'vitest';
import { CALENDAR_PRIVACY } from '@/core/booking/rules';
import type { SitDetail } from '@/features/bookings/data';
import { entryFor } from './entry-for';
import { etagMatches } from './read-feed';

const SIT: SitDetail = {
  id: 'sit_1',
  clubId: 'clb_1',
  standId: 'std_1',
  memberId: 'mbr_dale',
  day: '2026-11-07',
  windows: 'all_day',
  startAt: 1,
  endAt: 2,
  weapon: 'bow',
  approachId: 'app_1',
  guests: [{ name: 'Gil Fern', memberId: null }],
  note: 'private words',
  status: 'booked',
  cancelReason: null,
  cancelledAt: null,
  requestKey: 'k',
  sequence: 0,
  bookedBy: 'mbr_dale',
  createdAt: 1,
  updatedAt: 1,
  standName: 'Oak Ladder',
  standLat: 34.11751,
  standLon: -84.00213,
  memberName: 'Dale Ruck',
  memberEmail: 'dale@example.test',
  memberUnits: null,
  approachName: 'Creek way',
  parkingName: 'North gate',
};

const shown = (memberId: string, privacy: (typeof CALENDAR_PRIVACY)[number], withPlace: boolean) =>
  JSON.stringify(entryFor(SIT, { name: 'Our Club' }, { memberId, privacy, withPlace }));

describe('what a calendar says of a sit', () => {
  it.each(CALENDAR_PRIVACY)('shows the reader their own in full under %s', (privacy) => {
    const text = shown('mbr_dale', privacy, true);
    for (const word of ['Oak Ladder', 'Creek way', 'Gil Fern', 'private words', '34.11751'])
      expect(text).toContain(word);
    expect(shown('mbr_dale', privacy, false)).not.toContain('34.11751');
  });

  it("shows of others what the club's rule lets be seen, never note, guests, way in or address", () => {
    const names = (privacy: (typeof CALENDAR_PRIVACY)[number]) => {
      const text = shown('mbr_other', privacy, true);
      for (const word of ['Creek way', 'Gil Fern', 'private words', 'dale@']) expect(text).not.toContain(word);
      return ['Dale Ruck', 'Oak Ladder', '34.11751'].map((word) => text.includes(word));
    };
    expect(names('names_and_stands')).toEqual([true, true, true]);
    expect(names('names_only')).toEqual([true, false, false]);
    expect(names('busy_only')).toEqual([false, false, false]);
    expect(shown('mbr_other', 'names_and_stands', false)).not.toContain('34.11751');
  });
});

it('compares entity tags as RFC 9110 13.1.2 says', () => {
  expect(etagMatches('"a", W/"b"', '"b"')).toBe(true);
  expect(etagMatches('*', '"b"')).toBe(true);
  expect(etagMatches('"a"', '"b"')).toBe(false);
  expect(etagMatches(null, '"b"')).toBe(false);
});
