import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, it } from 'vitest';
import { shadeLevel, shadePaths } from './strip-drawing';
import { WindStrip } from './wind-strip';

const at = Date.UTC(2026, 10, 7, 12);
const narrow = Array.from({ length: 72 }, (_, bin) => (bin >= 60 && bin < 66 ? 1 / 6 : 0));
const wide = Array.from({ length: 72 }, () => 1 / 72);
const arcs = [{ fromDeg: 303.75, toDeg: 11.25 }];

/** Left edges and widths of the solid bars in a drawing. */
function bars(markup: string) {
  return [...markup.matchAll(/<rect x="([\d.]+)"[^>]*?width="([\d.]+)"/g)].map((m) => [Number(m[1]), Number(m[2])]);
}

describe('WindStrip, one line', () => {
  const markup = renderToStaticMarkup(<WindStrip arcs={arcs} rows={[{ at, shares: narrow }]} />);

  it('says what it shows', () => {
    expect(markup).toContain('role="img"');
    expect(markup).toContain('aria-label="Wind mostly NW, ');
  });

  it('is 160 x 24 px', () => {
    expect(markup).toMatch(/width="160" height="24"/);
  });

  it('lays the arc over north as two bars in proportion to degrees', () => {
    // 150 px of line for 360 degrees from x = 5: 11.25 degrees is 4.69 px and 56.25 degrees 23.44 px.
    expect(bars(markup)).toEqual([
      [5, 4.69],
      [131.56, 23.44],
    ]);
  });

  it('draws a dotted line and no shading without a forecast', () => {
    const none = renderToStaticMarkup(<WindStrip arcs={arcs} rows={[{ at, shares: null }]} />);
    expect(none).toContain('stroke-dasharray');
    expect(none).not.toContain('fill-opacity');
  });
});

describe('shading', () => {
  it('is darker the surer the wind, and pale for an even one', () => {
    expect(shadeLevel(1 / 6)).toBe(8);
    expect(shadeLevel(1 / 72)).toBeLessThanOrEqual(2);
    expect(shadeLevel(0)).toBe(0);
    expect(shadeLevel(Number.NaN)).toBe(0);
  });

  it('joins touching bins of one level', () => {
    expect(shadePaths(narrow, (deg) => deg, 0, 10)).toEqual([{ level: 8, opacity: 0.92, d: 'M300 0H330v10H300z' }]);
    expect(shadePaths(wide, (deg) => deg, 0, 10).map((path) => path.d)).toEqual(['M0 0H360v10H0z']);
  });
});

describe('WindStrip, page', () => {
  const markup = renderToStaticMarkup(
    <WindStrip
      variant="page"
      arcs={arcs}
      rows={[
        { at, shares: narrow, hold: 0.84 },
        { at: at + 3_600_000, shares: null },
      ]}
      formatClock={(instant) => (instant === at ? '6:00' : '7:00')}
    />,
  );

  it('is a table with a row an hour, its clock time, direction and share', () => {
    expect(markup).toContain('<caption');
    expect(markup).toMatch(/6:00<\/th>.*NW<\/span>.*84 %<\/td>/s);
    expect(markup).toMatch(/7:00<\/th>.*no forecast<\/span>.*–<\/td>/s);
  });
});
