'use server';

import { signUpSchema } from '@/features/accounts/account-schema';
import { createAccount } from '@/features/accounts/create-account';
import { publicAction } from '@/server/doors';
import { requestSource } from '@/server/session';

/** Starts no session, so that the answer does not tell whether the address was known. */
export const signUpAction = publicAction({
  input: signUpSchema,
  run: async ({ input, now }) => {
    await createAccount(input, await requestSource(), now);
    return { email: input.email };
  },
});
