'use server';

import { forgotSchema } from '@/features/accounts/account-schema';
import { forgotPassword } from '@/features/accounts/forgot-password';
import { publicAction } from '@/server/doors';
import { requestSource } from '@/server/session';

export const forgotAction = publicAction({
  input: forgotSchema,
  run: async ({ input, now }) => {
    await forgotPassword(input, await requestSource(), now);
    return { email: input.email };
  },
});
