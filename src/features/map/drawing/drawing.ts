import type { MapThing } from '../thing';

/** A map being drawn: what is stored, what is drawn over it, and every state to go back and forth between. */
export interface Drawing {
  base: readonly MapThing[];
  things: readonly MapThing[];
  past: readonly (readonly MapThing[])[];
  future: readonly (readonly MapThing[])[];
  /** Changes with the same tag, one after another, are one step back: a name being typed, a corner being dragged. */
  tag: string | null;
}

const MOST_STEPS = 200;

export function startDrawing(base: readonly MapThing[]): Drawing {
  return { base, things: base, past: [], future: [], tag: null };
}

function step(drawing: Drawing, things: readonly MapThing[], tag: string | null = null): Drawing {
  const same = tag !== null && tag === drawing.tag;
  const past = same ? drawing.past : [...drawing.past, drawing.things].slice(-MOST_STEPS);
  return { ...drawing, things, past, future: [], tag };
}

export function addThing(drawing: Drawing, thing: MapThing): Drawing {
  return step(drawing, [...drawing.things, thing]);
}

/** Puts things in place of those with the same ids; others stay. */
export function setThings(drawing: Drawing, changed: readonly MapThing[], tag: string | null = null): Drawing {
  const byId = new Map(changed.map((thing) => [thing.id, thing]));
  return step(
    drawing,
    drawing.things.map((thing) => byId.get(thing.id) ?? thing),
    tag,
  );
}

/** A stand takes its approaches with it; a parking place is let go by those that begin there. */
export function removeThing(drawing: Drawing, id: string): Drawing {
  return step(
    drawing,
    drawing.things
      .filter((thing) => thing.id !== id && !(thing.kind === 'approach' && thing.standId === id))
      .map((thing) => (thing.kind === 'approach' && thing.parkingId === id ? { ...thing, parkingId: null } : thing)),
  );
}

/** Puts several things in the place of one. */
export function replaceThing(drawing: Drawing, id: string, parts: readonly MapThing[]): Drawing {
  return step(
    drawing,
    drawing.things.flatMap((thing) => (thing.id === id ? parts : [thing])),
  );
}

export function undo(drawing: Drawing): Drawing {
  const things = drawing.past.at(-1);
  if (!things) return drawing;
  const future = [drawing.things, ...drawing.future];
  return { ...drawing, things, past: drawing.past.slice(0, -1), future, tag: null };
}

export function redo(drawing: Drawing): Drawing {
  const [things, ...future] = drawing.future;
  if (!things) return drawing;
  return { ...drawing, things, past: [...drawing.past, drawing.things], future, tag: null };
}

/** Goes on from things as they are stored now, with what is drawn laid over them as one step. */
export function rebase(base: readonly MapThing[], things: readonly MapThing[]): Drawing {
  return things === base ? startDrawing(base) : { ...startDrawing(base), things, past: [base] };
}
