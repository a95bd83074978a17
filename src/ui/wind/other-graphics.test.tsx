import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, it } from 'vitest';
import { CompassMark } from './compass-mark';
import { describeTimeline, windedLine } from './describe-timeline';
import { describeRose, gatherSectors, ringStep } from './rose-shares';
import { SitTimeline } from './sit-timeline';
import { WindRose } from './wind-rose';

const at = Date.UTC(2026, 10, 7, 11);
const clock = (instant: number) => new Date(instant).toISOString().slice(11, 16);
const steps = [
  { at, arcHold: 0.9, windedChance: 0.05, sunInEyes: false, precipMm: 0 },
  { at: at + 1_800_000, arcHold: null, windedChance: null, sunInEyes: true, precipMm: null },
  { at: at + 3_600_000, arcHold: 0.4, windedChance: 0.3, sunInEyes: false, precipMm: 1.2 },
];

describe('gatherSectors', () => {
  it('splits a bin at a sector bound and loses nothing', () => {
    // Bin 2 is 10-15 degrees and the N / NNE bound stands at 11.25: one quarter to N.
    const shares = Array.from({ length: 72 }, (_, bin) => (bin === 2 ? 1 : 0));
    expect(gatherSectors(shares).slice(0, 3)).toEqual([0.25, 0.75, 0]);
    const even = gatherSectors(Array.from({ length: 72 }, () => 1 / 72));
    for (const share of even) expect(share).toBeCloseTo(1 / 16, 9);
  });
});

describe('WindRose', () => {
  const shares = Array.from({ length: 16 }, (_, i) => (i === 14 ? 0.6 : i === 0 ? 0.3 : 0));

  it('says the fullest first, and calm', () => {
    expect(describeRose(shares, 0.1)).toBe('Wind from NW 60 %, N 30 %; calm 10 %');
    expect(describeRose([])).toBe('No wind on record');
  });

  it('draws a petal only where the wind comes from', () => {
    const markup = renderToStaticMarkup(<WindRose shares={shares} calmShare={0.1} />);
    expect([...markup.matchAll(/data-sector="(\w+)"/g)].map((m) => m[1])).toEqual(['N', 'NW']);
  });

  it('keeps rings few', () => {
    for (const fullest of [0.05, 0.12, 0.33, 0.7, 1]) expect(fullest / ringStep(fullest)).toBeLessThanOrEqual(4);
  });
});

describe('SitTimeline', () => {
  it('tells lows, highs, sun and rain in words', () => {
    const text = describeTimeline(steps, clock);
    expect(text).toContain('Arc hold 90 % at 11:00, lowest 40 % at 12:00');
    expect(text).toContain('at most 30 % a half hour, at 12:00');
    expect(text).toContain('sun in the eyes 11:30');
    expect(text).toContain('rain 12:00');
  });

  it('breaks the line where there is no forecast', () => {
    expect(windedLine(steps)).toBe('M0.5 95M2.5 70');
  });

  it('holds the same numbers as a table', () => {
    const markup = renderToStaticMarkup(<SitTimeline steps={steps} formatClock={clock} />);
    expect(markup).toContain('role="img"');
    expect(markup).toMatch(/12:00<\/th><td>40 %<\/td><td>30 %<\/td><td>rain 1.2 mm/);
  });

  it('marks only moments inside the sit', () => {
    const marks = [
      { at: at + 2_700_000, label: 'sunrise 11:45' },
      { at: at - 60_000, label: 'too soon' },
    ];
    const markup = renderToStaticMarkup(<SitTimeline steps={steps} formatClock={clock} marks={marks} />);
    expect(markup).toContain('sunrise 11:45');
    expect(markup).toContain('left:50%');
    expect(markup).not.toContain('too soon');
  });
});

describe('CompassMark', () => {
  it('turns to the bearing and says it', () => {
    const markup = renderToStaticMarkup(<CompassMark bearingDeg={202.5} />);
    expect(markup).toContain('aria-label="Faces SSW, 203°"');
    expect(markup).toContain('data-bearing="203"');
    expect(renderToStaticMarkup(<CompassMark bearingDeg={null} />)).toContain('Faces every way');
  });
});
