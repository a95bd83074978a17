import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { parseMetarWind } from './metar-wind';
import { ktToMps, mpsToKt, mpsToMph } from './units';

const read = (text: string) => {
  const parsed = parseMetarWind(text);
  if (!parsed.ok) throw new Error(parsed.message);
  return parsed.wind;
};

describe('parseMetarWind', () => {
  // Forms of the FAA Aeronautical Information Manual 7-1 and US Navy training manuals on METAR.
  it('reads variable and calm as no direction', () => {
    expect(read('VRB04KT')).toMatchObject({ kind: 'variable', fromDeg: null, gustMps: null });
    expect(mpsToKt(read('VRB04KT').speedMps)).toBeCloseTo(4, 9);
    expect(read('00000KT')).toMatchObject({ kind: 'calm', fromDeg: null, speedMps: 0 });
  });

  it('reads a span of directions and gusts', () => {
    expect(read('21012KT 160V250')).toMatchObject({ kind: 'wind', fromDeg: 210, range: { fromDeg: 160, toDeg: 250 } });
    const gusty = read('32012G22KT 280V350');
    expect(gusty).toMatchObject({ fromDeg: 320, range: { fromDeg: 280, toDeg: 350 } });
    expect(gusty.gustMps).toBeCloseTo(ktToMps(22), 9);
  });

  it('reads north, metres a second, and knots by their definition', () => {
    expect(read('36010KT').fromDeg).toBe(360);
    expect(read('18005MPS').speedMps).toBe(5);
    // 6 kt, the most a US report may call variable, is 3.09 m/s or 6.9 mph.
    expect(read('VRB06KT').speedMps).toBeCloseTo(3.09, 2);
    expect(mpsToMph(read('VRB06KT').speedMps)).toBeCloseTo(6.9, 1);
  });

  it.each(['', '21012', '37012KT', 'VRBKT', '21012KT 160W250', '21012KT 160V250 X', '///12KT'])(
    'refuses %j',
    (text) => {
      expect(parseMetarWind(text).ok).toBe(false);
    },
  );

  it('never throws', () => {
    fc.assert(fc.property(fc.string(), (text) => typeof parseMetarWind(text).ok === 'boolean'));
  });
});
