'use server';

import { savedOuting } from '@/features/board/saved-outing';
import { moveBackBy } from '@/features/outings/move-back-by';
import {
  moveBackBySchema,
  signInSitSchema,
  signOutSitSchema,
  sitLinkSchema,
  walkUpSchema,
} from '@/features/outings/outing-schema';
import { signIn } from '@/features/outings/sign-in';
import { signOut } from '@/features/outings/sign-out';
import { revokeSitLinks, shareSit } from '@/features/outings/sit-links';
import { walkUp } from '@/features/outings/walk-up';
import { clubAction } from '@/server/doors';

export const signInSitAction = clubAction({
  permission: 'sits.book',
  input: signInSitSchema,
  run: async ({ scope, input, now }) => savedOuting(scope, await signIn(scope, input, now), now),
});

export const signOutSitAction = clubAction({
  permission: 'sits.book',
  input: signOutSitSchema,
  run: async ({ scope, input, now }) => savedOuting(scope, await signOut(scope, input, now), now),
});

export const moveBackByAction = clubAction({
  permission: 'sits.book',
  input: moveBackBySchema,
  run: async ({ scope, input, now }) => savedOuting(scope, await moveBackBy(scope, input, now), now),
});

export const walkUpAction = clubAction({
  permission: 'sits.book',
  input: walkUpSchema,
  run: async ({ scope, input, now }) => savedOuting(scope, await walkUp(scope, input, now), now),
});

export const shareSitAction = clubAction({
  permission: 'sits.book',
  input: sitLinkSchema,
  run: ({ scope, input, now }) => shareSit(scope, input, now),
});

export const revokeSitLinksAction = clubAction({
  permission: 'sits.book',
  input: sitLinkSchema,
  run: ({ scope, input, now }) => revokeSitLinks(scope, input, now),
});
