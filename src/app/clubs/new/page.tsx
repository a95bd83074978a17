import type { Metadata } from 'next';
import { PlainFrame } from '@/app/plain-frame';
import { ConfirmEmailNotice } from '@/features/accounts/components/confirm-email-notice';
import { StartClubForm } from '@/features/clubs/components/start-club-form';
import { accountPage } from '@/server/doors';
import { TextLink } from '@/ui/button';
import { PageTitle } from '@/ui/page-parts';
import { resendAction } from '../../(account)/verify/actions';
import { createClubAction } from './actions';

export const metadata: Metadata = { title: 'Start a club' };

export default accountPage(async ({ user }) => (
  <PlainFrame links={<TextLink href="/clubs">Your clubs</TextLink>}>
    <PageTitle
      title="Start a club"
      lead="For a club, a lease or family land. You become its admin and can change everything but the address later."
    />
    {user.emailVerifiedAt === null ? (
      <ConfirmEmailNotice email={user.email} action={resendAction} />
    ) : (
      <StartClubForm zones={Intl.supportedValuesOf('timeZone')} action={createClubAction} />
    )}
  </PlainFrame>
));
