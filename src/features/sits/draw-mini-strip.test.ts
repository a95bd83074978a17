import { describe, expect, it } from 'vitest';
import { drawBars, drawShades } from './draw-mini-strip';

/** All of the wind from one bin of five degrees. */
const from = (bin: number) => Array.from({ length: 72 }, (_, i) => (i === bin ? 1 : 0));

describe('the strip of a cell', () => {
  it('lays the compass along 72 px, a fifth of a pixel a degree', () => {
    // 90 degrees is a quarter of 72 px; a bin of 5 degrees is one px.
    expect(drawShades(from(18))).toEqual([{ opacity: 0.92, d: 'M18 0H19v8H18z' }]);
    expect(drawBars([{ fromDeg: 90, toDeg: 180 }])).toEqual([{ x: 18, width: 18 }]);
  });

  it('cuts an arc over north in two, and keeps a narrow one in sight', () => {
    expect(drawBars([{ fromDeg: 350, toDeg: 10 }])).toEqual([
      { x: 0, width: 2 },
      { x: 70, width: 2 },
    ]);
    expect(drawBars([{ fromDeg: 90, toDeg: 91 }])).toEqual([{ x: 18, width: 1.5 }]);
  });

  it('shades the same wind darker the surer it is', () => {
    const spread = Array.from({ length: 72 }, () => 1 / 72);
    const [pale] = drawShades(spread);
    const [dark] = drawShades(from(0));
    expect(pale?.opacity).toBeLessThan(dark?.opacity ?? 0);
  });
});
