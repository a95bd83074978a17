import type { LegalLightRule } from '@/core/booking/rules';
import { formatClock, formatClock12, formatDay } from '@/core/day-time';
import type { FeatureKind } from '@/core/ground-types';
import type { ApproachOption, Evidence } from '@/core/verdict-types';

/** A feature's kind in a sentence, for those who are not told its name. */
export const FEATURE_WORDS: Record<FeatureKind, string> = {
  bedding: 'a bedding area',
  food_plot: 'a food plot',
  crop: 'a crop field',
  mast: 'mast trees',
  water: 'water',
  scrape: 'a scrape',
  rub_line: 'a rub line',
  travel_line: 'a travel line',
  crossing: 'a crossing',
  sanctuary: 'a sanctuary',
};

export const ENTRY_WORDS: Record<ApproachOption['entry'], string> = {
  before_light: 'in before light',
  after_daybreak_30: 'in half an hour after daybreak',
  after_daybreak_60: 'in an hour after daybreak',
  midday: 'in around midday',
  afternoon: 'in for the afternoon',
};

/** What a reason rests on. */
export const EVIDENCE_WORDS: Record<Evidence, string> = {
  standard: 'published formula',
  study: 'field study',
  practice: "hunters' practice",
  'club log': "the club's log",
  'our choice': 'our own choice',
};

export interface ClubClock {
  zone: string;
  units: 'us' | 'metric';
}

/** A time as the club reads it: 12-hour clocks go with US units. */
export function clockText(at: number, club: ClubClock): string {
  return club.units === 'us' ? formatClock12(at, club.zone) : formatClock(at, club.zone);
}

/** As short as it can be said inside a window, where morning and evening are plain: '6:05', '10'. */
export function shortClock(at: number, club: ClubClock): string {
  if (club.units === 'metric') return formatClock(at, club.zone);
  return formatClock12(at, club.zone)
    .replace(/ [AP]M$/, '')
    .replace(/:00$/, '');
}

/** Points of sit score with their sign: '+6', '−12', '0'. */
export function pointsText(change: number): string {
  const points = Math.round(Math.abs(change));
  if (points === 0) return '0';
  return `${change < 0 ? '−' : '+'}${points}`;
}

function minutesFrom(minutes: number, event: string, after: boolean): string {
  if (minutes === 0) return event;
  const side = after === minutes > 0 ? 'after' : 'before';
  return `${Math.abs(minutes)} min ${side} ${event}`;
}

/** The club's rule with its source and date. The product itself declares no time legal. */
export function legalLightText(rule: LegalLightRule): string {
  const from = minutesFrom(rule.minutesBeforeSunrise, 'sunrise', false);
  const until = minutesFrom(rule.minutesAfterSunset, 'sunset', true);
  return `Club rule: ${from} to ${until} (${rule.source}, ${formatDay(rule.statedOn, true)}). State law decides.`;
}

/** 'in 3 days' is no use beside a rule: the day itself. */
export function endsText(endsOn: string | null): string | null {
  return endsOn === null ? null : `Open again ${formatDay(endsOn)}`;
}

export function ageText(ms: number): string {
  const minutes = Math.round(ms / 60_000);
  if (minutes < 1) return 'just now';
  if (minutes < 90) return `${minutes} min ago`;
  const hours = Math.round(minutes / 60);
  return hours < 48 ? `${hours} h ago` : `${Math.round(hours / 24)} days ago`;
}

export function minutesText(seconds: number): string {
  const minutes = Math.max(1, Math.round(seconds / 60));
  return minutes < 90 ? `${minutes} min` : `${Math.floor(minutes / 60)} h ${minutes % 60} min`;
}
