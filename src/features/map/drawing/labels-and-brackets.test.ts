import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { bracketPath, dragDeg, onCircle } from './bracket';
import { placeLabels } from './place-labels';

const wish = fc.record({
  x: fc.integer({ min: 0, max: 800 }),
  y: fc.integer({ min: 0, max: 600 }),
  width: fc.integer({ min: 20, max: 160 }),
  height: fc.constant(16),
  clear: fc.integer({ min: 0, max: 12 }),
  centred: fc.boolean(),
});

describe('labels', () => {
  it('never lie on one another or on a mark', () => {
    fc.assert(
      fc.property(fc.array(wish, { maxLength: 80 }), (wishes) => {
        const named = wishes.map((one, i) => ({ ...one, id: String(i) }));
        const marks = wishes.map(({ x, y }) => ({ x, y, clear: 8 }));
        const boxes = placeLabels(named, marks).map(({ id, left, top }) => {
          const { width, height } = named[Number(id)] ?? { width: 0, height: 0 };
          return { left, top, right: left + width, bottom: top + height };
        });
        const over = (a: (typeof boxes)[number], b: (typeof boxes)[number]) =>
          a.left < b.right && b.left < a.right && a.top < b.bottom && b.top < a.bottom;
        boxes.forEach((box, i) => {
          for (const other of boxes.slice(i + 1)) expect(over(box, other)).toBe(false);
          for (const { x, y } of marks)
            expect(over(box, { left: x - 8, top: y - 8, right: x + 8, bottom: y + 8 })).toBe(false);
        });
      }),
    );
  });

  it('write what is chosen even on a mark, but on no other word', () => {
    const marks = Array.from({ length: 400 }, (_, i) => ({ x: (i % 20) * 20, y: Math.floor(i / 20) * 20, clear: 10 }));
    const wish = { x: 200, y: 200, width: 80, height: 16, clear: 6 };
    expect(placeLabels([{ ...wish, id: 'a' }], marks)).toEqual([]);
    const both = placeLabels(
      [
        { ...wish, id: 'a', must: true },
        { ...wish, id: 'b', must: true },
      ],
      marks,
    );
    expect(both.map(({ id }) => id)).toEqual(['a', 'b']);
    expect(both[0]).not.toEqual({ ...both[1], id: 'a' });
  });

  it('give the first in the list the first choice, and leave out what fits nowhere', () => {
    const crowd = Array.from({ length: 30 }, (_, i) => ({
      id: String(i),
      x: 100,
      y: 100,
      width: 90,
      height: 16,
      clear: 6,
    }));
    const placed = placeLabels(crowd, []);
    expect(placed[0]).toEqual({ id: '0', left: 109, top: 92 });
    expect(placed.length).toBeLessThan(10);
    expect(placed.length).toBeGreaterThan(3);
  });
});

describe('arcs as open brackets', () => {
  it('run from end to end with a tick inward at each', () => {
    expect(bracketPath({ fromDeg: 270, toDeg: 0 }, 20, 6)).toBe('M-14 0L-20 0A20 20 0 0 1 0 -20L0 -14');
    expect(bracketPath({ fromDeg: 0, toDeg: 270 }, 20, 6)).toContain('A20 20 0 1 1');
    expect(bracketPath({ fromDeg: 0, toDeg: 360 }, 20, 6)).not.toContain('L');
  });

  it('a handle dragged to a direction reads that direction', () => {
    for (let deg = 0; deg < 360; deg += 7) expect(dragDeg(...onCircle(deg, 30))).toBe(deg);
  });
});
