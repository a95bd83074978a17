import { write } from '@/db/client';
import { notFound } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { auditClub } from './audit-club';
import { findInvitation, updateInvitation } from './invitations-data';
import { CLUB_AUDIT } from './words/audit';

/** The link stops working at once. */
export async function revokeInvitation(
  scope: ClubScope,
  input: { id: string },
  now: number,
): Promise<{ name: string }> {
  return write(async (tx) => {
    const invitation = await findInvitation(scope, input.id, tx);
    if (!invitation) throw notFound();
    await updateInvitation(scope, tx, invitation.id, { revokedAt: now });
    await auditClub(
      tx,
      scope,
      {
        action: 'member.invitation_revoked',
        subjectType: 'invitation',
        subjectId: invitation.id,
        summary: CLUB_AUDIT.invitationRevoked(scope.actor.name, invitation.name),
      },
      now,
    );
    return { name: invitation.name };
  });
}
