import { and, asc, eq, isNull } from 'drizzle-orm';
import { type ReadFrom, reader, type Tx } from '@/db/client';
import { calendarFeeds, memberships } from '@/db/schema';
import type { ClubScope } from '@/server/scope';

export type FeedRow = typeof calendarFeeds.$inferSelect;

/** By the secret of its address, which stands in for a scope: live feeds of people still in the club. */
export async function findLiveFeed(secretHash: string, from: ReadFrom = reader()) {
  const [row] = await from
    .select({ feed: calendarFeeds, role: memberships.role })
    .from(calendarFeeds)
    .innerJoin(memberships, eq(memberships.id, calendarFeeds.memberId))
    .where(
      and(
        eq(calendarFeeds.secretHash, secretHash),
        isNull(calendarFeeds.revokedAt),
        isNull(memberships.removedAt),
        eq(memberships.clubId, calendarFeeds.clubId),
      ),
    );
  return row ?? null;
}

const live = (scope: ClubScope) =>
  and(
    eq(calendarFeeds.clubId, scope.club.id),
    eq(calendarFeeds.memberId, scope.member.id),
    isNull(calendarFeeds.revokedAt),
  );

/** The member's own live feeds; never their secrets. */
export async function listLiveFeeds(scope: ClubScope, from: ReadFrom = reader()) {
  return from
    .select({
      id: calendarFeeds.id,
      scope: calendarFeeds.scope,
      withPlace: calendarFeeds.withPlace,
      createdAt: calendarFeeds.createdAt,
    })
    .from(calendarFeeds)
    .where(live(scope))
    .orderBy(asc(calendarFeeds.createdAt));
}

export async function insertFeed(tx: Tx, row: typeof calendarFeeds.$inferInsert): Promise<void> {
  await tx.insert(calendarFeeds).values(row);
}

/** Turns off the member's live feeds of one scope; gives their ids. */
export async function revokeFeeds(scope: ClubScope, tx: Tx, which: FeedRow['scope'], now: number): Promise<string[]> {
  const rows = await tx
    .update(calendarFeeds)
    .set({ revokedAt: now })
    .where(and(live(scope), eq(calendarFeeds.scope, which)))
    .returning({ id: calendarFeeds.id });
  return rows.map((row) => row.id);
}
