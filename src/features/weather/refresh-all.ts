import type { WeatherPort } from '@/adapters/weather/port';
import { write } from '@/db/client';
import { deleteForecastsUntouchedSince, listClubPlaces } from './data';
import { placeKey, roundPlace } from './place-key';
import { currentWeather, refreshForecast } from './refresh-forecast';

/** A place that no club has asked for in so long is a club that moved or a setting that changed. */
const FORGET_AFTER_MS = 30 * 86_400_000;

export interface RefreshAllOutcome {
  refreshed: number;
  failed: number;
  /** Not due yet, or under way elsewhere. */
  waiting: number;
}

/** Refreshes every club's place that is due, one after another: for the timed job. */
export async function refreshAllForecasts(
  now: number,
  port: WeatherPort = currentWeather(),
  signal?: AbortSignal,
): Promise<RefreshAllOutcome> {
  const places = new Map((await listClubPlaces()).map((place) => [placeKey(port.source, place), roundPlace(place)]));
  const outcome: RefreshAllOutcome = { refreshed: 0, failed: 0, waiting: 0 };
  for (const place of places.values()) {
    if (signal?.aborted) break;
    const { status } = await refreshForecast(place, now, port, signal);
    if (status === 'refreshed') outcome.refreshed++;
    else if (status === 'failed') outcome.failed++;
    else outcome.waiting++;
  }
  if (outcome.refreshed > 0) await write((tx) => deleteForecastsUntouchedSince(tx, now - FORGET_AFTER_MS));
  return outcome;
}
