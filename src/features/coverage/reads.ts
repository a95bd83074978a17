import { type Coverage, coveredShares, coverWinds } from '@/core/coverage/cover-winds';
import { dayOf } from '@/core/day-time';
import { toLocal } from '@/core/geometry';
import { cropYearOf } from '@/core/map-layers';
import { SECTOR_NAMES, sectorName } from '@/core/sectors';
import { DEFAULT_SETTINGS } from '@/core/settings';
import { judgeUsual } from '@/core/setup-check/weigh-finding';
import type { GoodWindArc, ScoredStand, Suitability, WindowName } from '@/core/types';
import { ydToM } from '@/core/units';
import { allDayWindows } from '@/core/windows';
import { wordFor } from '@/core/word';
import { loadGround } from '@/features/ground/data';
import { featuresInYear } from '@/features/ground/features-in-year';
import { type CoreGround, groundToCore } from '@/features/ground/to-core';
import type { ClubScope } from '@/server/scope';
import { type CoverageAsk, trialArcs } from './coverage-schema';
import { loadSeasonHours } from './load-season-hours';
import { sharesOf, windowsOf } from './usual-winds';

export interface PointShare {
  name: string;
  /** Share of the hours with a direction, and of those the shares covered and added by the trial; 0-1. */
  share: number;
  covered: number;
  added: number;
}

export interface WindowCoverage {
  window: WindowName;
  hours: number;
  calmShare: number;
  covered: number;
  added: number;
  points: PointShare[];
  months: { month: number; hours: number; covered: number | null; added: number; uncovered: string }[];
}

export interface CoverageView {
  source: string;
  fromDay: string | null;
  toDay: string | null;
  /** Why there are no hours. */
  error: string | null;
  windows: WindowCoverage[];
  stands: {
    id: string;
    name: string;
    trial: boolean;
    morning: number;
    evening: number;
    share: number;
    alone: number;
  }[];
  standCount: number;
  trial: { problem: string | null; placed: string | null };
}

const sum = (list: number[]) => list.reduce((a, b) => a + b, 0);

/** The commonest winds of a cell that nobody covers, for people. */
function uncoveredText(blew: number[], covered: number[], added: number[]): string {
  const open = blew
    .map((n, i) => ({ i, left: n - (covered[i] ?? 0) - (added[i] ?? 0) }))
    .filter(({ left }) => left > 0);
  const worst = open.sort((a, b) => b.left - a.left).slice(0, 3);
  return worst.map(({ i }) => SECTOR_NAMES[i] ?? '').join(', ') || 'none';
}

function windowView({ cells }: Coverage, window: WindowName): WindowCoverage[] {
  const season = cells.find((cell) => cell.window === window && cell.month === null);
  if (!season || season.hours === 0) return [];
  const directed = sum(season.blew);
  const shares = coveredShares(season);
  const part = (n: number | undefined) => (directed > 0 ? (n ?? 0) / directed : 0);
  return [
    {
      window,
      hours: season.hours,
      calmShare: season.noDirection / season.hours,
      covered: shares?.covered ?? 0,
      added: shares?.added ?? 0,
      points: SECTOR_NAMES.map((name, i) => ({
        name,
        share: part(season.blew[i]),
        covered: part(season.covered[i]),
        added: part(season.trialOnly[i]),
      })),
      months: cells.flatMap((cell) => {
        if (cell.window !== window || cell.month === null) return [];
        const own = coveredShares(cell);
        const uncovered = uncoveredText(cell.blew, cell.covered, cell.trialOnly);
        return [
          { month: cell.month, hours: cell.hours, covered: own?.covered ?? null, added: own?.added ?? 0, uncovered },
        ];
      }),
    },
  ];
}

function trialStand(ask: CoverageAsk, arcs: GoodWindArc[], scope: ClubScope): ScoredStand {
  const rated = (window: WindowName): Suitability =>
    ask.window === 'both' || ask.window === window ? 'usable' : 'avoid';
  const { lat, lon } = scope.club;
  return {
    id: 'trial',
    name: 'Trial',
    kind: 'hang_on',
    at: toLocal(scope.club, { lat: ask.lat ?? lat, lon: ask.lon ?? lon }),
    seatHeightM: 5,
    facingDeg: null,
    shotSide: 'either',
    shotRangeM: { bow: ydToM(30) },
    shelter: 'open_wood',
    arcs,
    suitability: { morning: rated('morning'), evening: rated('evening') },
    restDays: 0,
    drainBearingDeg: null,
    slopePercent: null,
  };
}

/** What the scoring core says of the trial where it is placed, on the commonest of its winds. */
function placedText(trial: ScoredStand, core: CoreGround, coverage: Coverage, scope: ClubScope, now: number) {
  const { club } = scope;
  const place = { lat: club.lat, lon: club.lon, zone: club.zone };
  const windows = allDayWindows(dayOf(now, club.zone), club.rules, place);
  const quiet = { events: [], sightings: [], settings: DEFAULT_SETTINGS, weapon: null, units: club.units };
  const found = judgeUsual(trial, { place, ...core, approaches: [], ...quiet }, windows, sharesOf(coverage));
  if (!found) return null;
  const score = Math.round(found.quiet);
  const when = `${sectorName(found.windFromDeg)} ${found.window}s`;
  return `Where it stands, its seat would be ${wordFor(found.quiet)} on ${when}: quiet ${score}, promise ${Math.round(found.promise)}, before any way in is drawn.`;
}

/** A season of hours held against the good winds of a club's stands, and of a trial stand. */
export async function readCoverage(scope: ClubScope, ask: CoverageAsk, now: number): Promise<CoverageView> {
  const { club } = scope;
  const season = await loadSeasonHours(scope, now);
  const rows = await loadGround(scope);
  const features = featuresInYear(rows.features, cropYearOf(dayOf(now, club.zone)));
  const core = groundToCore(club, { ...rows, features });
  const read = trialArcs(ask);
  const trial = read?.ok && read.arcs.length > 0 ? trialStand(ask, read.arcs, scope) : null;
  const coverage = coverWinds({ stands: core.stands, hours: season.hours, windows: windowsOf(season, club), trial });
  const windows = [...windowView(coverage, 'morning'), ...windowView(coverage, 'evening')];
  const all = sum(coverage.cells.filter((c) => c.month === null).map((c) => sum(c.blew)));
  const placed = trial && ask.lat !== undefined && ask.lon !== undefined;
  return {
    source: season.source,
    fromDay: season.fromDay,
    toDay: season.toDay,
    error: season.error,
    windows,
    stands: coverage.stands
      .map(({ standId, name, trial: isTrial, hours, alone }) => ({
        id: standId,
        name,
        trial: isTrial,
        ...hours,
        share: all > 0 ? (hours.morning + hours.evening) / all : 0,
        alone,
      }))
      .sort((a, b) => b.share - a.share || a.name.localeCompare(b.name)),
    standCount: core.stands.length,
    trial: {
      problem: read && !read.ok ? read.message : null,
      placed: placed ? placedText(trial, core, coverage, scope, now) : null,
    },
  };
}
