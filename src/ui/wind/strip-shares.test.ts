import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { describeWindStrip, mergeRows, nameArcs, settledName, shareInArcs, unrollArcs } from './strip-shares';

const even = Array.from({ length: 72 }, () => 1 / 72);
const only = (...bins: number[]) => even.map((_, bin) => (bins.includes(bin) ? 1 / bins.length : 0));
const at = Date.UTC(2026, 10, 7, 12);

/** NW-N by the 16-point compass: from the lower bound of NW to the upper bound of N (sectors of 22.5 degrees). */
const nwToN = { fromDeg: 303.75, toDeg: 11.25 };

describe('unrollArcs', () => {
  it('cuts an arc over north in two and joins arcs that overlap', () => {
    expect(unrollArcs([nwToN])).toEqual([
      { from: 0, to: 11.25 },
      { from: 303.75, to: 360 },
    ]);
    expect(
      unrollArcs([
        { fromDeg: 90, toDeg: 140 },
        { fromDeg: 120, toDeg: 180 },
      ]),
    ).toEqual([{ from: 90, to: 180 }]);
    expect(unrollArcs([{ fromDeg: 0, toDeg: 360 }])).toEqual([{ from: 0, to: 360 }]);
    expect(unrollArcs([{ fromDeg: 350, toDeg: 0 }])).toEqual([{ from: 350, to: 360 }]);
  });
});

describe('shareInArcs', () => {
  it('is the width of the arcs over 360 when the wind is even', () => {
    // A width just under 360 would round to equal ends, which mean one direction.
    const width = fc.oneof(fc.double({ min: 0, max: 359.9, noNaN: true }), fc.constant(360));
    fc.assert(
      fc.property(fc.double({ min: 0, max: 359.9, noNaN: true }), width, (from, wide) => {
        const arc = wide === 360 ? { fromDeg: 0, toDeg: 360 } : { fromDeg: from, toDeg: (from + wide) % 360 };
        expect(shareInArcs(even, [arc])).toBeCloseTo(wide / 360, 6);
      }),
    );
  });

  it('counts a bin that an arc cuts by the part inside', () => {
    // Bin 60 is 300-305 degrees; the arc begins at 303.75, so a quarter of it lies inside.
    expect(shareInArcs(only(60), [nwToN])).toBeCloseTo(0.25, 9);
    expect(shareInArcs(only(61), [nwToN])).toBe(1);
    expect(shareInArcs(only(30), [nwToN])).toBe(0);
  });
});

describe('settledName', () => {
  it('names the mean over north, and none for an even wind', () => {
    expect(settledName(only(70, 71, 0, 1))).toBe('N');
    expect(settledName(only(62, 63))).toBe('NW');
    expect(settledName(even)).toBeNull();
    expect(settledName(null)).toBeNull();
  });
});

describe('describeWindStrip', () => {
  it('says direction, share and arcs', () => {
    const text = describeWindStrip({ arcs: [nwToN], rows: [{ at, shares: only(62, 63) }] });
    expect(text).toBe('Wind mostly NW, 100 % in the good arcs NW-N');
  });

  it('says which way the wind turns', () => {
    const rows = [
      { at, shares: only(45) },
      { at: at + 3_600_000, shares: only(63) },
    ];
    expect(describeWindStrip({ arcs: [nwToN], rows })).toContain('veering to NW, 50 % in');
    expect(describeWindStrip({ arcs: [nwToN], rows: rows.toReversed() })).toContain('backing to SW');
  });

  it('uses the given hold before its own sum', () => {
    const rows = [{ at, shares: only(62), hold: 0.84 }];
    expect(describeWindStrip({ arcs: [nwToN], rows })).toContain('84 %');
  });

  it('says what is missing', () => {
    expect(describeWindStrip({ arcs: [nwToN], rows: [{ at, shares: null }] })).toMatch(/^No wind forecast/);
    expect(describeWindStrip({ arcs: [], rows: [{ at, shares: even }] })).toBe(
      'Wind from no settled direction; no good arcs set',
    );
  });
});

describe('mergeRows', () => {
  it('averages the rows that have a forecast', () => {
    const merged = mergeRows([
      { at, shares: only(0) },
      { at, shares: null },
      { at, shares: only(1) },
    ]);
    expect(merged?.shares?.slice(0, 3)).toEqual([0.5, 0.5, 0]);
    expect(mergeRows([])).toBeNull();
  });
});

describe('nameArcs', () => {
  it('joins names of arcs apart', () => {
    expect(nameArcs([{ fromDeg: 258.75, toDeg: 281.25 }, nwToN])).toBe('W and NW-N');
  });
});
