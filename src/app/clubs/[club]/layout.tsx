import { cookies } from 'next/headers';
import type { ReactNode } from 'react';
import { dayOf, formatDay } from '@/core/day-time';
import { lightBySun } from '@/core/sun-light';
import { env } from '@/env';
import { ConfirmEmailNotice } from '@/features/accounts/components/confirm-email-notice';
import { listMyClubs } from '@/features/accounts/reads';
import { clockText } from '@/features/bookings/words/sits';
import { clubNavItems } from '@/features/clubs/club-nav';
import { ClubSwitch } from '@/features/clubs/components/club-switch';
import { CLUB_SHELL_WORDS } from '@/features/clubs/words/pages';
import { LateFrame } from '@/features/offline/components/late-frame';
import { pagesToKeep } from '@/features/offline/keep-list';
import { hashSecret } from '@/lib/secrets';
import { now } from '@/server/clock';
import { findScope } from '@/server/scope';
import { currentUser } from '@/server/session';
import { AppShell } from '@/ui/app-shell';
import { FollowSun } from '@/ui/follow-sun';
import { LIGHT_COOKIE, parseLight } from '@/ui/light';
import { Menu } from '@/ui/menu';
import { KeptAccount } from '@/ui/offline/account';
import { OfflineMark } from '@/ui/offline/offline-mark';
import { resendAction } from '../../(account)/verify/actions';
import { signInSitAction, signOutSitAction } from './board/actions';
import { addVisitAction, saveLogAction } from './log/actions';

const WAITING = { signIn: signInSitAction, signOut: signOutSitAction, log: saveLogAction, visit: addVisitAction };

interface ClubLayoutProps {
  params: Promise<{ club: string }>;
  children: ReactNode;
}

/** Shows the frame and decides nothing: whoever may not enter gets the bare answer of the page's own door. */
export default async function ClubLayout({ params, children }: ClubLayoutProps) {
  const user = await currentUser();
  const scope = user && (await findScope((await params).club, user.id));
  if (!user || !scope) return children;
  const clubs = await listMyClubs(user.id, now());
  const { slug, name, zone, units } = scope.club;
  const at = now();
  return (
    <KeptAccount account={hashSecret(user.id).slice(0, 16)}>
      <AppShell
        items={clubNavItems(slug, scope.can)}
        home={`/clubs/${slug}`}
        light={parseLight((await cookies()).get(LIGHT_COOKIE)?.value)}
        club={
          <ClubSwitch name={name} slug={slug} clubs={clubs.map((club) => ({ slug: club.slug, name: club.name }))} />
        }
        offlineMark={<OfflineMark asOf={`${formatDay(dayOf(at, zone))}, ${clockText(at, scope.club)}`} />}
        account={
          <Menu
            label={user.name}
            look="quiet"
            items={[
              { label: CLUB_SHELL_WORDS.account, href: '/account' },
              { label: CLUB_SHELL_WORDS.clubs, href: '/clubs' },
            ]}
          />
        }
      >
        <FollowSun changes={lightBySun(at, scope.club)} />
        {user.emailVerifiedAt === null && <ConfirmEmailNotice email={user.email} action={resendAction} />}
        <LateFrame
          zone={zone}
          units={units}
          actions={WAITING}
          pages={env.production ? pagesToKeep(slug, scope.can) : null}
        />
        {children}
      </AppShell>
    </KeptAccount>
  );
}
