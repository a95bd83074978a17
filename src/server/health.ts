import { newestForecastAt } from '@/db/queries/health';
import { env } from '@/env';
import { log } from './log';

/** A replay's file name stays private. */
const weatherMode = env.weather.startsWith('replay:') ? 'replay' : env.weather;

/** Whether the database answers, and how old the newest forecast is. */
export async function readBaseHealth(now: number) {
  try {
    const lastFetchedAt = await newestForecastAt();
    const ageMinutes = lastFetchedAt === null ? null : Math.round((now - lastFetchedAt) / 60_000);
    return { database: 'ok' as const, weather: { mode: weatherMode, lastFetchedAt, ageMinutes } };
  } catch (error) {
    log.error({ err: error }, 'the database does not answer');
    return { database: 'error' as const, weather: { mode: weatherMode, lastFetchedAt: null, ageMinutes: null } };
  }
}
