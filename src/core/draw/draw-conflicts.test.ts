import { describe, expect, it } from 'vitest';
import { DEFAULT_CLUB_RULES } from '../booking/rules';
import type { Point, Weapon } from '../ground-types';
import { drawConflicts } from './draw-conflicts';

const line = (...points: [number, number][]) => points.map(([x, y]) => ({ eastM: x, northM: y }));
const stand = (id: string, east: number, north: number, ...approaches: Point[][]) => ({
  id,
  name: id,
  restDays: null,
  at: { eastM: east, northM: north },
  approaches,
});
const stands = [
  stand('a', 0, 0, line([0, -500], [0, 0])),
  stand('b', 150, 0),
  stand('c', 5, -400),
  stand('d', 2000, 0, line([1995, 900], [2000, 0]), line([1000, 0], [2000, 0])),
  stand('e', 1997, 700),
];
const spacingM = { ...DEFAULT_CLUB_RULES.spacingM, bow: 100, rifle: 200 };
const rules = { ...DEFAULT_CLUB_RULES, spacingM, passThroughM: 90 };
const pair = (a: number, b: number) => ({ a: { place: a, kind: null }, b: { place: b, kind: null } });
const oneDay = (weapons: Weapon[], occupied: Point[] = []) =>
  drawConflicts({ slots: [{ day: '2026-11-07', occupied }], stands, weapons, rules });

describe('stands in each other’s way', () => {
  it('takes the wider spacing of the two weapons', () => {
    expect(oneDay(['bow']).conflicts).toEqual([]);
    expect(oneDay(['rifle']).conflicts).toEqual([pair(0, 1)]);
    const both = oneDay(['bow', 'rifle']).conflicts;
    expect(both).toHaveLength(3);
    expect(both).not.toContainEqual({ a: { place: 0, kind: 0 }, b: { place: 1, kind: 0 } });
  });

  it('shuts a way that passes an occupied stand, and leaves the other way open', () => {
    expect(oneDay(['bow']).ways).toEqual([{ place: 0, shutBy: [[2]] }]);
    expect(oneDay(['bow'], [{ eastM: 1500, northM: 0 }]).ways).toEqual([
      { place: 0, shutBy: [[2]] },
      { place: 3, shutBy: [[4]] },
    ]);
  });

  it('goes by each window for itself, and rests a stand from one day to the next of the draw', () => {
    const days = (...all: string[]) => all.map((day) => ({ day, occupied: [] }));
    const two = stands.slice(0, 2);
    // Two windows of one day are no rest broken; 3 full days of rest after the 7th end with the 10th (club practice).
    const slots = days('2026-11-07', '2026-11-07', '2026-11-10', '2026-11-11');
    const { conflicts, ways } = drawConflicts({ slots, stands: two, weapons: ['rifle'], rules });
    expect(conflicts.filter(({ a, b }) => a.place % 2 !== b.place % 2)).toEqual([
      pair(0, 1),
      pair(2, 3),
      pair(4, 5),
      pair(6, 7),
    ]);
    const rests = conflicts.filter(({ a, b }) => a.place % 2 === b.place % 2);
    expect(rests.filter(({ a }) => a.place % 2 === 0)).toEqual([pair(0, 4), pair(2, 4), pair(4, 6)]);
    expect(rests).toHaveLength(6);
    expect(ways).toEqual([]);
    const unrested = two.map((one) => ({ ...one, restDays: 0 }));
    expect(drawConflicts({ slots, stands: unrested, weapons: ['rifle'], rules }).conflicts).toHaveLength(4);
  });
});
