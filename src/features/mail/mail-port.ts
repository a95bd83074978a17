import { chooseMail } from '@/adapters/mail/choose';
import type { KeptMessage } from '@/adapters/mail/kept';
import type { MailPort } from '@/adapters/mail/port';
import { write } from '@/db/client';
import { env } from '@/env';
import { newId } from '@/lib/ids';
import { now } from '@/server/clock';
import { insertKept } from './data';

async function keep(message: KeptMessage): Promise<void> {
  await write((tx) =>
    insertKept(tx, {
      id: newId('mail'),
      messageId: message.messageId,
      toEmail: message.to.email,
      subject: message.subject,
      text: message.text,
      html: message.html,
      calendar: message.calendar?.content ?? null,
      at: now(),
    }),
  );
}

/** The mail service that the settings name. */
export function mailPort(): MailPort {
  return chooseMail(env, keep);
}
