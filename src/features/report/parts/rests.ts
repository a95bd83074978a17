import { type BrokenRest, type RestRecord, restsOf } from '@/core/report/rests';
import type { ClubScope } from '@/server/scope';
import type { ReportRows, ReportSit } from '../load-rows';
import type { UsePart } from './use';

/** How a sit came to lie in a rest, as far as the record says. */
export type HowBooked = 'by_another' | 'at_the_gate' | 'ahead';

export interface BrokenLine extends BrokenRest {
  standId: string;
  name: string;
  /** Officers see who sat and how it was booked; null to others. */
  who: string | null;
  how: HowBooked[] | null;
}

export interface RestRow extends Omit<RestRecord, 'broken'> {
  standId: string;
  name: string;
  restDays: number;
}

export interface RestsPart {
  times: number;
  kept: number;
  /** Stands that were sat, those whose rest was broken most often first. */
  rows: RestRow[];
  /** The latest first. */
  broken: BrokenLine[];
}

function howBooked(sit: ReportSit): HowBooked {
  if (sit.bookedBy !== sit.memberId) return 'by_another';
  return sit.bookedAt >= sit.startAt ? 'at_the_gate' : 'ahead';
}

export function readRests(scope: ClubScope, rows: ReportRows, use: UsePart): RestsPart {
  const { rules } = scope.club;
  const officer = scope.can('report.read_all');
  const stands = new Map(rows.stands.map((stand) => [stand.id, stand]));
  const found = use.rows
    .filter(({ sits }) => sits > 0)
    .map(({ standId, name, days }) => {
      const restDays = stands.get(standId)?.restDays ?? rules.restDaysDefault;
      const { broken, ...record } = restsOf({ restDays, sitDays: days, before: rows.before.get(standId) ?? null });
      return { row: { standId, name, restDays, ...record }, broken };
    });
  const brokenLine = ({ standId, name }: RestRow, rest: BrokenRest): BrokenLine => {
    const sits = rows.sits.filter((sit) => sit.standId === standId && sit.day === rest.day);
    const who = officer ? sits.map(({ memberName }) => memberName).join(', ') : null;
    return { standId, name, ...rest, who, how: officer ? [...new Set(sits.map(howBooked))] : null };
  };
  const total = (pick: (row: RestRow) => number) => found.reduce((sum, { row }) => sum + pick(row), 0);
  return {
    times: total(({ times }) => times),
    kept: total(({ kept }) => kept),
    rows: found
      .map(({ row }) => row)
      .sort((a, b) => b.times - b.kept - (a.times - a.kept) || a.name.localeCompare(b.name)),
    broken: found
      .flatMap(({ row, broken }) => broken.map((rest) => brokenLine(row, rest)))
      .sort((a, b) => b.day.localeCompare(a.day)),
  };
}
