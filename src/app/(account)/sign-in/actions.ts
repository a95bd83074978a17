'use server';

import { signInSchema } from '@/features/accounts/account-schema';
import { localPath } from '@/features/accounts/local-path';
import { signIn } from '@/features/accounts/sign-in';
import { publicAction } from '@/server/doors';
import { requestSource, startSession } from '@/server/session';

export const signInAction = publicAction({
  input: signInSchema,
  run: async ({ input, now }) => {
    const { userId, verified } = await signIn(input, await requestSource(), now);
    await startSession(userId);
    return { to: localPath(input.next) ?? (verified ? '/' : '/verify') };
  },
});
