import { write } from '@/db/client';
import { requireVerified } from '@/features/accounts/resend-verify';
import { newId } from '@/lib/ids';
import { hashSecret, newSecret } from '@/lib/secrets';
import { AppError } from '@/server/errors';
import { takeRate } from '@/server/rate-limit';
import type { ClubScope } from '@/server/scope';
import { auditClub } from './audit-club';
import { requireStanding } from './check-standing';
import { listMembers } from './data';
import { findInvitationTo, insertInvitation, updateInvitation } from './invitations-data';
import type { InviteInput } from './member-schema';
import { INVITATION_MS, INVITATION_RATE, mailInvitation } from './send-invitation';
import { CLUB_AUDIT } from './words/audit';
import { CLUB_ERRORS } from './words/errors';
import { aRole } from './words/roles';

interface Inviter {
  emailVerifiedAt: number | null;
}

function refuseEmail(message: string): never {
  throw new AppError('conflict', message, { fields: { email: message } });
}

/** Mails a link that works once. An address already in the club, or already invited, is refused by name. */
export async function inviteMember(
  scope: ClubScope,
  user: Inviter,
  input: InviteInput,
  now: number,
): Promise<{ name: string }> {
  requireVerified(user);
  await takeRate(INVITATION_RATE, [scope.club.id], now);
  const secret = newSecret();
  const id = newId('invitation');
  await write(async (tx) => {
    const known = (await listMembers(scope, tx)).find((member) => member.email === input.email);
    if (known) refuseEmail(CLUB_ERRORS.memberAlready(known.name));
    const waiting = await findInvitationTo(scope, input.email, tx);
    if (waiting && waiting.expiresAt > now) {
      refuseEmail(CLUB_ERRORS.invitationWaits);
    }
    if (waiting) await updateInvitation(scope, tx, waiting.id, { revokedAt: now });
    const { sponsorName } = await requireStanding(scope, tx, input, now);
    await insertInvitation(tx, {
      id,
      clubId: scope.club.id,
      ...input,
      tokenHash: hashSecret(secret),
      invitedBy: scope.member.id,
      createdAt: now,
      sentAt: now,
      expiresAt: now + INVITATION_MS,
    });
    await auditClub(
      tx,
      scope,
      {
        action: 'member.invited',
        subjectType: 'invitation',
        subjectId: id,
        summary: CLUB_AUDIT.invited(scope.actor.name, input.name, aRole(input.role), sponsorName),
        detail: { ...input },
      },
      now,
    );
    await mailInvitation(tx, scope, { id, ...input }, secret, now);
  });
  return { name: input.name };
}
