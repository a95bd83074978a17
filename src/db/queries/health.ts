import { max } from 'drizzle-orm';
import { reader } from '../client';
import { forecasts } from '../schema';

/** Instant of the newest forecast kept, for any place; null for none. Throws when the database does not answer. */
export async function newestForecastAt(): Promise<number | null> {
  const [row] = await reader()
    .select({ at: max(forecasts.fetchedAt) })
    .from(forecasts);
  return row?.at ?? null;
}
