import type { Metadata } from 'next';
import { redirect } from 'next/navigation';
import { SignInForm } from '@/features/accounts/components/sign-in-form';
import { localPath } from '@/features/accounts/local-path';
import { publicPage } from '@/server/doors';
import { TextLink } from '@/ui/button';
import { PageTitle } from '@/ui/page-parts';
import { signInAction } from './actions';

export const metadata: Metadata = { title: 'Sign in' };

export default publicPage(async ({ user, search }) => {
  const next = localPath(search.next) ?? undefined;
  if (user) redirect(next ?? (user.emailVerifiedAt === null ? '/verify' : '/'));
  return (
    <>
      <PageTitle title="Sign in" />
      <SignInForm next={next} action={signInAction} />
      <p className="mt-6">
        New here? <TextLink href="/sign-up">Make an account</TextLink>
      </p>
    </>
  );
});
