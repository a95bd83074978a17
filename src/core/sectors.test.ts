import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { findSector, SECTORS, sectorName, sectorOf } from './sectors';

/** WMO 16-point compass: centres every 22.5 degrees, bounds 11.25 either side. */
const BOUNDS: [string, number, number][] = [
  ['N', 348.75, 11.25],
  ['NNE', 11.25, 33.75],
  ['NE', 33.75, 56.25],
  ['ENE', 56.25, 78.75],
  ['E', 78.75, 101.25],
  ['ESE', 101.25, 123.75],
  ['SE', 123.75, 146.25],
  ['SSE', 146.25, 168.75],
  ['S', 168.75, 191.25],
  ['SSW', 191.25, 213.75],
  ['SW', 213.75, 236.25],
  ['WSW', 236.25, 258.75],
  ['W', 258.75, 281.25],
  ['WNW', 281.25, 303.75],
  ['NW', 303.75, 326.25],
  ['NNW', 326.25, 348.75],
];

describe('sectors', () => {
  it('have the published bounds', () => {
    expect(SECTORS.map((s) => [s.name, s.lowerDeg, s.upperDeg])).toEqual(BOUNDS);
  });

  it('hold their lower bound and not their upper (our choice; no standard fixes it)', () => {
    for (const [name, lower, upper] of BOUNDS) {
      expect(sectorName(lower)).toBe(name);
      expect(sectorName(upper)).not.toBe(name);
    }
    expect(sectorName(11.25)).toBe('NNE');
    expect(sectorName(348.75)).toBe('N');
    expect(sectorName(360)).toBe('N');
  });

  it('hold each direction once, whatever turns are added', () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 35999 }), fc.integer({ min: -3, max: 3 }), (hundredths, turns) => {
        expect(sectorOf(hundredths / 100 + 360 * turns)).toBe(sectorOf(hundredths / 100));
      }),
    );
  });

  it('are found by point or word', () => {
    expect(findSector(' nw ')?.name).toBe('NW');
    expect(findSector('Northwest')?.name).toBe('NW');
    expect(findSector('NWN')).toBeNull();
  });
});
