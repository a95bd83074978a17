import { describe, expect, it } from 'vitest';
import { formatClock } from './day-time';
import { legalLight } from './legal-light';

const BUFORD = { lat: 34 + 7 / 60, lon: -84, zone: 'America/New_York' };

function minutes(clock: string): number {
  return Number(clock.slice(0, 2)) * 60 + Number(clock.slice(3));
}

describe('legalLight', () => {
  // USNO one-year table, Buford GA 2016, with the rule added and the clock in force (Eastern daylight or standard time).
  it.each([
    ['2016-11-05', 30, 30, '07:30', '19:09'],
    ['2016-11-06', 30, 30, '06:31', '18:08'],
    ['2016-03-13', 30, 30, '07:19', '20:13'],
    ['2016-11-15', 30, 0, '06:39', '17:32'],
  ])('%s with -%d/+%d is %s to %s within a minute', (day, before, after, start, end) => {
    const light = legalLight({ minutesBeforeSunrise: before, minutesAfterSunset: after }, day, BUFORD);
    if (!light) throw new Error('no light');
    expect(Math.abs(minutes(formatClock(light.startAt, BUFORD.zone)) - minutes(start))).toBeLessThanOrEqual(1);
    expect(Math.abs(minutes(formatClock(light.endAt, BUFORD.zone)) - minutes(end))).toBeLessThanOrEqual(1);
    expect(light.startAt % 60_000).toBe(0);
  });

  it('is null where the sun does not set, and ends after it starts where it sets past midnight', () => {
    const rule = { minutesBeforeSunrise: 30, minutesAfterSunset: 30 };
    expect(legalLight(rule, '2023-06-21', { lat: 71.29, lon: -156.79, zone: 'America/Anchorage' })).toBeNull();
    const light = legalLight(rule, '2024-06-21', { lat: 64.84, lon: -147.72, zone: 'America/Anchorage' });
    expect((light?.endAt ?? 0) - (light?.startAt ?? 0)).toBeGreaterThan(20 * 3_600_000);
  });
});
