import { formatDistance, type Units } from '@/core/units';
import { kindOf } from './kind-values';
import type { ReviewRow, Twin } from './review';
import { FATE_SENTENCES } from './words/import';

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

function twinText(twin: Twin, units: Units): string {
  const away = formatDistance(twin.apartM, units);
  return twin.row === null ? FATE_SENTENCES.onMap(twin.name, away) : FATE_SENTENCES.inFile(twin.row, twin.name, away);
}

/** One sentence for the row's fate. */
export function fateText(row: ReviewRow, kind: string, units: Units): string {
  const fate = fateOf(row, kind);
  if (fate === 'cannot') return FATE_SENTENCES.cannot(row.problem ?? '');
  const [twin] = twinsAs(row, kind);
  const near = twin && twinText(twin, units);
  if (fate === 'choose') return near ? FATE_SENTENCES.chooseNear(near) : FATE_SENTENCES.choose;
  return near ?? FATE_SENTENCES.ready;
}
