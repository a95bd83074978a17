import { and, asc, count, eq, gt, gte, inArray, isNull, lte, ne, or } from 'drizzle-orm';
import { alias } from 'drizzle-orm/sqlite-core';
import type { ReadFrom } from '@/db/client';
import { approaches, closures, memberships, sits, stands, users } from '@/db/schema';
import type { ClubScope } from '@/server/scope';

interface Days {
  fromDay: string;
  toDay: string;
}

/** Stands in use; all of them, or those named. */
export async function listStandsForRules(scope: ClubScope, standIds: string[] | null, from: ReadFrom) {
  return from
    .select({
      id: stands.id,
      name: stands.name,
      lat: stands.lat,
      lon: stands.lon,
      restDays: stands.restDays,
      mostSitsSeason: stands.mostSitsSeason,
      shotRangeM: stands.shotRangeM,
      allowedMemberIds: stands.allowedMemberIds,
      seats: stands.seats,
    })
    .from(stands)
    .where(
      and(
        eq(stands.clubId, scope.club.id),
        isNull(stands.removedAt),
        standIds === null ? undefined : inArray(stands.id, standIds),
      ),
    )
    .orderBy(asc(stands.name));
}

/** Closures that touch the day, of stands and (standId null) of the whole ground. */
export async function listClosuresForRules(scope: ClubScope, fromDay: string, from: ReadFrom) {
  return from
    .select({
      standId: closures.standId,
      fromDay: closures.fromDay,
      toDay: closures.toDay,
      reason: closures.reason,
    })
    .from(closures)
    .where(
      and(
        eq(closures.clubId, scope.club.id),
        isNull(closures.removedAt),
        or(isNull(closures.toDay), gte(closures.toDay, fromDay)),
      ),
    );
}

export async function listApproachesForRules(scope: ClubScope, standIds: string[] | null, from: ReadFrom) {
  return from
    .select({
      id: approaches.id,
      standId: approaches.standId,
      name: approaches.name,
      direction: approaches.direction,
      points: approaches.points,
    })
    .from(approaches)
    .where(
      and(
        eq(approaches.clubId, scope.club.id),
        isNull(approaches.removedAt),
        standIds === null ? undefined : inArray(approaches.standId, standIds),
      ),
    );
}

/** Sits that stand on the days given, and the member's own that have not ended. */
export async function listOtherSits(
  scope: ClubScope,
  days: Days,
  memberId: string | null,
  now: number,
  from: ReadFrom,
) {
  const inDays = and(gte(sits.day, days.fromDay), lte(sits.day, days.toDay));
  const live = memberId === null ? undefined : and(eq(sits.memberId, memberId), gt(sits.endAt, now));
  return from
    .select({
      sitId: sits.id,
      standId: sits.standId,
      standName: stands.name,
      lat: stands.lat,
      lon: stands.lon,
      memberId: sits.memberId,
      memberName: users.name,
      day: sits.day,
      windows: sits.windows,
      weapon: sits.weapon,
      endAt: sits.endAt,
    })
    .from(sits)
    .innerJoin(stands, eq(stands.id, sits.standId))
    .innerJoin(memberships, eq(memberships.id, sits.memberId))
    .innerJoin(users, eq(users.id, memberships.userId))
    .where(and(eq(sits.clubId, scope.club.id), eq(sits.status, 'booked'), or(inDays, live)));
}

/** How many sits stand for each stand and member in the days given, without one of them. */
export async function countSits(scope: ClubScope, days: Days, exceptSitId: string | null, from: ReadFrom) {
  return from
    .select({ standId: sits.standId, memberId: sits.memberId, sits: count() })
    .from(sits)
    .where(
      and(
        eq(sits.clubId, scope.club.id),
        eq(sits.status, 'booked'),
        gte(sits.day, days.fromDay),
        lte(sits.day, days.toDay),
        exceptSitId === null ? undefined : ne(sits.id, exceptSitId),
      ),
    )
    .groupBy(sits.standId, sits.memberId);
}

/** Sits with guests for whom a member answers: his own with guests, and those of guests he sponsors. */
export async function listGuestSits(
  scope: ClubScope,
  days: Days,
  hostId: string,
  exceptSitId: string | null,
  from: ReadFrom,
) {
  return from
    .select({ day: sits.day, windows: sits.windows, memberId: sits.memberId, guests: sits.guests })
    .from(sits)
    .innerJoin(memberships, eq(memberships.id, sits.memberId))
    .where(
      and(
        eq(sits.clubId, scope.club.id),
        eq(sits.status, 'booked'),
        gte(sits.day, days.fromDay),
        lte(sits.day, days.toDay),
        or(eq(sits.memberId, hostId), and(eq(memberships.sponsorId, hostId), eq(memberships.role, 'guest'))),
        exceptSitId === null ? undefined : ne(sits.id, exceptSitId),
      ),
    );
}

/** Members by id, with who sponsors them; a removed one is not found. */
export async function listMembersForRules(scope: ClubScope, memberIds: string[], from: ReadFrom) {
  if (memberIds.length === 0) return [];
  const sponsor = alias(memberships, 'sponsor');
  const sponsorUser = alias(users, 'sponsor_user');
  return from
    .select({
      id: memberships.id,
      name: users.name,
      role: memberships.role,
      guestFrom: memberships.guestFrom,
      guestTo: memberships.guestTo,
      sponsorId: sponsor.id,
      sponsorName: sponsorUser.name,
    })
    .from(memberships)
    .innerJoin(users, eq(users.id, memberships.userId))
    .leftJoin(sponsor, and(eq(sponsor.id, memberships.sponsorId), isNull(sponsor.removedAt)))
    .leftJoin(sponsorUser, eq(sponsorUser.id, sponsor.userId))
    .where(
      and(eq(memberships.clubId, scope.club.id), isNull(memberships.removedAt), inArray(memberships.id, memberIds)),
    );
}

export type MemberForRules = Awaited<ReturnType<typeof listMembersForRules>>[number];

/** Guests with an account whom a member sponsors, by name. */
export async function listSponsoredGuests(scope: ClubScope, sponsorId: string, from: ReadFrom) {
  return from
    .select({ id: memberships.id, name: users.name })
    .from(memberships)
    .innerJoin(users, eq(users.id, memberships.userId))
    .where(
      and(
        eq(memberships.clubId, scope.club.id),
        eq(memberships.sponsorId, sponsorId),
        eq(memberships.role, 'guest'),
        isNull(memberships.removedAt),
      ),
    )
    .orderBy(asc(users.name));
}
