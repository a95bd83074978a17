import type { Metadata } from 'next';
import { InvitationsList } from '@/features/clubs/components/invitations-list';
import { MembersTable } from '@/features/clubs/components/members-table';
import { readInvitations, readMembers } from '@/features/clubs/read-members';
import { CLUB_MEMBERS_PAGE_WORDS } from '@/features/clubs/words/pages';
import { now } from '@/server/clock';
import { clubPage } from '@/server/doors';
import { ButtonLink } from '@/ui/button';
import { PageTitle, Section } from '@/ui/page-parts';
import { resendInvitationAction, revokeInvitationAction } from './actions';

export const metadata: Metadata = { title: CLUB_MEMBERS_PAGE_WORDS.title };

export default clubPage('members.read', async ({ scope }) => {
  const at = now();
  const base = `/clubs/${scope.club.slug}/club/members`;
  const mayWrite = scope.can('members.write');
  const members = await readMembers(scope, at);
  const invitations = mayWrite ? await readInvitations(scope, at) : [];
  const invite = (
    <ButtonLink href={`${base}/invite`} look="primary">
      {CLUB_MEMBERS_PAGE_WORDS.invite}
    </ButtonLink>
  );
  return (
    <>
      <PageTitle title={CLUB_MEMBERS_PAGE_WORDS.title} over={scope.club.name} actions={mayWrite && invite} />
      <MembersTable
        rows={members.map((member) => ({ ...member, href: mayWrite ? `${base}/${member.id}` : null }))}
        withEmail={mayWrite}
      />
      {mayWrite && (
        <Section title={CLUB_MEMBERS_PAGE_WORDS.openInvitations} note={CLUB_MEMBERS_PAGE_WORDS.openInvitationsNote}>
          {invitations.length === 0 ? (
            <p className="text-ink-soft">{CLUB_MEMBERS_PAGE_WORDS.none}</p>
          ) : (
            <InvitationsList
              club={scope.club.slug}
              rows={invitations}
              resend={resendInvitationAction}
              revoke={revokeInvitationAction}
            />
          )}
        </Section>
      )}
    </>
  );
});
