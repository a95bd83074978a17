import { formatDay } from '@/core/day-time';
import type { Role } from '@/core/permissions';
import { reader } from '@/db/client';
import { findUserByEmail } from '@/features/accounts/data';
import { hashSecret } from '@/lib/secrets';
import { findMembershipOf } from './data';
import { findInvitationBySecret, isFresh } from './invitations-data';
import { invitationSecret } from './join-schema';
import { MEMBER_WORDS } from './words/members';

export interface OpenInvitation {
  kind: 'open';
  clubName: string;
  name: string;
  email: string;
  role: Role;
  /** 'Sat 7 Nov 2026 to Mon 9 Nov 2026' for guests. */
  days: string | null;
  /** The invited address has an account that can sign in. */
  hasAccount: boolean;
}

export type InvitationView =
  | OpenInvitation
  /** Whoever is signed in is in the club, by this invitation or another. */
  | { kind: 'in'; clubName: string; clubSlug: string }
  /** Used, revoked, too old or made up. */
  | { kind: 'dead' };

/** What an invitation's link shows to whoever holds it. */
export async function readInvitation(
  token: string | undefined,
  user: { id: string } | null,
  now: number,
): Promise<InvitationView> {
  const secret = invitationSecret.safeParse(token);
  const found = secret.success ? await findInvitationBySecret(hashSecret(secret.data)) : null;
  if (!found) return { kind: 'dead' };
  const { invitation, club } = found;
  const membership = user ? await findMembershipOf(club.id, user.id, reader()) : null;
  if (membership && membership.removedAt === null) return { kind: 'in', clubName: club.name, clubSlug: club.slug };
  if (!isFresh(invitation, now)) return { kind: 'dead' };
  const { name, email, role, guestFrom, guestTo } = invitation;
  const account = await findUserByEmail(email);
  return {
    kind: 'open',
    clubName: club.name,
    name,
    email,
    role,
    days:
      guestFrom && guestTo ? MEMBER_WORDS.guestDays(formatDay(guestFrom, true), formatDay(guestTo, true), false) : null,
    hasAccount: (account?.emailVerifiedAt ?? null) !== null,
  };
}
