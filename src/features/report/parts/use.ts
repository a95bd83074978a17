import type { PressureEvent } from '@/core/condition-types';
import { addDays } from '@/core/day-time';
import { toLocal } from '@/core/geometry';
import { pressureSeries } from '@/core/report/pressure-series';
import { useOfStand } from '@/core/report/stand-use';
import { type Week, weeksBetween } from '@/core/report/weeks';
import { DEFAULT_SETTINGS } from '@/core/settings';
import { sitWindow } from '@/core/windows';
import { windowsHeld } from '@/features/bookings/words/sits';
import { listSitEvents, listVisitEvents } from '@/features/sits/data';
import type { ClubScope } from '@/server/scope';
import type { ReportRows, ReportSit } from '../load-rows';

const DAY_MS = 86_400_000;
const { pressure: SETTINGS } = DEFAULT_SETTINGS;

export interface UseRow {
  standId: string;
  name: string;
  /** Taken out of use since. */
  gone: boolean;
  sits: number;
  mornings: number;
  evenings: number;
  /** Days sat, each once, in order. */
  days: string[];
  byWeek: number[];
  /** One value for each of the days. */
  pressure: number[];
  meanPressure: number;
  peakPressure: number;
  /** null: there was none. */
  peakDay: string | null;
}

export interface UsePart {
  /** From the first week with a sit to the last. */
  weeks: Week[];
  /** The days of those weeks, up to today; pressure is that found as the morning window begins. */
  days: string[];
  /** Every stand, the most used first. */
  rows: UseRow[];
}

function daysOf(weeks: readonly Week[], today: string): string[] {
  return weeks
    .flatMap(({ fromDay }) => Array.from({ length: 7 }, (_, n) => addDays(fromDay, n)))
    .filter((day) => day <= today);
}

/** What people did near the stands, from so long before that nothing earlier is felt. Bumps in logs kept from a reader are left out. */
async function loadPressure(scope: ClubScope, instants: number[], kept: boolean): Promise<PressureEvent[]> {
  const [first, last] = [instants[0], instants.at(-1)];
  if (first === undefined || last === undefined) return [];
  const span = { from: first - SETTINGS.forgetDays * DAY_MS, until: last };
  const [sits, visits] = await Promise.all([listSitEvents(scope, span), listVisitEvents(scope, span)]);
  return [
    ...sits.map(({ endAt: at, standId, bumped, ...place }) => ({
      at,
      kind: 'sit' as const,
      place: toLocal(scope.club, place),
      standId,
      bumped: kept ? 0 : Number(bumped),
    })),
    ...visits.map(({ at, kind, standId, bumped, ...place }) => ({
      at,
      kind,
      place: toLocal(scope.club, place),
      standId,
      bumped,
    })),
  ];
}

function groupByStand(sits: readonly ReportSit[]): Map<string, ReportSit[]> {
  const groups = new Map<string, ReportSit[]>();
  for (const sit of sits) {
    const own = groups.get(sit.standId);
    if (own) own.push(sit);
    else groups.set(sit.standId, [sit]);
  }
  return groups;
}

export async function readUse(scope: ClubScope, rows: ReportRows): Promise<UsePart> {
  const { club } = scope;
  const { sits, stands, today, kept } = rows;
  const [last, first] = [sits[0]?.day, sits.at(-1)?.day];
  const weeks = first && last ? weeksBetween(first, last) : [];
  const days = daysOf(weeks, today);
  const instants = days.map((day) => sitWindow(day, 'morning', club.rules, club).startAt);
  const events = await loadPressure(scope, instants, kept);
  const byStand = groupByStand(sits);
  return {
    weeks,
    days,
    rows: stands
      .map((stand): UseRow => {
        const own = (byStand.get(stand.id) ?? []).map((sit) => ({ ...sit, windows: windowsHeld(sit.windows) }));
        const pressure = pressureSeries(toLocal(club, stand), events, instants, SETTINGS);
        const peakPressure = Math.max(0, ...pressure);
        return {
          standId: stand.id,
          name: stand.name,
          gone: stand.removedAt !== null,
          ...useOfStand(own, weeks),
          pressure,
          meanPressure: pressure.length === 0 ? 0 : pressure.reduce((sum, one) => sum + one, 0) / pressure.length,
          peakPressure,
          peakDay: peakPressure > 0 ? (days[pressure.indexOf(peakPressure)] ?? null) : null,
        };
      })
      .sort((a, b) => b.sits - a.sits || a.name.localeCompare(b.name)),
  };
}
