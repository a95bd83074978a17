import { and, eq, inArray, isNull } from 'drizzle-orm';
import type { ReadFrom } from '@/db/client';
import { memberships, users } from '@/db/schema';
import type { ClubScope } from '@/server/scope';

/** Where guests with an account are written to, by membership; those who have left the club are not. */
export async function listGuestReaders(scope: ClubScope, memberIds: string[], from: ReadFrom) {
  if (memberIds.length === 0) return [];
  return from
    .select({ id: memberships.id, name: users.name, email: users.email, units: users.units })
    .from(memberships)
    .innerJoin(users, eq(users.id, memberships.userId))
    .where(
      and(eq(memberships.clubId, scope.club.id), isNull(memberships.removedAt), inArray(memberships.id, memberIds)),
    );
}

export type GuestReader = Awaited<ReturnType<typeof listGuestReaders>>[number];
