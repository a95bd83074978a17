import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { arcWidthDeg, formatArc } from './arcs';
import { parseArcs } from './parse-arcs';
import { SECTORS } from './sectors';

const arcsOf = (text: string) => {
  const parsed = parseArcs(text);
  return parsed.ok ? parsed.arcs.map((a) => [a.fromDeg, a.toDeg]) : parsed;
};

describe('parseArcs', () => {
  it.each([
    ['NW-N', [[303.75, 11.25]]],
    ['nw to n', [[303.75, 11.25]]],
    ['NW – N', [[303.75, 11.25]]],
    ['W', [[258.75, 281.25]]],
    ['west', [[258.75, 281.25]]],
    ['310-20', [[310, 20]]],
    ['310°-020°', [[310, 20]]],
    ['310 to 20', [[310, 20]]],
    ['0-360', [[0, 360]]],
    ['350-360', [[350, 0]]],
    ['any', [[0, 360]]],
    ['NNE-N', [[0, 360]]],
    [
      'N, SW-W',
      [
        [348.75, 11.25],
        [213.75, 281.25],
      ],
    ],
    [
      'NW-20; 90-100 and S',
      [
        [303.75, 20],
        [90, 100],
        [168.75, 191.25],
      ],
    ],
    ['  ', []],
  ])('reads %j', (text, arcs) => {
    expect(arcsOf(text)).toEqual(arcs);
  });

  it.each([
    ['NW-Q', 0, /"Q" is not a compass point/],
    ['N, 400-20', 3, /400 is more than 360/],
    ['N, SW, 310', 7, /310 is one direction only/],
    ['90-90', 0, /one direction only/],
    ['10-20-30', 0, /is not a wind/],
    ['-10-20', 0, /is not a wind/],
  ])('says what is wrong with %j and where', (text, at, message) => {
    const parsed = parseArcs(text);
    expect(parsed).toMatchObject({ ok: false, at });
    if (!parsed.ok) expect(parsed.message).toMatch(message);
  });

  it('takes back the points it prints', () => {
    const point = fc.integer({ min: 0, max: 15 });
    fc.assert(
      fc.property(point, point, (a, b) => {
        const typed = `${SECTORS[a]?.name}-${SECTORS[b]?.name}`;
        const parsed = parseArcs(typed);
        if (!parsed.ok) throw new Error(parsed.message);
        const arc = parsed.arcs[0];
        if (!arc) throw new Error('no arc');
        expect(arcWidthDeg(arc)).toBeCloseTo((((b - a + 16) % 16) + 1) * 22.5, 9);
        expect(parseArcs(formatArc(arc).split(' ')[0] ?? '')).toEqual(parsed);
      }),
    );
  });

  it('answers any text without throwing, and names a place inside it', () => {
    fc.assert(
      fc.property(fc.string(), (text) => {
        const parsed = parseArcs(text);
        if (!parsed.ok) {
          expect(parsed.at).toBeGreaterThanOrEqual(0);
          expect(parsed.at).toBeLessThan(text.length);
          expect(parsed.message.length).toBeGreaterThan(0);
        }
      }),
    );
  });
});
