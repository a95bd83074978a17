import type { VariablesWithTime } from '@openmeteo/sdk/variables-with-time.js';
import type { WeatherApiResponse } from '@openmeteo/sdk/weather-api-response.js';

/** More than any request here asks for; a cut or foreign body can claim millions. */
const MOST_VARIABLES = 2000;
const MOST_VALUES = 24 * 400;

export interface DecodedVariable {
  variable: number;
  unit: number;
  altitudeM: number;
  member: number;
  values: number[];
}

export interface DecodedAnswer {
  lat: number;
  lon: number;
  /** Unix seconds of the service's "current" block; null: none. */
  currentS: number | null;
  startS: number;
  endS: number;
  intervalS: number;
  variables: DecodedVariable[];
}

/**
 * Copies the SDK's lazy readers into plain data. Null when there is no hourly block or the bytes do not hold together: the
 * SDK reads any body at all (an error page, half an answer) as if it were an answer.
 */
export function decodeAnswer(response: WeatherApiResponse | undefined): DecodedAnswer | null {
  if (!response) return null;
  try {
    const hourly = response.hourly();
    if (!hourly) return null;
    const variables = decodeVariables(hourly);
    if (!variables) return null;
    return {
      lat: response.latitude(),
      lon: response.longitude(),
      currentS: Number(response.current()?.time() ?? 0n) || null,
      startS: Number(hourly.time()),
      endS: Number(hourly.timeEnd()),
      intervalS: hourly.interval(),
      variables,
    };
  } catch {
    return null;
  }
}

function decodeVariables(hourly: VariablesWithTime): DecodedVariable[] | null {
  const count = hourly.variablesLength();
  if (!(count > 0 && count <= MOST_VARIABLES)) return null;
  const decoded: DecodedVariable[] = [];
  for (let index = 0; index < count; index++) {
    const variable = hourly.variables(index);
    if (!variable || !(variable.valuesLength() <= MOST_VALUES)) return null;
    decoded.push({
      variable: variable.variable(),
      unit: variable.unit(),
      altitudeM: variable.altitude(),
      member: variable.ensembleMember(),
      values: Array.from(variable.valuesArray() ?? []),
    });
  }
  return decoded;
}
