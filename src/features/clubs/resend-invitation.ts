import { write } from '@/db/client';
import { requireVerified } from '@/features/accounts/resend-verify';
import { hashSecret, newSecret } from '@/lib/secrets';
import { notFound } from '@/server/errors';
import { takeRate } from '@/server/rate-limit';
import type { ClubScope } from '@/server/scope';
import { auditClub } from './audit-club';
import { requireStanding } from './check-standing';
import { findInvitation, updateInvitation } from './invitations-data';
import { INVITATION_MS, INVITATION_RATE, mailInvitation } from './send-invitation';
import { CLUB_AUDIT } from './words/audit';

/** Sends a new link with its full time; the one sent before stops working, for only its hash was kept. */
export async function resendInvitation(
  scope: ClubScope,
  user: { emailVerifiedAt: number | null },
  input: { id: string },
  now: number,
): Promise<{ name: string }> {
  requireVerified(user);
  await takeRate(INVITATION_RATE, [scope.club.id], now);
  const secret = newSecret();
  return write(async (tx) => {
    const invitation = await findInvitation(scope, input.id, tx);
    if (!invitation) throw notFound();
    await requireStanding(scope, tx, invitation, now);
    await updateInvitation(scope, tx, invitation.id, {
      tokenHash: hashSecret(secret),
      sentAt: now,
      expiresAt: now + INVITATION_MS,
    });
    await auditClub(
      tx,
      scope,
      {
        action: 'member.invited_again',
        subjectType: 'invitation',
        subjectId: invitation.id,
        summary: CLUB_AUDIT.invitationResent(scope.actor.name, invitation.name),
      },
      now,
    );
    await mailInvitation(tx, scope, invitation, secret, now);
    return { name: invitation.name };
  });
}
