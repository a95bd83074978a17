import { describe, expect, it } from 'vitest';
import { ageText, legalLightText, minutesText, pointsText, shortClock } from './terms';

const rule = {
  name: 'Deer',
  minutesBeforeSunrise: 30,
  minutesAfterSunset: 30,
  source: 'Hunting digest',
  statedOn: '2026-08-01',
};

describe('legalLightText', () => {
  it('names the rule, its source and its date, and leaves the law to the state', () => {
    expect(legalLightText(rule)).toBe(
      'Club rule: 30 min before sunrise to 30 min after sunset (Hunting digest, Sat 1 Aug 2026). State law decides.',
    );
  });

  it('says sunrise and sunset where the rule adds nothing, and turns round what is negative', () => {
    expect(legalLightText({ ...rule, minutesBeforeSunrise: 0, minutesAfterSunset: 0 })).toContain(
      'sunrise to sunset (',
    );
    expect(legalLightText({ ...rule, minutesBeforeSunrise: -15, minutesAfterSunset: -10 })).toContain(
      '15 min after sunrise to 10 min before sunset',
    );
  });
});

describe('shortClock', () => {
  const at = Date.UTC(2026, 10, 7, 15);
  it('drops what a window already says', () => {
    expect(shortClock(at, { zone: 'America/New_York', units: 'us' })).toBe('10');
    expect(shortClock(at + 300_000, { zone: 'America/New_York', units: 'us' })).toBe('10:05');
    expect(shortClock(at, { zone: 'America/New_York', units: 'metric' })).toBe('10:00');
  });
});

describe('texts of figures', () => {
  it('signs points with a true minus and none for nought', () => {
    expect([6.4, -12.2, 0.4, -0.4].map(pointsText)).toEqual(['+6', '−12', '0', '0']);
  });

  it('says ages in the largest unit that fits', () => {
    expect([20_000, 12 * 60_000, 3 * 3_600_000, 50 * 3_600_000].map(ageText)).toEqual([
      'just now',
      '12 min ago',
      '3 h ago',
      '2 days ago',
    ]);
  });

  it('says a walk in minutes, then hours', () => {
    expect([20, 13 * 60, 100 * 60].map(minutesText)).toEqual(['1 min', '13 min', '1 h 40 min']);
  });
});
