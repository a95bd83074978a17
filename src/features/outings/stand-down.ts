import type { Tx } from '@/db/client';
import { env } from '@/env';
import { listOfficers } from '@/features/bookings/readers-data';
import { composeMail } from '@/features/mail/compose';
import { queueMail } from '@/server/outbox';
import type { ClubScope } from '@/server/scope';
import { findContact } from './contacts-data';
import type { OutingDetail } from './data';
import { listSteps, type OverdueStepRow } from './overdue-data';
import type { OverdueReader } from './overdue-mails';
import { backByText, clockAndDay } from './words/outing';
import { STAND_DOWN_MAIL } from './words/overdue';

async function toldBy(
  tx: Tx,
  scope: ClubScope,
  outing: OutingDetail,
  steps: OverdueStepRow[],
): Promise<OverdueReader[]> {
  const mailed = (step: OverdueStepRow['step']) => steps.some((row) => row.step === step && row.outcome === 'mailed');
  const officers = mailed('officers') ? await listOfficers(scope, tx) : [];
  const contact = mailed('contact') ? await findContact(outing.userId, tx) : null;
  return [
    ...officers
      .filter((officer) => officer.memberId !== outing.memberId)
      .map(({ memberId, name, email }) => ({ key: memberId, name, email })),
    ...(contact?.consentedAt ? [{ key: 'contact', name: contact.name, email: contact.email }] : []),
  ];
}

/**
 * Tells those who were told of an overdue person that they are out, or have moved the time. Steps of an earlier back-by
 * time count too when somebody signs out: the last they may have heard is that the person was overdue.
 */
export async function queueStandDown(
  tx: Tx,
  scope: ClubScope,
  kind: 'out' | 'moved',
  outing: OutingDetail,
  now: number,
): Promise<void> {
  const all = await listSteps([outing.id], tx);
  const steps = kind === 'out' ? all : all.filter((row) => row.moves === outing.moves - 1);
  const words = STAND_DOWN_MAIL;
  const { club } = scope;
  const say = (at: number) => clockAndDay(at, club);
  const { memberName, standName } = outing;
  const news =
    kind === 'out'
      ? words.out(memberName, standName, say(now), outing.signedOutBy === outing.memberId ? null : scope.member.name)
      : words.moved(memberName, standName, backByText(outing, say));
  for (const to of await toldBy(tx, scope, outing, steps)) {
    const { text, html } = composeMail({
      clubName: club.name,
      paragraphs: [news],
      ...(to.key === 'contact'
        ? {}
        : { button: { label: words.button, url: `${env.appUrl}/clubs/${club.slug}/board` } }),
      footer: words.footer,
    });
    await queueMail(
      tx,
      {
        clubId: club.id,
        kind: `overdue.${kind}`,
        dedupeKey: `overdue.${kind}:${outing.id}:${outing.moves}:${to.key}`,
        to: { name: to.name, email: to.email },
        subject: kind === 'out' ? words.outSubject(memberName) : words.movedSubject(memberName),
        text,
        html,
      },
      now,
    );
  }
}
