import { formatDay } from '@/core/day-time';
import type { Role } from '@/core/permissions';
import type { Tx } from '@/db/client';
import { env } from '@/env';
import { composeMail } from '@/features/mail/compose';
import { hashSecret } from '@/lib/secrets';
import { queueMail } from '@/server/outbox';
import type { RateRule } from '@/server/rate-limit';
import type { ClubScope } from '@/server/scope';
import { aRole } from './role-words';

export const INVITATION_DAYS = 14;
export const INVITATION_MS = INVITATION_DAYS * 24 * 60 * 60_000;

/** For each club: enough for a whole club on its first day, too little to write to strangers with. */
export const INVITATION_RATE: RateRule = { name: 'invite', most: 30, windowMs: 60 * 60_000 };

interface Invited {
  id: string;
  name: string;
  email: string;
  role: Role;
  guestFrom: string | null;
  guestTo: string | null;
}

export async function mailInvitation(
  tx: Tx,
  scope: ClubScope,
  invited: Invited,
  secret: string,
  now: number,
): Promise<void> {
  const { club, actor } = scope;
  const { guestFrom, guestTo } = invited;
  const days =
    guestFrom && guestTo ? [`You may hunt from ${formatDay(guestFrom, true)} to ${formatDay(guestTo, true)}.`] : [];
  const { text, html } = composeMail({
    clubName: club.name,
    paragraphs: [
      `Hello ${invited.name},`,
      `${actor.name} invites you to join ${club.name} as ${aRole(invited.role)}.`,
      ...days,
      'The club books its stands with Windrest: you see which stands are quiet, book one, and everyone knows who is where.',
    ],
    button: { label: `Join ${club.name}`, url: `${env.appUrl}/invite/${secret}` },
    after: [
      `The link works once, for ${INVITATION_DAYS} days. If you do not know ${actor.name}, leave this mail alone.`,
    ],
  });
  await queueMail(
    tx,
    {
      clubId: club.id,
      kind: 'club.invited',
      dedupeKey: `club.invited:${invited.id}:${hashSecret(secret).slice(0, 16)}`,
      to: { email: invited.email, name: invited.name },
      subject: `${actor.name} invites you to ${club.name}`,
      text,
      html,
    },
    now,
  );
}
