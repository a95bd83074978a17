import type { Metadata } from 'next';
import { redirect } from 'next/navigation';
import { SignUpForm } from '@/features/accounts/components/sign-up-form';
import { SIGN_UP_PAGE_WORDS } from '@/features/accounts/words/pages';
import { publicPage } from '@/server/doors';
import { TextLink } from '@/ui/button';
import { PageTitle } from '@/ui/page-parts';
import { MailHint } from '../mail-hint';
import { signUpAction } from './actions';

export const metadata: Metadata = { title: SIGN_UP_PAGE_WORDS.title };

export default publicPage(async ({ user }) => {
  if (user) redirect('/clubs');
  return (
    <>
      <PageTitle title={SIGN_UP_PAGE_WORDS.title} lead={SIGN_UP_PAGE_WORDS.lead} />
      <SignUpForm mailHint={<MailHint />} action={signUpAction} />
      <p className="mt-6">
        {SIGN_UP_PAGE_WORDS.haveOne}
        <TextLink href="/sign-in">{SIGN_UP_PAGE_WORDS.signIn}</TextLink>
      </p>
    </>
  );
});
