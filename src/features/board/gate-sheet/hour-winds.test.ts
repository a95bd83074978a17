import { describe, expect, it } from 'vitest';
import type { Forecast, WeatherHour } from '@/core/condition-types';
import { hourWinds } from './hour-winds';

const hour = (at: number, more: Partial<WeatherHour>): WeatherHour => ({
  at,
  windFromDeg: 315,
  windSpeedMps: 4,
  gustMps: 7,
  tempC: 5,
  pressureHpa: 1015,
  precipMm: 0,
  cloudPercent: 50,
  radiationWm2: null,
  thunder: false,
  ...more,
});
const forecastOf = (hours: WeatherHour[]): Forecast => ({
  issuedAt: 0,
  fetchedAt: 0,
  source: 'made up',
  hours,
  members: [],
});
const ALL = { startAt: 0, endAt: 100 };

describe('wind by hour', () => {
  it('says direction and speed in the club’s units', () => {
    // 4 m/s is 8.9 mph and 14.4 km/h; 5 degrees C is 41 F (definitions of the units).
    const forecast = forecastOf([hour(1, { precipMm: 2.54 })]);
    expect(hourWinds(forecast, ALL, 'us')).toMatchObject([{ wind: 'NW 9 mph', temp: '41 °F', rain: '0.10 in' }]);
    expect(hourWinds(forecast, ALL, 'metric')).toMatchObject([{ wind: 'NW 14 km/h', temp: '5 °C', rain: '2.5 mm' }]);
  });

  it('calls still air calm and a wind without a direction variable', () => {
    const hours = [hour(1, { windSpeedMps: 0.2 }), hour(2, { windFromDeg: null, windSpeedMps: 2 })];
    expect(hourWinds(forecastOf(hours), ALL, 'us').map(({ wind, fromDeg }) => [wind, fromDeg])).toEqual([
      ['calm', null],
      ['variable 4 mph', null],
    ]);
  });

  it('leaves out hours outside the span and hours without a wind', () => {
    const hours = [hour(1, {}), hour(50, { windSpeedMps: null }), hour(60, {}), hour(101, {})];
    expect(hourWinds(forecastOf(hours), { startAt: 10, endAt: 100 }, 'us').map(({ at }) => at)).toEqual([60]);
    expect(hourWinds(null, ALL, 'us')).toEqual([]);
  });
});
