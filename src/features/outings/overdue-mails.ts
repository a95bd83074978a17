import type { OverdueStep } from '@/core/outing/overdue-steps';
import type { Tx } from '@/db/client';
import { env } from '@/env';
import { composeMail } from '@/features/mail/compose';
import { queueMail } from '@/server/outbox';
import type { ClubScope } from '@/server/scope';
import type { OutingDetail } from './data';
import { outingFacts } from './outing-facts';
import { clockAndDay } from './outing-words';

const NO_RESCUE =
  'Windrest is no rescue service, and this mail sends nobody. When somebody may be hurt, call the emergency number.';

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
    return {
      subject: `Are you out? Back by ${back}`,
      opening: `You said you would be back from ${standName} by ${back}, and have not signed out.`,
      button: { label: 'Sign out, or move the time', url: boardUrl(scope) },
      after: ['If nobody hears from you, the club officers and then your safety contact are told.'],
      footer: 'You get this because you are signed in on the board.',
    };
  }
  if (step === 'officers') {
    return {
      subject: `Overdue: ${memberName} at ${standName}`,
      opening: `${memberName} was to be back by ${back} and has not signed out.`,
      button: { label: 'Open the board', url: boardUrl(scope) },
      after: [
        'Most often a sign-out was forgotten: call first, then look for the vehicle where it was parked.',
        more,
        'On the board you can sign them out once you know that they are safe. It never closes by itself.',
      ],
      footer: `You get this because you are an officer of ${scope.club.name}.`,
    };
  }
  return {
    subject: `Overdue: ${memberName}, ${scope.club.name}`,
    opening: `${memberName} named you to be told: they were to be back from a deer stand by ${back} and have not signed out. The club's officers have been told.`,
    button: { label: 'See where they went', url: more },
    after: [
      'Most often a sign-out was forgotten: call them first.',
      'The link needs no account and works for three days. Whoever has it can open the page: pass it only to those who help.',
    ],
    footer: `You get this because you agreed to be the safety contact of ${memberName}. The page lets you stop.`,
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
    after: [...after.filter((line) => line !== ''), NO_RESCUE],
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
