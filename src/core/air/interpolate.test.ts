import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { DEFAULT_SETTINGS } from '../settings';
import { stepStarts, usableWinds, type WindHour, windAt } from './interpolate';

const s = DEFAULT_SETTINGS.air;
const HOUR = 3_600_000;
const MIN = 60_000;
const hour = (n: number, windFromDeg: number | null, windSpeedMps: number | null): WindHour => ({
  at: n * HOUR,
  windFromDeg,
  windSpeedMps,
});
const at = (hours: WindHour[], minutes: number) => windAt(usableWinds(hours), minutes * MIN, s);

describe('wind between hours', () => {
  it('goes over north, never through the mean of the angles', () => {
    const w = at([hour(0, 350, 4), hour(1, 10, 4)], 30);
    expect(w.kind).toBe('wind');
    expect(Math.cos(((w.fromDeg ?? 90) * Math.PI) / 180)).toBeCloseTo(1, 9);
    expect(w.speedMps).toBeCloseTo(4, 9);
  });
  it('gives the hour itself at the hour', () => {
    expect(at([hour(0, 350, 4), hour(1, 10, 2)], 60)).toMatchObject({ kind: 'wind', fromDeg: 10, speedMps: 2 });
  });
  it('weighs the stronger hour more (speed-weighted mean vector, EPA-454/R-99-005 section 6.2.1)', () => {
    expect(at([hour(0, 0, 9), hour(1, 90, 3)], 30).fromDeg).toBeCloseTo(18.435, 2);
  });
  it('leaves opposed hours without a direction but with a speed', () => {
    expect(at([hour(0, 0, 4), hour(1, 180, 4)], 30)).toMatchObject({ kind: 'variable', fromDeg: null, speedMps: 4 });
  });
  it('treats a speed of zero as calm whatever its direction (METAR 00000KT)', () => {
    expect(at([hour(0, 0, 0), hour(1, 90, 0)], 30)).toMatchObject({ kind: 'calm', fromDeg: null, speedMps: 0 });
    expect(at([hour(0, 0, 0), hour(1, 90, 4)], 30)).toMatchObject({ kind: 'wind', fromDeg: 90, speedMps: 2 });
  });
  it('makes a moment between a known and a variable hour part variable (METAR VRB)', () => {
    const near = at([hour(0, 90, 3), hour(1, null, 3)], 15);
    expect(near).toMatchObject({ kind: 'wind', fromDeg: 90, variableShare: 0.25 });
    expect(at([hour(0, 90, 3), hour(1, null, 3)], 45)).toMatchObject({
      kind: 'variable',
      fromDeg: null,
      variableShare: 1,
    });
  });
  it('bridges two hours and no more', () => {
    expect(at([hour(0, 90, 3), hour(2, 90, 3)], 60).kind).toBe('wind');
    expect(at([hour(0, 90, 3), hour(3, 90, 3)], 60).kind).toBe('missing');
    expect(at([hour(0, 90, 3), hour(1, 90, null), hour(3, 90, 3)], 60).kind).toBe('missing');
  });
  it('lets the outermost hours speak for half an hour more', () => {
    expect(at([hour(1, 90, 3)], 31).kind).toBe('wind');
    expect(at([hour(1, 90, 3)], 29).kind).toBe('missing');
    expect(at([hour(1, 90, 3)], 91).kind).toBe('missing');
    expect(at([], 0).kind).toBe('missing');
  });
  it('throws out values no anemometer gives', () => {
    expect(usableWinds([hour(0, 1, -1), hour(1, 1, 1e9), hour(2, 1, Number.NaN), hour(3, 1, null)])).toEqual([]);
  });
  it('never gives NaN', () => {
    const odd = fc.oneof(fc.constant(null), fc.double(), fc.integer({ min: 0, max: 360 }));
    fc.assert(
      fc.property(
        fc.array(fc.tuple(odd, odd), { maxLength: 6 }),
        fc.integer({ min: -60, max: 400 }),
        (pairs, minutes) => {
          const w = at(
            pairs.map(([d, v], i) => hour(i, d, v)),
            minutes,
          );
          expect(Number.isNaN(w.fromDeg ?? 0)).toBe(false);
          expect(Number.isNaN(w.speedMps ?? 0)).toBe(false);
          expect(w.kind === 'wind').toBe(w.fromDeg !== null);
        },
      ),
    );
  });
});

describe('steps', () => {
  it('cover the window from its start, the last one begun before its end', () => {
    expect(stepStarts(0, 90 * MIN, 30)).toEqual([0, 30 * MIN, 60 * MIN]);
    expect(stepStarts(0, 91 * MIN, 30)).toHaveLength(4);
  });
  it('are none for an empty, reversed or broken window', () => {
    expect(stepStarts(5, 5, 30)).toEqual([]);
    expect(stepStarts(10, 5, 30)).toEqual([]);
    expect(stepStarts(Number.NaN, 5, 30)).toEqual([]);
    expect(stepStarts(0, Number.POSITIVE_INFINITY, 30)).toEqual([]);
  });
});
