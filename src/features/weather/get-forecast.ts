import type { WeatherPlace } from '@/adapters/weather/port';
import type { Forecast } from '@/core/condition-types';
import { env } from '@/env';
import { findForecastRow } from './data';
import { unpackForecast } from './pack-forecast';
import { placeKey } from './place-key';

/** Three refreshes missed in a row: the forecast is shown with its age from here on. */
export const STALE_AFTER_MS = 3 * 3_600_000;

export interface KeptForecast {
  forecast: Forecast | null;
  /** Since it was fetched; null: none is kept. */
  ageMs: number | null;
  stale: boolean;
  /** Why the last request failed, for people; null: it did not. */
  error: string | null;
}

/** The forecast last kept for a place, from the database only: reading never asks the weather service. */
export async function getForecast(place: WeatherPlace, now: number, source = env.weather): Promise<KeptForecast> {
  const row = await findForecastRow(placeKey(source, place));
  const error = row?.lastError ?? null;
  if (!row || row.issuedAt === null || row.fetchedAt === null || row.source === null) {
    return { forecast: null, ageMs: null, stale: false, error };
  }
  const kept = { issuedAt: row.issuedAt, fetchedAt: row.fetchedAt, source: row.source };
  const forecast = unpackForecast(row.body, kept);
  if (!forecast) return { forecast: null, ageMs: null, stale: false, error };
  const ageMs = Math.max(0, now - row.fetchedAt);
  return { forecast, ageMs, stale: ageMs > STALE_AFTER_MS, error };
}
