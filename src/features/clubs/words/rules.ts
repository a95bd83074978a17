import type { CalendarPrivacy, ClubRules, SightingsSeenBy } from '@/core/booking/rules';
import { weaponWord } from '@/core/booking/seasons';
import { formatDay } from '@/core/day-time';
import { WEAPONS } from '@/core/ground-types';
import { GROUND_WORKS } from '@/core/ground-work';
import { quotaText } from '@/core/harvest/quotas';
import { mToYd, type Units } from '@/core/units';
import { numberText } from '../read-number';
import { WORK_RULE_WORDS, WORK_WORDS } from './ground-work';
import type { RuleLine } from './place';

export interface RuleGroup {
  title: string;
  lines: RuleLine[];
}

export const SIGHTINGS_WORDS: Record<SightingsSeenBy, string> = {
  all: 'All members, at once',
  officers: 'Officers only',
  after_season: 'All members, after the season',
};

export const PRIVACY_WORDS: Record<CalendarPrivacy, string> = {
  names_and_stands: 'Names and stands',
  names_only: 'Names without stands',
  busy_only: 'Only that somebody hunts',
};

const plural = (count: number, word: string) => `${count} ${word}${count === 1 ? '' : 's'}`;

/** Minutes from the sun's rise or set: '30 minutes before sunrise', 'at sunset'. */
export function fromSun(minutes: number, event: 'sunrise' | 'sunset'): string {
  if (minutes === 0) return `at ${event}`;
  return `${plural(Math.abs(minutes), 'minute')} ${minutes < 0 ? 'before' : 'after'} ${event}`;
}

function distance(m: number, units: Units): string {
  return units === 'us' ? `${numberText(mToYd(m), 1)} yd` : `${numberText(m, 1)} m`;
}

/** A clock as the club reads it. */
function clock(text: string, units: Units): string {
  if (units === 'metric') return text;
  const hour = Number(text.slice(0, 2));
  return `${hour % 12 || 12}:${text.slice(3)} ${hour < 12 ? 'AM' : 'PM'}`;
}

const stated = (rule: { source: string; statedOn: string }) =>
  `Source: ${rule.source}, stated on ${formatDay(rule.statedOn, true)}.`;

function legalLightLines({ legalLight }: ClubRules): RuleLine[] {
  if (legalLight.length === 0) return [{ label: 'Legal light', text: 'No rule is written down.' }];
  return legalLight.map((rule) => {
    const from = fromSun(-rule.minutesBeforeSunrise, 'sunrise');
    const to = fromSun(rule.minutesAfterSunset, 'sunset');
    return { label: rule.name, text: `From ${from} to ${to}. ${stated(rule)}` };
  });
}

function windowLines({ windowHours }: ClubRules, units: Units): RuleLine[] {
  const { morning, evening } = windowHours;
  const starts = fromSun(morning.startMinutesFromSunrise, 'sunrise');
  const ends = fromSun(evening.endMinutesFromSunset, 'sunset');
  return [
    { label: 'Morning', text: `From ${starts} to ${clock(morning.endClock, units)}` },
    { label: 'Evening', text: `From ${clock(evening.startClock, units)} to ${ends}` },
  ];
}

function seasonLines({ seasons }: ClubRules): RuleLine[] {
  if (seasons.length === 0) return [{ label: 'Seasons', text: 'No dates are set: every day is open.' }];
  return seasons.map((season) => {
    const days = `${formatDay(season.fromDay, true)} to ${formatDay(season.toDay, true)}`;
    const light = season.legalLightName ? `; legal light: ${season.legalLightName}` : '';
    return { label: season.name, text: `${days}: ${season.weapons.map(weaponWord).join(', ')}${light}` };
  });
}

function overdueText({ overdueSteps, overdueShowsPlace }: ClubRules): string {
  const { memberMinutes, officersMinutes, contactMinutes } = overdueSteps;
  const place = overdueShowsPlace ? "and sees the stand's position" : 'and sees no position';
  return `The member is told after ${plural(memberMinutes, 'minute')}, officers after ${officersMinutes}, the member's safety contact after ${contactMinutes} ${place}`;
}

function claimLines(rules: ClubRules): RuleLine[] {
  const { claimAhead, maxLiveClaims, holdMinutes } = rules;
  return [
    {
      label: 'Booking ahead',
      text:
        claimAhead.kind === 'days'
          ? `Up to ${plural(claimAhead.days, 'day')}`
          : `Only within ${plural(claimAhead.hours, 'hour')} of a window's start, one stand at a time`,
    },
    { label: 'Sits booked at once', text: maxLiveClaims === null ? 'No limit' : `At most ${maxLiveClaims} a member` },
    {
      label: 'Hold',
      text:
        holdMinutes === null
          ? 'A sit stays booked whether its member signs in or not'
          : `A sit lapses ${plural(holdMinutes, 'minute')} after its window began when nobody has signed in`,
    },
    {
      label: 'Walk-up',
      text: rules.walkUpSits
        ? 'A free stand may be taken after its window has begun'
        : 'No stand may be taken after its window has begun',
    },
    { label: 'Back by', text: `Overdue ${plural(rules.backByMinutes, 'minute')} after the back-by time` },
    { label: 'When overdue', text: overdueText(rules) },
  ];
}

function limitLines(rules: ClubRules): RuleLine[] {
  const { restDaysDefault, mostSitsPerMemberSeason, guestDaysPerSeason, guestsAtOnce } = rules;
  return [
    {
      label: 'Rest of a stand',
      text: `${plural(restDaysDefault, 'full day')} between sits, where a stand sets none of its own`,
    },
    {
      label: 'Sits a season',
      text: mostSitsPerMemberSeason === null ? 'No limit' : `At most ${mostSitsPerMemberSeason} a member`,
    },
    {
      label: 'Guest days',
      text: guestDaysPerSeason === null ? 'No limit' : `At most ${plural(guestDaysPerSeason, 'day')} a member a season`,
    },
    {
      label: 'Guests at once',
      text: guestsAtOnce === 0 ? 'A member may bring none' : `A member may bring ${plural(guestsAtOnce, 'guest')}`,
    },
  ];
}

function distanceLines({ spacingM, passThroughM }: ClubRules, units: Units): RuleLine[] {
  return [
    ...WEAPONS.map((weapon) => ({
      label: `Spacing, ${weaponWord(weapon)}`,
      text:
        spacingM[weapon] === 0
          ? 'None between occupied stands'
          : `At least ${distance(spacingM[weapon], units)} between occupied stands`,
    })),
    {
      label: 'Walking through',
      text:
        passThroughM === 0 ? 'No distance is set' : `Not within ${distance(passThroughM, units)} of an occupied stand`,
    },
  ];
}

function shareLines({ sightingsSeenBy, calendarPrivacy, orangeRule }: ClubRules): RuleLine[] {
  return [
    { label: 'Sightings are seen by', text: SIGHTINGS_WORDS[sightingsSeenBy] },
    { label: "The club's calendar shows", text: PRIVACY_WORDS[calendarPrivacy] },
    {
      label: 'Orange',
      text: orangeRule === null ? 'No rule is written down.' : `${orangeRule.text} ${stated(orangeRule)}`,
    },
  ];
}

function harvestLines({ harvestQuotas, stateHarvestRule }: ClubRules): RuleLine[] {
  const quotas = harvestQuotas.map((quota) => ({ label: 'Quota', text: `${quotaText(quota)}, a season` }));
  return [
    ...(quotas.length === 0 ? [{ label: 'Quota', text: 'None is set' }] : quotas),
    {
      label: "The state's rules for deer",
      text:
        stateHarvestRule === null ? 'None are written down.' : `${stateHarvestRule.text} ${stated(stateHarvestRule)}`,
    },
  ];
}

function workLines({ workRules }: ClubRules): RuleLine[] {
  return GROUND_WORKS.map((work) => {
    const rule = workRules[work];
    return { label: WORK_WORDS[work], text: rule === null ? WORK_RULE_WORDS.none : `${rule.text} ${stated(rule)}` };
  });
}

/** All rules of a club in words, in the club's units, in the order of the form. */
export function describeRules(rules: ClubRules, units: Units): RuleGroup[] {
  return [
    { title: 'Legal light', lines: legalLightLines(rules) },
    { title: 'Window hours', lines: windowLines(rules, units) },
    { title: 'Seasons', lines: seasonLines(rules) },
    { title: 'Booking', lines: claimLines(rules) },
    { title: 'Rest, limits and guests', lines: limitLines(rules) },
    { title: 'Distances', lines: distanceLines(rules, units) },
    { title: 'Who sees what, and orange', lines: shareLines(rules) },
    { title: 'Harvest', lines: harvestLines(rules) },
    { title: WORK_RULE_WORDS.group, lines: workLines(rules) },
  ];
}

export interface ChangedLine {
  label: string;
  before: string | null;
  after: string | null;
}

/** What differs between two lists of lines, by label; lines of one label are taken together. */
export function changedLines(before: RuleLine[], after: RuleLine[]): ChangedLine[] {
  const textOf = (lines: RuleLine[], label: string) => {
    const texts = lines.filter((line) => line.label === label).map((line) => line.text);
    return texts.length === 0 ? null : texts.join(' / ');
  };
  const labels = new Set([...before, ...after].map((line) => line.label));
  return [...labels]
    .map((label) => ({ label, before: textOf(before, label), after: textOf(after, label) }))
    .filter((line) => line.before !== line.after);
}
