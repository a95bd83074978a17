import { describe, expect, it } from 'vitest';
import { declinationDeg } from './magnetic';

describe('declination', () => {
  it.each([
    // WMM2025 technical report (NOAA/BGS), test values at height 0, decimal years 2025.0 and 2027.5; values from memory.
    [2025, 80, 0, 1.28],
    [2025, 0, 120, -0.16],
    [2025, -80, 240, 68.78],
    [2027.5, 80, 0, 2.59],
    [2027.5, 0, 120, -0.24],
    [2027.5, -80, 240, 68.49],
  ])('%f, latitude %f, longitude %f', (year, lat, lon, expected) => {
    const start = Date.UTC(Math.floor(year), 0, 1);
    const length = Date.UTC(Math.floor(year) + 1, 0, 1) - start;
    expect(declinationDeg({ lat, lon }, start + (year % 1) * length)).toBeCloseTo(expected, 1);
  });

  it('is not told for a day that no model covers', () => {
    expect(declinationDeg({ lat: 40, lon: -80 }, Date.UTC(2093, 0, 1))).toBeNull();
  });
});
