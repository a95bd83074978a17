import { z } from 'zod';
import { RULE_ERRORS, RULE_FIELDS } from '@/core/words/rules';
import { isClock, isDay } from '../day-time';
import { WEAPONS } from '../ground-types';
import { QUOTA_DEER, QUOTA_PER } from '../harvest/harvest-types';
import { CALENDAR_PRIVACY, type ClubRules, SIGHTINGS_SEEN_BY } from './rules';

const day = z.string().refine(isDay, RULE_ERRORS.day);
const clock = z.string().refine(isClock, RULE_ERRORS.clock);

function text(what: string, most: number) {
  return z.string().trim().min(1, RULE_ERRORS.needed(what)).max(most, RULE_ERRORS.long(what, most));
}

function whole(what: string, least: number, most: number) {
  const message = RULE_ERRORS.whole(what, least, most);
  return z.number({ error: message }).int(message).min(least, message).max(most, message);
}

function metres(what: string, most: number) {
  const message = RULE_ERRORS.metres(what, most);
  return z.number({ error: message }).min(0, message).max(most, message);
}

interface Days {
  fromDay: string;
  toDay: string;
}
const inOrder = (span: Days) => span.fromDay <= span.toDay;
const LAST_FIRST = { error: RULE_ERRORS.daysOrder, path: ['toDay'] };

export const legalLightRuleSchema = z.object({
  name: text(RULE_FIELDS.ruleName, 60),
  minutesBeforeSunrise: whole(RULE_FIELDS.beforeSunrise, -60, 90),
  minutesAfterSunset: whole(RULE_FIELDS.afterSunset, -60, 90),
  source: text(RULE_FIELDS.source, 300),
  statedOn: day,
});

export const windowHoursSchema = z.object({
  morning: z.object({ startMinutesFromSunrise: whole(RULE_FIELDS.morningStart, -180, 180), endClock: clock }),
  evening: z.object({ startClock: clock, endMinutesFromSunset: whole(RULE_FIELDS.eveningEnd, -180, 180) }),
});

export const seasonSchema = z
  .object({
    id: text(RULE_FIELDS.id, 40),
    name: text(RULE_FIELDS.seasonName, 60),
    weapons: z.array(z.enum(WEAPONS)).min(1, RULE_ERRORS.oneWeapon),
    fromDay: day,
    toDay: day,
    legalLightName: z.string().trim().max(60).nullish(),
  })
  .refine(inOrder, LAST_FIRST);

export const claimAheadSchema = z.discriminatedUnion('kind', [
  z.object({ kind: z.literal('days'), days: whole(RULE_FIELDS.daysAhead, 0, 365) }),
  z.object({ kind: z.literal('hunt_time'), hours: whole(RULE_FIELDS.hoursAhead, 1, 24) }),
]);

export const orangeRuleSchema = z.object({
  text: text(RULE_FIELDS.rule, 500),
  source: text(RULE_FIELDS.source, 300),
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
  most: whole(RULE_FIELDS.deer, 0, 1000),
});

export const stateHarvestRuleSchema = z.object({
  text: text(RULE_FIELDS.rule, 2000),
  source: text(RULE_FIELDS.source, 300),
  statedOn: day,
});

export const overdueStepsSchema = z
  .object({
    memberMinutes: whole(RULE_FIELDS.memberMinutes, 0, 720),
    officersMinutes: whole(RULE_FIELDS.officersMinutes, 0, 720),
    contactMinutes: whole(RULE_FIELDS.contactMinutes, 0, 720),
  })
  .refine((steps) => steps.memberMinutes <= steps.officersMinutes, {
    error: RULE_ERRORS.officersOrder,
    path: ['officersMinutes'],
  })
  .refine((steps) => steps.officersMinutes <= steps.contactMinutes, {
    error: RULE_ERRORS.contactOrder,
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
      .refine((rules) => noTwice(rules.map((r) => r.name)), RULE_ERRORS.rulesTwice),
    windowHours: windowHoursSchema,
    seasons: z
      .array(seasonSchema)
      .max(60)
      .refine((seasons) => noTwice(seasons.map((s) => s.id)), RULE_ERRORS.seasonsTwice),
    claimAhead: claimAheadSchema,
    maxLiveClaims: whole(RULE_FIELDS.liveClaims, 1, 100).nullable(),
    holdMinutes: whole(RULE_FIELDS.holdTime, 5, 600).nullable(),
    restDaysDefault: whole(RULE_FIELDS.restDays, 0, 60),
    mostSitsPerMemberSeason: whole(RULE_FIELDS.sitsPerMember, 1, 400).nullable(),
    spacingM: z.object({
      bow: metres(RULE_FIELDS.spacingBow, 2000),
      crossbow: metres(RULE_FIELDS.spacingCrossbow, 2000),
      muzzleloader: metres(RULE_FIELDS.spacingMuzzleloader, 2000),
      shotgun: metres(RULE_FIELDS.spacingShotgun, 2000),
      rifle: metres(RULE_FIELDS.spacingRifle, 2000),
    }),
    passThroughM: metres(RULE_FIELDS.passThrough, 1000),
    guestDaysPerSeason: whole(RULE_FIELDS.guestDays, 0, 366).nullable(),
    guestsAtOnce: whole(RULE_FIELDS.guestsAtOnce, 0, 20),
    backByMinutes: whole(RULE_FIELDS.backBy, 0, 720),
    overdueSteps: overdueStepsSchema,
    overdueShowsPlace: z.boolean(),
    sightingsSeenBy: z.enum(SIGHTINGS_SEEN_BY),
    calendarPrivacy: z.enum(CALENDAR_PRIVACY),
    walkUpSits: z.boolean(),
    orangeRule: orangeRuleSchema.nullable(),
    harvestQuotas: z
      .array(harvestQuotaSchema)
      .max(20)
      .refine((quotas) => noTwice(quotas.map(({ deer, per }) => `${deer} ${per}`)), RULE_ERRORS.quotasTwice),
    stateHarvestRule: stateHarvestRuleSchema.nullable(),
    workRules: workRulesSchema,
  })
  .superRefine((rules, ctx) => {
    const names = rules.legalLight.map((r) => r.name);
    rules.seasons.forEach((season, i) => {
      if (!season.legalLightName || names.includes(season.legalLightName)) return;
      const message = RULE_ERRORS.noLegalLight(season.legalLightName);
      ctx.addIssue({ code: 'custom', message, path: ['seasons', i, 'legalLightName'] });
    });
  }) satisfies z.ZodType<ClubRules>;
