import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, it } from 'vitest';
import { RangeChart, type RangeRow, rangeScale } from './range-chart';

const row = (key: string, value: number, low: number, high: number): RangeRow => ({
  key,
  label: key,
  range: { value, low, high },
  text: String(value),
});

describe('rangeScale', () => {
  it('begins at nought and takes in every whisker that is not far longer than the bars', () => {
    const { scale, ticks } = rangeScale([row('a', 1, 0.6, 1.6), row('b', 0.5, 0.2, 1.1)]);
    expect(scale(0)).toBe(0);
    expect(scale(1.6)).toBeLessThanOrEqual(100);
    expect(ticks[0]).toBe(0);
    expect(scale(1)).toBeCloseTo(2 * scale(0.5), 9);
  });

  it('lets the whisker of a group with hardly any hours run off the edge', () => {
    const { scale } = rangeScale([row('a', 1, 0.6, 1.6), row('b', 0, 0, 40)]);
    expect(scale(40)).toBe(100);
    expect(scale(1)).toBeGreaterThan(30);
  });

  it('stands without any figure', () => {
    expect(rangeScale([]).scale(0)).toBe(0);
    expect(rangeScale([row('a', 0, 0, 1.2)]).scale(1.2)).toBeLessThanOrEqual(100);
  });
});

it('draws a row for each group, and none of a bar where nothing can be said', () => {
  const none: RangeRow = { key: 'c', label: 'Pool', range: null, text: 'no hours sat' };
  const html = renderToStaticMarkup(
    <RangeChart title="Deer." unit="deer an hour" rows={[row('Oak', 1, 0.5, 2), none]} />,
  );
  expect(html.match(/<rect/g)).toHaveLength(1);
  expect(html).toContain('no hours sat');
  expect(html).toContain('aria-label="Chart: Deer. The table says the same."');
});
