import { describe, expect, it } from 'vitest';
import { distanceM, toLocal } from '@/core/geometry';
import type { HeightGrid } from '@/core/terrain/height-grid';
import { traceContours } from './trace-contours';

const STEP = 1 / 1200;
const SOUTH_WEST = { lat: 41.1, lon: -77.3 };
const TOP = { lat: SOUTH_WEST.lat + 15 * STEP, lon: SOUTH_WEST.lon + 15 * STEP };

function gridOver(height: (at: { lat: number; lon: number }) => number): HeightGrid {
  const heights = Array.from({ length: 31 * 31 }, (_, i) =>
    height({ lat: SOUTH_WEST.lat + Math.floor(i / 31) * STEP, lon: SOUTH_WEST.lon + (i % 31) * STEP }),
  );
  return { southLat: SOUTH_WEST.lat, westLon: SOUTH_WEST.lon, stepDeg: STEP, rows: 31, columns: 31, heights };
}

const fromTopM = (at: { lat: number; lon: number }) => distanceM({ eastM: 0, northM: 0 }, toLocal(TOP, at));

describe('contours', () => {
  it('run round a cone at the distance of their height', () => {
    const { lines, interval } = traceContours(
      gridOver((at) => 500 - 0.1 * fromTopM(at)),
      'metric',
    );
    const closed = lines.filter((line) => line[0]?.[0] === line.at(-1)?.[0] && line[0]?.[1] === line.at(-1)?.[1]);
    expect(interval).toBe(10);
    expect(closed.length).toBeGreaterThanOrEqual(9);
    for (const line of closed) {
      const reaches = line.map(([lon = 0, lat = 0]) => fromTopM({ lat, lon }));
      // One height to a line, and that height a whole step.
      expect(Math.max(...reaches) - Math.min(...reaches)).toBeLessThan(12);
      const height = 500 - 0.1 * (reaches.reduce((sum, r) => sum + r, 0) / reaches.length);
      expect(Math.abs(height / 10 - Math.round(height / 10))).toBeLessThan(0.1);
    }
  });

  it('run straight over a plane and never along the edge of what is known', () => {
    const { lines } = traceContours(
      gridOver(({ lat }) => 300 + (lat - SOUTH_WEST.lat) * 2000),
      'metric',
    );
    expect(lines.length).toBeGreaterThan(5);
    for (const line of lines) {
      const lats = line.map(([, lat = 0]) => lat);
      expect(Math.max(...lats) - Math.min(...lats)).toBeLessThan(1e-5);
    }
  });

  it('take steps of whole feet where the club measures in them', () => {
    const { interval, lowest, highest } = traceContours(
      gridOver(({ lat }) => 300 + (lat - SOUTH_WEST.lat) * 2000),
      'us',
    );
    expect([10, 20, 40]).toContain(interval);
    expect(highest - lowest).toBeCloseTo(((30 * STEP * 2000) / 0.3048) | 0, -1);
  });
});
