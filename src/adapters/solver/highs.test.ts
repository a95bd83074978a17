import { describe, expect, it } from 'vitest';
import { type Allotment, faultOf, type Given, placesOf, totalWorth } from '@/core/draw/allotment';
import { buildProgram, readGiven } from '@/core/draw/build-program';
import { exampleAllotment } from '@/core/draw/example-allotment';
import { solveByTrying } from '@/core/draw/solve-by-trying';
import { highsSolver } from './highs';
import type { SolveHooks, SolveProgress } from './port';

const EXACT = { gap: 0, mostNodes: 5_000, seconds: 100, seed: 1 };

async function solve(allotment: Allotment, options = EXACT, hooks: SolveHooks = {}) {
  const built = buildProgram(allotment);
  const answer = await highsSolver.solve(built.program, options, hooks);
  if (answer.kind !== 'found') throw new Error(`No answer: ${JSON.stringify(answer)}`);
  const given: Given = readGiven(allotment, built, answer.columns);
  return { given, ...answer };
}

const free = (worth: (number | null)[][]): Allotment => ({
  kinds: worth.map(() => 0),
  slots: 1,
  slotOf: worth[0]?.map(() => 0) ?? [],
  worth,
  steps: worth.map(() => [0]),
  conflicts: [],
  ways: [],
  limits: [],
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
    expect(given).toEqual([[3], [2], [1], [0], [null]]);
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

  it.each(Array.from({ length: 8 }, (_, seed) => seed))(
    'equals trying every answer over three windows with rest and limits, draw %i',
    async (seed) => {
      const size = { members: 3, stands: 3, conflicts: 1, twoWay: 1, slots: 3, seed };
      const allotment = exampleAllotment(size);
      const [first] = allotment.limits;
      // One stand is used in one window at most; so many limits at once are no plain flow any more.
      allotment.limits.push({ member: null, places: [1, 4, 7], most: 1 });
      if (first) allotment.limits.push({ member: 1, places: [0, 1, 2, 6, 7, 8], most: 1 });
      const { given, value } = await solve(allotment);
      expect(faultOf(allotment, given)).toBeNull();
      expect(totalWorth(allotment, given)).toBeCloseTo(value, 6);
      expect(value).toBeCloseTo(solveByTrying(allotment).value, 6);
    },
  );

  it('asks again with all columns whole when one comes out in between', async () => {
    // Three columns of which each two are too much: 1.5 in between, 1 whole.
    const rows = [
      [0, 1],
      [1, 2],
      [0, 2],
    ].map((columns) => ({ columns, values: [1, 1], most: 1 }));
    const answer = await highsSolver.solve({ gain: [1, 1, 1], whole: [false, false, false], rows }, EXACT);
    expect(answer).toMatchObject({ kind: 'found', value: 1, gap: 0 });
  });

  it('keeps 200 conflicts for 30 members and 40 stands, proved the best, twice the same', async () => {
    const allotment = exampleAllotment({ members: 30, stands: 40, conflicts: 200, seed: 7 });
    const heard: SolveProgress[] = [];
    const best = await solve(allotment, EXACT, { onProgress: (progress) => heard.push(progress) });
    expect(faultOf(allotment, best.given)).toBeNull();
    expect(best).toMatchObject({ gap: 0, cutBy: null });
    expect(totalWorth(allotment, best.given)).toBeCloseTo(best.value, 6);
    expect(placesOf(best.given, null).length).toBeGreaterThan(5);
    const again = await solve(allotment);
    expect(again.given).toEqual(best.given);
    expect(heard.length).toBeGreaterThan(0);
    for (const { value, bound } of heard) {
      expect(value ?? 0).toBeLessThanOrEqual(best.value + 1e-6);
      expect(bound ?? best.value).toBeGreaterThanOrEqual(best.value - 1e-6);
    }
  });

  it('gives the best so far and its gap when the branches run out', async () => {
    const hard = exampleAllotment({ members: 16, stands: 24, conflicts: 90, slots: 2, seed: 3 });
    const cut = await solve(hard, { ...EXACT, mostNodes: 1 });
    expect(faultOf(hard, cut.given)).toBeNull();
    expect(cut.bound).toBeGreaterThanOrEqual(cut.value);
    if (cut.cutBy === 'nodes') expect(cut.gap).toBeGreaterThan(0);
    else expect(cut.gap).toBe(0);
  });

  it('stops at once when told to', async () => {
    const hard = buildProgram(exampleAllotment({ members: 60, stands: 80, conflicts: 900, slots: 3, seed: 3 })).program;
    const stop = new AbortController();
    const answer = highsSolver.solve(hard, EXACT, { signal: stop.signal, onProgress: () => stop.abort() });
    expect(await answer).toEqual({ kind: 'stopped' });
    expect(await highsSolver.solve(hard, EXACT, { signal: stop.signal })).toEqual({ kind: 'stopped' });
  });

  it('says plainly what is no program, and what the time did not reach', async () => {
    const bad = { gain: [1], whole: [true], rows: [{ columns: [0, 0], values: [1, 1], most: 1 }] };
    await expect(highsSolver.solve(bad, EXACT)).rejects.toThrow();
    const never = { gain: [1], whole: [true], rows: [{ columns: [0], values: [1], most: -1 }] };
    expect(await highsSolver.solve(never, EXACT)).toMatchObject({ kind: 'impossible' });
    const hard = buildProgram(exampleAllotment({ members: 60, stands: 80, conflicts: 900, seed: 3 }));
    const cut = await highsSolver.solve(hard.program, { ...EXACT, seconds: 0 });
    expect(cut.kind === 'no_answer_in_time' || (cut.kind === 'found' && cut.cutBy === 'time')).toBe(true);
  });

  it('has an answer for a draw in which nothing was asked for', async () => {
    const { given, value } = await solve(free([[null, null]]));
    expect({ given, value }).toEqual({ given: [[null]], value: 0 });
  });
}, 240_000);
