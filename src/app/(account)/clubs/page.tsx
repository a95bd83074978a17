import type { Metadata } from 'next';
import { ConfirmEmailNotice } from '@/features/accounts/components/confirm-email-notice';
import { SignOutButton } from '@/features/accounts/components/sign-out-button';
import { listMyClubs } from '@/features/accounts/reads';
import { CLUBS_PAGE_WORDS } from '@/features/accounts/words/pages';
import { ROLE_WORDS } from '@/features/clubs/words/roles';
import { now } from '@/server/clock';
import { accountPage } from '@/server/doors';
import { ButtonLink, TextLink } from '@/ui/button';
import { Link } from '@/ui/link';
import { EmptyState } from '@/ui/notices';
import { PageTitle } from '@/ui/page-parts';
import { signOutAction } from '../account/actions';
import { resendAction } from '../verify/actions';

export const metadata: Metadata = { title: CLUBS_PAGE_WORDS.title };

export default accountPage(async ({ user }) => {
  const clubs = await listMyClubs(user.id, now());
  const start = (
    <ButtonLink href="/clubs/new" look="primary">
      {CLUBS_PAGE_WORDS.start}
    </ButtonLink>
  );
  return (
    <>
      <PageTitle title={CLUBS_PAGE_WORDS.title} over={user.name} actions={clubs.length > 0 && start} />
      {user.emailVerifiedAt === null && <ConfirmEmailNotice email={user.email} action={resendAction} />}
      {clubs.length === 0 ? (
        <EmptyState title={CLUBS_PAGE_WORDS.none} action={start}>
          {CLUBS_PAGE_WORDS.noneText}
        </EmptyState>
      ) : (
        <ul className="divide-y divide-rule border-rule border-y">
          {clubs.map(({ slug, name, role }) => (
            <li key={slug}>
              <Link
                href={`/clubs/${slug}`}
                className="flex min-h-14 items-center justify-between gap-4 px-1 py-3 no-underline hover:bg-sunk"
              >
                <span className="min-w-0 break-words font-serif text-lg">{name}</span>
                <span className="text-ink-soft">{ROLE_WORDS[role]}</span>
              </Link>
            </li>
          ))}
        </ul>
      )}
      <div className="mt-8 flex flex-wrap items-center gap-4">
        <TextLink href="/account">{CLUBS_PAGE_WORDS.account}</TextLink>
        <SignOutButton action={signOutAction} look="quiet" />
      </div>
    </>
  );
});
