import type { Tx } from '@/db/client';
import { env } from '@/env';
import { dayAndWindow } from '@/features/bookings/words/sits';
import { composeMail } from '@/features/mail/compose';
import { queueMail } from '@/server/outbox';
import type { ClubScope } from '@/server/scope';
import { listBookedAt } from './inspections-data';
import { STAND_CLOSED_MAIL } from './words/inspections';

/** Tells everyone booked at a stand that an inspection has closed it; gives how many sits. */
export async function mailClosed(
  tx: Tx,
  scope: ClubScope,
  closed: { stand: { id: string; name: string }; reason: string; closureId: string; day: string },
  now: number,
): Promise<number> {
  const words = STAND_CLOSED_MAIL;
  const { club } = scope;
  const { stand, reason, closureId, day } = closed;
  const booked = await listBookedAt(scope, stand.id, { day, now }, tx);
  for (const sit of booked) {
    const when = dayAndWindow(sit.day, sit.windows, true);
    const { text, html } = composeMail({
      clubName: club.name,
      paragraphs: [words.hello(sit.memberName), words.opening(stand.name)],
      facts: [
        { label: words.stand, value: stand.name },
        { label: words.sit, value: when },
        { label: words.why, value: reason },
      ],
      button: { label: words.button, url: `${env.appUrl}/clubs/${club.slug}/my-sits` },
      footer: words.footer,
    });
    const kind = 'stand.closed';
    const dedupeKey = `${kind}:${closureId}:${sit.id}`;
    const to = { email: sit.memberEmail, name: sit.memberName };
    const subject = words.subject(stand.name, dayAndWindow(sit.day, sit.windows));
    await queueMail(tx, { clubId: club.id, kind, dedupeKey, to, subject, text, html }, now);
  }
  return booked.length;
}
