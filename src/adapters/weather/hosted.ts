import { fetchWeatherApi } from 'openmeteo';
import type { EnsembleMember } from '@/core/condition-types';
import { checkHours, checkMembers } from './check-answer';
import { type DecodedAnswer, decodeAnswer } from './decode-answer';
import {
  type PastDays,
  type WeatherFailure,
  type WeatherPlace,
  type WeatherPort,
  type WeatherResult,
  weatherFailure,
} from './port';
import { WEATHER_FAULTS, WEATHER_LABELS } from './words';

export interface HostedWeatherOptions {
  /** Whole addresses of the two services, such as https://host/v1/forecast. */
  forecastUrl: string;
  ensembleUrl: string;
  archiveUrl: string;
  apiKey?: string | undefined;
  /** The setting this port goes by. */
  source: string;
  /** Written on each forecast, for people. */
  label: string;
  now: () => number;
  timeLimitMs?: number | undefined;
}

const FORECAST_VARIABLES = [
  'wind_speed_10m',
  'wind_direction_10m',
  'wind_gusts_10m',
  'temperature_2m',
  'pressure_msl',
  'precipitation',
  'cloud_cover',
  'shortwave_radiation',
  'weather_code',
];
const MEMBER_VARIABLES = ['wind_speed_10m', 'wind_direction_10m'];
/** The global ensemble with the most members over North America. */
const ENSEMBLE_MODEL = 'gfs_seamless';
/** Seven whole days anywhere on earth, whatever the UTC hour of asking. */
const FORECAST_DAYS = 9;
const TIME_LIMIT_MS = 10_000;
const DAY_MS = 86_400_000;

/** Forecasts of the hosted service by its SDK; the fake answers the same requests. Members are left out when they fail. */
export function makeHostedWeather(options: HostedWeatherOptions): WeatherPort {
  return {
    source: options.source,
    forecast: async (place, signal): Promise<WeatherResult> => {
      const limit = AbortSignal.timeout(options.timeLimitMs ?? TIME_LIMIT_MS);
      const within = signal ? AbortSignal.any([signal, limit]) : limit;
      const [plain, ensemble] = await Promise.all([
        ask(options.forecastUrl, forecastQuery(place, options.apiKey), within),
        ask(options.ensembleUrl, ensembleQuery(place, options.apiKey), within),
      ]);
      if (!plain.ok) return plain;
      const fetchedAt = options.now();
      const hours = checkHours(plain.answer, place, fetchedAt);
      if (!hours.ok) return weatherFailure('bad_answer', WEATHER_FAULTS.badAnswer(hours.problem));
      const instants = hours.value.map((hour) => hour.at);
      let members: EnsembleMember[] = [];
      if (ensemble.ok) {
        const checked = checkMembers(ensemble.answer, place, fetchedAt, instants);
        if (checked.ok) members = checked.value;
      }
      return {
        ok: true,
        forecast: {
          issuedAt: issueTime(plain.answer, fetchedAt),
          fetchedAt,
          source: options.label,
          hours: hours.value,
          members,
        },
      };
    },
    history: async (place, days, signal): Promise<WeatherResult> => {
      const limit = AbortSignal.timeout(options.timeLimitMs ?? TIME_LIMIT_MS);
      const within = signal ? AbortSignal.any([signal, limit]) : limit;
      const answered = await ask(options.archiveUrl, archiveQuery(place, days, options.apiKey), within);
      if (!answered.ok) return answered;
      const fetchedAt = options.now();
      const from = Date.parse(`${days.fromDay}T00:00:00Z`);
      const until = Date.parse(`${days.toDay}T00:00:00Z`) + DAY_MS;
      const span = { startsAt: (at: number) => at === from, endsAt: (at: number) => at === until };
      const hours = checkHours(answered.answer, place, fetchedAt, span);
      if (!hours.ok) return weatherFailure('bad_answer', WEATHER_FAULTS.badArchive(hours.problem));
      const source = WEATHER_LABELS.pastHours(options.label);
      return { ok: true, forecast: { issuedAt: fetchedAt, fetchedAt, source, hours: hours.value, members: [] } };
    },
  };
}

type Answered = { ok: true; answer: DecodedAnswer | null } | WeatherFailure;

async function ask(url: string, query: Record<string, string>, signal: AbortSignal): Promise<Answered> {
  try {
    // One try: a refresh is one request, and the caller waits before the next.
    const [response] = await fetchWeatherApi(url, query, 1, 0, 0, { signal });
    return { ok: true, answer: decodeAnswer(response) };
  } catch (error) {
    return explain(error, signal);
  }
}

/** The SDK throws the service's own reason for 400 and 429, the status line for 5xx, and what fetch or the reader threw. */
function explain(error: unknown, signal: AbortSignal): WeatherFailure {
  if (signal.aborted) return weatherFailure('unavailable', WEATHER_FAULTS.late);
  if (error instanceof Error && /limit exceeded|too many requests/i.test(error.message)) {
    return weatherFailure('limit', WEATHER_FAULTS.tooOften);
  }
  if (error instanceof RangeError) return weatherFailure('bad_answer', WEATHER_FAULTS.cutShort);
  return weatherFailure('unavailable', WEATHER_FAULTS.noAnswer);
}

function placeQuery(place: WeatherPlace, apiKey: string | undefined): Record<string, string> {
  return {
    latitude: place.lat.toFixed(4),
    longitude: place.lon.toFixed(4),
    wind_speed_unit: 'ms',
    timezone: 'GMT',
    past_days: '1',
    forecast_days: String(FORECAST_DAYS),
    ...(apiKey ? { apikey: apiKey } : {}),
  };
}

function forecastQuery(place: WeatherPlace, apiKey: string | undefined): Record<string, string> {
  return { ...placeQuery(place, apiKey), hourly: FORECAST_VARIABLES.join(','), current: 'temperature_2m' };
}

/** The archive knows no days back or ahead, only dates. */
function archiveQuery(place: WeatherPlace, days: PastDays, apiKey: string | undefined): Record<string, string> {
  const { past_days: _, forecast_days: __, ...at } = placeQuery(place, apiKey);
  return { ...at, hourly: FORECAST_VARIABLES.join(','), start_date: days.fromDay, end_date: days.toDay };
}

function ensembleQuery(place: WeatherPlace, apiKey: string | undefined): Record<string, string> {
  return { ...placeQuery(place, apiKey), hourly: MEMBER_VARIABLES.join(','), models: ENSEMBLE_MODEL };
}

/** The service names no model run; the time of its "current" block is the nearest it says, else the time of asking. */
function issueTime(answer: DecodedAnswer | null, fetchedAt: number): number {
  const said = (answer?.currentS ?? 0) * 1000;
  return said > fetchedAt - DAY_MS && said <= fetchedAt ? said : fetchedAt;
}
