import type { Metadata } from 'next';
import { ForgotForm } from '@/features/accounts/components/forgot-form';
import { FORGOT_PAGE_WORDS } from '@/features/accounts/words/pages';
import { publicPage } from '@/server/doors';
import { TextLink } from '@/ui/button';
import { PageTitle } from '@/ui/page-parts';
import { MailHint } from '../mail-hint';
import { forgotAction } from './actions';

export const metadata: Metadata = { title: FORGOT_PAGE_WORDS.title };

export default publicPage(async () => (
  <>
    <PageTitle title={FORGOT_PAGE_WORDS.title} lead={FORGOT_PAGE_WORDS.lead} />
    <ForgotForm mailHint={<MailHint />} action={forgotAction} />
    <p className="mt-6">
      <TextLink href="/sign-in">{FORGOT_PAGE_WORDS.back}</TextLink>
    </p>
  </>
));
