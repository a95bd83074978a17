import { dayOf } from '@/core/day-time';
import { type Indices, indicesBy, indicesOf, type SitCount } from '@/core/indices';
import { SIT_WINDOW_WORDS, SIT_WINDOWS } from '@/features/bookings/words/sits';
import type { ClubScope } from '@/server/scope';
import { findFirstLoggedDay, type LoggedSit, listEnded, listLogged } from './logs-data';
import { type LogLine, logLine } from './reads';
import { type SeasonYear, seasonYear, seasonYears, yearOf } from './season-years';
import { maySeeSightings } from './see-sightings';
import type { SightingsAsk } from './sightings-schema';
import { monthText } from './words/sightings';

const HOUR_MS = 3_600_000;

export interface IndexGroup {
  key: string;
  label: string;
  indices: Indices;
}

export interface Sightings {
  year: SeasonYear;
  years: SeasonYear[];
  /** Whose sits are counted. */
  whose: 'club' | 'own';
  /** The club's rule keeps others' sightings from this reader. */
  kept: boolean;
  total: Indices;
  /** Sits of the season that ended without a log. */
  unlogged: number;
  byStand: IndexGroup[];
  byWindow: IndexGroup[];
  byMonth: IndexGroup[];
  /** The latest first. */
  logs: LogLine[];
}

export type CountedSit = LoggedSit & SitCount;

/** A logged sit as the indices count it. */
export function countOf(sit: LoggedSit): CountedSit {
  const { log } = sit;
  return {
    ...sit,
    hours: Math.max(0, log.endAt - log.startAt) / HOUR_MS,
    bucks: log.antleredBucks,
    does: log.does,
    fawns: log.fawns,
    unknown: log.unknown,
    bumped: log.bumpedIn + log.bumpedSitting + log.bumpedOut,
  };
}

const rateOf = ({ indices }: IndexGroup) => (indices.perHour.all.known ? indices.perHour.all.value : -1);

export function standGroups(sits: CountedSit[]): IndexGroup[] {
  const names = new Map(sits.map((sit) => [sit.standId, sit.standName]));
  return [...indicesBy(sits, (sit) => sit.standId)]
    .map(([key, indices]) => ({ key, label: names.get(key) ?? '', indices }))
    .sort((a, b) => rateOf(b) - rateOf(a) || a.label.localeCompare(b.label));
}

function windowGroups(sits: CountedSit[]): IndexGroup[] {
  const groups = indicesBy(sits, (sit) => sit.windows);
  return SIT_WINDOWS.flatMap((key) => {
    const indices = groups.get(key);
    return indices ? [{ key, label: SIT_WINDOW_WORDS[key], indices }] : [];
  });
}

export function monthGroups(sits: CountedSit[]): IndexGroup[] {
  return [...indicesBy(sits, (sit) => sit.day.slice(0, 7))]
    .sort(([a], [b]) => a.localeCompare(b))
    .map(([key, indices]) => ({
      key,
      label: monthText(key),
      indices,
    }));
}

/** Sits with a log that this reader may see, and what else the tables of a season say. */
async function loadSightings(scope: ClubScope, ask: SightingsAsk, now: number) {
  const { club, member } = scope;
  const today = dayOf(now, club.zone);
  const year = seasonYear(ask.year ?? yearOf(today));
  const kept = !maySeeSightings(member.role, club.rules, today, year.fromDay);
  const own = kept || ask.whose === 'own';
  const days = { fromDay: year.fromDay, toDay: year.toDay, own };
  const sits = (await listLogged(scope, days)).map(countOf);
  return { today, year, kept, own, sits, days };
}

export async function readSightings(scope: ClubScope, ask: SightingsAsk, now: number): Promise<Sightings> {
  const { today, year, kept, own, sits, days } = await loadSightings(scope, ask, now);
  const ended = await listEnded(scope, { ...days, now });
  const years = seasonYears(today, await findFirstLoggedDay(scope));
  return {
    year,
    years: years.some((one) => one.year === year.year) ? years : [...years, year],
    whose: own ? 'own' : 'club',
    kept,
    total: indicesOf(sits),
    unlogged: ended.filter((sit) => sit.log === null).length,
    byStand: standGroups(sits),
    byWindow: windowGroups(sits),
    byMonth: monthGroups(sits),
    logs: sits.map((sit) => logLine(scope.club, sit, sit.log)),
  };
}

/** The same sits one by one, for a file. */
export async function listSightings(scope: ClubScope, ask: SightingsAsk, now: number) {
  const { year, own, sits } = await loadSightings(scope, ask, now);
  return { year, own, sits };
}
