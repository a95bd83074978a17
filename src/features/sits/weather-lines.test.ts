import { describe, expect, it } from 'vitest';
import type { Forecast, WeatherHour } from '@/core/condition-types';
import { mphToMps } from '@/core/units';
import { weatherLines } from './weather-lines';

const START = Date.UTC(2026, 10, 7, 11);
const HOUR = 3_600_000;

function forecast(hours: Partial<WeatherHour>[]): Forecast {
  const full = hours.map(
    (hour, i): WeatherHour => ({
      at: START + i * HOUR,
      windFromDeg: 315,
      windSpeedMps: mphToMps(8),
      gustMps: null,
      tempC: 0,
      pressureHpa: 1013.25,
      precipMm: 0,
      cloudPercent: 50,
      radiationWm2: null,
      thunder: false,
      ...hour,
    }),
  );
  return { issuedAt: START, fetchedAt: START, source: 'test', hours: full, members: [] };
}

const span = { startAt: START, endAt: START + 4 * HOUR };

describe('weatherLines', () => {
  it('gives range, gusts, temperature and barometer in the club’s units', () => {
    const given = forecast([
      { windSpeedMps: mphToMps(6), tempC: -1, pressureHpa: 1010 },
      { gustMps: mphToMps(18) },
      { windSpeedMps: mphToMps(10), tempC: 5, precipMm: 2.54, pressureHpa: 1016 },
    ]);
    expect(weatherLines(given, span, 'us')).toEqual({
      wind: 'NW 6–10 mph, gusts 18 mph',
      air: '30–41 °F, rain 0.10 in',
      // 1016 hPa / 33.86389 hPa per inHg (NIST SP 811) = 30.00 inHg
      barometer: '30.00 in, rising',
    });
    expect(weatherLines(given, span, 'metric')?.air).toBe('-1 to 5 °C, rain 2.5 mm');
  });

  it('names no direction when winds cancel, are variable or are calm', () => {
    expect(weatherLines(forecast([{ windFromDeg: 0 }, { windFromDeg: 180 }]), span, 'us')?.wind).toBe('Variable 8 mph');
    expect(weatherLines(forecast([{ windFromDeg: null }]), span, 'us')?.wind).toBe('Variable 8 mph');
    expect(weatherLines(forecast([{ windSpeedMps: 0 }]), span, 'us')?.wind).toBe('Calm');
  });

  it('takes the mean over north', () => {
    expect(weatherLines(forecast([{ windFromDeg: 350 }, { windFromDeg: 10 }]), span, 'us')?.wind).toBe('N 8 mph');
  });

  it('is null where no hour of the span is known', () => {
    expect(weatherLines(null, span, 'us')).toBeNull();
    expect(weatherLines(forecast([{}]), { startAt: START + 9 * HOUR, endAt: START + 12 * HOUR }, 'us')).toBeNull();
  });
});
