import type { DrawingChange } from '../drawing-schema';
import type { MapThing } from '../thing';

function same(a: unknown, b: unknown): boolean {
  return a === b || JSON.stringify(a) === JSON.stringify(b);
}

/** What saving sends of one thing; null when nothing of it differs. Only a geometry that was drawn anew is sent. */
function changeOf(thing: MapThing, before: MapThing | undefined): DrawingChange | null {
  if (thing === before) return null;
  const { id, version, name, geometry } = thing;
  const moved = !before || !same(geometry, before.geometry);
  const base = { op: 'set' as const, id, version, name };
  switch (thing.kind) {
    case 'stand': {
      const { what, arcs } = thing;
      const kept = before?.kind === 'stand' && before.what === what && same(before.arcs, arcs);
      if (kept && before.name === name && !moved) return null;
      return { ...base, kind: 'stand', what, arcs, ...(moved && geometry.type === 'Point' ? { geometry } : {}) };
    }
    case 'parking':
      if (before?.name === name && !moved) return null;
      return { ...base, kind: 'parking', ...(moved && geometry.type === 'Point' ? { geometry } : {}) };
    case 'approach': {
      const { standId, parkingId, direction, vehicleToIndex } = thing;
      const facts = { standId, parkingId, direction, vehicleToIndex };
      const old = before?.kind === 'approach' ? before : null;
      if (old && old.name === name && !moved && same(facts, pickFacts(old))) return null;
      return { ...base, kind: 'approach', ...facts, ...(moved && geometry.type === 'LineString' ? { geometry } : {}) };
    }
    case 'feature':
      if (before?.kind === 'feature' && before.name === name && before.what === thing.what && !moved) return null;
      return { ...base, kind: 'feature', what: thing.what, ...(moved && isDrawn(geometry) ? { geometry } : {}) };
    case 'item': {
      const { what, props } = thing;
      const kept = before?.kind === 'item' && before.what === what && same(before.props, props);
      if (kept && before.name === name && !moved) return null;
      return { ...base, kind: 'item', what, props, ...(moved && isDrawn(geometry) ? { geometry } : {}) };
    }
  }
}

function pickFacts({ standId, parkingId, direction, vehicleToIndex }: Extract<MapThing, { kind: 'approach' }>) {
  return { standId, parkingId, direction, vehicleToIndex };
}

type DrawnGeometry = Extract<MapThing['geometry'], { type: 'Point' | 'LineString' | 'Polygon' }>;

/** Whether it is of one part, as drawing makes them; what was imported in several parts can be looked at only. */
export function isDrawn(geometry: MapThing['geometry']): geometry is DrawnGeometry {
  return geometry.type === 'Point' || geometry.type === 'LineString' || geometry.type === 'Polygon';
}

/** What differs between the stored map and the drawn one, in the order of drawing. */
export function listChanges(base: readonly MapThing[], things: readonly MapThing[]): DrawingChange[] {
  if (base === things) return [];
  const before = new Map(base.map((thing) => [thing.id, thing]));
  const left = new Set(things.map((thing) => thing.id));
  const removed = base
    .filter((thing) => !left.has(thing.id))
    .map(({ kind, id, version }): DrawingChange => ({ op: 'remove', kind, id, version }));
  // An approach goes with its stand on the server: saying so again would be a change of nothing.
  const goneStands = new Set(removed.filter(({ kind }) => kind === 'stand').map(({ id }) => id));
  const alone = removed.filter((change) => {
    const thing = before.get(change.id);
    return !(thing?.kind === 'approach' && goneStands.has(thing.standId));
  });
  const set = things.flatMap((thing) => {
    const change = changeOf(thing, before.get(thing.id));
    return change ? [change] : [];
  });
  return [...alone, ...set];
}
