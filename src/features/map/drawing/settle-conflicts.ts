import type { DrawingChange, DrawingConflict } from '../drawing-schema';
import type { MapThing } from '../thing';
import { SETTLE_WORDS } from '../words/drawing';

/** both: what is stored stays, and what was drawn is added beside it under another name. */
export type ConflictChoice = 'both' | 'theirs' | 'mine';

const MARK = SETTLE_WORDS.beside;

function freeName(name: string, taken: ReadonlySet<string>): string {
  for (let n = 1; ; n++) {
    const tried = `${name.slice(0, 40)}${n === 1 ? MARK : `${MARK} ${n}`}`;
    if (!taken.has(tried.toLowerCase())) return tried;
  }
}

/**
 * Changes as they may be saved once the drawer has chosen for each conflict. `stored` is the map as it is now, `drawn` the
 * things as drawn: a copy needs the whole of its geometry, which a change may have left out.
 */
export function settleConflicts(
  changes: readonly DrawingChange[],
  conflicts: readonly DrawingConflict[],
  choices: ReadonlyMap<string, ConflictChoice>,
  maps: { stored: readonly MapThing[]; drawn: readonly MapThing[]; newId: () => string },
): DrawingChange[] {
  const byId = new Map(conflicts.map((conflict) => [conflict.id, conflict]));
  const taken = new Set([...maps.stored, ...maps.drawn].map((thing) => thing.name.toLowerCase()));
  return changes.flatMap((change): DrawingChange[] => {
    const conflict = byId.get(change.id);
    if (!conflict) return [change];
    const choice = choices.get(change.id) ?? 'both';
    const stored = maps.stored.find((thing) => thing.id === change.id);
    if (choice === 'theirs') return [];
    if (change.op === 'remove') return choice === 'mine' && stored ? [{ ...change, version: stored.version }] : [];
    const geometry = change.geometry ?? maps.drawn.find((thing) => thing.id === change.id)?.geometry;
    const whole = { ...change, ...(geometry ? { geometry } : {}) } as typeof change;
    if (stored && choice === 'mine') return [{ ...whole, version: stored.version }];
    const name = stored && change.name ? freeName(change.name, taken) : change.name;
    taken.add(name.toLowerCase());
    return [{ ...whole, id: maps.newId(), version: 0, name }];
  });
}
