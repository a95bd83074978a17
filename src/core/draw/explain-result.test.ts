import { describe, expect, it } from 'vitest';
import type { Allotment } from './allotment';
import { whyNot } from './explain-result';
import { solveByTrying } from './solve-by-trying';

const one: Allotment = {
  kinds: [0, 0],
  slots: 1,
  slotOf: [0, 0, 0],
  worth: [
    [200, 150, null],
    [100, 75, 50],
  ],
  steps: [[400], [200]],
  conflicts: [{ a: { place: 0, kind: null }, b: { place: 1, kind: null } }],
  ways: [],
  limits: [],
};

describe('why a stand was not given', () => {
  it('names the rule, the holder, or the stand that is too near', () => {
    const { given, value } = solveByTrying(one);
    expect({ given, value }).toEqual({ given: [[0], [2]], value: 850 });
    const why = (place: number, ruleText: string | null = null) => whyNot(one, given, { member: 1, place, ruleText });
    expect(why(0)).toEqual({ kind: 'taken', by: 0 });
    expect(why(1)).toEqual({ kind: 'blocked', by: 0, place: 0 });
    expect(why(0, 'It is resting.')).toEqual({ kind: 'rule', text: 'It is resting.' });
    expect(whyNot(one, [[null], [2]], { member: 1, place: 1, ruleText: null })).toEqual({ kind: 'total' });
  });

  it('knows a rest between days, one’s own too, and a limit', () => {
    // Two stands on two days; stand 0 rests from one to the other.
    const days: Allotment = {
      kinds: [0, 0],
      slots: 2,
      slotOf: [0, 0, 1, 1],
      worth: [
        [100, 80, 90, 70],
        [60, 50, 60, 50],
      ],
      steps: [
        [300, 50],
        [150, 25],
      ],
      conflicts: [{ a: { place: 0, kind: null }, b: { place: 2, kind: null } }],
      ways: [],
      limits: [{ member: 1, places: [0, 1, 2, 3], most: 1 }],
    };
    const given = [
      [0, 3],
      [1, null],
    ];
    expect(whyNot(days, given, { member: 0, place: 2, ruleText: null })).toEqual({ kind: 'blocked', by: 0, place: 0 });
    const free = [
      [0, null],
      [null, null],
    ];
    expect(whyNot(days, free, { member: 1, place: 2, ruleText: null })).toEqual({ kind: 'blocked', by: 0, place: 0 });
    expect(
      whyNot(
        days,
        [
          [null, null],
          [1, null],
        ],
        { member: 1, place: 3, ruleText: null },
      ),
    ).toEqual({ kind: 'limit' });
  });
});
