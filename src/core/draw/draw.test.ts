import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { fairnessWords, gini } from './fairness';
import { countPoints, DEFAULT_POINT_RULES } from './points';
import { turnOrder } from './turn-order';
import { stepsOf, turnWeight, worthOf } from './worth';

describe('points', () => {
  it('adds one for a miss, starts again after a stand, and gives one for a work day of 4 hours (practice)', () => {
    const rules = DEFAULT_POINT_RULES;
    expect(countPoints([], rules)).toBe(0);
    const missed = [
      { day: '2026-10-01', kind: 'missed' as const },
      { day: '2026-10-08', kind: 'missed' as const },
    ];
    expect(countPoints(missed, rules)).toBe(2);
    const given = { day: '2026-10-15', kind: 'given' as const };
    expect(countPoints([given, ...missed], rules)).toBe(0);
    expect(countPoints([given, ...missed], { ...rules, resetOnGiven: false })).toBe(2);
    const work = (day: string, hours: number) => ({ day, kind: 'worked' as const, hours });
    expect(countPoints([...missed, work('2026-08-01', 3), work('2026-09-01', 5.5)], rules)).toBe(4);
    expect(countPoints([given, work('2026-09-01', 8), work('2026-10-16', 7.9)], rules)).toBe(1);
    expect(countPoints([work('2026-09-01', 8)], { ...rules, workHoursPerPoint: null })).toBe(0);
  });
});

describe('the order of turns', () => {
  const members = Array.from({ length: 12 }, (_, i) => ({ id: `m${i}`, points: i % 3 }));
  it('is the same for the same seed, however the members come', () => {
    expect(turnOrder('a', [...members].reverse())).toEqual(turnOrder('a', members));
    expect(turnOrder('b', members)).not.toEqual(turnOrder('a', members));
    expect([...turnOrder('a', members)].sort()).toEqual(members.map((one) => one.id).sort());
  });

  it('puts a member with 2 points first three times as often as one with none', () => {
    const two = [
      { id: 'many', points: 2 },
      { id: 'none', points: 0 },
    ];
    const draws = 4000;
    const first = Array.from({ length: draws }, (_, i) => turnOrder(`draw ${i}`, two)[0]);
    // 3 entries against 1: a share of 0.75; 4 standard errors of 4000 draws are 0.027.
    expect(Math.abs(first.filter((id) => id === 'many').length / draws - 0.75)).toBeLessThan(0.027);
  });
});

describe('worth', () => {
  it('falls with each choice, and counts the rest by score only when asked to', () => {
    const entry = { choices: ['a', 'b'], anyByScore: false };
    expect(worthOf(entry, 'a', null)).toBe(100);
    expect(worthOf(entry, 'b', 90)).toBe(75);
    expect(worthOf(entry, 'c', 90)).toBeNull();
    expect(worthOf({ ...entry, anyByScore: true }, 'c', 80)).toBeCloseTo(56.25 * 0.8, 9);
    expect(worthOf({ choices: [], anyByScore: true }, 'c', 70)).toBe(70);
  });

  it('goes from 2 for the first in line to 1 for the last', () => {
    expect([0, 1, 2].map((turn) => turnWeight(turn, 3))).toEqual([2, 1.5, 1]);
    expect(turnWeight(0, 1)).toBe(1);
  });

  it('is never more for a second stand of the first in line than for any first of the last', () => {
    const [first = 0, second = 0, third = 0] = stepsOf(3);
    expect(second).toBeGreaterThan(third);
    const best = worthOf({ choices: ['a'], anyByScore: false }, 'a', null) ?? 0;
    expect(turnWeight(0, 9) * (second + best)).toBeLessThanOrEqual(turnWeight(8, 9) * first);
  });
});

describe('the fairness figure', () => {
  it('is 0 for equal shares and (n - 1) / n when one has all', () => {
    expect(gini([3, 3, 3])).toBeCloseTo(0, 12);
    expect(gini([0, 0, 0, 8])).toBeCloseTo(0.75, 12);
    // By hand: differences of 1, 2, 3 sum to 8 over all pairs both ways; 8 / (2 * 9 * 2).
    expect(gini([1, 2, 3])).toBeCloseTo(8 / 36, 12);
    expect(gini([])).toBeNull();
    expect(gini([0, 0])).toBeNull();
    expect([0.05, 0.2, 0.3, 0.6].map(fairnessWords)).toHaveLength(
      new Set([0.05, 0.2, 0.3, 0.6].map(fairnessWords)).size,
    );
  });

  it('does not change when everybody has twice as much, and falls when the richest gives to the poorest', () => {
    fc.assert(
      fc.property(fc.array(fc.integer({ min: 1, max: 50 }), { minLength: 2, maxLength: 12 }), (values) => {
        const value = gini(values) ?? 0;
        expect(gini(values.map((one) => one * 2))).toBeCloseTo(value, 9);
        const sorted = [...values].sort((a, b) => a - b);
        const [low = 0, high = 0] = [sorted[0], sorted.at(-1)];
        if (high - low < 2) return;
        expect(gini([low + 1, ...sorted.slice(1, -1), high - 1]) ?? 0).toBeLessThan(value);
      }),
    );
  });
});
