import type { Metadata } from 'next';
import { momentText } from '@/features/clubs/audit-words';
import { DeadMailList } from '@/features/clubs/components/dead-mail-list';
import { listDeadMail } from '@/features/mail/reads';
import { clubPage } from '@/server/doors';
import { EmptyState } from '@/ui/notices';
import { PageTitle } from '@/ui/page-parts';
import { retryMailAction } from './actions';

export const metadata: Metadata = { title: 'Mail' };

export default clubPage('mail.read', async ({ scope }) => {
  const mails = await listDeadMail(scope);
  const lines = mails.map((mail) => ({
    id: mail.id,
    subject: mail.subject,
    to: `${mail.toName} (${mail.toEmail})`,
    when: `Given up ${momentText(mail.deadAt ?? mail.createdAt, scope.club)} after ${mail.attempts} ${mail.attempts === 1 ? 'try' : 'tries'}.`,
    error: mail.lastError ?? '',
  }));
  return (
    <>
      <PageTitle
        title="Mail that was given up"
        over={scope.club.name}
        lead="Mail of this club that could not be delivered after several tries, or that the receiver's server refused."
      />
      {lines.length === 0 ? (
        <EmptyState title="None">Every mail of the club was delivered or is still being tried.</EmptyState>
      ) : (
        <DeadMailList club={scope.club.slug} lines={lines} action={retryMailAction} />
      )}
    </>
  );
});
