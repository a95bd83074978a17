import type { ClubScope } from '@/server/scope';
import type { ReportRows } from '../load-rows';
import { sumHoursByKind } from '../report-data';

export interface HoursRow {
  memberId: string;
  name: string;
  onDays: number;
  forChores: number;
  total: number;
}

export interface HoursPart {
  onDays: number;
  forChores: number;
  total: number;
  /** Members of the club, those with none too, and former ones with some; the most hours first. */
  rows: HoursRow[];
}

export async function readHours(scope: ClubScope, { period, hunters, names }: ReportRows): Promise<HoursPart> {
  const sums = await sumHoursByKind(scope, period);
  const hoursOf = (rows: readonly { memberId: string | null; hours: number }[]) =>
    new Map(rows.flatMap(({ memberId, hours }) => (memberId === null ? [] : [[memberId, Number(hours)] as const])));
  const [onDays, forChores] = [hoursOf(sums.onDays), hoursOf(sums.forChores)];
  const rows = [...new Set([...hunters, ...onDays.keys(), ...forChores.keys()])]
    .map((memberId): HoursRow => {
      const [days, chores] = [onDays.get(memberId) ?? 0, forChores.get(memberId) ?? 0];
      return { memberId, name: names.get(memberId) ?? '', onDays: days, forChores: chores, total: days + chores };
    })
    .sort((a, b) => b.total - a.total || a.name.localeCompare(b.name));
  const total = (pick: (row: HoursRow) => number) => rows.reduce((sum, row) => sum + pick(row), 0);
  return {
    onDays: total((row) => row.onDays),
    forChores: total((row) => row.forChores),
    total: total((row) => row.total),
    rows,
  };
}
