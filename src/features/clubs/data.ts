import { and, asc, count, desc, eq, isNull } from 'drizzle-orm';
import { type ReadFrom, reader, type Tx } from '@/db/client';
import { auditLog, calendarFeeds, clubs, memberships, users } from '@/db/schema';
import type { ClubScope } from '@/server/scope';

export type NewClub = typeof clubs.$inferInsert;
export type MembershipRow = typeof memberships.$inferSelect;
type NewMembership = typeof memberships.$inferInsert;

export async function insertClub(tx: Tx, row: NewClub): Promise<void> {
  await tx.insert(clubs).values(row);
}

export async function slugTaken(tx: Tx, slug: string): Promise<boolean> {
  return (await tx.select({ id: clubs.id }).from(clubs).where(eq(clubs.slug, slug))).length > 0;
}

/** Saves over the version the person saw; false when another save came between. */
export async function updateClub(
  scope: ClubScope,
  tx: Tx,
  version: number,
  set: Partial<Pick<NewClub, 'name' | 'lat' | 'lon' | 'zone' | 'units' | 'rules'>>,
): Promise<boolean> {
  const saved = await tx
    .update(clubs)
    .set({ ...set, version: version + 1 })
    .where(and(eq(clubs.id, scope.club.id), eq(clubs.version, version)))
    .returning({ id: clubs.id });
  return saved.length > 0;
}

/** The club as it stands inside a change. */
export async function getClub(scope: ClubScope, from: ReadFrom) {
  const [row] = await from.select().from(clubs).where(eq(clubs.id, scope.club.id));
  return row ?? null;
}

/** Who last changed the club's rules or place. */
export async function lastClubChange(scope: ClubScope, from: ReadFrom): Promise<string | null> {
  const [row] = await from
    .select({ name: auditLog.actorName })
    .from(auditLog)
    .where(and(eq(auditLog.clubId, scope.club.id), eq(auditLog.subjectType, 'club')))
    .orderBy(desc(auditLog.at), desc(auditLog.id))
    .limit(1);
  return row?.name ?? null;
}

const kept = (scope: ClubScope) => and(eq(memberships.clubId, scope.club.id), isNull(memberships.removedAt));

function selectMembers(from: ReadFrom) {
  return from
    .select({ membership: memberships, name: users.name, email: users.email })
    .from(memberships)
    .innerJoin(users, eq(users.id, memberships.userId));
}

/** A membership with its person. */
export type MemberRow = MembershipRow & { name: string; email: string };

/** Everyone in the club, by name. */
export async function listMembers(scope: ClubScope, from: ReadFrom = reader()): Promise<MemberRow[]> {
  const rows = await selectMembers(from).where(kept(scope)).orderBy(asc(users.name), asc(memberships.id));
  return rows.map(({ membership, name, email }) => ({ ...membership, name, email }));
}

export async function findMember(scope: ClubScope, id: string, from: ReadFrom = reader()): Promise<MemberRow | null> {
  const [row] = await selectMembers(from).where(and(kept(scope), eq(memberships.id, id)));
  return row ? { ...row.membership, name: row.name, email: row.email } : null;
}

export async function countAdmins(scope: ClubScope, from: ReadFrom): Promise<number> {
  const [row] = await from
    .select({ admins: count() })
    .from(memberships)
    .where(and(kept(scope), eq(memberships.role, 'admin')));
  return row?.admins ?? 0;
}

/** By club and person, one who was removed too: before there is a scope, an invitation's secret stands in for it. */
export async function findMembershipOf(clubId: string, userId: string, from: ReadFrom): Promise<MembershipRow | null> {
  const [row] = await from
    .select()
    .from(memberships)
    .where(and(eq(memberships.clubId, clubId), eq(memberships.userId, userId)));
  return row ?? null;
}

export async function insertMembership(tx: Tx, row: NewMembership): Promise<void> {
  await tx.insert(memberships).values(row);
}

/** A person who was removed comes back as the same member. */
export async function reviveMembership(tx: Tx, id: string, set: Partial<NewMembership>): Promise<void> {
  await tx
    .update(memberships)
    .set({ ...set, removedAt: null })
    .where(eq(memberships.id, id));
}

export async function updateMember(scope: ClubScope, tx: Tx, id: string, set: Partial<NewMembership>): Promise<void> {
  await tx
    .update(memberships)
    .set(set)
    .where(and(kept(scope), eq(memberships.id, id)));
}

/** The addresses of a member's calendars stop working. */
export async function revokeFeedsOf(scope: ClubScope, tx: Tx, memberId: string, now: number): Promise<void> {
  await tx
    .update(calendarFeeds)
    .set({ revokedAt: now })
    .where(
      and(
        eq(calendarFeeds.clubId, scope.club.id),
        eq(calendarFeeds.memberId, memberId),
        isNull(calendarFeeds.revokedAt),
      ),
    );
}
