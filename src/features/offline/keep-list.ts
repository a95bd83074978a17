import type { Permission } from '@/core/permissions';
import type { PageToKeep } from '@/ui/offline/keep-pages';

const MINUTE = 60_000;
/** What changes by the hour, and what hardly changes in a day; our choice between a fresh copy and a poor signal. */
const SOON = 5 * MINUTE;
const DAY_LONG = 12 * 60 * MINUTE;

interface Readable {
  path: string;
  needs: Permission;
  maxAgeMs: number;
  follow?: Omit<NonNullable<PageToKeep['follow']>, 'under'>;
  details?: PageToKeep['details'];
}

/** In the order of worth before dawn: a signal may be gone after the first. */
const PAGES: Readable[] = [
  // The best dozen can be opened: nobody chooses among more before dawn.
  { path: 'sit', needs: 'sits.read', maxAgeMs: SOON, details: { most: 12, maxAgeMs: 6 * SOON } },
  { path: 'board', needs: 'board.read', maxAgeMs: SOON },
  { path: 'my-sits', needs: 'sits.book', maxAgeMs: SOON },
  { path: 'log', needs: 'log.write', maxAgeMs: SOON, follow: { most: 20, maxAgeMs: DAY_LONG } },
  { path: 'log/visits/new', needs: 'visits.write', maxAgeMs: DAY_LONG },
  { path: 'board/gate-sheet', needs: 'board.read', maxAgeMs: SOON },
  { path: 'stands', needs: 'stands.read', maxAgeMs: DAY_LONG, follow: { most: 60, maxAgeMs: DAY_LONG } },
];

/** The pages of a club that a person may open and wants without signal. */
export function pagesToKeep(slug: string, can: (permission: Permission) => boolean): PageToKeep[] {
  return PAGES.filter((page) => can(page.needs)).map(({ path, maxAgeMs, follow, details }) => {
    const address = `/clubs/${slug}/${path}`;
    return {
      path: address,
      maxAgeMs,
      ...(follow ? { follow: { ...follow, under: `${address}/` } } : {}),
      ...(details ? { details } : {}),
    };
  });
}
