import type { Metadata } from 'next';
import { redirect } from 'next/navigation';
import { ResendButton } from '@/features/accounts/components/resend-button';
import { accountPage } from '@/server/doors';
import { TextLink } from '@/ui/button';
import { PageTitle } from '@/ui/page-parts';
import { MailHint } from '../mail-hint';
import { resendAction } from './actions';

export const metadata: Metadata = { title: 'Confirm your e-mail address' };

export default accountPage(async ({ user }) => {
  if (user.emailVerifiedAt !== null) redirect('/clubs');
  return (
    <>
      <PageTitle title="Confirm your e-mail address" lead={`We mailed a link to ${user.email}. Open it to finish.`} />
      <ResendButton action={resendAction} />
      <MailHint />
      <p className="mt-6">
        You can look around meanwhile, but not invite anyone. <TextLink href="/clubs">Go on to your clubs</TextLink>
      </p>
    </>
  );
});
