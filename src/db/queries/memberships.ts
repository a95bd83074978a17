import { and, asc, eq, isNull } from 'drizzle-orm';
import { type ReadFrom, reader } from '../client';
import { clubs, memberships, users } from '../schema';

export type ClubRow = typeof clubs.$inferSelect;
export type MembershipRow = typeof memberships.$inferSelect;

export async function findMembership(slug: string, userId: string, from: ReadFrom = reader()) {
  const [row] = await from
    .select({
      club: clubs,
      membership: memberships,
      user: { name: users.name, email: users.email, units: users.units },
    })
    .from(memberships)
    .innerJoin(clubs, eq(clubs.id, memberships.clubId))
    .innerJoin(users, eq(users.id, memberships.userId))
    .where(and(eq(clubs.slug, slug), eq(memberships.userId, userId), isNull(memberships.removedAt)));
  return row ?? null;
}

export async function findClubBySlug(slug: string, from: ReadFrom = reader()): Promise<ClubRow | null> {
  const [row] = await from.select().from(clubs).where(eq(clubs.slug, slug));
  return row ?? null;
}

export async function findClubById(id: string, from: ReadFrom = reader()): Promise<ClubRow | null> {
  const [row] = await from.select().from(clubs).where(eq(clubs.id, id));
  return row ?? null;
}

export function listClubsOf(userId: string) {
  return reader()
    .select({
      slug: clubs.slug,
      name: clubs.name,
      role: memberships.role,
      guestTo: memberships.guestTo,
      zone: clubs.zone,
    })
    .from(memberships)
    .innerJoin(clubs, eq(clubs.id, memberships.clubId))
    .where(and(eq(memberships.userId, userId), isNull(memberships.removedAt)))
    .orderBy(asc(clubs.name));
}

export function listClubs() {
  return reader().select().from(clubs).orderBy(asc(clubs.slug));
}
