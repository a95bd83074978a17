import type { Tx } from '@/db/client';
import { lastChangedBy } from '@/features/ground/people-data';
import type { ClubScope } from '@/server/scope';
import type { DrawingChange, DrawingConflict } from './drawing-schema';
import type { DrawnRows } from './drawn-rows';
import { MAP_ERRORS } from './words/errors';
import { LAYER_WORDS } from './words/things';

function nameOfRow(row: DrawnRows[keyof DrawnRows][number]): string {
  return row.name || ('layer' in row ? LAYER_WORDS[row.layer] : '');
}

const TABLES = {
  stand: 'stands',
  parking: 'parkings',
  approach: 'approaches',
  feature: 'features',
  item: 'items',
} as const satisfies Record<DrawingChange['kind'], keyof DrawnRows>;

/** Things that are not as they were when they were opened for drawing. Removing what is already gone is no conflict. */
export async function findConflicts(
  scope: ClubScope,
  tx: Tx,
  rows: DrawnRows,
  changes: DrawingChange[],
): Promise<DrawingConflict[]> {
  const conflicts: DrawingConflict[] = [];
  for (const change of changes) {
    const { id, kind, version } = change;
    if (version === 0) continue;
    const row = rows[TABLES[kind]].find((one) => one.id === id);
    if (row?.version === version || (!row && change.op === 'remove')) continue;
    const who = (await lastChangedBy(scope, id, tx)) ?? MAP_ERRORS.somebody;
    const name = row ? nameOfRow(row) : change.op === 'set' ? change.name : '';
    conflicts.push({ id, kind, name, who, gone: !row });
  }
  return conflicts;
}
