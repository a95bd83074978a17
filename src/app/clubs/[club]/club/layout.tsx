import type { ReactNode } from 'react';
import type { Permission } from '@/core/permissions';
import { ClubTabs } from '@/features/clubs/components/club-tabs';
import { findScope } from '@/server/scope';
import { currentUser } from '@/server/session';

const PAGES: { path: string; label: string; needs: Permission }[] = [
  { path: '', label: 'Club', needs: 'club.read' },
  { path: '/rules', label: 'Rules', needs: 'club.read' },
  { path: '/members', label: 'Members', needs: 'members.read' },
  { path: '/audit', label: 'Audit log', needs: 'audit.read' },
  { path: '/mail', label: 'Mail', needs: 'mail.read' },
  { path: '/jobs', label: 'Jobs', needs: 'jobs.read' },
];

interface Props {
  params: Promise<{ club: string }>;
  children: ReactNode;
}

/** Tabs for whoever the person is; the pages check. */
export default async function ClubPagesLayout({ params, children }: Props) {
  const { club } = await params;
  const user = await currentUser();
  const scope = user && (await findScope(club, user.id));
  if (!scope) return children;
  const items = PAGES.filter((page) => scope.can(page.needs));
  return (
    <>
      <ClubTabs items={items.map(({ path, label }) => ({ href: `/clubs/${club}/club${path}`, label }))} />
      {children}
    </>
  );
}
