import { huntingYear } from '@/core/booking/hunting-year';
import { dayOf } from '@/core/day-time';
import { can } from '@/core/permissions';
import { isOwnSit } from '@/features/logs/log-access';
import { type LoggableSit, listEnded } from '@/features/logs/logs-data';
import { maySeeSightings } from '@/features/logs/see-sightings';
import type { ClubScope } from '@/server/scope';
import { choosePeriod, type Period, type PeriodChoice } from './choose-period';
import { findSitDays, lastSatBefore, listEverybody, listEveryStand, listSitFacts, type SitFacts } from './report-data';
import type { ReportAsk } from './report-schema';

export type ReportSit = LoggableSit &
  Omit<SitFacts, 'signedIn'> & {
    signedIn: boolean;
    /** On whose count it goes: a guest's is on that of the member who answers for them. */
    countsOn: string;
    hasLog: boolean;
  };
export type ReportStand = Awaited<ReturnType<typeof listEveryStand>>[number];

/** What the parts of a report are made of, read once. */
export interface ReportRows {
  period: Period;
  choices: PeriodChoice[];
  today: string;
  /** The hunting year in which the period ends: quotas are counted over it. */
  year: { fromDay: string; toDay: string };
  /** The club's rule keeps others' logs from this reader: `log` is null where it is kept, `hasLog` says that there is one. */
  kept: boolean;
  /** Sits that have ended, the latest first. */
  sits: ReportSit[];
  /** In use, or sat in the period, by name. */
  stands: ReportStand[];
  names: Map<string, string>;
  /** Members of the club now on whose count sits, deer and work go: neither guests nor landowners. */
  hunters: string[];
  /** The last day each stand was sat before the period. */
  before: Map<string, string>;
}

export async function loadRows(scope: ClubScope, ask: ReportAsk, now: number): Promise<ReportRows> {
  const { club, member } = scope;
  const today = dayOf(now, club.zone);
  const { period, choices } = choosePeriod(ask, {
    today,
    seasons: club.rules.seasons,
    ...(await findSitDays(scope, now)),
  });
  const [ended, facts, stands, people, before] = await Promise.all([
    listEnded(scope, { fromDay: period.fromDay, toDay: period.toDay, now, own: false }),
    listSitFacts(scope, period, now),
    listEveryStand(scope),
    listEverybody(scope),
    lastSatBefore(scope, period.fromDay, now),
  ]);
  const kept = !maySeeSightings(member.role, club.rules, today, period.toDay);
  const factsOf = new Map(facts.map((row) => [row.id, row]));
  const sits = ended.map((sit): ReportSit => {
    const { bookedBy, bookedAt, score, windFromDeg, signedIn } = factsOf.get(sit.id) ?? NO_FACTS;
    const countsOn = sit.memberRole === 'guest' && sit.sponsorId !== null ? sit.sponsorId : sit.memberId;
    const log = kept && !isOwnSit(scope, sit) ? null : sit.log;
    const own = { countsOn, log, hasLog: sit.log !== null, signedIn: Number(signedIn) === 1 };
    return { ...sit, bookedBy, bookedAt, score, windFromDeg, ...own };
  });
  const sat = new Set(sits.map(({ standId }) => standId));
  return {
    period,
    choices,
    today,
    year: huntingYear(period.toDay),
    kept,
    sits,
    stands: stands.filter(({ id, removedAt }) => removedAt === null || sat.has(id)),
    names: new Map(people.map(({ id, name }) => [id, name])),
    hunters: people.filter(({ role, removedAt }) => removedAt === null && can(role, 'log.write')).map(({ id }) => id),
    before,
  };
}

/** Of a sit that ended between the two readings: nothing is known yet. */
const NO_FACTS = { bookedBy: '', bookedAt: 0, score: null, windFromDeg: null, signedIn: 0 };
