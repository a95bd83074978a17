import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { normalizeDeg } from '../angles';
import { DEFAULT_SETTINGS } from '../settings';
import { sunPosition } from '../sun';
import { type SlopeDrift, slopeDrift } from './slope-drift';

const MPH = 0.44704;
const s = DEFAULT_SETTINGS.air.drift;
// Buford GA, 15 November 2016 (US Naval Observatory one-year table): rise 07:09, set 17:32 EST.
const rise = Date.UTC(2016, 10, 15, 12, 9);
const set = Date.UTC(2016, 10, 15, 22, 32);
const noon = Date.UTC(2016, 10, 15, 17, 18);
const MIN = 60_000;

function driftAt(at: number, aspect: number, over: { mph?: number; cloud?: number; slope?: number } = {}): SlopeDrift {
  const sun = sunPosition(at, 34.117, -84);
  return slopeDrift(
    {
      drainBearingDeg: aspect,
      slopePercent: over.slope ?? 12,
      sunAltitudeDeg: sun.altitudeDeg,
      sunAzimuthDeg: sun.azimuthDeg,
      cloudPercent: over.cloud ?? 0,
      generalSpeedMps: (over.mph ?? 3) * MPH,
    },
    s,
  );
}

/** Minutes after sunrise at which a slope first draws air up. */
function onset(aspect: number): number {
  for (let n = 0; n < 600; n += 5) {
    const drift = driftAt(rise + n * MIN, aspect);
    if (drift.weight > 0 && drift.fromDeg === aspect) return n;
  }
  return 600;
}

describe('slope drift (NWCG PMS 437; Schroeder & Buck 1970)', () => {
  it('(a) drains after sunset and at first light, turns on east slopes first, and rises at noon', () => {
    expect(driftAt(set + 60 * MIN, 90)).toMatchObject({ phase: 'down', fromDeg: 270, weight: 1 });
    expect(driftAt(rise + 15 * MIN, 270)).toMatchObject({ phase: 'down', fromDeg: 90 });
    expect(driftAt(rise + 15 * MIN, 90).phase).toBe('turning');
    expect(driftAt(noon, 180)).toMatchObject({ phase: 'up', fromDeg: 180 });
  });
  it('(b) gives way to a general wind of 15 mph', () =>
    expect(driftAt(set + 60 * MIN, 90, { mph: 15 }).weight).toBe(0));
  it('(c) is gone under an overcast', () => expect(driftAt(set + 60 * MIN, 90, { cloud: 100 }).weight).toBe(0));
  it('(d) begins on east slopes, then south, then west', () => {
    expect(onset(90)).toBeLessThan(onset(180));
    expect(onset(180)).toBeLessThan(onset(270));
  });
  it('east slopes also turn back before west ones', () => {
    const at = set - 90 * MIN;
    expect(driftAt(at, 90).fromDeg).toBe(270);
    expect(driftAt(at, 270).fromDeg).toBe(270);
    expect(driftAt(at, 270).phase).not.toBe('down');
  });
  it('(e) stays inside 2-8 mph, up 3-8 and down 2-5, at any hour and slope', () => {
    for (let n = 0; n < 1440; n += 15) {
      for (const slope of [4, 12, 40, 120]) {
        for (const aspect of [0, 90, 180, 270]) {
          const drift = driftAt(rise + n * MIN, aspect, { slope });
          if (drift.weight === 0) continue;
          const mph = drift.speedMps / MPH;
          const up = drift.fromDeg === aspect;
          expect(mph).toBeGreaterThanOrEqual(up ? 3 : 2);
          expect(mph).toBeLessThanOrEqual(up ? 8 : 5);
        }
      }
    }
  });
  it('is not modelled on flat land, without a drain bearing, or when switched off', () => {
    expect(driftAt(set + 60 * MIN, 90, { slope: 1 }).phase).toBe('none');
    const night = { slopePercent: 20, sunAltitudeDeg: -10, sunAzimuthDeg: 280, cloudPercent: 0, generalSpeedMps: 1 };
    expect(slopeDrift({ ...night, drainBearingDeg: null }, s).phase).toBe('none');
    expect(slopeDrift({ ...night, drainBearingDeg: 90 }, { ...s, modelled: false }).phase).toBe('none');
    expect(slopeDrift({ ...night, drainBearingDeg: 90 }, s).phase).toBe('down');
  });
  it('turns with the world', () => {
    fc.assert(
      fc.property(fc.double({ min: 0, max: 360, noNaN: true }), fc.integer({ min: 0, max: 359 }), (turn, aspect) => {
        const input = {
          slopePercent: 20,
          sunAltitudeDeg: 4,
          sunAzimuthDeg: 120,
          cloudPercent: 10,
          generalSpeedMps: 1.5,
        };
        const a = slopeDrift({ ...input, drainBearingDeg: aspect }, s);
        const b = slopeDrift({ ...input, drainBearingDeg: aspect + turn, sunAzimuthDeg: 120 + turn }, s);
        expect(b.weight).toBeCloseTo(a.weight, 9);
        if (a.fromDeg !== null && b.fromDeg !== null) {
          expect(Math.cos(((b.fromDeg - normalizeDeg(a.fromDeg + turn)) * Math.PI) / 180)).toBeCloseTo(1, 9);
        }
      }),
    );
  });
});
