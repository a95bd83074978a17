import type { NoticeKind } from '@/core/notices/notice-kinds';
import { afterQuiet } from '@/core/notices/quiet-hours';
import type { Tx } from '@/db/client';
import { env } from '@/env';
import { composeMail, type MailParts } from '@/features/mail/compose';
import { hashSecret, newSecret } from '@/lib/secrets';
import { queueMail } from '@/server/outbox';
import type { ClubScope } from '@/server/scope';
import { insertNoticeLink, type NoticePerson } from './choices-data';
import { NOTICE_MAIL } from './words/mails';

export interface NoticeMail extends Pick<MailParts, 'paragraphs' | 'facts' | 'button' | 'after'> {
  kind: NoticeKind;
  dedupeKey: string;
  subject: string;
  /** The last instant at which it is of use: quiet hours give way to it. */
  latest?: number;
}

/**
 * Queues a notice: held over the member's quiet hours, and with a link that stops its kind, which mail programs may press
 * too (RFC 8058). False when it was queued before.
 */
export async function queueNotice(
  tx: Tx,
  scope: ClubScope,
  person: NoticePerson,
  mail: NoticeMail,
  now: number,
): Promise<boolean> {
  const { club } = scope;
  const { kind, dedupeKey, subject, latest, paragraphs, ...parts } = mail;
  const secret = newSecret();
  const { text, html } = composeMail({
    ...parts,
    paragraphs: [NOTICE_MAIL.hello(person.name), ...paragraphs],
    clubName: club.name,
    footer: NOTICE_MAIL.footer(kind),
    footLinks: [
      { label: NOTICE_MAIL.stop, url: `${env.appUrl}/unsubscribe/${secret}` },
      { label: NOTICE_MAIL.choose, url: `${env.appUrl}/clubs/${club.slug}/notices` },
    ],
  });
  const ends = afterQuiet(now, person.choices, club.zone);
  const queued = await queueMail(
    tx,
    {
      clubId: club.id,
      kind: `notice.${kind}`,
      dedupeKey,
      to: { email: person.email, name: person.name },
      subject,
      text,
      html,
      headers: {
        'List-Unsubscribe': `<${env.appUrl}/api/unsubscribe/${secret}>`,
        'List-Unsubscribe-Post': 'List-Unsubscribe=One-Click',
      },
      notBefore: latest === undefined ? ends : Math.min(ends, Math.max(now, latest)),
    },
    now,
  );
  if (queued) {
    const link = { clubId: club.id, memberId: person.memberId, kind, createdAt: now };
    await insertNoticeLink(tx, { ...link, secretHash: hashSecret(secret) });
  }
  return queued;
}

/** Those who want a kind of notice and may still come in. */
export function wanting(people: NoticePerson[], kind: NoticeKind, today: string): NoticePerson[] {
  return people.filter(
    ({ choices, guestTo, role }) => choices.kinds.includes(kind) && (role !== 'guest' || !guestTo || guestTo >= today),
  );
}
