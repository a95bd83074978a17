import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { coverCliques } from './cover-cliques';

const graph = (size: number, pairs: readonly (readonly [number, number])[]) => {
  const has = (a: number, b: number) => a !== b && pairs.some(([x, y]) => (x === a && y === b) || (x === b && y === a));
  return Array.from({ length: size }, (_, a) => Array.from({ length: size }, (_, b) => has(a, b)));
};

describe('groups that stand in each other’s way', () => {
  it('takes a triangle as one group and a pair beside it as another', () => {
    const found = coverCliques(
      graph(5, [
        [0, 1],
        [1, 2],
        [0, 2],
        [2, 3],
      ]),
    );
    expect(found).toEqual([
      [0, 1, 2],
      [2, 3],
    ]);
    expect(coverCliques(graph(3, []))).toEqual([]);
  });

  it('covers every pair, holds no two that do not clash, and leaves nobody out who clashes with all', () => {
    const index = fc.integer({ min: 0, max: 8 });
    fc.assert(
      fc.property(fc.array(fc.tuple(index, index), { maxLength: 25 }), (pairs) => {
        const inWay = graph(9, pairs);
        const cliques = coverCliques(inWay);
        for (const clique of cliques) {
          expect(clique.every((a) => clique.every((b) => a === b || inWay[a]?.[b]))).toBe(true);
          const more = inWay.some((row, a) => !clique.includes(a) && clique.every((b) => row[b]));
          expect(more).toBe(false);
        }
        inWay.forEach((row, a) => {
          row.forEach((pair, b) => {
            if (pair) expect(cliques.some((clique) => clique.includes(a) && clique.includes(b))).toBe(true);
          });
        });
      }),
    );
  });
});
