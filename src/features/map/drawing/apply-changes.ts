import type { DrawingChange, SetChange } from '../drawing-schema';
import type { MapThing } from '../thing';

/** The thing a change makes of what is stored; null: a new one without a place. */
function thingOf(change: SetChange, before: MapThing | undefined): MapThing | null {
  const { id, version, name } = change;
  const geometry = change.geometry ?? before?.geometry;
  if (!geometry) return null;
  const base = { id, version, name, geometry };
  switch (change.kind) {
    case 'stand':
      return {
        ...base,
        kind: 'stand',
        what: change.what,
        arcs: change.arcs,
        closed: before?.kind === 'stand' ? before.closed : '',
      };
    case 'parking':
      return { ...base, kind: 'parking' };
    case 'approach': {
      const { standId, parkingId, direction, vehicleToIndex } = change;
      return { ...base, kind: 'approach', standId, parkingId, direction, vehicleToIndex };
    }
    case 'feature': {
      const old = before?.kind === 'feature' ? before : null;
      return { ...base, kind: 'feature', what: change.what, months: old?.months ?? ALL_YEAR, crop: old?.crop ?? null };
    }
    case 'item':
      return { ...base, kind: 'item', what: change.what, props: change.props };
  }
}

const ALL_YEAR = [1, 2, 3, 4, 5, 6, 7, 8, 9, 10, 11, 12];

/** Lays changes over the stored map: what was drawn, brought back. Changes of what is no longer stored add it anew. */
export function applyChanges(base: readonly MapThing[], changes: readonly DrawingChange[]): MapThing[] {
  const removed = new Set(changes.flatMap((change) => (change.op === 'remove' ? [change.id] : [])));
  const sets = new Map(changes.flatMap((change) => (change.op === 'set' ? [[change.id, change] as const] : [])));
  const kept = base
    .filter((thing) => !removed.has(thing.id) && !(thing.kind === 'approach' && removed.has(thing.standId)))
    .map((thing) => {
      const change = sets.get(thing.id);
      sets.delete(thing.id);
      return change ? (thingOf(change, thing) ?? thing) : thing;
    });
  const added = [...sets.values()].flatMap((change) => thingOf({ ...change, version: 0 }, undefined) ?? []);
  return [...kept, ...added];
}
