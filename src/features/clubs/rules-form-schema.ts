import { z } from 'zod';
import { CALENDAR_PRIVACY, type ClaimAhead, type ClubRules, SIGHTINGS_SEEN_BY } from '@/core/booking/rules';
import { clubRulesSchema } from '@/core/booking/rules-schema';
import { isClock } from '@/core/day-time';
import { WEAPONS, type Weapon } from '@/core/ground-types';
import { type Units, ydToM } from '@/core/units';
import { formReader, type TextReader } from './read-number';
import { harvestRuleFields, readHarvestRules, readStated } from './rules-harvest-form';
import { readWorkRules, workRuleFields } from './rules-work-form';
import { RULES_ERRORS } from './words/field-errors';

const line = z.string().max(600, RULES_ERRORS.long600);
const fromSunFields = z.object({ minutes: line, side: z.enum(['before', 'after']) });

/** What the rules form holds: text in the club's units. */
export const rulesFormSchema = z.object({
  version: z.number().int().min(1),
  legalLight: z
    .array(z.object({ name: line, minutesBeforeSunrise: line, minutesAfterSunset: line, source: line, statedOn: line }))
    .max(20),
  morningStart: fromSunFields,
  morningEnd: line,
  eveningStart: line,
  eveningEnd: fromSunFields,
  seasons: z
    .array(
      z.object({
        id: z.string().max(40),
        name: line,
        weapons: z.array(z.enum(WEAPONS)).max(WEAPONS.length),
        fromDay: line,
        toDay: line,
        legalLightName: line,
      }),
    )
    .max(60),
  claimAhead: z.enum(['days', 'hunt_time']),
  claimDays: line,
  claimHours: line,
  maxLiveClaims: line,
  holdMinutes: line,
  walkUpSits: z.boolean(),
  backByMinutes: line,
  overdueMember: line,
  overdueOfficers: line,
  overdueContact: line,
  overdueShowsPlace: z.boolean(),
  restDays: line,
  mostSitsPerMember: line,
  guestDays: line,
  guestsAtOnce: line,
  spacing: z.object({ bow: line, crossbow: line, muzzleloader: line, shotgun: line, rifle: line }),
  passThrough: line,
  sightingsSeenBy: z.enum(SIGHTINGS_SEEN_BY),
  calendarPrivacy: z.enum(CALENDAR_PRIVACY),
  orangeText: line,
  orangeSource: line,
  orangeStatedOn: line,
  ...harvestRuleFields,
  ...workRuleFields,
});
export type RulesForm = z.output<typeof rulesFormSchema>;

const whole = (label: string, min: number, max: number) => ({ label, min, max, whole: true });

function readDistance(form: TextReader, path: string[], text: string, label: string, max: number, units: Units) {
  const unit = units === 'us' ? 'yd' : 'm';
  const value = form.needNumber(path, text, { label, min: 0, max, unit });
  return units === 'us' ? ydToM(value) : value;
}

function readFromSun(form: TextReader, path: string, { minutes, side }: RulesForm['morningStart'], label: string) {
  const value = form.needNumber([path, 'minutes'], minutes, whole(label, 0, 180));
  return side === 'before' ? 0 - value : value;
}

function readClock(form: TextReader, path: string, text: string): string {
  if (!isClock(text.trim())) form.fail([path], RULES_ERRORS.clock);
  return text.trim();
}

function readClaimAhead(form: TextReader, typed: RulesForm): ClaimAhead {
  if (typed.claimAhead === 'days') {
    return {
      kind: 'days',
      days: form.needNumber(['claimDays'], typed.claimDays, whole(RULES_ERRORS.daysAhead, 0, 365)),
    };
  }
  return {
    kind: 'hunt_time',
    hours: form.needNumber(['claimHours'], typed.claimHours, whole(RULES_ERRORS.hoursAhead, 1, 24)),
  };
}

function readLegalLight(form: TextReader, typed: RulesForm): ClubRules['legalLight'] {
  return typed.legalLight.map((rule, i) => ({
    name: rule.name.trim(),
    minutesBeforeSunrise: form.needNumber(
      ['legalLight', i, 'minutesBeforeSunrise'],
      rule.minutesBeforeSunrise,
      whole(RULES_ERRORS.minutesBeforeSunrise, -60, 90),
    ),
    minutesAfterSunset: form.needNumber(
      ['legalLight', i, 'minutesAfterSunset'],
      rule.minutesAfterSunset,
      whole(RULES_ERRORS.minutesAfterSunset, -60, 90),
    ),
    source: rule.source.trim(),
    statedOn: rule.statedOn.trim(),
  }));
}

function readSpacing(form: TextReader, typed: RulesForm, units: Units): ClubRules['spacingM'] {
  const read = (weapon: Weapon) =>
    readDistance(form, ['spacing', weapon], typed.spacing[weapon], RULES_ERRORS.spacing, 2000, units);
  return {
    bow: read('bow'),
    crossbow: read('crossbow'),
    muzzleloader: read('muzzleloader'),
    shotgun: read('shotgun'),
    rifle: read('rifle'),
  };
}

function readOverdue(form: TextReader, typed: RulesForm): ClubRules['overdueSteps'] {
  const memberMinutes = form.needNumber(['overdueMember'], typed.overdueMember, whole(RULES_ERRORS.minutes, 0, 720));
  const officersMinutes = form.needNumber(
    ['overdueOfficers'],
    typed.overdueOfficers,
    whole(RULES_ERRORS.minutes, 0, 720),
  );
  const contactMinutes = form.needNumber(['overdueContact'], typed.overdueContact, whole(RULES_ERRORS.minutes, 0, 720));
  if (officersMinutes < memberMinutes) form.fail(['overdueOfficers'], RULES_ERRORS.officersOrder);
  if (contactMinutes < officersMinutes) form.fail(['overdueContact'], RULES_ERRORS.contactOrder);
  return { memberMinutes, officersMinutes, contactMinutes };
}

function readRules(form: TextReader, typed: RulesForm, units: Units): ClubRules {
  return {
    legalLight: readLegalLight(form, typed),
    windowHours: {
      morning: {
        startMinutesFromSunrise: readFromSun(form, 'morningStart', typed.morningStart, RULES_ERRORS.startMorning),
        endClock: readClock(form, 'morningEnd', typed.morningEnd),
      },
      evening: {
        startClock: readClock(form, 'eveningStart', typed.eveningStart),
        endMinutesFromSunset: readFromSun(form, 'eveningEnd', typed.eveningEnd, RULES_ERRORS.endEvening),
      },
    },
    seasons: typed.seasons.map((season) => ({ ...season, legalLightName: season.legalLightName.trim() || null })),
    claimAhead: readClaimAhead(form, typed),
    maxLiveClaims: form.number(['maxLiveClaims'], typed.maxLiveClaims, whole(RULES_ERRORS.sitsBookedOnce, 1, 100)),
    holdMinutes: form.number(['holdMinutes'], typed.holdMinutes, whole(RULES_ERRORS.holdTime, 5, 600)),
    restDaysDefault: form.needNumber(['restDays'], typed.restDays, whole(RULES_ERRORS.restDays, 0, 60)),
    mostSitsPerMemberSeason: form.number(
      ['mostSitsPerMember'],
      typed.mostSitsPerMember,
      whole(RULES_ERRORS.sitsASeason, 1, 400),
    ),
    spacingM: readSpacing(form, typed, units),
    passThroughM: readDistance(form, ['passThrough'], typed.passThrough, RULES_ERRORS.walkingDistance, 1000, units),
    guestDaysPerSeason: form.number(['guestDays'], typed.guestDays, whole(RULES_ERRORS.guestDays, 0, 366)),
    guestsAtOnce: form.needNumber(['guestsAtOnce'], typed.guestsAtOnce, whole(RULES_ERRORS.guestsAtOnce, 0, 20)),
    backByMinutes: form.needNumber(['backByMinutes'], typed.backByMinutes, whole(RULES_ERRORS.backByAllowance, 0, 720)),
    overdueSteps: readOverdue(form, typed),
    overdueShowsPlace: typed.overdueShowsPlace,
    sightingsSeenBy: typed.sightingsSeenBy,
    calendarPrivacy: typed.calendarPrivacy,
    walkUpSits: typed.walkUpSits,
    orangeRule: readStated(
      form,
      { text: typed.orangeText, source: typed.orangeSource, statedOn: typed.orangeStatedOn },
      { text: 'orangeText', source: 'orangeSource', statedOn: 'orangeStatedOn' },
      500,
    ),
    ...readHarvestRules(form, typed),
    workRules: readWorkRules(form, typed.workRules),
  };
}

/** These stand in form and store under the same names, so the stored schema's own findings fall beside their fields. */
const SAME_NAMES = ['legalLight', 'seasons', 'harvestQuotas'];

/** From the form in the club's units to the rules as they are stored, in metres. */
export function makeRulesSchema(units: Units) {
  return rulesFormSchema.transform((typed, ctx): { version: number; rules: ClubRules } => {
    const form = formReader(ctx);
    const rules = readRules(form, typed, units);
    const checked = clubRulesSchema.safeParse(rules);
    for (const issue of checked.error?.issues ?? []) {
      if (SAME_NAMES.includes(String(issue.path[0]))) form.fail(issue.path.map(keyOf), issue.message);
    }
    if (form.failed() || !checked.success) {
      if (!form.failed()) form.fail([], RULES_ERRORS.whole);
      return z.NEVER;
    }
    return { version: typed.version, rules: checked.data };
  });
}

const keyOf = (key: PropertyKey): string | number => (typeof key === 'number' ? key : String(key));
