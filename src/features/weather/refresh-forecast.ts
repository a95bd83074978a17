import { randomUUID } from 'node:crypto';
import { chooseWeather } from '@/adapters/weather/choose';
import { type WeatherPlace, type WeatherPort, type WeatherResult, weatherFailure } from '@/adapters/weather/port';
import { write } from '@/db/client';
import { env } from '@/env';
import { now as readClock } from '@/server/clock';
import { log } from '@/server/log';
import { claimForecastRow, findForecastRow, finishForecastRow } from './data';
import { packForecast } from './pack-forecast';
import { placeKey, roundPlace } from './place-key';
import { WEATHER_WORDS } from './words';

const HOUR_MS = 3_600_000;
/** One request a place an hour, whoever asks; after failures the wait doubles up to this. */
export const MOST_WAIT_MS = 6 * HOUR_MS;
/** Longer than any request may take, so a lease is lost only with its process. */
const LEASE_MS = 60_000;

export type RefreshOutcome =
  | { status: 'refreshed' }
  | { status: 'failed'; message: string }
  /** The last request is less than an hour (after failures: its back-off) ago. */
  | { status: 'not_due' }
  /** Another request for the place is under way. */
  | { status: 'busy' };

export function currentWeather(): WeatherPort {
  return chooseWeather(env, { now: readClock });
}

/**
 * Asks for a place's forecast if one is due. The right to ask is claimed in a write of its own, so any number of members
 * and processes make one request an hour; the request runs outside it. A failure keeps the forecast there is.
 */
export async function refreshForecast(
  place: WeatherPlace,
  now: number,
  port: WeatherPort = currentWeather(),
  signal?: AbortSignal,
): Promise<RefreshOutcome> {
  const key = placeKey(port.source, place);
  // Most calls end here: looking costs no write.
  const waiting = refusal(await findForecastRow(key), now);
  if (waiting) return waiting;

  const leaseBy = randomUUID();
  const claimed = await write(async (tx) => {
    const row = await findForecastRow(key, tx);
    const refused = refusal(row, now);
    if (refused) return refused;
    await claimForecastRow(tx, key, {
      nextFetchAt: now + HOUR_MS,
      leaseUntil: now + LEASE_MS,
      leaseBy,
      lastTriedAt: now,
    });
    return { failures: row?.failures ?? 0 };
  });
  if ('status' in claimed) return claimed;

  const result = await ask(port, place, signal);
  if (result.ok) {
    const { issuedAt, source } = result.forecast;
    const body = packForecast(result.forecast);
    const set = { issuedAt, source, body, fetchedAt: now, lastError: null, failures: 0 };
    await write((tx) => finishForecastRow(tx, key, leaseBy, set));
    return { status: 'refreshed' };
  }
  const failures = claimed.failures + 1;
  const nextFetchAt = now + Math.min(MOST_WAIT_MS, HOUR_MS * 2 ** (failures - 1));
  await write((tx) => finishForecastRow(tx, key, leaseBy, { lastError: result.message, failures, nextFetchAt }));
  log.warn({ place: key, reason: result.reason, failures }, 'no new forecast');
  return { status: 'failed', message: result.message };
}

function refusal(
  row: { leaseUntil: number | null; nextFetchAt: number } | null,
  now: number,
): Extract<RefreshOutcome, { status: 'busy' | 'not_due' }> | null {
  if (row?.leaseUntil && row.leaseUntil > now) return { status: 'busy' };
  if (row && row.nextFetchAt > now) return { status: 'not_due' };
  return null;
}

/** A port does not throw; if one does all the same, the lease must still end. */
async function ask(port: WeatherPort, place: WeatherPlace, signal?: AbortSignal): Promise<WeatherResult> {
  try {
    return await port.forecast(roundPlace(place), signal);
  } catch (error) {
    log.error({ err: error }, 'the weather port threw');
    return weatherFailure('unavailable', WEATHER_WORDS.cannotBeRead);
  }
}
