import type { ReactNode } from 'react';
import type { Permission } from '@/core/permissions';
import { ClubTabs } from '@/features/clubs/components/club-tabs';
import { findScope } from '@/server/scope';
import { currentUser } from '@/server/session';

export interface FolderProps {
  params: Promise<{ club: string }>;
  children: ReactNode;
}

export interface Tab {
  path: string;
  label: string;
  needs: Permission;
}

/** Tabs over the pages of one folder, for whoever the person is; the pages check. */
export async function PagesWithTabs({
  params,
  children,
  folder,
  label,
  tabs,
}: FolderProps & { folder: string; label: string; tabs: Tab[] }) {
  const { club } = await params;
  const user = await currentUser();
  const scope = user && (await findScope(club, user.id));
  if (!scope) return children;
  const items = tabs
    .filter((tab) => scope.can(tab.needs))
    .map((tab) => ({ href: `/clubs/${club}/${folder}${tab.path}`, label: tab.label }));
  return (
    <>
      <ClubTabs label={label} items={items} />
      {children}
    </>
  );
}
