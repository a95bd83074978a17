import { write } from '@/db/client';
import { env } from '@/env';
import { newId } from '@/lib/ids';
import { hashSecret, newSecret } from '@/lib/secrets';
import { audit } from '@/server/audit';
import { AppError } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { insertFeed, revokeFeeds } from './data';
import { FEED_PERMISSIONS } from './feed-permission';
import type { MakeFeedInput } from './feed-schema';
import { CALENDAR_AUDIT, CALENDAR_ERRORS, FEED_NAMES } from './words';

export interface MadeFeed {
  /** Shown once: only a hash of its secret is kept. */
  url: string;
  /** An address made before has stopped working. */
  replaced: boolean;
}

/** Makes a secret address; one made before for the same calendar stops working. */
export async function makeFeed(scope: ClubScope, input: MakeFeedInput, now: number): Promise<MadeFeed> {
  if (!scope.can(FEED_PERMISSIONS[input.scope])) {
    throw new AppError('forbidden', CALENDAR_ERRORS.notYours(scope.club.name));
  }
  const secret = newSecret();
  const replaced = await write(async (tx) => {
    const before = await revokeFeeds(scope, tx, input.scope, now);
    const id = newId('feed');
    await insertFeed(tx, {
      id,
      clubId: scope.club.id,
      memberId: scope.member.id,
      scope: input.scope,
      withPlace: input.withPlace,
      secretHash: hashSecret(secret),
      createdAt: now,
    });
    await audit(
      tx,
      {
        clubId: scope.club.id,
        actor: scope.actor,
        action: before.length > 0 ? 'feed.renewed' : 'feed.made',
        subjectType: 'feed',
        subjectId: id,
        summary: CALENDAR_AUDIT.made(FEED_NAMES[input.scope], before.length > 0, input.withPlace),
        detail: { scope: input.scope, withPlace: input.withPlace, replaced: before },
      },
      now,
    );
    return before.length > 0;
  });
  return { url: `${env.appUrl}/calendar/${secret}.ics`, replaced };
}
