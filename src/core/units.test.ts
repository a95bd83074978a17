import { describe, expect, it } from 'vitest';
import * as units from './units';

describe('unit conversions', () => {
  it('match the exact definitions', () => {
    // 1 mph = 0.44704 m/s, 1 ft = 0.3048 m, 1 yd = 0.9144 m (International Yard and Pound, 1959); 1 kt = 1852/3600 m/s.
    expect(units.mphToMps(1)).toBeCloseTo(0.44704, 12);
    expect(units.ktToMps(1)).toBeCloseTo(0.514444444, 9);
    expect(units.mpsToMph(units.ktToMps(1))).toBeCloseTo(1.150779, 6);
    expect(units.mpsToMph(1)).toBeCloseTo(2.236936, 6);
    expect(units.ydToM(300)).toBeCloseTo(274.32, 10);
    expect(units.ydToM(500)).toBeCloseTo(457.2, 10);
    expect(units.ftToM(1000)).toBeCloseTo(304.8, 10);
    expect(units.miToM(1)).toBeCloseTo(1609.344, 10);
    expect(units.inToMm(1)).toBe(25.4);
    expect(units.acreToM2(1)).toBeCloseTo(4046.8564224, 6);
    // Standard atmosphere: 1013.25 hPa is 29.92 inHg.
    expect(units.hPaToInHg(1013.25)).toBeCloseTo(29.92, 2);
    expect(units.fToC(212)).toBe(100);
    expect(units.fToC(-40)).toBe(-40);
    expect(units.cToF(0)).toBe(32);
  });

  it('undo themselves', () => {
    const pairs = [
      [units.ydToM, units.mToYd],
      [units.ftToM, units.mToFt],
      [units.miToM, units.mToMi],
      [units.mphToMps, units.mpsToMph],
      [units.ktToMps, units.mpsToKt],
      [units.kmhToMps, units.mpsToKmh],
      [units.fToC, units.cToF],
      [units.inToMm, units.mmToIn],
      [units.inHgToHpa, units.hPaToInHg],
      [units.acreToM2, units.m2ToAcre],
    ] as const;
    for (const [there, back] of pairs) expect(back(there(123.456))).toBeCloseTo(123.456, 9);
  });
});

describe('display', () => {
  it('speaks in the units of the club', () => {
    expect(units.formatDistance(274.32, 'us')).toBe('300 yd');
    expect(units.formatDistance(274.32, 'metric')).toBe('274 m');
    expect(units.formatDistance(1609.344, 'us')).toBe('1.0 mi');
    expect(units.formatDistance(1500, 'metric')).toBe('1.5 km');
    expect(units.formatSpeed(5, 'us')).toBe('11 mph');
    expect(units.formatSpeed(5, 'metric')).toBe('18 km/h');
    expect(units.formatTemp(0, 'us')).toBe('32 °F');
    expect(units.formatTemp(-0.2, 'metric')).toBe('0 °C');
    expect(units.formatHeight(4.572, 'us')).toBe('15 ft');
    expect(units.formatArea(units.acreToM2(420), 'us')).toBe('420.0 acres');
  });

  it('gives rain and pressure as gauges read', () => {
    // An inch is 25.4 mm by definition; 29.92 inHg is the standard atmosphere of 1013.25 hPa.
    expect([units.formatRain(25.4, 'us'), units.formatRain(2.54, 'us'), units.formatRain(2.54, 'metric')]).toEqual([
      '1.00 in',
      '0.10 in',
      '2.5 mm',
    ]);
    expect([units.formatPressure(1013.25, 'us'), units.formatPressure(1013.25, 'metric')]).toEqual([
      '29.92 in',
      '1013 hPa',
    ]);
  });

  it('never rounds a short distance up to the rule', () => {
    expect(units.formatExactDistance(units.ydToM(299.98), 'us')).toBe('299.9 yd');
    expect(units.formatExactDistance(units.ydToM(300), 'us')).toBe('300 yd');
    expect(units.formatExactDistance(274.39, 'metric')).toBe('274.3 m');
  });
});
