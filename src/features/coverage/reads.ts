import type { WindowName } from '@/core/condition-types';
import { type Coverage, coveredShare, coverWinds } from '@/core/coverage/cover-winds';
import { dayOf } from '@/core/day-time';
import { cropYearOf } from '@/core/map-layers';
import { SECTOR_NAMES } from '@/core/sectors';
import { loadGround } from '@/features/ground/data';
import { featuresInYear } from '@/features/ground/features-in-year';
import { groundToCore } from '@/features/ground/to-core';
import type { ClubScope } from '@/server/scope';
import { loadSeasonHours } from './load-season-hours';
import { type PackedWinds, packWinds } from './pack-winds';
import { windowsOf } from './usual-winds';
import { COVERAGE_WORDS } from './words';

export interface PointShare {
  name: string;
  /** Share of the hours with a direction, and of those the shares covered and added by a trial; 0-1. */
  share: number;
  covered: number;
  added: number;
}

export interface WindowCoverage {
  window: WindowName;
  hours: number;
  calmShare: number;
  covered: number;
  points: PointShare[];
  months: { month: number; hours: number; covered: number | null; uncovered: string }[];
}

export interface CoverageView {
  source: string;
  fromDay: string | null;
  toDay: string | null;
  /** Why there are no hours. */
  error: string | null;
  windows: WindowCoverage[];
  stands: { id: string; name: string; morning: number; evening: number; share: number; alone: number }[];
  /** Every hour with a direction, for a trial to be held against. */
  winds: PackedWinds;
}

const sum = (list: number[]) => list.reduce((a, b) => a + b, 0);

/** The commonest winds of a cell that nobody covers, for people. */
function uncoveredText(blew: number[], covered: number[]): string {
  const open = blew.map((n, i) => ({ i, left: n - (covered[i] ?? 0) })).filter(({ left }) => left > 0);
  const worst = open.sort((a, b) => b.left - a.left).slice(0, 3);
  return worst.map(({ i }) => SECTOR_NAMES[i] ?? '').join(', ') || COVERAGE_WORDS.noneUncovered;
}

function windowView({ cells }: Coverage, window: WindowName): WindowCoverage[] {
  const season = cells.find((cell) => cell.window === window && cell.month === null);
  if (!season || season.hours === 0) return [];
  const directed = sum(season.blew);
  const part = (n: number | undefined) => (directed > 0 ? (n ?? 0) / directed : 0);
  return [
    {
      window,
      hours: season.hours,
      calmShare: season.noDirection / season.hours,
      covered: coveredShare(season) ?? 0,
      points: SECTOR_NAMES.map((name, i) => ({
        name,
        share: part(season.blew[i]),
        covered: part(season.covered[i]),
        added: 0,
      })),
      months: cells.flatMap((cell) => {
        if (cell.window !== window || cell.month === null) return [];
        const { month, hours, blew, covered } = cell;
        return [{ month, hours, covered: coveredShare(cell), uncovered: uncoveredText(blew, covered) }];
      }),
    },
  ];
}

/** A season of hours held against the good winds of a club's stands. */
export async function readCoverage(scope: ClubScope, now: number): Promise<CoverageView> {
  const { club } = scope;
  const season = await loadSeasonHours(scope, now);
  const rows = await loadGround(scope);
  const features = featuresInYear(rows.features, cropYearOf(dayOf(now, club.zone)));
  const core = groundToCore(club, { ...rows, features });
  const coverage = coverWinds({ stands: core.stands, hours: season.hours, windows: windowsOf(season, club) });
  const all = coverage.winds.length;
  return {
    source: season.source,
    fromDay: season.fromDay,
    toDay: season.toDay,
    error: season.error,
    windows: [...windowView(coverage, 'morning'), ...windowView(coverage, 'evening')],
    stands: coverage.stands
      .map(({ standId, name, hours, alone }) => ({
        id: standId,
        name,
        ...hours,
        share: all > 0 ? (hours.morning + hours.evening) / all : 0,
        alone,
      }))
      .sort((a, b) => b.share - a.share || a.name.localeCompare(b.name)),
    winds: packWinds(coverage.winds),
  };
}
