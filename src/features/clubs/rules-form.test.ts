import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type ClubRules, DEFAULT_CLUB_RULES } from '@/core/booking/rules';
import { WEAPONS } from '@/core/ground-types';
import { rulesToForm } from './rules-form';
import { makeRulesSchema, type RulesForm } from './rules-form-schema';

const FULL: ClubRules = {
  ...DEFAULT_CLUB_RULES,
  legalLight: [
    {
      name: 'Deer',
      minutesBeforeSunrise: 30,
      minutesAfterSunset: -15,
      source: 'State digest, p. 12',
      statedOn: '2026-08-01',
    },
  ],
  seasons: [
    {
      id: 's1',
      name: 'Archery',
      weapons: ['bow', 'crossbow'],
      fromDay: '2026-09-12',
      toDay: '2026-12-31',
      legalLightName: 'Deer',
    },
    { id: 's2', name: 'Gun', weapons: ['rifle'], fromDay: '2026-11-14', toDay: '2026-11-29', legalLightName: null },
  ],
  claimAhead: { kind: 'hunt_time', hours: 2 },
  maxLiveClaims: 3,
  holdMinutes: 45,
  mostSitsPerMemberSeason: 40,
  guestDaysPerSeason: null,
  walkUpSits: false,
  orangeRule: { text: '500 square inches above the waist', source: 'State digest, p. 14', statedOn: '2026-08-01' },
  harvestQuotas: [
    { deer: 'antlered', per: 'member', most: 1 },
    { deer: 'any', per: 'club', most: 0 },
  ],
  stateHarvestRule: {
    text: 'Two deer a licence year.\nReport within 24 hours.',
    source: 'Digest',
    statedOn: '2026-08-01',
  },
  workRules: {
    ...DEFAULT_CLUB_RULES.workRules,
    bait: { text: 'None within 200 yards.', source: 'Digest, p. 20', statedOn: '2026-08-01' },
  },
};

const read = (form: RulesForm, units: 'us' | 'metric' = 'us') => makeRulesSchema(units).safeParse(form);
const problems = (change: Partial<RulesForm>, rules = DEFAULT_CLUB_RULES) => {
  const parsed = read({ ...rulesToForm(rules, 'us', 1), ...change });
  return parsed.success ? [] : parsed.error.issues.map((issue) => `${issue.path.join('.')}: ${issue.message}`);
};

describe('rules for work on the ground', () => {
  it('need their source and day, each beside its own field', () => {
    const { workRules } = rulesToForm(DEFAULT_CLUB_RULES, 'us', 1);
    const bait = { text: 'None.', source: ' ', statedOn: '' };
    expect(problems({ workRules: { ...workRules, bait } })).toEqual([
      'workRules.bait.source: Say where the rule is written.',
      'workRules.bait.statedOn: Choose the day on which it was stated.',
    ]);
  });
});

describe('harvest rules of the form', () => {
  const quota = { deer: 'any' as const, per: 'club' as const, most: '2' };

  it('need a count, and one quota for the same deer and people', () => {
    expect(problems({ harvestQuotas: [{ ...quota, most: '' }] })).toEqual(['harvestQuotas.0.most: Deer is needed.']);
    expect(problems({ harvestQuotas: [{ ...quota, most: '1.5' }] })[0]).toContain('whole number from 0 to 1000');
    expect(problems({ harvestQuotas: [quota, quota] })[0]).toContain('same deer and the same people');
  });

  it('take the state rule whole or not at all', () => {
    expect(problems({ stateRuleText: 'Two deer.' }).map((p) => p.split(':')[0])).toEqual([
      'stateRuleSource',
      'stateRuleStatedOn',
    ]);
  });
});

describe('the rules form', () => {
  it.each([
    ['the defaults', DEFAULT_CLUB_RULES],
    ['a full set', FULL],
  ])('gives back %s as they were stored', (_, rules) => {
    for (const units of ['us', 'metric'] as const) {
      const { data } = read(rulesToForm(rules, units, 7), units);
      expect(data?.version).toBe(7);
      const { spacingM, passThroughM, ...rest } = data?.rules ?? DEFAULT_CLUB_RULES;
      const { spacingM: storedSpacing, passThroughM: storedPass, ...stored } = rules;
      expect(rest).toEqual(stored);
      expect(passThroughM).toBeCloseTo(storedPass, 2);
      for (const weapon of WEAPONS) expect(spacingM[weapon]).toBeCloseTo(storedSpacing[weapon], 2);
    }
  });

  // International Yard and Pound, 1959: 1 yd = 0.9144 m exactly.
  it('holds distances in yards for a club of US units and keeps metres', () => {
    const form = rulesToForm(DEFAULT_CLUB_RULES, 'us', 1);
    expect([form.spacing.bow, form.passThrough]).toEqual(['300', '100']);
    const { data } = read({ ...form, spacing: { ...form.spacing, rifle: '437.5' } });
    expect(data?.rules.spacingM.rifle).toBeCloseTo(400.05, 6);
    expect(rulesToForm(DEFAULT_CLUB_RULES, 'metric', 1).spacing.bow).toBe('274.32');
  });

  it('shows the side of the sun in words and stores the sign', () => {
    const form = rulesToForm(DEFAULT_CLUB_RULES, 'us', 1);
    expect([form.morningStart, form.eveningEnd]).toEqual([
      { minutes: '30', side: 'before' },
      { minutes: '30', side: 'after' },
    ]);
    const { data } = read({
      ...form,
      morningStart: { minutes: '0', side: 'before' },
      eveningEnd: { minutes: '15', side: 'before' },
    });
    expect(data?.rules.windowHours.morning.startMinutesFromSunrise).toBe(0);
    expect(data?.rules.windowHours.evening.endMinutesFromSunset).toBe(-15);
  });

  it('comes back the same for any distance and minutes', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 0, max: 200_000 }),
        fc.integer({ min: -180, max: 180 }),
        fc.constantFrom('us' as const, 'metric' as const),
        (hundredths, minutes, units) => {
          const typed = String(hundredths / 100);
          const base = rulesToForm(DEFAULT_CLUB_RULES, units, 1);
          const form = { ...base, spacing: { ...base.spacing, bow: typed } };
          form.morningStart = { minutes: String(Math.abs(minutes)), side: minutes < 0 ? 'before' : 'after' };
          const rules = read(form, units).data?.rules ?? FULL;
          expect(rulesToForm(rules, units, 1)).toEqual(form);
        },
      ),
    );
  });

  it.each<[Partial<RulesForm>, string]>([
    [{ restDays: '' }, 'restDays: Rest days is needed.'],
    [{ restDays: 'three' }, 'restDays: Rest days: type a whole number from 0 to 60.'],
    [{ restDays: '2.5' }, 'restDays: Rest days: type a whole number from 0 to 60.'],
    [{ passThrough: '1001' }, 'passThrough: Walking distance: type a number from 0 to 1000 yd.'],
    [{ overdueMember: '20' }, 'overdueOfficers: Officers are not told before the member.'],
    [{ morningEnd: '' }, 'morningEnd: Give a time.'],
    [{ claimAhead: 'hunt_time', claimHours: '' }, 'claimHours: Hours ahead is needed.'],
    [{ orangeText: 'Wear orange', orangeSource: 'Digest' }, 'orangeStatedOn: Choose the day on which it was stated.'],
    [
      {
        seasons: [
          { id: 'a', name: '', weapons: ['bow'], fromDay: '2026-09-01', toDay: '2026-09-02', legalLightName: '' },
        ],
      },
      'seasons.0.name: A name for the season is needed.',
    ],
    [
      {
        seasons: [{ id: 'a', name: 'A', weapons: [], fromDay: '2026-09-01', toDay: '2026-09-02', legalLightName: '' }],
      },
      'seasons.0.weapons: Choose at least one weapon.',
    ],
    [
      {
        seasons: [
          { id: 'a', name: 'A', weapons: ['bow'], fromDay: '2026-09-03', toDay: '2026-09-02', legalLightName: '' },
        ],
      },
      'seasons.0.toDay: The last day may not come before the first.',
    ],
    [
      {
        seasons: [
          { id: 'a', name: 'A', weapons: ['bow'], fromDay: '2026-09-01', toDay: '2026-09-02', legalLightName: 'Elk' },
        ],
      },
      'seasons.0.legalLightName: No legal-light rule is called "Elk".',
    ],
  ])('says beside its field what is wrong with %j', (change, message) => {
    expect(problems(change)).toEqual([message]);
  });

  it('says it beside the list when two legal-light rules have one name', () => {
    const [rule] = rulesToForm(FULL, 'us', 1).legalLight;
    expect(problems({ legalLight: rule ? [rule, rule] : [] })).toEqual(['legalLight: Two rules have the same name.']);
  });

  it('finds several mistakes at once', () => {
    expect(problems({ restDays: 'x', guestsAtOnce: '99' })).toHaveLength(2);
  });

  it('refuses or takes anything without throwing', () => {
    const base = rulesToForm(FULL, 'us', 1);
    fc.assert(
      fc.property(fc.constantFrom(...Object.keys(base)), fc.anything(), (key, value) => {
        expect(typeof makeRulesSchema('us').safeParse({ ...base, [key]: value }).success).toBe('boolean');
      }),
    );
  });
});
