import { and, asc, eq, gt, isNull } from 'drizzle-orm';
import { type ReadFrom, reader, type Tx } from '@/db/client';
import { clubs, invitations } from '@/db/schema';
import type { ClubScope } from '@/server/scope';

export type InvitationRow = typeof invitations.$inferSelect;
type NewInvitation = typeof invitations.$inferInsert;

export async function insertInvitation(tx: Tx, row: NewInvitation): Promise<void> {
  await tx.insert(invitations).values(row);
}

const open = (scope: ClubScope) =>
  and(eq(invitations.clubId, scope.club.id), isNull(invitations.acceptedAt), isNull(invitations.revokedAt));

/** Neither accepted nor revoked; those too old are among them, for they can be sent again. */
export function listInvitations(scope: ClubScope, from: ReadFrom = reader()): Promise<InvitationRow[]> {
  return from.select().from(invitations).where(open(scope)).orderBy(asc(invitations.name), asc(invitations.id));
}

export async function findInvitation(scope: ClubScope, id: string, from: ReadFrom): Promise<InvitationRow | null> {
  const [row] = await from
    .select()
    .from(invitations)
    .where(and(open(scope), eq(invitations.id, id)));
  return row ?? null;
}

export async function findInvitationTo(scope: ClubScope, email: string, from: ReadFrom): Promise<InvitationRow | null> {
  const [row] = await from
    .select()
    .from(invitations)
    .where(and(open(scope), eq(invitations.email, email)));
  return row ?? null;
}

export async function updateInvitation(
  scope: ClubScope,
  tx: Tx,
  id: string,
  set: Partial<NewInvitation>,
): Promise<void> {
  await tx
    .update(invitations)
    .set(set)
    .where(and(open(scope), eq(invitations.id, id)));
}

/** Guests whose sponsor is gone are not let in any more; gives their names. */
export async function revokeInvitationsBy(scope: ClubScope, tx: Tx, sponsorId: string, now: number): Promise<string[]> {
  const rows = await tx
    .update(invitations)
    .set({ revokedAt: now })
    .where(and(open(scope), eq(invitations.sponsorId, sponsorId)))
    .returning({ name: invitations.name });
  return rows.map((row) => row.name);
}

function fresh(tokenHash: string, now: number) {
  return and(
    eq(invitations.tokenHash, tokenHash),
    isNull(invitations.acceptedAt),
    isNull(invitations.revokedAt),
    gt(invitations.expiresAt, now),
  );
}

/** By the secret in its link, which stands in for a scope; a spent one too. */
export async function findInvitationBySecret(tokenHash: string, from: ReadFrom = reader()) {
  const [row] = await from
    .select({ invitation: invitations, club: clubs })
    .from(invitations)
    .innerJoin(clubs, eq(clubs.id, invitations.clubId))
    .where(eq(invitations.tokenHash, tokenHash));
  return row ?? null;
}

export function isFresh({ acceptedAt, revokedAt, expiresAt }: InvitationRow, now: number): boolean {
  return acceptedAt === null && revokedAt === null && expiresAt > now;
}

/** Marks a fresh invitation accepted: of any number of tries one gets it. */
export async function spendInvitation(tx: Tx, tokenHash: string, now: number): Promise<InvitationRow | null> {
  const [row] = await tx.update(invitations).set({ acceptedAt: now }).where(fresh(tokenHash, now)).returning();
  return row ?? null;
}
