import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Forecast, WeatherHour } from '../condition-types';
import { DEFAULT_SETTINGS } from '../settings';
import { placeAir } from './place-air';
import { standAir } from './stand-air';

const s = DEFAULT_SETTINGS.air;
const HOUR = 3_600_000;
// Buford GA, 15 November 2016 (US Naval Observatory one-year table): rise 07:09, set 17:32 EST.
const place = { lat: 34.117, lon: -84 };
const midnight = Date.UTC(2016, 10, 15, 5);

const hour = (n: number, over: Partial<WeatherHour> = {}): WeatherHour => ({
  at: midnight + n * HOUR,
  windFromDeg: 300,
  windSpeedMps: 2,
  gustMps: null,
  tempC: 5,
  pressureHpa: 1015,
  precipMm: 0,
  cloudPercent: 0,
  radiationWm2: null,
  thunder: false,
  ...over,
});
const forecast = (hours: WeatherHour[]): Forecast => ({
  issuedAt: midnight,
  fetchedAt: midnight,
  source: 'test',
  hours,
  members: [],
});
const day = (over: Partial<WeatherHour> = {}): Forecast =>
  forecast(Array.from({ length: 24 }, (_, n) => hour(n, over)));
const stand = { seatHeightM: 5, shelter: 'open', drainBearingDeg: null, slopePercent: null } as const;
const steps = (f: Forecast | null, from: number, to: number) =>
  placeAir({ ...place, startAt: midnight + from * HOUR, endAt: midnight + to * HOUR, forecast: f }, s);

describe('air at the place', () => {
  it('is very stable on a clear light night until an hour past sunrise, then not', () => {
    const classes = steps(day(), 6, 10).map((step) => step.stability);
    expect(classes.slice(0, 4)).toEqual(['F', 'F', 'F', 'F']);
    expect(classes.slice(5)).toEqual(['C', 'C', 'C']);
  });
  it('carries the hour’s weather, thunder from either side', () => {
    const storm = forecast([
      hour(8, { gustMps: 8, tempC: 4 }),
      hour(9, { gustMps: 12, tempC: 8, thunder: true, precipMm: 3 }),
    ]);
    const step = steps(storm, 8.25, 8.75)[0];
    expect(step).toMatchObject({ gustMps: 10, tempC: 6, thunder: true, precipMm: 3, kind: 'wind', fromDeg: 300 });
  });
  it('says missing where no forecast reaches, and still knows the sun', () => {
    const [step] = steps(null, 12, 12.5);
    expect(step).toMatchObject({ kind: 'missing', fromDeg: null, speedMps: null, gustMps: null, thunder: false });
    expect(step?.sunAltitudeDeg).toBeGreaterThan(30);
  });
  it('does not mind hours out of order', () => {
    const mixed = forecast([...day().hours].reverse());
    expect(steps(mixed, 6, 10)).toEqual(steps(day(), 6, 10));
  });
});

describe('air at a stand', () => {
  it('slows the open wind by the power law and shelter', () => {
    const at = steps(day({ cloudPercent: 100 }), 12, 12.5);
    // Class D at 5 m: 0.901 (EPA-454/R-99-005 exponents).
    expect(standAir(stand, at, s)[0]?.seatSpeedMps).toBeCloseTo(2 * 0.901, 2);
    expect(standAir({ ...stand, shelter: 'dense_wood' }, at, s)[0]?.seatSpeedMps).toBeCloseTo(0.25 * 2 * 0.901, 2);
  });
  it('turns the seat wind toward the drain before sunrise, not in a strong wind', () => {
    const hill = { ...stand, drainBearingDeg: 90, slopePercent: 20 };
    const [light] = standAir(hill, steps(day(), 6, 6.5), s);
    expect(light?.driftPhase).toBe('down');
    expect(light?.seatFromDeg).toBeLessThan(300);
    expect(light?.seatFromDeg).toBeGreaterThan(270);
    const [strong] = standAir(hill, steps(day({ windSpeedMps: 7 }), 6, 6.5), s);
    expect(strong).toMatchObject({ driftWeight: 0, seatFromDeg: 300 });
  });
  it('lets drain flow decide a calm', () => {
    const hill = { ...stand, drainBearingDeg: 90, slopePercent: 20 };
    const [calm] = standAir(hill, steps(day({ windSpeedMps: 0 }), 6, 6.5), s);
    expect(calm).toMatchObject({ kind: 'calm', seatFromDeg: 270 });
    const [flat] = standAir(stand, steps(day({ windSpeedMps: 0 }), 6, 6.5), s);
    expect(flat).toMatchObject({ kind: 'calm', seatFromDeg: null, seatSpeedMps: 0 });
  });
  it('never puts a seat in a dense wood above open wind, and never gives NaN', () => {
    const num = fc.oneof(fc.constant(null), fc.double(), fc.double({ min: 0, max: 30, noNaN: true }));
    fc.assert(
      fc.property(num, num, num, fc.double(), num, (deg, speed, cloud, height, drain) => {
        const f = day({ windFromDeg: deg, windSpeedMps: speed, cloudPercent: cloud });
        const odd = { ...stand, shelter: 'dense_wood', seatHeightM: height, drainBearingDeg: drain } as const;
        for (const step of standAir(odd, steps(f, 6, 8), s)) {
          expect(Number.isNaN(step.seatSpeedMps ?? 0) || Number.isNaN(step.seatFromDeg ?? 0)).toBe(false);
          if (step.driftWeight === 0 && step.speedMps !== null) {
            expect(step.seatSpeedMps).toBeLessThanOrEqual(step.speedMps);
          }
        }
      }),
      { numRuns: 60 },
    );
  });
});
