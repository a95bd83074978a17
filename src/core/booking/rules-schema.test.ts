import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type ClubRules, DEFAULT_CLUB_RULES } from './rules';
import { clubRulesSchema } from './rules-schema';

const problems = (change: unknown) => {
  const parsed = clubRulesSchema.safeParse({ ...DEFAULT_CLUB_RULES, ...Object(change) });
  return parsed.success ? [] : parsed.error.issues.map((i) => `${i.path.join('.')}: ${i.message}`);
};

describe('clubRulesSchema', () => {
  it('takes the defaults as they are', () => {
    expect(clubRulesSchema.parse(DEFAULT_CLUB_RULES)).toEqual(DEFAULT_CLUB_RULES);
  });

  it('takes a full set', () => {
    const rules: ClubRules = {
      ...DEFAULT_CLUB_RULES,
      legalLight: [
        {
          name: 'Deer',
          minutesBeforeSunrise: 30,
          minutesAfterSunset: 30,
          source: 'State digest, page 12',
          statedOn: '2026-08-01',
        },
      ],
      seasons: [
        {
          id: 's1',
          name: 'Archery',
          weapons: ['bow'],
          fromDay: '2026-09-12',
          toDay: '2026-12-31',
          legalLightName: 'Deer',
        },
      ],
      claimAhead: { kind: 'hunt_time', hours: 2 },
      orangeRule: {
        text: '500 square inches above the waist in gun season',
        source: 'State digest',
        statedOn: '2026-08-01',
      },
    };
    expect(clubRulesSchema.parse(rules)).toEqual(rules);
  });

  it.each([
    [{ restDaysDefault: -1 }, 'restDaysDefault: Rest days must be a whole number from 0 to 60.'],
    [{ restDaysDefault: '3' }, 'restDaysDefault: Rest days must be a whole number from 0 to 60.'],
    [{ restDaysDefault: Number.NaN }, 'restDaysDefault: Rest days must be a whole number from 0 to 60.'],
    [{ passThroughM: 5000 }, 'passThroughM: Walking distance from an occupied stand must be from 0 to 1000 metres.'],
    [
      { seasons: [{ id: 'a', name: 'A', weapons: ['bow'], fromDay: '2026-02-30', toDay: '2026-03-01' }] },
      'seasons.0.fromDay: Give a day as YYYY-MM-DD.',
    ],
    [
      { seasons: [{ id: 'a', name: 'A', weapons: ['bow'], fromDay: '2026-03-02', toDay: '2026-03-01' }] },
      'seasons.0.toDay: The last day may not come before the first.',
    ],
    [
      {
        windowHours: {
          ...DEFAULT_CLUB_RULES.windowHours,
          morning: { startMinutesFromSunrise: -30, endClock: '25:00' },
        },
      },
      'windowHours.morning.endClock: Give a time as HH:MM, 24-hour.',
    ],
    [
      {
        seasons: [
          { id: 'a', name: 'A', weapons: ['bow'], fromDay: '2026-09-01', toDay: '2026-09-02', legalLightName: 'None' },
        ],
      },
      'seasons.0.legalLightName: No legal-light rule is called "None".',
    ],
  ])('says what is wrong with %j', (change, message) => {
    expect(problems(change)).toEqual([message]);
  });

  it('refuses or takes anything without throwing', () => {
    fc.assert(
      fc.property(
        fc.object(),
        fc.constantFrom(...Object.keys(DEFAULT_CLUB_RULES)),
        fc.anything(),
        (object, key, value) => {
          expect(clubRulesSchema.safeParse(object).success).toBe(false);
          expect(typeof clubRulesSchema.safeParse({ ...DEFAULT_CLUB_RULES, [key]: value }).success).toBe('boolean');
        },
      ),
    );
  });
});
