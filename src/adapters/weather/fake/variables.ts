import { Unit } from '@openmeteo/sdk/unit.js';
import { Variable } from '@openmeteo/sdk/variable.js';
import type { EncodedVariable } from './encode';
import type { MadeWeather } from './make-weather';

interface Served {
  variable: Variable;
  unit: Unit;
  altitudeM: number;
  read: (made: MadeWeather) => number;
}

/** What the fake can be asked for, by the names the service's addresses use. */
export const SERVED: Record<string, Served> = {
  wind_speed_10m: {
    variable: Variable.wind_speed,
    unit: Unit.metre_per_second,
    altitudeM: 10,
    read: (made) => made.windSpeedMps,
  },
  wind_direction_10m: {
    variable: Variable.wind_direction,
    unit: Unit.degree_direction,
    altitudeM: 10,
    read: (made) => made.windFromDeg,
  },
  wind_gusts_10m: {
    variable: Variable.wind_gusts,
    unit: Unit.metre_per_second,
    altitudeM: 10,
    read: (made) => made.gustMps,
  },
  temperature_2m: { variable: Variable.temperature, unit: Unit.celsius, altitudeM: 2, read: (made) => made.tempC },
  pressure_msl: {
    variable: Variable.pressure_msl,
    unit: Unit.hectopascal,
    altitudeM: 0,
    read: (made) => made.pressureHpa,
  },
  precipitation: {
    variable: Variable.precipitation,
    unit: Unit.millimetre,
    altitudeM: 0,
    read: (made) => made.precipMm,
  },
  cloud_cover: {
    variable: Variable.cloud_cover,
    unit: Unit.percentage,
    altitudeM: 0,
    read: (made) => made.cloudPercent,
  },
  shortwave_radiation: {
    variable: Variable.shortwave_radiation,
    unit: Unit.watt_per_square_metre,
    altitudeM: 0,
    read: (made) => made.radiationWm2,
  },
  weather_code: {
    variable: Variable.weather_code,
    unit: Unit.wmo_code,
    altitudeM: 0,
    read: (made) => made.weatherCode,
  },
};

const KMH_PER_MPS = 3.6;

/** Like the service, speeds are in km/h unless metres per second were asked for. */
export function encodeVariable(
  served: Served,
  made: MadeWeather[],
  member: number,
  speedUnit: string,
): EncodedVariable {
  const inKmh = served.unit === Unit.metre_per_second && speedUnit !== 'ms';
  return {
    variable: served.variable,
    unit: inKmh ? Unit.kilometres_per_hour : served.unit,
    altitudeM: served.altitudeM,
    member,
    values: made.map((one) => served.read(one) * (inKmh ? KMH_PER_MPS : 1)),
  };
}
