import { z } from 'zod';
import { isClock, isDay } from '../day-time';
import { WEAPONS } from '../ground-types';
import { QUOTA_DEER, QUOTA_PER } from '../harvest/harvest-types';
import { CALENDAR_PRIVACY, type ClubRules, SIGHTINGS_SEEN_BY } from './rules';

const day = z.string().refine(isDay, 'Give a day as YYYY-MM-DD.');
const clock = z.string().refine(isClock, 'Give a time as HH:MM, 24-hour.');

function text(what: string, most: number) {
  return z.string().trim().min(1, `${what} is needed.`).max(most, `${what} may be at most ${most} characters.`);
}

function whole(what: string, least: number, most: number) {
  const message = `${what} must be a whole number from ${least} to ${most}.`;
  return z.number({ error: message }).int(message).min(least, message).max(most, message);
}

function metres(what: string, most: number) {
  const message = `${what} must be from 0 to ${most} metres.`;
  return z.number({ error: message }).min(0, message).max(most, message);
}

interface Days {
  fromDay: string;
  toDay: string;
}
const inOrder = (span: Days) => span.fromDay <= span.toDay;
const LAST_FIRST = { error: 'The last day may not come before the first.', path: ['toDay'] };

export const legalLightRuleSchema = z.object({
  name: text('A name for the rule', 60),
  minutesBeforeSunrise: whole('Minutes before sunrise', -60, 90),
  minutesAfterSunset: whole('Minutes after sunset', -60, 90),
  source: text('Where the rule is written', 300),
  statedOn: day,
});

export const windowHoursSchema = z.object({
  morning: z.object({ startMinutesFromSunrise: whole('Start of the morning', -180, 180), endClock: clock }),
  evening: z.object({ startClock: clock, endMinutesFromSunset: whole('End of the evening', -180, 180) }),
});

export const seasonSchema = z
  .object({
    id: text('An id', 40),
    name: text('A name for the season', 60),
    weapons: z.array(z.enum(WEAPONS)).min(1, 'Choose at least one weapon.'),
    fromDay: day,
    toDay: day,
    legalLightName: z.string().trim().max(60).nullish(),
  })
  .refine(inOrder, LAST_FIRST);

export const claimAheadSchema = z.discriminatedUnion('kind', [
  z.object({ kind: z.literal('days'), days: whole('Days ahead', 0, 365) }),
  z.object({ kind: z.literal('hunt_time'), hours: whole('Hours ahead', 1, 24) }),
]);

export const orangeRuleSchema = z.object({
  text: text('The rule', 500),
  source: text('Where the rule is written', 300),
  statedOn: day,
});

const workRule = orangeRuleSchema.nullable();
export const workRulesSchema = z.object({
  mock_scrape: workRule,
  water: workRule,
  bait: workRule,
  cutting: workRule,
  planting: workRule,
});

export const harvestQuotaSchema = z.object({
  deer: z.enum(QUOTA_DEER),
  per: z.enum(QUOTA_PER),
  most: whole('Deer', 0, 1000),
});

export const stateHarvestRuleSchema = z.object({
  text: text('The rule', 2000),
  source: text('Where the rule is written', 300),
  statedOn: day,
});

export const overdueStepsSchema = z
  .object({
    memberMinutes: whole('Minutes until the member is told', 0, 720),
    officersMinutes: whole('Minutes until officers are told', 0, 720),
    contactMinutes: whole('Minutes until the safety contact is told', 0, 720),
  })
  .refine((steps) => steps.memberMinutes <= steps.officersMinutes, {
    error: 'Officers are not told before the member.',
    path: ['officersMinutes'],
  })
  .refine((steps) => steps.officersMinutes <= steps.contactMinutes, {
    error: 'The safety contact is not told before the officers.',
    path: ['contactMinutes'],
  });

function noTwice(names: string[]): boolean {
  return new Set(names).size === names.length;
}

/** What an officer may save as the club's rules; every message is for the field it stands beside. */
export const clubRulesSchema = z
  .object({
    legalLight: z
      .array(legalLightRuleSchema)
      .max(20)
      .refine((rules) => noTwice(rules.map((r) => r.name)), 'Two rules have the same name.'),
    windowHours: windowHoursSchema,
    seasons: z
      .array(seasonSchema)
      .max(60)
      .refine((seasons) => noTwice(seasons.map((s) => s.id)), 'Two seasons have the same id.'),
    claimAhead: claimAheadSchema,
    maxLiveClaims: whole('Live claims', 1, 100).nullable(),
    holdMinutes: whole('Hold time', 5, 600).nullable(),
    restDaysDefault: whole('Rest days', 0, 60),
    mostSitsPerMemberSeason: whole('Sits a member', 1, 400).nullable(),
    spacingM: z.object({
      bow: metres('Spacing for the bow', 2000),
      crossbow: metres('Spacing for the crossbow', 2000),
      muzzleloader: metres('Spacing for the muzzleloader', 2000),
      shotgun: metres('Spacing for the shotgun', 2000),
      rifle: metres('Spacing for the rifle', 2000),
    }),
    passThroughM: metres('Walking distance from an occupied stand', 1000),
    guestDaysPerSeason: whole('Guest days', 0, 366).nullable(),
    guestsAtOnce: whole('Guests at once', 0, 20),
    backByMinutes: whole('Back-by allowance', 0, 720),
    overdueSteps: overdueStepsSchema,
    overdueShowsPlace: z.boolean(),
    sightingsSeenBy: z.enum(SIGHTINGS_SEEN_BY),
    calendarPrivacy: z.enum(CALENDAR_PRIVACY),
    walkUpSits: z.boolean(),
    orangeRule: orangeRuleSchema.nullable(),
    harvestQuotas: z
      .array(harvestQuotaSchema)
      .max(20)
      .refine(
        (quotas) => noTwice(quotas.map(({ deer, per }) => `${deer} ${per}`)),
        'Two quotas are for the same deer and the same people.',
      ),
    stateHarvestRule: stateHarvestRuleSchema.nullable(),
    workRules: workRulesSchema,
  })
  .superRefine((rules, ctx) => {
    const names = rules.legalLight.map((r) => r.name);
    rules.seasons.forEach((season, i) => {
      if (!season.legalLightName || names.includes(season.legalLightName)) return;
      const message = `No legal-light rule is called "${season.legalLightName}".`;
      ctx.addIssue({ code: 'custom', message, path: ['seasons', i, 'legalLightName'] });
    });
  }) satisfies z.ZodType<ClubRules>;
