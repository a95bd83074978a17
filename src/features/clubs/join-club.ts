import { dayOf } from '@/core/day-time';
import { type Tx, write } from '@/db/client';
import { requireGoodPassword } from '@/features/accounts/check-password';
import { createAccountRow, markVerified } from '@/features/accounts/create-account-row';
import { newId } from '@/lib/ids';
import { hashSecret } from '@/lib/secrets';
import { audit } from '@/server/audit';
import { AppError } from '@/server/errors';
import { hashPassword } from '@/server/passwords';
import { findMembershipOf, insertMembership, reviveMembership } from './data';
import { findInvitationBySecret, type InvitationRow, isFresh, spendInvitation } from './invitations-data';
import type { JoinInput, JoinNewInput } from './join-schema';
import { CLUB_AUDIT } from './words/audit';
import { CLUB_ERRORS } from './words/errors';
import { aRole } from './words/roles';

const deadLink = () => new AppError('invalid', CLUB_ERRORS.invitationSpent);

async function openInvitation(token: string, now: number) {
  const found = await findInvitationBySecret(hashSecret(token));
  if (!found || !isFresh(found.invitation, now)) throw deadLink();
  const { invitation, club } = found;
  if (invitation.guestTo !== null && invitation.guestTo < dayOf(now, club.zone)) {
    throw new AppError('conflict', CLUB_ERRORS.invitationOver);
  }
  return found;
}

interface Joiner {
  id: string;
  name: string;
}

async function addMember(tx: Tx, invitation: InvitationRow, user: Joiner, now: number): Promise<void> {
  const { clubId, role, sponsorId, guestFrom, guestTo } = invitation;
  const known = await findMembershipOf(clubId, user.id, tx);
  if (known && known.removedAt === null) throw new AppError('conflict', CLUB_ERRORS.inClub);
  const standing = { role, sponsorId, guestFrom, guestTo, joinedAt: now };
  const id = known?.id ?? newId('membership');
  if (known) await reviveMembership(tx, id, standing);
  else await insertMembership(tx, { id, clubId, userId: user.id, ...standing });
  await audit(
    tx,
    {
      clubId,
      actor: { userId: user.id, name: user.name },
      action: 'member.joined',
      subjectType: 'member',
      subjectId: id,
      summary: CLUB_AUDIT.joined(user.name, aRole(role), invitation.name),
      detail: { invitationId: invitation.id, role, sponsorId, guestFrom, guestTo },
    },
    now,
  );
}

/** A signed-in person takes the invitation, whatever address it was sent to: who holds the secret was given it. */
export async function joinClub(
  user: Joiner & { email: string; emailVerifiedAt: number | null },
  input: JoinInput,
  now: number,
): Promise<{ slug: string }> {
  const { club } = await openInvitation(input.token, now);
  await write(async (tx) => {
    const invitation = await spendInvitation(tx, hashSecret(input.token), now);
    if (!invitation) throw deadLink();
    if (user.emailVerifiedAt === null && user.email === invitation.email) await markVerified(tx, user.id, now);
    await addMember(tx, invitation, user, now);
  });
  return { slug: club.slug };
}

/** Makes an account for the invited address, which the link has proven, and joins. */
export async function joinWithNewAccount(input: JoinNewInput, now: number): Promise<{ slug: string; userId: string }> {
  const { invitation, club } = await openInvitation(input.token, now);
  const { name } = input;
  const { email } = invitation;
  requireGoodPassword(input.password, { name, email });
  const passwordHash = await hashPassword(input.password);
  const userId = await write(async (tx) => {
    const spent = await spendInvitation(tx, hashSecret(input.token), now);
    if (!spent) throw deadLink();
    const { id } = await createAccountRow(tx, { name, email, passwordHash }, now);
    await addMember(tx, spent, { id, name }, now);
    return id;
  });
  return { slug: club.slug, userId };
}
