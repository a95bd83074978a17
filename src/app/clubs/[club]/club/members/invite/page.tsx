import type { Metadata } from 'next';
import { resendAction } from '@/app/(account)/verify/actions';
import { ConfirmEmailNotice } from '@/features/accounts/components/confirm-email-notice';
import { InviteForm } from '@/features/clubs/components/invite-form';
import { readSponsors } from '@/features/clubs/read-members';
import { clubPage } from '@/server/doors';
import { PageTitle } from '@/ui/page-parts';
import { inviteAction } from '../actions';

export const metadata: Metadata = { title: 'Invite someone' };

export default clubPage('members.write', async ({ scope, user }) => (
  <>
    <PageTitle title="Invite someone" over={scope.club.name} lead="They get a mail with a link to join." />
    {user.emailVerifiedAt === null ? (
      <ConfirmEmailNotice email={user.email} action={resendAction} />
    ) : (
      <InviteForm club={scope.club.slug} sponsors={await readSponsors(scope)} action={inviteAction} />
    )}
  </>
));
