'use server';

import { joinClub, joinWithNewAccount } from '@/features/clubs/join-club';
import { joinNewSchema, joinSchema } from '@/features/clubs/join-schema';
import { accountAction, publicAction } from '@/server/doors';
import { startSession } from '@/server/session';

export const joinAction = accountAction({
  input: joinSchema,
  run: ({ user, input, now }) => joinClub(user, input, now),
});

/** The link has proven the address, so the new account is signed in at once. */
export const joinNewAction = publicAction({
  input: joinNewSchema,
  run: async ({ input, now }) => {
    const { slug, userId } = await joinWithNewAccount(input, now);
    await startSession(userId);
    return { slug };
  },
});
