'use server';

import { makeFeedSchema, revokeFeedSchema } from '@/features/calendar/feed-schema';
import { makeFeed } from '@/features/calendar/make-feed';
import { revokeFeed } from '@/features/calendar/revoke-feed';
import { clubAction } from '@/server/doors';

export const makeFeedAction = clubAction({
  permission: 'feeds.own',
  input: makeFeedSchema,
  run: ({ scope, input, now }) => makeFeed(scope, input, now),
});

export const revokeFeedAction = clubAction({
  permission: 'feeds.own',
  input: revokeFeedSchema,
  run: ({ scope, input, now }) => revokeFeed(scope, input, now),
});
