import type { ReactNode } from 'react';
import type { Permission } from '@/core/permissions';
import { ClubTabs } from '@/features/clubs/components/club-tabs';
import { findScope } from '@/server/scope';
import { currentUser } from '@/server/session';

const PAGES: { path: string; label: string; needs: Permission }[] = [
  { path: '/sightings', label: 'Sightings', needs: 'log.read' },
  { path: '/harvest', label: 'Harvest', needs: 'harvest.read' },
  { path: '/setup', label: 'Set-up check', needs: 'features.read' },
  { path: '/coverage', label: 'Wind coverage', needs: 'features.read' },
  { path: '/movement', label: 'Movement', needs: 'features.read' },
  { path: '/learning', label: 'Learning', needs: 'log.read_all' },
];

interface Props {
  params: Promise<{ club: string }>;
  children: ReactNode;
}

/** Tabs for whoever the person is; the pages check. */
export default async function SeasonLayout({ params, children }: Props) {
  const { club } = await params;
  const user = await currentUser();
  const scope = user && (await findScope(club, user.id));
  if (!scope) return children;
  const items = PAGES.filter((page) => scope.can(page.needs));
  return (
    <>
      <ClubTabs
        label="About the season"
        items={items.map(({ path, label }) => ({ href: `/clubs/${club}/season${path}`, label }))}
      />
      {children}
    </>
  );
}
