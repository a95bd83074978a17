import { Body, Observer, SearchRiseSet } from 'astronomy-engine';
import { expect, it } from 'vitest';
import { lightBySun } from './sun-light';

const BUFORD = { lat: 34.12, lon: -84, zone: 'America/New_York' };
const HOUR = 3_600_000;
const astronomy = (direction: 1 | -1) =>
  SearchRiseSet(Body.Sun, new Observer(BUFORD.lat, BUFORD.lon, 0), direction, new Date(noon), 1)?.date.getTime() ?? 0;
const noon = Date.UTC(2026, 10, 7, 17);

it('is day at noon, dark at midnight, and turns at sunrise and sunset as astronomy-engine finds them', () => {
  const [first, set, rise, ...later] = lightBySun(noon, BUFORD);
  expect(first).toEqual({ at: noon, light: 'day' });
  expect(set?.light).toBe('dark');
  expect(Math.abs((set?.at ?? 0) - astronomy(-1))).toBeLessThanOrEqual(60_000);
  expect(rise?.light).toBe('day');
  expect(Math.abs((rise?.at ?? 0) - astronomy(1))).toBeLessThanOrEqual(60_000);
  expect(later).toHaveLength(3);
  expect(lightBySun(noon + 10 * HOUR, BUFORD)[0]?.light).toBe('dark');
  expect(lightBySun(noon - 7 * HOUR, BUFORD).map(({ light }) => light)).toEqual([
    'dark',
    'day',
    'dark',
    'day',
    'dark',
    'day',
    'dark',
  ]);
});

it('changes at the very instant of an event', () => {
  const set = lightBySun(noon, BUFORD)[1]?.at ?? 0;
  expect(lightBySun(set - 1, BUFORD)[0]?.light).toBe('day');
  expect(lightBySun(set, BUFORD)[0]?.light).toBe('dark');
});

it('stays as the sun stands where it neither rises nor sets', () => {
  const north = { lat: 78.2, lon: 15.6, zone: 'Europe/Oslo' };
  expect(lightBySun(Date.UTC(2026, 5, 21, 0), north)).toEqual([{ at: Date.UTC(2026, 5, 21, 0), light: 'day' }]);
  expect(lightBySun(Date.UTC(2026, 11, 21, 11), north)).toEqual([{ at: Date.UTC(2026, 11, 21, 11), light: 'dark' }]);
});
