import type { Season } from '@/core/booking/rules';
import { addDays, daysBetween } from '@/core/day-time';
import { type SeasonYear, seasonYear, seasonYears, yearOf } from '@/features/logs/season-years';
import type { ReportAsk } from './report-schema';
import { PERIOD_WORDS } from './words/period';

/** More days than a year and its odd weeks make no season. */
const MOST_DAYS = 400;

export interface Period {
  /** As it stands in the address: a year, or the id of a season. */
  season: string;
  label: string;
  fromDay: string;
  toDay: string;
  /** Days asked for by hand, as they stand in the address. */
  from?: string;
  to?: string;
  /** What of the question could not be met, for people. */
  problem: string | null;
}

export interface PeriodChoice {
  value: string;
  label: string;
}

interface Known {
  today: string;
  seasons: readonly Season[];
  /** First and last day on which a sit has ended; null: none has. */
  firstDay: string | null;
  lastDay: string | null;
}

type Span = Pick<Period, 'season' | 'label' | 'fromDay' | 'toDay'>;

const ofYear = ({ year, label, fromDay, toDay }: SeasonYear): Span => ({ season: String(year), label, fromDay, toDay });

const ofSeason = ({ id, name, fromDay, toDay }: Season): Span => ({
  season: id,
  label: PERIOD_WORDS.season(name, fromDay),
  fromDay,
  toDay,
});

/** The hunting year that is running, unless nobody has sat in it yet: then the last one with a sit. */
function usualYear({ today, lastDay }: Known): SeasonYear {
  return seasonYear(yearOf(lastDay !== null && lastDay < today ? lastDay : today));
}

/** The days a report is of, and what else may be chosen. */
export function choosePeriod(ask: ReportAsk, known: Known): { period: Period; choices: PeriodChoice[] } {
  const years = seasonYears(known.today, known.firstDay).map(ofYear);
  const seasons = known.seasons.filter(({ fromDay }) => fromDay <= known.today).map(ofSeason);
  const spans = [...years, ...seasons];
  const asked = ask.season ?? '';
  const year = /^20\d\d$/.test(asked) ? ofYear(seasonYear(Number(asked))) : undefined;
  const found = spans.find(({ season }) => season === asked) ?? year ?? ofYear(usualYear(known));
  const listed = spans.some(({ season }) => season === found.season) ? spans : [found, ...spans];
  return {
    period: cut(found, ask),
    choices: listed.map(({ season, label }) => ({ value: season, label })),
  };
}

function cut(span: Span, { from, to }: ReportAsk): Period {
  const whole = { ...span, problem: null };
  if (from === undefined && to === undefined) return whole;
  const fromDay = from ?? span.fromDay;
  const toDay = to ?? span.toDay;
  if (fromDay > toDay) return { ...whole, problem: PERIOD_WORDS.turnedRound };
  const days = { ...whole, ...(from && { from }), ...(to && { to }), label: PERIOD_WORDS.days(fromDay, toDay) };
  if (daysBetween(fromDay, toDay) < MOST_DAYS) return { ...days, fromDay, toDay };
  const last = addDays(fromDay, MOST_DAYS - 1);
  return {
    ...days,
    to: last,
    label: PERIOD_WORDS.days(fromDay, last),
    fromDay,
    toDay: last,
    problem: PERIOD_WORDS.tooLong(MOST_DAYS),
  };
}
