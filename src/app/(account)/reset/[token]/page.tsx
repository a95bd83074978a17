import type { Metadata } from 'next';
import { redirect } from 'next/navigation';
import { ResetForm } from '@/features/accounts/components/reset-form';
import { peekLink } from '@/features/accounts/reads';
import { RESET_PAGE_WORDS } from '@/features/accounts/words/pages';
import { now } from '@/server/clock';
import { publicPage } from '@/server/doors';
import { ButtonLink } from '@/ui/button';
import { PageTitle } from '@/ui/page-parts';
import { SpentLink } from '../../spent-link';
import { resetAction } from './actions';

export const metadata: Metadata = { title: RESET_PAGE_WORDS.title };

export default publicPage(async ({ params, user }) => {
  const token = params.token ?? '';
  const owner = await peekLink(token, 'reset_password', now());
  if (!owner && user) redirect('/');
  return (
    <>
      <PageTitle title={RESET_PAGE_WORDS.title} lead={owner ? RESET_PAGE_WORDS.lead(owner.email) : undefined} />
      {owner ? (
        <ResetForm token={token} email={owner.email} action={resetAction} />
      ) : (
        <SpentLink action={<ButtonLink href="/forgot">{RESET_PAGE_WORDS.askLink}</ButtonLink>}>
          {RESET_PAGE_WORDS.ask}
        </SpentLink>
      )}
    </>
  );
});
