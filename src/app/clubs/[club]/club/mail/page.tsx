import type { Metadata } from 'next';
import { DeadMailList } from '@/features/clubs/components/dead-mail-list';
import { momentText } from '@/features/clubs/words/audit-text';
import { CLUB_MAIL_PAGE_WORDS } from '@/features/clubs/words/pages';
import { listDeadMail } from '@/features/mail/reads';
import { clubPage } from '@/server/doors';
import { EmptyState } from '@/ui/notices';
import { PageTitle } from '@/ui/page-parts';
import { retryMailAction } from './actions';

export const metadata: Metadata = { title: CLUB_MAIL_PAGE_WORDS.title };

export default clubPage('mail.read', async ({ scope }) => {
  const mails = await listDeadMail(scope);
  const lines = mails.map((mail) => ({
    id: mail.id,
    subject: mail.subject,
    to: `${mail.toName} (${mail.toEmail})`,
    when: CLUB_MAIL_PAGE_WORDS.givenUp(momentText(mail.deadAt ?? mail.createdAt, scope.club), mail.attempts),
    error: mail.lastError ?? '',
  }));
  return (
    <>
      <PageTitle title={CLUB_MAIL_PAGE_WORDS.heading} over={scope.club.name} lead={CLUB_MAIL_PAGE_WORDS.lead} />
      {lines.length === 0 ? (
        <EmptyState title={CLUB_MAIL_PAGE_WORDS.none}>{CLUB_MAIL_PAGE_WORDS.noneText}</EmptyState>
      ) : (
        <DeadMailList club={scope.club.slug} lines={lines} action={retryMailAction} />
      )}
    </>
  );
});
