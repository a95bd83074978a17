'use server';

import { resetSchema } from '@/features/accounts/account-schema';
import { resetPassword } from '@/features/accounts/reset-password';
import { publicAction } from '@/server/doors';
import { startSession } from '@/server/session';

export const resetAction = publicAction({
  input: resetSchema,
  run: async ({ input, now }) => {
    const { userId } = await resetPassword(input, now);
    await startSession(userId);
    return { to: '/' };
  },
});
