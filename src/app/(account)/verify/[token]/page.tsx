import type { Metadata } from 'next';
import { redirect } from 'next/navigation';
import { ConfirmEmailForm } from '@/features/accounts/components/confirm-email-form';
import { peekLink } from '@/features/accounts/reads';
import { now } from '@/server/clock';
import { publicPage } from '@/server/doors';
import { ButtonLink } from '@/ui/button';
import { PageTitle } from '@/ui/page-parts';
import { SpentLink } from '../../spent-link';
import { verifyAction } from '../actions';

export const metadata: Metadata = { title: 'Confirm your e-mail address' };

export default publicPage(async ({ params, user }) => {
  const token = params.token ?? '';
  const owner = await peekLink(token, 'verify_email', now());
  if (!owner && user) redirect('/clubs');
  return (
    <>
      <PageTitle
        title="Confirm your e-mail address"
        lead={owner ? `${owner.email}, for the account of ${owner.name}.` : undefined}
      />
      {owner ? (
        <ConfirmEmailForm token={token} action={verifyAction} />
      ) : (
        <SpentLink action={<ButtonLink href="/sign-in">Sign in</ButtonLink>}>
          Sign in: if the address still has to be confirmed, you can have a new link sent there.
        </SpentLink>
      )}
    </>
  );
});
