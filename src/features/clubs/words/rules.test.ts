import { describe, expect, it } from 'vitest';
import { type ClubRules, DEFAULT_CLUB_RULES } from '@/core/booking/rules';
import { placeText } from './place';
import { changedLines, describeRules, fromSun } from './rules';

const linesOf = (rules: Partial<ClubRules>, units: 'us' | 'metric' = 'us') =>
  describeRules({ ...DEFAULT_CLUB_RULES, ...rules }, units).flatMap((group) => group.lines);
const textOf = (label: string, rules: Partial<ClubRules> = {}, units: 'us' | 'metric' = 'us') =>
  linesOf(rules, units).find((line) => line.label === label)?.text;

describe('rules in words', () => {
  it('counts from the sun on the right side', () => {
    expect([fromSun(-30, 'sunrise'), fromSun(0, 'sunset'), fromSun(1, 'sunset')]).toEqual([
      '30 minutes before sunrise',
      'at sunset',
      '1 minute after sunset',
    ]);
  });

  it('states a legal-light rule with its source and day', () => {
    const rule = {
      name: 'Deer',
      minutesBeforeSunrise: 30,
      minutesAfterSunset: 30,
      source: 'Digest, p. 12',
      statedOn: '2026-08-01',
    };
    expect(textOf('Deer', { legalLight: [rule] })).toBe(
      'From 30 minutes before sunrise to 30 minutes after sunset. Source: Digest, p. 12, stated on Sat 1 Aug 2026.',
    );
    const short = { ...rule, minutesBeforeSunrise: -15, minutesAfterSunset: 0 };
    expect(textOf('Deer', { legalLight: [short] })).toContain('From 15 minutes after sunrise to at sunset.');
  });

  it("reads clocks and distances in the club's units", () => {
    expect(textOf('Morning')).toBe('From 30 minutes before sunrise to 11:00 AM');
    expect(textOf('Evening', {}, 'metric')).toBe('From 14:30 to 30 minutes after sunset');
    expect(textOf('Walking through')).toBe('Not within 100 yd of an occupied stand');
    expect(textOf('Spacing, bow', {}, 'metric')).toBe('At least 274.3 m between occupied stands');
  });

  it('says that there is no limit where none is set', () => {
    expect(textOf('Sits booked at once')).toBe('No limit');
    expect(textOf('Seasons')).toBe('No dates are set: every day is open.');
  });

  it('has a line that differs for every rule a club sets', () => {
    const changes: Partial<ClubRules>[] = [
      { restDaysDefault: 5 },
      { claimAhead: { kind: 'days', days: 3 } },
      { claimAhead: { kind: 'hunt_time', hours: 3 } },
      { maxLiveClaims: 2 },
      { holdMinutes: 30 },
      { mostSitsPerMemberSeason: 20 },
      { spacingM: { ...DEFAULT_CLUB_RULES.spacingM, rifle: 500 } },
      { passThroughM: 0 },
      { guestDaysPerSeason: null },
      { guestsAtOnce: 0 },
      { backByMinutes: 90 },
      { overdueSteps: { memberMinutes: 0, officersMinutes: 15, contactMinutes: 60 } },
      { overdueShowsPlace: true },
      { sightingsSeenBy: 'officers' },
      { calendarPrivacy: 'busy_only' },
      { walkUpSits: false },
      { harvestQuotas: [{ deer: 'antlered', per: 'member', most: 1 }] },
      { stateHarvestRule: { text: 'Two deer.', source: 'Digest', statedOn: '2026-08-01' } },
      { orangeRule: { text: 'Orange in gun season.', source: 'Digest', statedOn: '2026-08-01' } },
      { seasons: [{ id: 'a', name: 'Archery', weapons: ['bow'], fromDay: '2026-09-12', toDay: '2026-12-31' }] },
      {
        legalLight: [
          { name: 'Deer', minutesBeforeSunrise: 30, minutesAfterSunset: 30, source: 'D', statedOn: '2026-08-01' },
        ],
      },
      {
        windowHours: { ...DEFAULT_CLUB_RULES.windowHours, evening: { startClock: '13:00', endMinutesFromSunset: 30 } },
      },
    ];
    for (const change of changes)
      expect(changedLines(linesOf({}), linesOf(change)), JSON.stringify(change)).not.toEqual([]);
  });
});

describe('changedLines', () => {
  it('gives what was, what is, what is new and what is gone', () => {
    const before = [
      { label: 'A', text: '1' },
      { label: 'B', text: '2' },
      { label: 'Gone', text: '3' },
    ];
    const after = [
      { label: 'A', text: '1' },
      { label: 'B', text: '5' },
      { label: 'New', text: '6' },
    ];
    expect(changedLines(before, after)).toEqual([
      { label: 'B', before: '2', after: '5' },
      { label: 'Gone', before: '3', after: null },
      { label: 'New', before: null, after: '6' },
    ]);
  });

  it('sees a change in the second line of one label', () => {
    const one = { label: 'Gun', text: 'first' };
    expect(changedLines([one, { label: 'Gun', text: 'a' }], [one, { label: 'Gun', text: 'b' }])).toHaveLength(1);
  });
});

describe('placeText', () => {
  it('names the halves of the globe', () => {
    expect(placeText({ lat: 34.117, lon: -84 })).toBe('34.11700° N, 84.00000° W');
    expect(placeText({ lat: -33.5, lon: 150.25 })).toBe('33.50000° S, 150.25000° E');
  });
});
