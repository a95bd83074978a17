import type { Metadata } from 'next';
import { redirect } from 'next/navigation';
import { SignInForm } from '@/features/accounts/components/sign-in-form';
import { localPath } from '@/features/accounts/local-path';
import { SIGN_IN_PAGE_WORDS } from '@/features/accounts/words/sign-in';
import { publicPage } from '@/server/doors';
import { TextLink } from '@/ui/button';
import { PageTitle } from '@/ui/page-parts';
import { signInAction } from './actions';

export const metadata: Metadata = { title: SIGN_IN_PAGE_WORDS.title };

export default publicPage(async ({ user, search }) => {
  const next = localPath(search.next) ?? undefined;
  if (user) redirect(next ?? (user.emailVerifiedAt === null ? '/verify' : '/'));
  return (
    <>
      <PageTitle title={SIGN_IN_PAGE_WORDS.title} />
      <SignInForm next={next} action={signInAction} />
      <p className="mt-6">
        {SIGN_IN_PAGE_WORDS.newHere} <TextLink href="/sign-up">{SIGN_IN_PAGE_WORDS.makeAccount}</TextLink>
      </p>
    </>
  );
});
