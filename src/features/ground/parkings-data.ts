import { and, asc, eq, isNull, sql } from 'drizzle-orm';
import { type ReadFrom, reader, type Tx } from '@/db/client';
import { parkings } from '@/db/schema';
import type { ClubScope } from '@/server/scope';

export type ParkingRow = typeof parkings.$inferSelect;
export type ParkingValues = Omit<ParkingRow, 'id' | 'clubId' | 'version' | 'removedAt'>;

const kept = (scope: ClubScope) => and(eq(parkings.clubId, scope.club.id), isNull(parkings.removedAt));

export function listParkings(scope: ClubScope, from: ReadFrom = reader()): Promise<ParkingRow[]> {
  return from
    .select()
    .from(parkings)
    .where(kept(scope))
    .orderBy(asc(sql`lower(${parkings.name})`), asc(parkings.id));
}

export async function getParking(scope: ClubScope, id: string, from: ReadFrom = reader()): Promise<ParkingRow | null> {
  const [row] = await from
    .select()
    .from(parkings)
    .where(and(kept(scope), eq(parkings.id, id)));
  return row ?? null;
}

export async function insertParking(scope: ClubScope, tx: Tx, row: ParkingValues & { id: string }): Promise<void> {
  await tx.insert(parkings).values({ ...row, clubId: scope.club.id });
}

/** Saves over the version that was read; null when another save came between. */
export async function updateParking(
  scope: ClubScope,
  tx: Tx,
  at: { id: string; version: number },
  set: Partial<ParkingValues & { removedAt: number }>,
): Promise<ParkingRow | null> {
  const [row] = await tx
    .update(parkings)
    .set({ ...set, version: at.version + 1 })
    .where(and(kept(scope), eq(parkings.id, at.id), eq(parkings.version, at.version)))
    .returning();
  return row ?? null;
}
