import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { MapThing } from '../thing';
import { applyChanges } from './apply-changes';
import { addThing, type Drawing, redo, removeThing, replaceThing, setThings, startDrawing, undo } from './drawing';
import { APPROACH, CENTRE, PARKING, STAND, spot, THINGS, WOOD } from './example-things';
import { followMove, tieDrawn } from './follow';
import { listChanges } from './list-changes';

const moved = { ...STAND, geometry: { type: 'Point' as const, coordinates: spot(150, 210) } };

const step = fc.oneof(
  fc.constantFrom(...THINGS.map(({ id }) => id)).map((id) => (d: Drawing) => removeThing(d, id)),
  fc.tuple(fc.constantFrom(...THINGS), fc.string({ minLength: 1, maxLength: 8 })).map(
    ([thing, name]) =>
      (d: Drawing) =>
        setThings(d, [{ ...thing, name }]),
  ),
  fc
    .nat(1000)
    .map((n) => (d: Drawing) => addThing(d, { ...WOOD, id: `new-${n}-${d.past.length}`, version: 0, name: `w${n}` })),
);

describe('drawing', () => {
  it('goes all the way back, and forth again, whatever was done', () => {
    fc.assert(
      fc.property(fc.array(step, { maxLength: 30 }), (steps) => {
        const done = steps.reduce((d, change) => change(d), startDrawing(THINGS));
        let back = done;
        for (let i = 0; i < steps.length; i++) back = undo(back);
        expect(back.things).toBe(THINGS);
        expect(listChanges(back.base, back.things)).toEqual([]);
        for (let i = 0; i < steps.length; i++) back = redo(back);
        expect(back.things).toBe(done.things);
      }),
    );
  });

  it('changes, laid over the stored map again, give what was drawn', () => {
    fc.assert(
      fc.property(fc.array(step, { maxLength: 30 }), (steps) => {
        const done = steps.reduce((d, change) => change(d), startDrawing(THINGS));
        const again = applyChanges(THINGS, listChanges(THINGS, done.things));
        const byId = (things: readonly MapThing[]) => things.toSorted((a, b) => (a.id < b.id ? -1 : 1));
        expect(byId(again)).toEqual(byId(done.things));
      }),
    );
  });

  it('makes one step of a name being typed', () => {
    let d = startDrawing(THINGS);
    for (const name of ['C', 'Cr', 'Cre']) d = setThings(d, [{ ...STAND, name }], 'name:std_1');
    expect(d.past).toHaveLength(1);
    expect(undo(d).things).toBe(THINGS);
  });

  it('sends a geometry only where it was drawn anew', () => {
    const named = setThings(startDrawing(THINGS), [{ ...WOOD, name: 'North Wood' }]);
    expect(listChanges(named.base, named.things)).toEqual([
      { op: 'set', kind: 'item', id: 'map_1', version: 1, name: 'North Wood', what: 'wood', props: {} },
    ]);
    const over = setThings(startDrawing(THINGS), [moved]);
    expect(listChanges(over.base, over.things)).toMatchObject([{ id: 'std_1', geometry: moved.geometry }]);
  });

  it('takes a stand away with its approaches, said once; a parking place is let go', () => {
    const noStand = removeThing(startDrawing(THINGS), 'std_1');
    expect(noStand.things.map(({ id }) => id)).toEqual(['map_1', 'ftr_1', 'prk_1']);
    expect(listChanges(noStand.base, noStand.things)).toEqual([
      { op: 'remove', kind: 'stand', id: 'std_1', version: 3 },
    ]);
    const noGate = removeThing(startDrawing(THINGS), 'prk_1');
    expect(noGate.things).toContainEqual({ ...APPROACH, parkingId: null });
  });

  it('puts pieces in the place of what was split', () => {
    const d = replaceThing(startDrawing(THINGS), 'map_1', [WOOD, { ...WOOD, id: 'new-1', version: 0 }]);
    expect(d.things.map(({ id }) => id)).toEqual(['map_1', 'new-1', 'ftr_1', 'app_1', 'prk_1', 'std_1']);
  });
});

describe('approaches and their ends', () => {
  it('follow the stand and the parking place that are moved', () => {
    expect(followMove(CENTRE, THINGS, STAND, moved)).toMatchObject([
      { id: 'app_1', geometry: { coordinates: [spot(-300, -100), spot(-50, 0), spot(150, 210)] } },
    ]);
    const gate = { ...PARKING, geometry: { type: 'Point' as const, coordinates: spot(-310, -90) } };
    expect(followMove(CENTRE, THINGS, PARKING, gate)).toMatchObject([
      { geometry: { coordinates: [spot(-310, -90), spot(-50, 0), spot(100, 200)] } },
    ]);
  });

  it('are tied to what lies at the ends, and turned about when drawn from the stand', () => {
    const line = [spot(103, 198), spot(0, 0), spot(-298, -104)];
    const tied = tieDrawn(CENTRE, THINGS, line, 30);
    expect(tied).toEqual({ line: line.toReversed(), standId: 'std_1', parkingId: 'prk_1' });
    expect(tieDrawn(CENTRE, THINGS, line.toReversed(), 30)).toEqual(tied);
    expect(tieDrawn(CENTRE, THINGS, [spot(900, 900), spot(1000, 900)], 30)).toMatchObject({
      standId: null,
      parkingId: null,
    });
  });
});
