'use server';

import {
  changeNameSchema,
  changePasswordSchema,
  changeUnitsSchema,
  endSessionSchema,
  nothingSchema,
} from '@/features/accounts/account-schema';
import { changeName } from '@/features/accounts/change-name';
import { changePassword } from '@/features/accounts/change-password';
import { changeUnits } from '@/features/accounts/change-units';
import { endAllSessions, endOneSession } from '@/features/accounts/end-sessions';
import { saveContactSchema, switchContactSchema } from '@/features/outings/contact-schema';
import { removeContact, saveContact, switchContact } from '@/features/outings/save-contact';
import { accountAction } from '@/server/doors';
import { endSession, forgetSessionCookie, requestSource } from '@/server/session';

export const changeNameAction = accountAction({
  input: changeNameSchema,
  run: async ({ user, input, now }) => {
    await changeName(user, input, now);
    return null;
  },
});

export const changeUnitsAction = accountAction({
  input: changeUnitsSchema,
  run: async ({ user, input, now }) => {
    await changeUnits(user, input, now);
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

export const saveContactAction = accountAction({
  input: saveContactSchema,
  run: ({ user, input, now }) => saveContact(user, input, now),
});

export const switchContactAction = accountAction({
  input: switchContactSchema,
  run: async ({ user, input, now }) => {
    await switchContact(user, input, now);
    return null;
  },
});

export const removeContactAction = accountAction({
  input: nothingSchema,
  run: async ({ user, now }) => {
    await removeContact(user, now);
    return null;
  },
});
