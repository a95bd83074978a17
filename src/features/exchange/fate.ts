import { formatDistance, type Units } from '@/core/units';
import { kindOf } from './kind-values';
import type { ReviewRow, Twin } from './review';

export type Fate = 'ready' | 'choose' | 'twin' | 'cannot';

/** Of what lies there already, what this kind would stand for a second time. A row without a kind yet clashes with all. */
export function twinsAs(row: ReviewRow, kind: string): Twin[] {
  const family = kindOf(kind)?.kind;
  return row.twins.filter((twin) => family === undefined || twin.family === '' || twin.family === family);
}

export function fateOf(row: ReviewRow, kind: string): Fate {
  if (row.problem !== null) return 'cannot';
  if (kind === '') return 'choose';
  return twinsAs(row, kind).length > 0 ? 'twin' : 'ready';
}

/** One sentence for the row's fate. */
export function fateText(row: ReviewRow, kind: string, units: Units): string {
  const fate = fateOf(row, kind);
  if (fate === 'cannot') return `Cannot be taken: ${row.problem}`;
  const [twin] = twinsAs(row, kind);
  const near = twin
    ? `${twin.row === null ? `${twin.name} is there already` : `Row ${twin.row}, ${twin.name}, is the same`}, ${formatDistance(twin.apartM, units)} away.`
    : '';
  if (fate === 'choose') return ['Choose what it is.', near].filter(Boolean).join(' ');
  return fate === 'twin' ? near : 'Will be added.';
}
