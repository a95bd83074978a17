import { makeHostedWeather } from './hosted';
import { type WeatherPort, type WeatherResult, weatherFailure } from './port';
import { makeReplayWeather } from './replay';
import { WEATHER_FAULTS, WEATHER_LABELS } from './words';

export interface WeatherSettings {
  /** fake, hosted or replay:FILE. */
  weather: string;
  weatherForecastUrl?: string | undefined;
  weatherEnsembleUrl?: string | undefined;
  weatherArchiveUrl?: string | undefined;
  weatherApiKey?: string | undefined;
}

const REPLAY = 'replay:';

/** The weather a setting names. `issuedAt` is for replays: when their hours count as forecast (default: now). */
export function chooseWeather(
  settings: WeatherSettings,
  options: { now?: () => number; issuedAt?: () => number } = {},
): WeatherPort {
  const now = options.now ?? Date.now;
  if (settings.weather.startsWith(REPLAY)) {
    return makeReplayWeather({ file: settings.weather.slice(REPLAY.length), issuedAt: options.issuedAt ?? now });
  }
  if (settings.weather === 'hosted') return hosted(settings, now);
  return fake(now);
}

function hosted(settings: WeatherSettings, now: () => number): WeatherPort {
  const customer = settings.weatherApiKey ? 'customer-' : '';
  return makeHostedWeather({
    forecastUrl: settings.weatherForecastUrl ?? `https://${customer}api.open-meteo.com/v1/forecast`,
    ensembleUrl: settings.weatherEnsembleUrl ?? `https://${customer}ensemble-api.open-meteo.com/v1/ensemble`,
    archiveUrl: settings.weatherArchiveUrl ?? `https://${customer}archive-api.open-meteo.com/v1/archive`,
    apiKey: settings.weatherApiKey,
    source: 'hosted',
    label: WEATHER_LABELS.hosted,
    now,
  });
}

/** The hosted adapter pointed at made weather on this machine, whose server starts with the first request. */
function fake(now: () => number): WeatherPort {
  const ask = async (request: (port: WeatherPort) => Promise<WeatherResult>): Promise<WeatherResult> => {
    let url: string;
    try {
      const { serveFakeWeather } = await import('./fake/serve');
      url = await serveFakeWeather(now);
    } catch {
      return weatherFailure('unavailable', WEATHER_FAULTS.madeNotStarted);
    }
    return request(
      makeHostedWeather({
        forecastUrl: `${url}/v1/forecast`,
        ensembleUrl: `${url}/v1/ensemble`,
        archiveUrl: `${url}/v1/archive`,
        source: 'fake',
        label: WEATHER_LABELS.made,
        now,
      }),
    );
  };
  return {
    source: 'fake',
    forecast: (place, signal) => ask((port) => port.forecast(place, signal)),
    history: (place, days, signal) => ask((port) => port.history(place, days, signal)),
  };
}
