import type { Metadata } from 'next';
import { redirect } from 'next/navigation';
import { ResetForm } from '@/features/accounts/components/reset-form';
import { peekLink } from '@/features/accounts/reads';
import { now } from '@/server/clock';
import { publicPage } from '@/server/doors';
import { ButtonLink } from '@/ui/button';
import { PageTitle } from '@/ui/page-parts';
import { SpentLink } from '../../spent-link';
import { resetAction } from './actions';

export const metadata: Metadata = { title: 'Choose a new password' };

export default publicPage(async ({ params, user }) => {
  const token = params.token ?? '';
  const owner = await peekLink(token, 'reset_password', now());
  if (!owner && user) redirect('/');
  return (
    <>
      <PageTitle
        title="Choose a new password"
        lead={owner ? `For ${owner.email}. Every browser signed in with this account is signed out.` : undefined}
      />
      {owner ? (
        <ResetForm token={token} email={owner.email} action={resetAction} />
      ) : (
        <SpentLink action={<ButtonLink href="/forgot">Ask for a new link</ButtonLink>}>Ask for another.</SpentLink>
      )}
    </>
  );
});
