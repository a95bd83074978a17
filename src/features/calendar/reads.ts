import { dayOf, formatDay } from '@/core/day-time';
import type { ClubScope } from '@/server/scope';
import { listLiveFeeds } from './data';
import { FEED_PERMISSIONS } from './feed-permission';
import { FEED_SCOPES, type FeedScope } from './feed-schema';

export interface FeedView {
  scope: FeedScope;
  /** Day on which the live address was made; null: there is none. */
  madeOn: string | null;
  withPlace: boolean;
}

/** The calendars a member may have, each with its live address if there is one. */
export async function readFeeds(scope: ClubScope): Promise<FeedView[]> {
  const feeds = await listLiveFeeds(scope);
  return FEED_SCOPES.filter((which) => scope.can(FEED_PERMISSIONS[which])).map((which) => {
    const feed = feeds.find((row) => row.scope === which);
    return {
      scope: which,
      madeOn: feed ? formatDay(dayOf(feed.createdAt, scope.club.zone), true) : null,
      withPlace: feed?.withPlace ?? false,
    };
  });
}
