import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, it } from 'vitest';
import { barbMarks, barbParts, STAFF } from './barb-parts';
import { WindBarb } from './wind-barb';

describe('barbParts', () => {
  // WMO-No. 485, appendix II-4: half barb 5 kt, full barb 10 kt, pennant 50 kt [value from memory].
  it.each([
    [0, { calm: true, pennants: 0, full: 0, half: 0 }],
    [2.4, { calm: true, pennants: 0, full: 0, half: 0 }],
    [2.5, { calm: false, pennants: 0, full: 0, half: 1 }],
    [7.4, { calm: false, pennants: 0, full: 0, half: 1 }],
    [7.5, { calm: false, pennants: 0, full: 1, half: 0 }],
    [15, { calm: false, pennants: 0, full: 1, half: 1 }],
    [48, { calm: false, pennants: 1, full: 0, half: 0 }],
    [65, { calm: false, pennants: 1, full: 1, half: 1 }],
    [120, { calm: false, pennants: 2, full: 2, half: 0 }],
  ])('%d kt', (knots, parts) => {
    expect(barbParts(knots)).toMatchObject(parts);
  });

  it('adds up to the speed it drew', () => {
    for (let knots = 0; knots <= 150; knots += 0.5) {
      const { pennants, full, half, knots: drawn } = barbParts(knots);
      expect(pennants * 50 + full * 10 + half * 5).toBe(drawn);
      expect(Math.abs(drawn - knots)).toBeLessThanOrEqual(2.5);
    }
  });

  it('takes no speed and a bad one as calm', () => {
    expect(barbParts(Number.NaN).calm).toBe(true);
    expect(barbParts(-4).calm).toBe(true);
  });
});

describe('barbMarks', () => {
  it('keeps a lone half barb off the end of the staff', () => {
    const starts = [...barbMarks(barbParts(5)).lines.matchAll(/M0 -([\d.]+)L/g)].map((m) => Number(m[1]));
    expect(starts).toHaveLength(1);
    expect(starts[0]).toBeLessThan(STAFF);
  });

  it('puts every feather on the clockwise side of a staff that points up', () => {
    const { lines, fills } = barbMarks(barbParts(65));
    const tips = [...`${lines}${fills}`.matchAll(/L([\d.-]+) /g)].map((m) => Number(m[1]));
    expect(tips.every((x) => x >= 0)).toBe(true);
    expect(Math.max(...tips)).toBeGreaterThan(0);
  });
});

describe('WindBarb', () => {
  it('points the staff to where the wind comes from and says so', () => {
    const markup = renderToStaticMarkup(<WindBarb fromDeg={315} speedMps={7.7} />);
    expect(markup).toContain('rotate(315)');
    expect(markup).toContain('aria-label="NW wind, 15 kt"');
  });

  it('shows calm as a ring and variable without a staff', () => {
    expect(renderToStaticMarkup(<WindBarb fromDeg={90} speedMps={0} />)).toContain('aria-label="Calm"');
    const variable = renderToStaticMarkup(<WindBarb fromDeg={null} speedMps={2} />);
    expect(variable).toContain('Variable wind, 5 kt');
    expect(variable).not.toContain('rotate');
  });
});
