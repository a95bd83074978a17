import type { Metadata } from 'next';
import { redirect } from 'next/navigation';
import { SignUpForm } from '@/features/accounts/components/sign-up-form';
import { publicPage } from '@/server/doors';
import { TextLink } from '@/ui/button';
import { PageTitle } from '@/ui/page-parts';
import { MailHint } from '../mail-hint';
import { signUpAction } from './actions';

export const metadata: Metadata = { title: 'Make an account' };

export default publicPage(async ({ user }) => {
  if (user) redirect('/clubs');
  return (
    <>
      <PageTitle
        title="Make an account"
        lead="Then start your club, or open the invitation your club has mailed you."
      />
      <SignUpForm mailHint={<MailHint />} action={signUpAction} />
      <p className="mt-6">
        Have one already? <TextLink href="/sign-in">Sign in</TextLink>
      </p>
    </>
  );
});
