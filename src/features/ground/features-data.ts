import { and, asc, eq, isNull, sql } from 'drizzle-orm';
import { type ReadFrom, reader, type Tx } from '@/db/client';
import { features } from '@/db/schema';
import type { ClubScope } from '@/server/scope';

export type FeatureRow = typeof features.$inferSelect;
export type FeatureValues = Omit<FeatureRow, 'id' | 'clubId' | 'rotation' | 'version' | 'removedAt'> &
  Partial<Pick<FeatureRow, 'rotation'>>;

const kept = (scope: ClubScope) => and(eq(features.clubId, scope.club.id), isNull(features.removedAt));

export function listFeatures(scope: ClubScope, from: ReadFrom = reader()): Promise<FeatureRow[]> {
  return from
    .select()
    .from(features)
    .where(kept(scope))
    .orderBy(asc(sql`lower(${features.name})`), asc(features.id));
}

export async function getFeature(scope: ClubScope, id: string, from: ReadFrom = reader()): Promise<FeatureRow | null> {
  const [row] = await from
    .select()
    .from(features)
    .where(and(kept(scope), eq(features.id, id)));
  return row ?? null;
}

export async function insertFeature(scope: ClubScope, tx: Tx, row: FeatureValues & { id: string }): Promise<void> {
  await tx.insert(features).values({ ...row, clubId: scope.club.id });
}

/** Saves over the version that was read; null when another save came between. */
export async function updateFeature(
  scope: ClubScope,
  tx: Tx,
  at: { id: string; version: number },
  set: Partial<FeatureValues & { removedAt: number }>,
): Promise<FeatureRow | null> {
  const [row] = await tx
    .update(features)
    .set({ ...set, version: at.version + 1 })
    .where(and(kept(scope), eq(features.id, at.id), eq(features.version, at.version)))
    .returning();
  return row ?? null;
}
