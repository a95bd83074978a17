import type { ClubRules } from '@/core/booking/rules';
import { WEAPONS, type Weapon } from '@/core/ground-types';
import { mToYd, type Units } from '@/core/units';
import { numberText } from './read-number';
import type { RulesForm } from './rules-form-schema';
import { harvestRulesToForm } from './rules-harvest-form';
import { workRulesToForm } from './rules-work-form';

/** A distance as typed: yards or metres, to a hundredth. */
export function distanceText(m: number, units: Units): string {
  return numberText(units === 'us' ? mToYd(m) : m, 2);
}

/** Signed minutes from the sun as the form shows them: how many, and on which side. */
function sunParts(minutes: number): { minutes: string; side: 'before' | 'after' } {
  return { minutes: String(Math.abs(minutes)), side: minutes < 0 ? 'before' : 'after' };
}

/** Stored rules as a form in the club's units; null is blank. */
export function rulesToForm(rules: ClubRules, units: Units, version: number): RulesForm {
  const { morning, evening } = rules.windowHours;
  const { claimAhead, orangeRule } = rules;
  const spacing: Partial<Record<Weapon, string>> = {};
  for (const weapon of WEAPONS) spacing[weapon] = distanceText(rules.spacingM[weapon], units);
  return {
    version,
    legalLight: rules.legalLight.map((rule) => ({
      name: rule.name,
      minutesBeforeSunrise: String(rule.minutesBeforeSunrise),
      minutesAfterSunset: String(rule.minutesAfterSunset),
      source: rule.source,
      statedOn: rule.statedOn,
    })),
    morningStart: sunParts(morning.startMinutesFromSunrise),
    morningEnd: morning.endClock,
    eveningStart: evening.startClock,
    eveningEnd: sunParts(evening.endMinutesFromSunset),
    seasons: rules.seasons.map(({ legalLightName, weapons, ...season }) => ({
      ...season,
      weapons: [...weapons],
      legalLightName: legalLightName ?? '',
    })),
    claimAhead: claimAhead.kind,
    claimDays: claimAhead.kind === 'days' ? String(claimAhead.days) : '',
    claimHours: claimAhead.kind === 'hunt_time' ? String(claimAhead.hours) : '',
    maxLiveClaims: numberText(rules.maxLiveClaims),
    holdMinutes: numberText(rules.holdMinutes),
    walkUpSits: rules.walkUpSits,
    backByMinutes: String(rules.backByMinutes),
    overdueMember: String(rules.overdueSteps.memberMinutes),
    overdueOfficers: String(rules.overdueSteps.officersMinutes),
    overdueContact: String(rules.overdueSteps.contactMinutes),
    overdueShowsPlace: rules.overdueShowsPlace,
    restDays: String(rules.restDaysDefault),
    mostSitsPerMember: numberText(rules.mostSitsPerMemberSeason),
    guestDays: numberText(rules.guestDaysPerSeason),
    guestsAtOnce: String(rules.guestsAtOnce),
    spacing: { bow: '', crossbow: '', muzzleloader: '', shotgun: '', rifle: '', ...spacing },
    passThrough: distanceText(rules.passThroughM, units),
    sightingsSeenBy: rules.sightingsSeenBy,
    calendarPrivacy: rules.calendarPrivacy,
    orangeText: orangeRule?.text ?? '',
    orangeSource: orangeRule?.source ?? '',
    orangeStatedOn: orangeRule?.statedOn ?? '',
    ...harvestRulesToForm(rules),
    ...workRulesToForm(rules),
  };
}
