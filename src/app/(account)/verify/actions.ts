'use server';

import { nothingSchema, verifySchema } from '@/features/accounts/account-schema';
import { resendVerify } from '@/features/accounts/resend-verify';
import { verifyEmail } from '@/features/accounts/verify-email';
import { accountAction, publicAction } from '@/server/doors';
import { requestSource, startSession } from '@/server/session';

export const verifyAction = publicAction({
  input: verifySchema,
  run: async ({ input, now }) => {
    const { userId } = await verifyEmail(input, now);
    await startSession(userId);
    return { to: '/clubs' };
  },
});

export const resendAction = accountAction({
  input: nothingSchema,
  run: async ({ user, now }) => {
    await resendVerify(user, await requestSource(), now);
    return { email: user.email };
  },
});
