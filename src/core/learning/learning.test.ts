import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { SitOutcome } from './learning-types';
import { DEFAULT_LEARNING, proposeAdjustments } from './propose-adjustments';
import { reliabilityOf } from './reliability';

const sit = (quiet: number, clean: boolean, over: Partial<SitOutcome> = {}): SitOutcome => ({
  standId: 'oak',
  quiet,
  adjustedBy: 0,
  clean,
  ...over,
});
const sits = (quiet: number, clean: number, bumped: number, over: Partial<SitOutcome> = {}) => [
  ...Array.from({ length: clean }, () => sit(quiet, true, over)),
  ...Array.from({ length: bumped }, () => sit(quiet, false, over)),
];

describe('the reliability table', () => {
  /**
   * By hand. Ten sits: 90 said five times, 4 clean; 50 said three times, 1 clean; 10 said twice, 0 clean. 5 of 10 clean.
   * Brier: (4 x .01 + .81 + .25 x 3 + 2 x .01) / 10 = (.04 + .81 + .75 + .02) / 10 = .162.
   * Reliability: .5 x (.9 - .8)^2 + .3 x (.5 - 1/3)^2 + .2 x (.1 - 0)^2 = .005 + .0083333 + .002 = .0153333.
   * Resolution: .5 x .3^2 + .3 x (1/3 - .5)^2 + .2 x .5^2 = .045 + .0083333 + .05 = .1033333. Uncertainty: .25.
   * .0153333 - .1033333 + .25 = .162.
   */
  it('equals one worked by hand, with the parts of the Brier score', () => {
    const { rows, brier } = reliabilityOf([...sits(90, 4, 1), ...sits(50, 1, 2), ...sits(10, 0, 2)]);
    expect(rows.map((r) => [r.fromQuiet, r.toQuiet, r.sits, r.clean])).toEqual([
      [0, 20, 2, 0],
      [20, 40, 0, 0],
      [40, 60, 3, 1],
      [60, 80, 0, 0],
      [80, 100, 5, 4],
    ]);
    expect(rows.map((r) => r.observed)).toEqual([0, null, 1 / 3, null, 0.8]);
    expect(rows[4]?.predicted).toBeCloseTo(0.9, 12);
    // Wilson interval of 4 of 5: 0.3755 to 0.9638, by its formula.
    expect(rows[4]?.interval?.low).toBeCloseTo(0.3755, 4);
    expect(rows[4]?.interval?.high).toBeCloseTo(0.9638, 4);
    expect(brier?.score).toBeCloseTo(0.162, 12);
    expect(brier?.reliability).toBeCloseTo(0.0153333333, 9);
    expect(brier?.resolution).toBeCloseTo(0.1033333333, 9);
    expect(brier?.uncertainty).toBeCloseTo(0.25, 12);
    expect(brier?.within).toBeCloseTo(0, 12);
  });

  it('holds the ends of the scale: 100 in the last bin, 20 in the second, and nothing of nothing', () => {
    const { rows, brier } = reliabilityOf([sit(100, true), sit(20, false), sit(0, false)]);
    expect(rows.map((r) => r.sits)).toEqual([1, 1, 0, 0, 1]);
    expect(brier?.score).toBeCloseTo(0.04 / 3, 12);
    expect(reliabilityOf([]).brier).toBeNull();
  });

  it('has parts that sum to the mean square, whatever is said', () => {
    const some = fc.array(fc.record({ quiet: fc.double({ min: 0, max: 100, noNaN: true }), clean: fc.boolean() }), {
      minLength: 1,
    });
    fc.assert(
      fc.property(some, (list) => {
        const { brier, rows } = reliabilityOf(list.map(({ quiet, clean }) => sit(quiet, clean)));
        if (!brier) throw new Error('No score.');
        const plain =
          list.reduce((sum, { quiet, clean }) => sum + (quiet / 100 - (clean ? 1 : 0)) ** 2, 0) / list.length;
        expect(brier.score).toBeCloseTo(plain, 9);
        const parts = brier.reliability - brier.resolution + brier.uncertainty + brier.within;
        expect(parts).toBeCloseTo(plain, 9);
        expect(rows.reduce((sum, row) => sum + row.sits, 0)).toBe(list.length);
      }),
    );
  });
});

describe('adjustments a log asks for', () => {
  it('are shrunk by the number of sits, as by hand', () => {
    // 20 sits said 80, 12 clean: 60 - 80 = -20 points, times 20 / (20 + 20) = -10.
    const [found] = proposeAdjustments(sits(80, 12, 8));
    expect(found?.points).toBeCloseTo(-10, 9);
    // Wilson interval of 12 of 20 is 0.3866 to 0.7812: -20.67 bounded to -15, and -0.94.
    expect(found?.lowPoints).toBe(-15);
    expect(found?.highPoints).toBeCloseTo(-0.94, 2);
    expect(found?.sure).toBe(true);
  });

  it('say nothing of a stand with few sits, and are not sure of a small miss', () => {
    expect(proposeAdjustments(sits(80, 1, 3))).toEqual([]);
    expect(proposeAdjustments(sits(80, 7, 3))[0]?.sure).toBe(false);
  });

  it('stand in place of one that holds already', () => {
    const before = proposeAdjustments(sits(80, 12, 8))[0]?.points ?? 0;
    const [after] = proposeAdjustments(sits(70, 12, 8, { adjustedBy: -10 }));
    expect(after?.points).toBeCloseTo(before, 9);
  });

  it('never pass their bounds, and rise with each clean sit', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 0, max: 100 }),
        fc.integer({ min: 0, max: 60 }),
        fc.integer({ min: 5, max: 60 }),
        (quiet, clean, bumped) => {
          const [one] = proposeAdjustments(sits(quiet, clean, bumped));
          const [better] = proposeAdjustments(sits(quiet, clean + 1, bumped - 1));
          expect(Math.abs(one?.points ?? 99)).toBeLessThanOrEqual(DEFAULT_LEARNING.mostPoints);
          expect(better?.points).toBeGreaterThanOrEqual(one?.points ?? 99);
          expect(one?.lowPoints).toBeLessThanOrEqual(one?.points ?? -99);
          expect(one?.highPoints).toBeGreaterThanOrEqual(one?.points ?? 99);
        },
      ),
    );
  });
});
