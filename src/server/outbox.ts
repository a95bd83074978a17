import type { Tx } from '@/db/client';
import { insertMail } from '@/db/queries/outbox';
import type { OutboxMessage } from '@/db/schema';
import { newId } from '@/lib/ids';

export interface QueuedMail {
  clubId: string | null;
  /** What it is, such as `sit.booked`. */
  kind: string;
  /** One mail for one key, for ever. */
  dedupeKey: string;
  to: { email: string; name: string };
  subject: string;
  text: string;
  html?: string | null;
  calendar?: OutboxMessage['calendar'];
  headers?: Record<string, string>;
  /** Not to be sent before this instant: quiet hours. */
  notBefore?: number;
}

/** Queues a mail in the same transaction as the change it tells of; the mail job sends it. */
export async function queueMail(tx: Tx, mail: QueuedMail, at: number): Promise<boolean> {
  return insertMail(tx, {
    id: newId('mail'),
    clubId: mail.clubId,
    kind: mail.kind,
    dedupeKey: mail.dedupeKey,
    toEmail: mail.to.email,
    toName: mail.to.name,
    subject: mail.subject,
    message: {
      text: mail.text,
      html: mail.html ?? null,
      calendar: mail.calendar ?? null,
      headers: mail.headers ?? {},
    },
    nextAttemptAt: Math.max(at, mail.notBefore ?? at),
    createdAt: at,
  });
}
