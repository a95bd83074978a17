import { describe, expect, it } from 'vitest';
import { drawingInput } from '../drawing-schema';
import { PARKING, STAND, spot, THINGS } from './example-things';
import { listChanges } from './list-changes';
import { settleConflicts } from './settle-conflicts';

const drawn = THINGS.map((thing) => (thing.id === 'std_1' ? { ...STAND, name: 'Creek Bend', arcs: [] } : thing));
const changes = listChanges(THINGS, drawn);
const theirs = { ...STAND, version: 4, geometry: { type: 'Point' as const, coordinates: spot(90, 190) } };
const stored = THINGS.map((thing) => (thing.id === 'std_1' ? theirs : thing));
const conflict = { id: 'std_1', kind: 'stand' as const, name: 'Creek Bend', who: 'Dale', gone: false };
const maps = { stored, drawn, newId: () => 'new-9' };

describe('settling conflicts', () => {
  it('keeps both unless told otherwise: theirs stays, mine is added whole beside it', () => {
    const [copy, ...rest] = settleConflicts(changes, [conflict], new Map(), maps);
    expect(rest).toEqual([]);
    expect(copy).toMatchObject({
      id: 'new-9',
      version: 0,
      name: 'Creek Bend (drawn beside)',
      arcs: [],
      geometry: STAND.geometry,
    });
    expect(drawingInput.safeParse({ changes: [copy] }).success).toBe(true);
  });

  it('lets theirs stand, or lays mine over it by the version it has now', () => {
    expect(settleConflicts(changes, [conflict], new Map([['std_1', 'theirs']]), maps)).toEqual([]);
    expect(settleConflicts(changes, [conflict], new Map([['std_1', 'mine']]), maps)).toMatchObject([
      { id: 'std_1', version: 4, arcs: [] },
    ]);
  });

  it('adds anew, under its own name, what others removed', () => {
    const gone = THINGS.filter((thing) => thing.id !== 'std_1');
    const settled = settleConflicts(changes, [{ ...conflict, gone: true }], new Map([['std_1', 'mine']]), {
      ...maps,
      stored: gone,
    });
    expect(settled).toMatchObject([{ id: 'new-9', version: 0, name: 'Creek Bend', geometry: STAND.geometry }]);
  });

  it('takes back a removal of what others changed, or removes it as it is now; leaves other changes alone', () => {
    const remove = listChanges(THINGS, [{ ...PARKING, name: 'Upper Gate' }]).filter(
      (one) => one.id === 'std_1' || one.id === 'prk_1',
    );
    expect(settleConflicts(remove, [conflict], new Map(), maps)).toMatchObject([{ id: 'prk_1', name: 'Upper Gate' }]);
    expect(settleConflicts(remove, [conflict], new Map([['std_1', 'mine']]), maps)).toMatchObject([
      { op: 'remove', id: 'std_1', version: 4 },
      { id: 'prk_1' },
    ]);
  });
});
