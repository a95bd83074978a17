import type { Metadata } from 'next';
import { resendAction } from '@/app/(account)/verify/actions';
import { ConfirmEmailNotice } from '@/features/accounts/components/confirm-email-notice';
import { InviteForm } from '@/features/clubs/components/invite-form';
import { readSponsors } from '@/features/clubs/read-members';
import { CLUB_MEMBERS_INVITE_PAGE_WORDS } from '@/features/clubs/words/pages';
import { clubPage } from '@/server/doors';
import { PageTitle } from '@/ui/page-parts';
import { inviteAction } from '../actions';

export const metadata: Metadata = { title: CLUB_MEMBERS_INVITE_PAGE_WORDS.title };

export default clubPage('members.write', async ({ scope, user }) => (
  <>
    <PageTitle
      title={CLUB_MEMBERS_INVITE_PAGE_WORDS.title}
      over={scope.club.name}
      lead={CLUB_MEMBERS_INVITE_PAGE_WORDS.lead}
    />
    {user.emailVerifiedAt === null ? (
      <ConfirmEmailNotice email={user.email} action={resendAction} />
    ) : (
      <InviteForm club={scope.club.slug} sponsors={await readSponsors(scope)} action={inviteAction} />
    )}
  </>
));
