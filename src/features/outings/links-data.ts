import { and, eq, gt, isNull, lt } from 'drizzle-orm';
import { type ReadFrom, reader, type Tx } from '@/db/client';
import { outings, sitLinks } from '@/db/schema';
import type { ClubScope } from '@/server/scope';

export async function insertSitLink(tx: Tx, row: typeof sitLinks.$inferInsert): Promise<void> {
  await tx.insert(sitLinks).values(row);
}

/** By the secret of its address, which stands in for a scope: neither expired nor revoked. */
export async function findLiveLink(secretHash: string, now: number, from: ReadFrom = reader()) {
  const [row] = await from
    .select({ link: sitLinks, memberId: outings.memberId })
    .from(sitLinks)
    .innerJoin(outings, eq(outings.id, sitLinks.outingId))
    .where(and(eq(sitLinks.secretHash, secretHash), isNull(sitLinks.revokedAt), gt(sitLinks.expiresAt, now)));
  return row ?? null;
}

const live = (scope: ClubScope, outingId: string, now: number) =>
  and(
    eq(sitLinks.clubId, scope.club.id),
    eq(sitLinks.outingId, outingId),
    isNull(sitLinks.revokedAt),
    gt(sitLinks.expiresAt, now),
  );

/** Turns off every live link of an outing; gives how many. */
export async function revokeLinksOf(scope: ClubScope, tx: Tx, outingId: string, now: number): Promise<number> {
  const rows = await tx
    .update(sitLinks)
    .set({ revokedAt: now })
    .where(live(scope, outingId, now))
    .returning({ id: sitLinks.id });
  return rows.length;
}

/** Outings with a live link, of those given by their club. */
export async function listLinkedOutings(scope: ClubScope, now: number, from: ReadFrom = reader()): Promise<string[]> {
  const rows = await from
    .selectDistinct({ outingId: sitLinks.outingId })
    .from(sitLinks)
    .where(and(eq(sitLinks.clubId, scope.club.id), isNull(sitLinks.revokedAt), gt(sitLinks.expiresAt, now)));
  return rows.map((row) => row.outingId);
}

/** Links that stopped working before an instant. */
export async function deleteOldLinks(tx: Tx, before: number): Promise<void> {
  await tx.delete(sitLinks).where(lt(sitLinks.expiresAt, before));
}
