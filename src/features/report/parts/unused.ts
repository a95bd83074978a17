import { addDays, dayOf, daysBetween } from '@/core/day-time';
import { type Unused, unusedOf } from '@/core/report/stand-use';
import { listClosures } from '@/features/ground/data';
import type { ClubScope } from '@/server/scope';
import type { ReportRows } from '../load-rows';
import type { Days } from '../report-data';
import type { UsePart } from './use';

export interface UnusedLine {
  standId: string;
  name: string;
  what: Unused;
  sits: number;
  /** Before or in the period; null: no sit is on record. */
  lastDay: string | null;
  /** Days of the period, up to today, on which the stand was closed. */
  closedDays: number;
  /** The day it was drawn, when that lies in the period. */
  drawnOn: string | null;
}

function daysOf({ fromDay, toDay }: Days): string[] {
  return Array.from({ length: daysBetween(fromDay, toDay) + 1 }, (_, n) => addDays(fromDay, n));
}

const ORDER: readonly Unused[] = ['never', 'mornings_only', 'evenings_only'];

/** Stands in use that nobody sat, or only in one of the windows they are good for. */
export async function readUnused(scope: ClubScope, rows: ReportRows, use: UsePart): Promise<UnusedLine[]> {
  const { period, today, before } = rows;
  const past = daysOf(period).filter((day) => day <= today);
  const closures = await listClosures(scope);
  const usage = new Map(use.rows.map((row) => [row.standId, row]));
  const closedDays = (standId: string) => {
    const own = closures.filter((closure) => closure.standId === standId);
    return past.filter((day) => own.some(({ fromDay, toDay }) => fromDay <= day && (toDay ?? day) >= day)).length;
  };
  return rows.stands
    .flatMap((stand): UnusedLine[] => {
      const used = usage.get(stand.id);
      const what = used && stand.removedAt === null ? unusedOf(used, stand) : null;
      if (!used || !what) return [];
      const drawnOn = dayOf(stand.createdAt, scope.club.zone);
      return [
        {
          standId: stand.id,
          name: stand.name,
          what,
          sits: used.sits,
          lastDay: used.days.at(-1) ?? before.get(stand.id) ?? null,
          closedDays: closedDays(stand.id),
          drawnOn: drawnOn > period.fromDay && drawnOn <= period.toDay ? drawnOn : null,
        },
      ];
    })
    .sort((a, b) => ORDER.indexOf(a.what) - ORDER.indexOf(b.what) || a.name.localeCompare(b.name));
}
