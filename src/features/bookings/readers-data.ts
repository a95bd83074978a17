import { and, asc, eq, inArray, isNull } from 'drizzle-orm';
import { PERMISSIONS_BY_ROLE, ROLES } from '@/core/permissions';
import { type ReadFrom, reader } from '@/db/client';
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

const OFFICER_ROLES = ROLES.filter((role) => PERMISSIONS_BY_ROLE[role].includes('board.sign_for_others'));

/** Who signs for others in the club, by name. */
export async function listOfficers(scope: ClubScope, from: ReadFrom = reader()) {
  return from
    .select({ memberId: memberships.id, name: users.name, email: users.email })
    .from(memberships)
    .innerJoin(users, eq(users.id, memberships.userId))
    .where(
      and(
        eq(memberships.clubId, scope.club.id),
        isNull(memberships.removedAt),
        inArray(memberships.role, OFFICER_ROLES),
      ),
    )
    .orderBy(asc(users.name), asc(memberships.id));
}
