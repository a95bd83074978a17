import { and, eq, lt, sql } from 'drizzle-orm';
import { type ReadFrom, reader, type Tx } from '@/db/client';
import { clubs, forecasts } from '@/db/schema';

export type ForecastRow = typeof forecasts.$inferSelect;

export async function findForecastRow(placeKey: string, from: ReadFrom = reader()): Promise<ForecastRow | null> {
  const [row] = await from.select().from(forecasts).where(eq(forecasts.placeKey, placeKey));
  return row ?? null;
}

/** What tells one kept forecast from the next, without its hours. */
export async function findForecastMark(placeKey: string, from: ReadFrom = reader()) {
  const [row] = await from
    .select({ fetchedAt: forecasts.fetchedAt, issuedAt: forecasts.issuedAt, lastError: forecasts.lastError })
    .from(forecasts)
    .where(eq(forecasts.placeKey, placeKey));
  return row ?? null;
}

export type ClaimSet = Pick<ForecastRow, 'nextFetchAt' | 'leaseUntil' | 'leaseBy' | 'lastTriedAt'>;

export async function claimForecastRow(tx: Tx, placeKey: string, set: ClaimSet): Promise<void> {
  await tx
    .insert(forecasts)
    .values({ placeKey, ...set })
    .onConflictDoUpdate({ target: forecasts.placeKey, set });
}

/** Writes the outcome of a request, unless the lease went to another in the meantime. */
export async function finishForecastRow(
  tx: Tx,
  placeKey: string,
  leaseBy: string,
  set: Partial<ForecastRow>,
): Promise<void> {
  await tx
    .update(forecasts)
    .set({ ...set, leaseUntil: null, leaseBy: null })
    .where(and(eq(forecasts.placeKey, placeKey), eq(forecasts.leaseBy, leaseBy)));
}

export async function deleteForecastsUntouchedSince(tx: Tx, before: number): Promise<void> {
  await tx.delete(forecasts).where(lt(sql`coalesce(${forecasts.lastTriedAt}, 0)`, before));
}

export async function listClubPlaces(): Promise<{ lat: number; lon: number }[]> {
  return reader().selectDistinct({ lat: clubs.lat, lon: clubs.lon }).from(clubs);
}
