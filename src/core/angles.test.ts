import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { apartDeg, downwindDeg, normalizeDeg, turnDeg, windFromVector, windVector } from './angles';

const deg = fc.double({ min: -1000, max: 1000, noNaN: true });

describe('angles', () => {
  it('come into one turn', () => {
    expect([-10, 0, 360, 370, -360].map(normalizeDeg)).toEqual([350, 0, 0, 10, 0]);
    fc.assert(fc.property(deg, (d) => normalizeDeg(d) >= 0 && normalizeDeg(d) <= 360));
  });

  it('turn the short way', () => {
    expect(turnDeg(350, 10)).toBe(20);
    expect(turnDeg(10, 350)).toBe(-20);
    expect(turnDeg(0, 180)).toBe(180);
    fc.assert(
      fc.property(deg, deg, (a, b) => {
        expect(apartDeg(a, b)).toBeCloseTo(apartDeg(b, a), 9);
        expect(apartDeg(a + turnDeg(a, b), b)).toBeCloseTo(0, 9);
      }),
    );
  });

  it('send scent to the other side of where the wind comes from', () => {
    // WMO: direction is where the wind comes from.
    expect(downwindDeg(270)).toBe(90);
    expect(downwindDeg(10)).toBe(190);
    const west = windVector(270, 5);
    expect(west.east).toBeCloseTo(5, 12);
    expect(west.north).toBeCloseTo(0, 12);
  });

  it('make vectors and take them back', () => {
    fc.assert(
      fc.property(deg, fc.double({ min: 0.01, max: 60, noNaN: true }), (from, speed) => {
        const v = windVector(from, speed);
        const back = windFromVector(v.east, v.north);
        expect(back.speed).toBeCloseTo(speed, 9);
        expect(apartDeg(back.fromDeg ?? Number.NaN, from)).toBeLessThan(1e-6);
      }),
    );
    expect(windFromVector(0, 0)).toEqual({ fromDeg: null, speed: 0 });
  });
});
