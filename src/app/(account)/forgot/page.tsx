import type { Metadata } from 'next';
import { ForgotForm } from '@/features/accounts/components/forgot-form';
import { publicPage } from '@/server/doors';
import { TextLink } from '@/ui/button';
import { PageTitle } from '@/ui/page-parts';
import { MailHint } from '../mail-hint';
import { forgotAction } from './actions';

export const metadata: Metadata = { title: 'Forgot your password' };

export default publicPage(async () => (
  <>
    <PageTitle title="Forgot your password" lead="We mail you a link to choose a new one." />
    <ForgotForm mailHint={<MailHint />} action={forgotAction} />
    <p className="mt-6">
      <TextLink href="/sign-in">Back to sign in</TextLink>
    </p>
  </>
));
