import { and, asc, eq, isNull, sql } from 'drizzle-orm';
import { type ReadFrom, reader, type Tx } from '@/db/client';
import { mapItems } from '@/db/schema';
import type { ClubScope } from '@/server/scope';

export type MapItemRow = typeof mapItems.$inferSelect;
export type MapItemValues = Omit<MapItemRow, 'id' | 'clubId' | 'version' | 'removedAt'>;

const kept = (scope: ClubScope) => and(eq(mapItems.clubId, scope.club.id), isNull(mapItems.removedAt));

export function listMapItems(scope: ClubScope, from: ReadFrom = reader()): Promise<MapItemRow[]> {
  return from
    .select()
    .from(mapItems)
    .where(kept(scope))
    .orderBy(asc(mapItems.layer), asc(sql`lower(${mapItems.name})`), asc(mapItems.id));
}

export async function getMapItem(scope: ClubScope, id: string, from: ReadFrom = reader()): Promise<MapItemRow | null> {
  const [row] = await from
    .select()
    .from(mapItems)
    .where(and(kept(scope), eq(mapItems.id, id)));
  return row ?? null;
}

export async function insertMapItem(scope: ClubScope, tx: Tx, row: MapItemValues & { id: string }): Promise<void> {
  await tx.insert(mapItems).values({ ...row, clubId: scope.club.id });
}

/** Saves over the version that was read; null when another save came between. */
export async function updateMapItem(
  scope: ClubScope,
  tx: Tx,
  at: { id: string; version: number },
  set: Partial<MapItemValues & { removedAt: number }>,
): Promise<MapItemRow | null> {
  const [row] = await tx
    .update(mapItems)
    .set({ ...set, version: at.version + 1 })
    .where(and(kept(scope), eq(mapItems.id, at.id), eq(mapItems.version, at.version)))
    .returning();
  return row ?? null;
}
