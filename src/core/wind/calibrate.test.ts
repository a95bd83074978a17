import { describe, expect, it } from 'vitest';
import { normalizeDeg } from '../angles';
import type { WeatherHour } from '../condition-types';
import { DEFAULT_SETTINGS } from '../settings';
import { calibrate, type ForecastPair, pairHours, sectorArcs, tuneErrorModel, withErrorModel } from './calibrate';
import { normalNodes } from './error-model';

const HOUR = 3_600_000;
const hour = (n: number, windFromDeg: number | null, windSpeedMps: number | null): WeatherHour => ({
  at: n * HOUR,
  windFromDeg,
  windSpeedMps,
  gustMps: null,
  tempC: null,
  pressureHpa: null,
  precipMm: null,
  cloudPercent: null,
  radiationWm2: null,
  thunder: false,
});

/** Forecasts all round the compass whose errors follow a normal curve of a known spread, laid out evenly, no dice. */
function pairsWithError(sigmaDeg: number, count = 400, mps = 6): ForecastPair[] {
  const { z, weights } = normalNodes(41);
  return z.flatMap((x, i) =>
    Array.from({ length: Math.round(count * (weights[i] ?? 0)) }, (_, k) => ({
      at: 0,
      leadHours: 6,
      forecastDeg: (k * 137.5) % 360,
      forecastMps: mps,
      observedDeg: normalizeDeg(((k * 137.5) % 360) + x * sigmaDeg),
    })),
  );
}

describe('pairs of hours', () => {
  it('take the observation k hours before, and count what cannot be scored', () => {
    const hours = [
      hour(0, 90, 3),
      hour(1, 0, 0),
      hour(2, null, 2),
      hour(6, 100, 4),
      hour(7, 110, 4),
      hour(8, 120, 4),
      hour(9, 1, 1),
      hour(12, null, 3),
    ];
    const { pairs, noForecast, noDirection } = pairHours(hours, 6, 6 * HOUR, 13 * HOUR);
    expect(pairs.map((p) => [p.forecastDeg, p.forecastMps, p.observedDeg])).toEqual([
      [90, 3, 100],
      [null, 0, 110],
      [null, 2, 120],
    ]);
    expect([noForecast, noDirection]).toEqual([1, 1]);
  });
});

describe('calibration', () => {
  it('is near perfect when errors are as the model says (30 degrees at 6 m/s)', () => {
    for (const width of [45, 90, 135]) {
      const result = calibrate(pairsWithError(30), width, DEFAULT_SETTINGS);
      expect(result.meanGap).toBeLessThan(0.02);
      expect(result.brier).toBeLessThan(result.climateBrier);
      expect(result.bins.reduce((n, b) => n + b.count, 0)).toBe(result.questions);
    }
  });
  it('shows a model that is too sure of itself', () => {
    const sure = calibrate(pairsWithError(60), 90, DEFAULT_SETTINGS);
    const top = sure.bins.filter((b) => b.from >= 0.7 && b.count > 0);
    for (const b of top) expect(b.came).toBeLessThan(b.given - 0.1);
  });
  it('tunes back to the spread the errors were made with', () => {
    const tuned = tuneErrorModel(pairsWithError(60, 60), [90], DEFAULT_SETTINGS);
    expect(tuned.scale).toBe(2);
    expect(tuned.strayShare).toBe(0);
  });
  it('leaves the shares of a forecast of no direction at the width of the arc', () => {
    const pairs = pairsWithError(30).map((p) => ({ ...p, forecastDeg: null }));
    const used = calibrate(pairs, 90, DEFAULT_SETTINGS).bins.filter((b) => b.count > 0);
    expect(used).toHaveLength(1);
    expect(used[0]?.given).toBeCloseTo(0.25, 9);
  });
  it('takes 16 arcs of one width round the compass', () => {
    expect(sectorArcs(90)[0]).toEqual({ fromDeg: 315, toDeg: 45 });
    expect(sectorArcs(90)).toHaveLength(16);
    expect(withErrorModel(DEFAULT_SETTINGS, 2, 0.1).wind.errorBySpeed.every((p) => p.deg <= 180)).toBe(true);
  });
});
