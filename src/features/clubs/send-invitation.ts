import { formatDay } from '@/core/day-time';
import type { Role } from '@/core/permissions';
import type { Tx } from '@/db/client';
import { env } from '@/env';
import { composeMail } from '@/features/mail/compose';
import { hashSecret } from '@/lib/secrets';
import { queueMail } from '@/server/outbox';
import type { RateRule } from '@/server/rate-limit';
import type { ClubScope } from '@/server/scope';
import { INVITATION_MAIL } from './words/mails';
import { aRole } from './words/roles';

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
  const days = guestFrom && guestTo ? [INVITATION_MAIL.days(formatDay(guestFrom, true), formatDay(guestTo, true))] : [];
  const { text, html } = composeMail({
    clubName: club.name,
    paragraphs: [
      INVITATION_MAIL.hello(invited.name),
      INVITATION_MAIL.opening(actor.name, club.name, aRole(invited.role)),
      ...days,
      INVITATION_MAIL.what,
    ],
    button: { label: INVITATION_MAIL.button(club.name), url: `${env.appUrl}/invite/${secret}` },
    after: [INVITATION_MAIL.lasts(INVITATION_DAYS, actor.name)],
  });
  await queueMail(
    tx,
    {
      clubId: club.id,
      kind: 'club.invited',
      dedupeKey: `club.invited:${invited.id}:${hashSecret(secret).slice(0, 16)}`,
      to: { email: invited.email, name: invited.name },
      subject: INVITATION_MAIL.subject(actor.name, club.name),
      text,
      html,
    },
    now,
  );
}
