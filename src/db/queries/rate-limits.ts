import { eq, lt } from 'drizzle-orm';
import type { Tx } from '../client';
import { rateLimits } from '../schema';

/** Counts one more in the current window of a key and gives the count so far with the window's start. */
export async function countRate(tx: Tx, key: string, now: number, windowMs: number) {
  const [row] = await tx.select().from(rateLimits).where(eq(rateLimits.key, key));
  const current = row && now - row.windowStartAt < windowMs ? row : null;
  const next = { windowStartAt: current?.windowStartAt ?? now, count: (current?.count ?? 0) + 1 };
  await tx
    .insert(rateLimits)
    .values({ key, ...next })
    .onConflictDoUpdate({ target: rateLimits.key, set: next });
  return next;
}

export async function clearRate(tx: Tx, key: string): Promise<void> {
  await tx.delete(rateLimits).where(eq(rateLimits.key, key));
}

export async function deleteOldRates(tx: Tx, before: number): Promise<void> {
  await tx.delete(rateLimits).where(lt(rateLimits.windowStartAt, before));
}
