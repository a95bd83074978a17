import type { Permission } from '@/core/permissions';
import { type Tx, write } from '@/db/client';
import { AppError } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import type { DrawingAnswer, DrawingChange, SetChange } from './drawing-schema';
import { loadDrawn } from './drawn-rows';
import { findConflicts } from './find-conflicts';
import { removeDrawn } from './remove-drawn';
import { setApproach } from './set-approach';
import { type Saving, setFeature, setItem, setParking, setStand } from './set-drawn';
import { MAP_ERRORS } from './words/errors';

const NEEDS: Record<DrawingChange['kind'], Permission> = {
  stand: 'stands.write',
  parking: 'features.write',
  approach: 'approaches.write',
  feature: 'features.write',
  item: 'features.write',
};

function refuseUnallowed(scope: ClubScope, changes: DrawingChange[]): void {
  if (changes.every(({ kind }) => scope.can(NEEDS[kind]))) return;
  throw new AppError('forbidden', MAP_ERRORS.notAllowed(scope.club.name));
}

function refuseTwice(changes: DrawingChange[]): void {
  if (new Set(changes.map(({ id }) => id)).size === changes.length) return;
  throw new AppError('invalid', MAP_ERRORS.changedTwice);
}

function set(saving: Saving, change: SetChange): Promise<void> {
  switch (change.kind) {
    case 'stand':
      return setStand(saving, change);
    case 'parking':
      return setParking(saving, change);
    case 'approach':
      return setApproach(saving, change);
    case 'feature':
      return setFeature(saving, change);
    case 'item':
      return setItem(saving, change);
  }
}

/** Approaches come last of what is set, for they name stands and parking places; a parking place goes when none begins there. */
const SET_ORDER = ['parking', 'stand', 'feature', 'item', 'approach'] as const;
const REMOVE_FIRST = ['approach', 'stand', 'feature', 'item'] as const;

/**
 * Saves what was drawn, all of it or none. Where something was saved by others since it was opened here, nothing is
 * written and the answer names each such thing: the drawer chooses, and saves again.
 */
export function saveDrawing(
  scope: ClubScope,
  input: { changes: DrawingChange[] },
  now: number,
): Promise<DrawingAnswer> {
  const { changes } = input;
  refuseUnallowed(scope, changes);
  refuseTwice(changes);
  return write(async (tx: Tx): Promise<DrawingAnswer> => {
    const rows = await loadDrawn(scope, tx);
    const conflicts = await findConflicts(scope, tx, rows, changes);
    if (conflicts.length > 0) return { saved: false, conflicts };
    const removed = new Set(changes.flatMap((change) => (change.op === 'remove' ? [change.id] : [])));
    const saving: Saving = { scope, tx, now, rows, removed, ids: {} };
    const removes = changes.filter((change) => change.op === 'remove');
    const sets = changes.filter((change) => change.op === 'set');
    for (const kind of REMOVE_FIRST) {
      for (const change of removes) if (change.kind === kind) await removeDrawn(saving, change);
    }
    for (const kind of SET_ORDER) {
      for (const change of sets) if (change.kind === kind) await set(saving, change);
    }
    for (const change of removes) if (change.kind === 'parking') await removeDrawn(saving, change);
    return { saved: true, ids: saving.ids, count: changes.length };
  });
}
