'use server';

import {
  changeNameSchema,
  changePasswordSchema,
  endSessionSchema,
  nothingSchema,
} from '@/features/accounts/account-schema';
import { changeName } from '@/features/accounts/change-name';
import { changePassword } from '@/features/accounts/change-password';
import { endAllSessions, endOneSession } from '@/features/accounts/end-sessions';
import { accountAction } from '@/server/doors';
import { endSession, forgetSessionCookie, requestSource } from '@/server/session';

export const changeNameAction = accountAction({
  input: changeNameSchema,
  run: async ({ user, input, now }) => {
    await changeName(user, input, now);
    return null;
  },
});

export const changePasswordAction = accountAction({
  input: changePasswordSchema,
  run: async ({ user, input, now }) => {
    await changePassword(user, input, await requestSource(), now);
    return null;
  },
});

export const endSessionAction = accountAction({
  input: endSessionSchema,
  run: async ({ user, input, now }) => {
    await endOneSession(user, input.id, now);
    return null;
  },
});

export const signOutAction = accountAction({
  input: nothingSchema,
  run: async ({ user }) => {
    await endSession(user.sessionId);
    return null;
  },
});

export const signOutEverywhereAction = accountAction({
  input: nothingSchema,
  run: async ({ user, now }) => {
    await endAllSessions(user, now);
    await forgetSessionCookie();
    return null;
  },
});
