import type { Metadata } from 'next';
import { PlainFrame } from '@/app/plain-frame';
import { JoinForm } from '@/features/clubs/components/join-form';
import { JoinNewForm } from '@/features/clubs/components/join-new-form';
import { type OpenInvitation, readInvitation } from '@/features/clubs/read-invitation';
import { INVITE_PAGE_WORDS } from '@/features/clubs/words/pages';
import { aRole, ROLE_NOTES } from '@/features/clubs/words/roles';
import { now } from '@/server/clock';
import { publicPage } from '@/server/doors';
import { ButtonLink, TextLink } from '@/ui/button';
import { PageTitle } from '@/ui/page-parts';
import { joinAction, joinNewAction } from './actions';

export const metadata: Metadata = { title: INVITE_PAGE_WORDS.title, referrer: 'no-referrer' };

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
          {INVITE_PAGE_WORDS.signedIn(user.name, user.email)}
          {user.email !== email && (
            <>
              {' '}
              {INVITE_PAGE_WORDS.otherEmail(email, user.name)} {INVITE_PAGE_WORDS.signOutBefore}
              <TextLink href="/account">{INVITE_PAGE_WORDS.signOutLink}</TextLink>
              {INVITE_PAGE_WORDS.signOutAfter}
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
        <p className="mb-4 max-w-prose">{INVITE_PAGE_WORDS.hasAccount(email)}</p>
        <ButtonLink href={signIn} look="primary">
          {INVITE_PAGE_WORDS.signIn}
        </ButtonLink>
      </>
    );
  }
  return (
    <>
      <JoinNewForm token={token} name={name} email={email} clubName={clubName} action={joinNewAction} />
      <p className="mt-6">
        {INVITE_PAGE_WORDS.otherAccountBefore}
        <TextLink href={signIn}>{INVITE_PAGE_WORDS.otherAccountLink}</TextLink>
        {INVITE_PAGE_WORDS.otherAccountAfter}
      </p>
    </>
  );
}

function DeadInvitation() {
  return (
    <>
      <PageTitle title={INVITE_PAGE_WORDS.spent} />
      <p className="max-w-prose">{INVITE_PAGE_WORDS.spentText}</p>
      <p className="mt-6">
        <TextLink href="/">{INVITE_PAGE_WORDS.firstPage}</TextLink>
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
          <PageTitle title={INVITE_PAGE_WORDS.inClub(view.clubName)} />
          <ButtonLink href={`/clubs/${view.clubSlug}`} look="primary">
            {INVITE_PAGE_WORDS.open}
          </ButtonLink>
        </>
      )}
      {view.kind === 'open' && (
        <>
          <PageTitle
            title={INVITE_PAGE_WORDS.join(view.clubName)}
            lead={INVITE_PAGE_WORDS.lead(view.name, aRole(view.role), ROLE_NOTES[view.role])}
          />
          {view.days && <p className="mb-4">{INVITE_PAGE_WORDS.days(view.days)}</p>}
          <WayIn token={token} invitation={view} user={user} />
        </>
      )}
    </PlainFrame>
  );
});
