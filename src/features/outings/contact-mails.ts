import type { Tx } from '@/db/client';
import { env } from '@/env';
import { composeMail } from '@/features/mail/compose';
import { newId } from '@/lib/ids';
import { queueMail } from '@/server/outbox';
import { CONTACT_ANSWER_MAIL, CONTACT_ASK_MAIL } from './words/contact';

interface Person {
  name: string;
  email: string;
}

/** Asks a person whether they agree to be told. Nothing else is ever mailed to them before they say yes. */
export async function mailContactAsk(tx: Tx, member: Person, to: Person, secret: string, now: number): Promise<void> {
  const words = CONTACT_ASK_MAIL;
  const { text, html } = composeMail({
    clubName: null,
    paragraphs: [words.hello(to.name), words.opening(member.name, member.email), words.what],
    button: { label: words.button, url: `${env.appUrl}/contact/${secret}` },
    after: [words.lasts, words.noRescue],
    footer: words.footer(member.name),
  });
  await queueMail(
    tx,
    {
      clubId: null,
      kind: 'contact.asked',
      dedupeKey: `contact.asked:${newId('mail')}`,
      to,
      subject: words.subject(member.name),
      text,
      html,
    },
    now,
  );
}

/** Tells the member what their contact answered. */
export async function mailContactAnswer(tx: Tx, member: Person, contact: Person, agreed: boolean, now: number) {
  const words = CONTACT_ANSWER_MAIL;
  const { text, html } = composeMail({
    clubName: null,
    paragraphs: [words.hello(member.name), agreed ? words.agreed(contact.name) : words.declined(contact.name)],
    button: { label: words.button, url: `${env.appUrl}/account` },
  });
  await queueMail(
    tx,
    {
      clubId: null,
      kind: 'contact.answered',
      dedupeKey: `contact.answered:${newId('mail')}`,
      to: { name: member.name, email: member.email },
      subject: words.subject(contact.name, agreed),
      text,
      html,
    },
    now,
  );
}
