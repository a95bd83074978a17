import type { Metadata } from 'next';
import { PlainFrame } from '@/app/plain-frame';
import { ConfirmEmailNotice } from '@/features/accounts/components/confirm-email-notice';
import { StartClubForm } from '@/features/clubs/components/start-club-form';
import { NEW_PAGE_WORDS } from '@/features/clubs/words/pages';
import { accountPage } from '@/server/doors';
import { TextLink } from '@/ui/button';
import { PageTitle } from '@/ui/page-parts';
import { resendAction } from '../../(account)/verify/actions';
import { createClubAction } from './actions';

export const metadata: Metadata = { title: NEW_PAGE_WORDS.title };

export default accountPage(async ({ user }) => (
  <PlainFrame links={<TextLink href="/clubs">{NEW_PAGE_WORDS.yourClubs}</TextLink>}>
    <PageTitle title={NEW_PAGE_WORDS.title} lead={NEW_PAGE_WORDS.lead} />
    {user.emailVerifiedAt === null ? (
      <ConfirmEmailNotice email={user.email} action={resendAction} />
    ) : (
      <StartClubForm zones={Intl.supportedValuesOf('timeZone')} action={createClubAction} />
    )}
  </PlainFrame>
));
