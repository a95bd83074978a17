import type { Metadata } from 'next';
import { PlainFrame } from '@/app/plain-frame';
import { JoinForm } from '@/features/clubs/components/join-form';
import { JoinNewForm } from '@/features/clubs/components/join-new-form';
import { type OpenInvitation, readInvitation } from '@/features/clubs/read-invitation';
import { aRole, ROLE_NOTES } from '@/features/clubs/role-words';
import { now } from '@/server/clock';
import { publicPage } from '@/server/doors';
import { ButtonLink, TextLink } from '@/ui/button';
import { PageTitle } from '@/ui/page-parts';
import { joinAction, joinNewAction } from './actions';

export const metadata: Metadata = { title: 'Join a club', referrer: 'no-referrer' };

interface Visit {
  token: string;
  invitation: OpenInvitation;
  user: { email: string; name: string } | null;
}

function WayIn({ token, invitation, user }: Visit) {
  const { clubName, email, name, hasAccount } = invitation;
  if (user) {
    return (
      <>
        <p className="mb-4 max-w-prose">
          You are signed in as {user.name} ({user.email}).
          {user.email !== email && (
            <>
              {' '}
              The invitation went to {email}: join as {user.name} only if both are you. To join with another account,
              sign out under <TextLink href="/account">Account</TextLink> and open this link again.
            </>
          )}
        </p>
        <JoinForm token={token} clubName={clubName} action={joinAction} />
      </>
    );
  }
  const signIn = `/sign-in?next=${encodeURIComponent(`/invite/${token}`)}`;
  if (hasAccount) {
    return (
      <>
        <p className="mb-4 max-w-prose">You have an account with {email}. Sign in, and you come back here to join.</p>
        <ButtonLink href={signIn} look="primary">
          Sign in to join
        </ButtonLink>
      </>
    );
  }
  return (
    <>
      <JoinNewForm token={token} name={name} email={email} clubName={clubName} action={joinNewAction} />
      <p className="mt-6">
        Have an account with another address? <TextLink href={signIn}>Sign in</TextLink> with it, then join.
      </p>
    </>
  );
}

function DeadInvitation() {
  return (
    <>
      <PageTitle title="This invitation does not work" />
      <p className="max-w-prose">
        It was used already, was revoked, is older than 14 days, or is not whole. Open the newest mail again, or ask
        whoever invited you for a new one.
      </p>
      <p className="mt-6">
        <TextLink href="/">First page</TextLink>
      </p>
    </>
  );
}

export default publicPage(async ({ params, user }) => {
  const token = params.token ?? '';
  const view = await readInvitation(token, user, now());
  return (
    <PlainFrame>
      {view.kind === 'dead' && <DeadInvitation />}
      {view.kind === 'in' && (
        <>
          <PageTitle title={`You are in ${view.clubName}`} />
          <ButtonLink href={`/clubs/${view.clubSlug}`} look="primary">
            Open the club
          </ButtonLink>
        </>
      )}
      {view.kind === 'open' && (
        <>
          <PageTitle
            title={`Join ${view.clubName}`}
            lead={`${view.name}, you are invited as ${aRole(view.role)}. ${ROLE_NOTES[view.role]}`}
          />
          {view.days && <p className="mb-4">Your days: {view.days}.</p>}
          <WayIn token={token} invitation={view} user={user} />
        </>
      )}
    </PlainFrame>
  );
});
