import { write } from '@/db/client';
import { audit } from '@/server/audit';
import { notFound } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { revokeFeeds } from './data';
import type { RevokeFeedInput } from './feed-schema';
import { CALENDAR_AUDIT, FEED_NAMES } from './words';

/** Turns the address off for good. */
export async function revokeFeed(scope: ClubScope, input: RevokeFeedInput, now: number): Promise<{ revoked: number }> {
  return write(async (tx) => {
    const ids = await revokeFeeds(scope, tx, input.scope, now);
    if (ids.length === 0) throw notFound();
    for (const id of ids) {
      await audit(
        tx,
        {
          clubId: scope.club.id,
          actor: scope.actor,
          action: 'feed.revoked',
          subjectType: 'feed',
          subjectId: id,
          summary: CALENDAR_AUDIT.turnedOff(FEED_NAMES[input.scope]),
          detail: { scope: input.scope },
        },
        now,
      );
    }
    return { revoked: ids.length };
  });
}
