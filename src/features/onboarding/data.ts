import { eq } from 'drizzle-orm';
import { type ReadFrom, reader, type Tx } from '@/db/client';
import { clubStarts, sampleThings } from '@/db/schema';
import type { ClubScope } from '@/server/scope';

export async function stepsAreHidden(scope: ClubScope, from: ReadFrom = reader()): Promise<boolean> {
  return (await from.select().from(clubStarts).where(eq(clubStarts.clubId, scope.club.id))).length > 0;
}

export async function insertHidden(scope: ClubScope, tx: Tx, now: number): Promise<void> {
  await tx
    .insert(clubStarts)
    .values({ clubId: scope.club.id, hiddenBy: scope.member.id, hiddenAt: now })
    .onConflictDoNothing();
}

export function listSamples(scope: ClubScope, from: ReadFrom = reader()) {
  return from.select().from(sampleThings).where(eq(sampleThings.clubId, scope.club.id));
}

export async function insertSamples(
  scope: ClubScope,
  tx: Tx,
  rows: { id: string; kind: 'stand' | 'parking' }[],
): Promise<void> {
  await tx.insert(sampleThings).values(rows.map((row) => ({ ...row, clubId: scope.club.id })));
}

export async function deleteSamples(scope: ClubScope, tx: Tx): Promise<void> {
  await tx.delete(sampleThings).where(eq(sampleThings.clubId, scope.club.id));
}
