import { describe, expect, it } from 'vitest';
import { type Allotment, faultOf, type Given, totalWorth } from '@/core/draw/allotment';
import { buildProgram, readGiven } from '@/core/draw/build-program';
import { exampleAllotment } from '@/core/draw/example-allotment';
import { solveByTrying } from '@/core/draw/solve-by-trying';
import { highsSolver } from './highs';

async function solve(allotment: Allotment, options = { seconds: 60, gap: 0, seed: 1 }) {
  const built = buildProgram(allotment);
  const answer = await highsSolver.solve(built.program, options);
  if (answer.kind !== 'found') throw new Error(`No answer: ${JSON.stringify(answer)}`);
  const given: Given = readGiven(allotment, built, answer.columns);
  return { given, ...answer };
}

const free = (worth: (number | null)[][]): Allotment => ({
  kinds: worth.map(() => 0),
  stands: worth[0]?.length ?? 0,
  worth,
  conflicts: [],
  ways: [],
});

describe('HiGHS on draws', () => {
  it('gives the published answer of a worked assignment', async () => {
    // developers.google.com/optimization/assignment/assignment_example: five workers, four tasks, least cost 265.
    const cost = [
      [90, 80, 75, 70],
      [35, 85, 55, 65],
      [125, 95, 90, 95],
      [45, 110, 95, 115],
      [50, 100, 90, 100],
    ];
    const { given, value, gap } = await solve(free(cost.map((row) => row.map((one) => 1000 - one))));
    expect(4000 - value).toBe(265);
    expect(gap).toBe(0);
    expect(given).toEqual([3, 2, 1, 0, null]);
  });

  it.each(Array.from({ length: 8 }, (_, seed) => seed))(
    'equals trying every answer at 6 x 7, draw %i',
    async (seed) => {
      const allotment = exampleAllotment({ members: 6, stands: 7, conflicts: 9, twoWay: 2, seed });
      const { given, value } = await solve(allotment);
      expect(faultOf(allotment, given)).toBeNull();
      expect(totalWorth(allotment, given)).toBeCloseTo(value, 6);
      expect(value).toBeCloseTo(solveByTrying(allotment).value, 6);
    },
  );

  it('keeps 200 conflicts for 30 members and 40 stands, to the gap it says', async () => {
    const allotment = exampleAllotment({ members: 30, stands: 40, conflicts: 200, seed: 7 });
    const near = await solve(allotment, { seconds: 60, gap: 0.02, seed: 1 });
    expect(faultOf(allotment, near.given)).toBeNull();
    expect(near.gap).toBeLessThanOrEqual(0.02);
    expect(totalWorth(allotment, near.given)).toBeCloseTo(near.value, 6);
    expect(near.given.filter((stand) => stand !== null).length).toBeGreaterThan(5);
    const again = await solve(allotment, { seconds: 60, gap: 0.02, seed: 1 });
    expect(again.given).toEqual(near.given);
  });

  it('says plainly what is no program, and what the time did not reach', async () => {
    const bad = { gain: [1], rows: [{ columns: [0, 0], values: [1, 1], most: 1 }] };
    await expect(highsSolver.solve(bad, { seconds: 5, gap: 0, seed: 1 })).rejects.toThrow();
    const never = { gain: [1], rows: [{ columns: [0], values: [1], most: -1 }] };
    expect(await highsSolver.solve(never, { seconds: 5, gap: 0, seed: 1 })).toMatchObject({ kind: 'impossible' });
    const hard = buildProgram(exampleAllotment({ members: 60, stands: 80, conflicts: 900, seed: 3 }));
    const cut = await highsSolver.solve(hard.program, { seconds: 0, gap: 0, seed: 1 });
    expect(cut.kind === 'no_answer_in_time' || (cut.kind === 'found' && cut.timeUp)).toBe(true);
  });

  it('has an answer for a draw in which nothing was asked for', async () => {
    const { given, value } = await solve(free([[null, null]]));
    expect({ given, value }).toEqual({ given: [null], value: 0 });
  });
}, 120_000);
