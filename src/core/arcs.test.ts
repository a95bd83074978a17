import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { normalizeDeg } from './angles';
import {
  anyArcContains,
  arcContains,
  arcsFor,
  arcWidthDeg,
  coveredDeg,
  FULL_CIRCLE,
  formatArc,
  mergeArcs,
} from './arcs';
import type { Arc } from './ground-types';

const arcGen = fc.record({
  fromDeg: fc.integer({ min: 0, max: 359 }),
  width: fc.integer({ min: 1, max: 359 }),
});
const toArc = (g: { fromDeg: number; width: number }): Arc => ({
  fromDeg: g.fromDeg,
  toDeg: normalizeDeg(g.fromDeg + g.width),
});

describe('an arc', () => {
  it('runs clockwise and may cross north', () => {
    const arc = { fromDeg: 310, toDeg: 20 };
    expect(arcWidthDeg(arc)).toBe(70);
    for (const deg of [310, 340, 0, 360, 20]) expect(arcContains(arc, deg)).toBe(true);
    for (const deg of [309.9, 20.1, 180]) expect(arcContains(arc, deg)).toBe(false);
  });

  it('is the full circle at 360 and one direction at 0', () => {
    expect(arcWidthDeg(FULL_CIRCLE)).toBe(360);
    expect(arcWidthDeg({ fromDeg: 90, toDeg: 450 })).toBe(360);
    expect(arcContains(FULL_CIRCLE, 123.4)).toBe(true);
    expect(arcContains({ fromDeg: 90, toDeg: 90 }, 90)).toBe(true);
    expect(arcContains({ fromDeg: 90, toDeg: 90 }, 90.1)).toBe(false);
  });

  it('turned with the direction holds the same', () => {
    fc.assert(
      fc.property(
        arcGen,
        fc.integer({ min: 0, max: 359 }),
        fc.double({ min: 0, max: 360, noNaN: true }),
        (g, deg, turn) => {
          const arc = toArc(g);
          const turned = { fromDeg: normalizeDeg(arc.fromDeg + turn), toDeg: normalizeDeg(arc.toDeg + turn) };
          expect(arcContains(turned, deg + turn)).toBe(arcContains(arc, deg));
        },
      ),
    );
  });

  it('reads as points and degrees', () => {
    expect(formatArc({ fromDeg: 303.75, toDeg: 11.25 })).toBe('NW-N · 304°–11°');
    expect(formatArc({ fromDeg: 258.75, toDeg: 281.25 })).toBe('W · 259°–281°');
    expect(formatArc({ fromDeg: 310, toDeg: 20 })).toBe('NW-NNE · 310°–20°');
    expect(formatArc(FULL_CIRCLE)).toBe('any · 0°–360°');
    expect(formatArc({ fromDeg: 8, toDeg: 5 })).toBe('N-N · 8°–5°');
  });
});

describe('arcs of a stand', () => {
  it('count in their own window or in both', () => {
    const arcs = [
      { fromDeg: 0, toDeg: 90, window: null },
      { fromDeg: 180, toDeg: 200, window: 'morning' as const },
      { fromDeg: 270, toDeg: 300, window: 'evening' as const },
    ];
    expect(arcsFor(arcs, 'morning')).toEqual([
      { fromDeg: 0, toDeg: 90 },
      { fromDeg: 180, toDeg: 200 },
    ]);
    expect(arcsFor(arcs, 'evening').map((a) => a.fromDeg)).toEqual([0, 270]);
  });
});

describe('mergeArcs', () => {
  it('joins what overlaps or touches, also over north', () => {
    expect(
      mergeArcs([
        { fromDeg: 350, toDeg: 20 },
        { fromDeg: 10, toDeg: 40 },
      ]),
    ).toEqual([{ fromDeg: 350, toDeg: 40 }]);
    expect(
      mergeArcs([
        { fromDeg: 90, toDeg: 120 },
        { fromDeg: 120, toDeg: 130 },
      ]),
    ).toEqual([{ fromDeg: 90, toDeg: 130 }]);
    expect(
      mergeArcs([
        { fromDeg: 0, toDeg: 200 },
        { fromDeg: 190, toDeg: 10 },
      ]),
    ).toEqual([FULL_CIRCLE]);
    expect(mergeArcs([])).toEqual([]);
  });

  it('holds the same directions as the arcs, each once', () => {
    fc.assert(
      fc.property(fc.array(arcGen, { maxLength: 6 }), (gens) => {
        const arcs = gens.map(toArc);
        const merged = mergeArcs(arcs);
        let steps = 0;
        for (let deg = 0.5; deg < 360; deg += 1) {
          const inAny = anyArcContains(arcs, deg);
          expect(merged.filter((arc) => arcContains(arc, deg)).length).toBe(inAny ? 1 : 0);
          if (inAny) steps++;
        }
        expect(coveredDeg(arcs)).toBeCloseTo(steps, 6);
      }),
    );
  });
});
