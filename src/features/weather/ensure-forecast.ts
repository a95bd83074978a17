import { setTimeout as wait } from 'node:timers/promises';
import type { WeatherPlace, WeatherPort } from '@/adapters/weather/port';
import { log } from '@/server/log';
import { getForecast, type KeptForecast } from './get-forecast';
import { currentWeather, refreshForecast } from './refresh-forecast';

const WAIT_MS = 3_000;
const LOOK_AGAIN_MS = 100;
const FRESH_MS = 3_600_000;

/**
 * The forecast for a list: what is kept if it is under an hour old, else what a refresh brings within `waitMs`, else what
 * there is, with its age and error. A refresh that takes longer goes on and is kept for the next reader.
 */
export async function ensureForecast(
  place: WeatherPlace,
  now: number,
  options: { port?: WeatherPort; waitMs?: number } = {},
): Promise<KeptForecast> {
  const port = options.port ?? currentWeather();
  const kept = await getForecast(place, now, port.source);
  if (kept.ageMs !== null && kept.ageMs < FRESH_MS) return kept;

  const ends = new AbortController();
  const timeUp = wait(options.waitMs ?? WAIT_MS, 'late' as const, { signal: ends.signal }).catch(() => 'late' as const);
  const refreshing = refreshForecast(place, now, port).catch((error: unknown) => {
    log.error({ err: error }, 'forecast not refreshed');
    return { status: 'failed' as const };
  });
  const first = await Promise.race([refreshing, timeUp]);
  if (first !== 'late' && first.status === 'busy' && !kept.forecast) await awaitOther(place, now, port, timeUp);
  ends.abort();
  return getForecast(place, now, port.source);
}

/** Another process is asking: look for what it keeps, since there is nothing else to show. */
async function awaitOther(place: WeatherPlace, now: number, port: WeatherPort, timeUp: Promise<'late'>): Promise<void> {
  for (;;) {
    if ((await Promise.race([wait(LOOK_AGAIN_MS), timeUp])) === 'late') return;
    const { forecast, error } = await getForecast(place, now, port.source);
    if (forecast || error) return;
  }
}
