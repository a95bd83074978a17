import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Forecast } from '@/core/condition-types';
import { packForecast, unpackForecast } from './pack-forecast';
import { placeKey, roundPlace } from './place-key';

const value = fc.option(fc.double({ min: -100, max: 2000, noNaN: true }).map((x) => Math.round(x * 1000) / 1000 + 0));
const hour = fc.record({
  windFromDeg: value,
  windSpeedMps: value,
  gustMps: value,
  tempC: value,
  pressureHpa: value,
  precipMm: value,
  cloudPercent: value,
  radiationWm2: value,
  thunder: fc.boolean(),
});

describe('a packed forecast', () => {
  it('unpacks, through JSON, to what it was', () => {
    fc.assert(
      fc.property(fc.array(hour, { maxLength: 30 }), fc.nat(3), (raw, memberCount) => {
        const hours = raw.map((one, index) => ({ at: index * 3_600_000, ...one }));
        const members = Array.from({ length: memberCount }, (_, id) => ({
          id: `m${id}`,
          hours: hours.map(({ at, gustMps, tempC }) => ({ at, windFromDeg: gustMps, windSpeedMps: tempC })),
        }));
        const forecast: Forecast = { issuedAt: 1, fetchedAt: 2, source: 'x', hours, members };
        const body: unknown = JSON.parse(JSON.stringify(packForecast(forecast)));
        expect(unpackForecast(body, { issuedAt: 1, fetchedAt: 2, source: 'x' })).toEqual(forecast);
      }),
    );
  });

  it('is no forecast when another version wrote it', () => {
    const kept = { issuedAt: 1, fetchedAt: 2, source: 'x' };
    const packed = packForecast({ ...kept, hours: [], members: [] });
    expect(unpackForecast({ ...packed, version: 2 }, kept)).toBeNull();
    expect(unpackForecast(null, kept)).toBeNull();
    expect(unpackForecast({ ...packed, speed: ['fast'] }, kept)).toBeNull();
  });
});

describe('placeKey', () => {
  it('is shared within a hundredth of a degree and never between sources', () => {
    expect(placeKey('fake', { lat: 34.1234, lon: -83.9876 })).toBe('fake@34.12,-83.99');
    expect(placeKey('fake', { lat: 34.1199, lon: -83.9901 })).toBe('fake@34.12,-83.99');
    expect(placeKey('hosted', { lat: 34.12, lon: -83.99 })).not.toBe(placeKey('fake', { lat: 34.12, lon: -83.99 }));
    expect(placeKey('fake', { lat: 0.001, lon: -0.001 })).toBe('fake@0.00,0.00');
    expect(Object.is(roundPlace({ lat: -0.001, lon: 0 }).lat, 0)).toBe(true);
  });
});
