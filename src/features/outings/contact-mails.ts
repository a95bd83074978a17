import type { Tx } from '@/db/client';
import { env } from '@/env';
import { composeMail } from '@/features/mail/compose';
import { newId } from '@/lib/ids';
import { queueMail } from '@/server/outbox';

interface Person {
  name: string;
  email: string;
}

/** Asks a person whether they agree to be told. Nothing else is ever mailed to them before they say yes. */
export async function mailContactAsk(tx: Tx, member: Person, to: Person, secret: string, now: number): Promise<void> {
  const { text, html } = composeMail({
    clubName: null,
    paragraphs: [
      `Hello ${to.name},`,
      `${member.name} (${member.email}) hunts deer with a club that keeps its board on Windrest, and asks you to be their safety contact.`,
      'If you agree, you get an e-mail when they are not back in time from a stand: where they sat, where they parked, their vehicle, and when they were to be back.',
    ],
    button: { label: 'Answer yes or no', url: `${env.appUrl}/contact/${secret}` },
    after: [
      'The link works for 14 days. If you do not answer, you hear nothing more.',
      'Windrest is no rescue service: it tells you, and sends nobody.',
    ],
    footer: `You get this because ${member.name} gave this address.`,
  });
  await queueMail(
    tx,
    {
      clubId: null,
      kind: 'contact.asked',
      dedupeKey: `contact.asked:${newId('mail')}`,
      to,
      subject: `${member.name} asks you to be their safety contact`,
      text,
      html,
    },
    now,
  );
}

/** Tells the member what their contact answered. */
export async function mailContactAnswer(tx: Tx, member: Person, contact: Person, agreed: boolean, now: number) {
  const { text, html } = composeMail({
    clubName: null,
    paragraphs: [
      `Hello ${member.name},`,
      agreed
        ? `${contact.name} has agreed to be your safety contact, and is mailed when you are overdue.`
        : `${contact.name} does not want to be your safety contact. Nobody at home is mailed when you are overdue, until you name somebody who agrees.`,
    ],
    button: { label: 'Open my account', url: `${env.appUrl}/account` },
  });
  await queueMail(
    tx,
    {
      clubId: null,
      kind: 'contact.answered',
      dedupeKey: `contact.answered:${newId('mail')}`,
      to: { name: member.name, email: member.email },
      subject: agreed ? `${contact.name} agreed` : `${contact.name} said no`,
      text,
      html,
    },
    now,
  );
}
