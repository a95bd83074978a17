import type { Metadata } from 'next';
import { redirect } from 'next/navigation';
import { ConfirmEmailForm } from '@/features/accounts/components/confirm-email-form';
import { peekLink } from '@/features/accounts/reads';
import { CONFIRM_PAGE_WORDS } from '@/features/accounts/words/pages';
import { now } from '@/server/clock';
import { publicPage } from '@/server/doors';
import { ButtonLink } from '@/ui/button';
import { PageTitle } from '@/ui/page-parts';
import { SpentLink } from '../../spent-link';
import { verifyAction } from '../actions';

export const metadata: Metadata = { title: CONFIRM_PAGE_WORDS.title };

export default publicPage(async ({ params, user }) => {
  const token = params.token ?? '';
  const owner = await peekLink(token, 'verify_email', now());
  if (!owner && user) redirect('/clubs');
  return (
    <>
      <PageTitle
        title={CONFIRM_PAGE_WORDS.title}
        lead={owner ? CONFIRM_PAGE_WORDS.lead(owner.email, owner.name) : undefined}
      />
      {owner ? (
        <ConfirmEmailForm token={token} action={verifyAction} />
      ) : (
        <SpentLink action={<ButtonLink href="/sign-in">{CONFIRM_PAGE_WORDS.signIn}</ButtonLink>}>
          {CONFIRM_PAGE_WORDS.spentText}
        </SpentLink>
      )}
    </>
  );
});
