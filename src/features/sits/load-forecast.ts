import type { WeatherPort } from '@/adapters/weather/port';
import type { SitWindow } from '@/core/condition-types';
import { ensureForecast } from '@/features/weather/ensure-forecast';
import type { KeptForecast } from '@/features/weather/get-forecast';
import type { ClubScope } from '@/server/scope';
import type { ForecastView } from './view-types';

const HOUR_MS = 3_600_000;

/** A forecast straight from a port, as a replay gives it: kept nowhere. */
export async function forecastFrom(port: WeatherPort, scope: ClubScope): Promise<KeptForecast> {
  const { lat, lon } = scope.club;
  const result = await port.forecast({ lat, lon });
  return result.ok
    ? { forecast: result.forecast, ageMs: 0, stale: false, error: null }
    : { forecast: null, ageMs: null, stale: false, error: result.message };
}

export function loadForecast(scope: ClubScope, now: number): Promise<KeptForecast> {
  const { lat, lon } = scope.club;
  return ensureForecast({ lat, lon }, now);
}

export function forecastReaches(kept: KeptForecast, window: SitWindow): boolean {
  return kept.forecast?.hours.some((hour) => hour.at > window.startAt - HOUR_MS && hour.at < window.endAt) ?? false;
}

/** What a screen says of the forecast for a window. */
export function forecastView(kept: KeptForecast, window: SitWindow | null): ForecastView {
  const { forecast, error, stale } = kept;
  const reaches = window === null || forecastReaches(kept, window);
  const known = stale ? 'stale' : 'fresh';
  return {
    state: !forecast ? 'none' : reaches ? known : 'beyond',
    source: forecast?.source ?? null,
    issuedAt: forecast?.issuedAt ?? null,
    fetchedAt: forecast?.fetchedAt ?? null,
    error,
  };
}
