import { expect, it } from 'vitest';
import { seasonYear, seasonYears } from './season-years';

it('runs a season from July to June', () => {
  expect(seasonYear(2026)).toEqual({ year: 2026, label: '2026-27', fromDay: '2026-07-01', toDay: '2027-06-30' });
  expect(seasonYear(1999).label).toBe('1999-00');
});

it('lists the seasons back to the first record', () => {
  expect(seasonYears('2027-01-09', '2025-09-20').map((season) => season.year)).toEqual([2026, 2025]);
  expect(seasonYears('2026-06-30', null).map((season) => season.year)).toEqual([2025]);
  expect(seasonYears('2026-11-07', '2027-11-07').map((season) => season.year)).toEqual([2026]);
});
