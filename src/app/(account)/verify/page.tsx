import type { Metadata } from 'next';
import { redirect } from 'next/navigation';
import { ResendButton } from '@/features/accounts/components/resend-button';
import { VERIFY_PAGE_WORDS } from '@/features/accounts/words/pages';
import { accountPage } from '@/server/doors';
import { TextLink } from '@/ui/button';
import { PageTitle } from '@/ui/page-parts';
import { MailHint } from '../mail-hint';
import { resendAction } from './actions';

export const metadata: Metadata = { title: VERIFY_PAGE_WORDS.title };

export default accountPage(async ({ user }) => {
  if (user.emailVerifiedAt !== null) redirect('/clubs');
  return (
    <>
      <PageTitle title={VERIFY_PAGE_WORDS.title} lead={VERIFY_PAGE_WORDS.lead(user.email)} />
      <ResendButton action={resendAction} />
      <MailHint />
      <p className="mt-6">
        {VERIFY_PAGE_WORDS.meanwhile}
        <TextLink href="/clubs">{VERIFY_PAGE_WORDS.goOn}</TextLink>
      </p>
    </>
  );
});
