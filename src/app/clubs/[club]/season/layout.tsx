import type { ReactNode } from 'react';
import type { Permission } from '@/core/permissions';
import { ClubTabs } from '@/features/clubs/components/club-tabs';
import { SEASON_WORDS } from '@/features/logs/words/sightings';
import { findScope } from '@/server/scope';
import { currentUser } from '@/server/session';

const PAGES: { path: string; label: string; needs: Permission }[] = [
  { path: '', label: SEASON_WORDS.report, needs: 'report.read' },
  { path: '/sightings', label: SEASON_WORDS.sightings, needs: 'log.read' },
  { path: '/harvest', label: SEASON_WORDS.harvest, needs: 'harvest.read' },
  { path: '/setup', label: SEASON_WORDS.setup, needs: 'features.read' },
  { path: '/coverage', label: SEASON_WORDS.coverage, needs: 'features.read' },
  { path: '/movement', label: SEASON_WORDS.movement, needs: 'features.read' },
  { path: '/learning', label: SEASON_WORDS.learning, needs: 'log.read_all' },
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
        label={SEASON_WORDS.tabs}
        items={items.map(({ path, label }) => ({ href: `/clubs/${club}/season${path}`, label }))}
      />
      {children}
    </>
  );
}
