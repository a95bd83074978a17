import type { OverdueStep } from '@/core/outing/overdue-steps';
import type { Tx } from '@/db/client';
import { env } from '@/env';
import { composeMail } from '@/features/mail/compose';
import { queueMail } from '@/server/outbox';
import type { ClubScope } from '@/server/scope';
import type { OutingDetail } from './data';
import { outingFacts } from './outing-facts';
import { clockAndDay } from './words/outing';
import { OVERDUE_MAIL } from './words/overdue';

export interface OverdueReader {
  /** Of the membership, or 'contact': one mail a step and reader. */
  key: string;
  name: string;
  email: string;
}

interface Words {
  subject: string;
  opening: string;
  button: { label: string; url: string };
  after: string[];
  footer: string;
}

const boardUrl = (scope: ClubScope) => `${env.appUrl}/clubs/${scope.club.slug}/board`;

/** What each is told. `more`: for officers, what becomes of the safety contact; for the contact, the secret address. */
function wordsFor(scope: ClubScope, step: OverdueStep, outing: OutingDetail, more: string): Words {
  const { memberName, standName } = outing;
  const back = clockAndDay(outing.backBy, scope.club);
  if (step === 'member') {
    const words = OVERDUE_MAIL.member;
    return {
      subject: words.subject(back),
      opening: words.opening(standName, back),
      button: { label: words.button, url: boardUrl(scope) },
      after: [words.after],
      footer: words.footer,
    };
  }
  if (step === 'officers') {
    const words = OVERDUE_MAIL.officers;
    return {
      subject: words.subject(memberName, standName),
      opening: words.opening(memberName, back),
      button: { label: words.button, url: boardUrl(scope) },
      after: [words.call, more, words.signOut],
      footer: words.footer(scope.club.name),
    };
  }
  const words = OVERDUE_MAIL.contact;
  return {
    subject: words.subject(memberName, scope.club.name),
    opening: words.opening(memberName, back),
    button: { label: words.button, url: more },
    after: [words.call, words.link],
    footer: words.footer(memberName),
  };
}

/** Queues one mail of an overdue step; its key makes it one, whatever the number of processes. */
export async function queueOverdueMail(
  tx: Tx,
  scope: ClubScope,
  mail: { step: OverdueStep; stepId: string; outing: OutingDetail; to: OverdueReader; more: string },
  now: number,
): Promise<void> {
  const { step, outing, to } = mail;
  const { subject, opening, button, after, footer } = wordsFor(scope, step, outing, mail.more);
  const { text, html } = composeMail({
    clubName: scope.club.name,
    paragraphs: [opening],
    facts: outingFacts(outing, scope.club),
    button,
    after: [...after.filter((line) => line !== ''), OVERDUE_MAIL.noRescue],
    footer,
  });
  await queueMail(
    tx,
    {
      clubId: scope.club.id,
      kind: `overdue.${step}`,
      dedupeKey: `overdue:${mail.stepId}:${to.key}`,
      to: { name: to.name, email: to.email },
      subject,
      text,
      html,
      headers: { 'X-Priority': '1', Importance: 'high' },
    },
    now,
  );
}
