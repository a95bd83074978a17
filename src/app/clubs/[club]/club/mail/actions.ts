'use server';

import { retryMail } from '@/features/mail/retry-mail';
import { retryMailSchema } from '@/features/mail/retry-mail-schema';
import { clubAction } from '@/server/doors';

export const retryMailAction = clubAction({
  permission: 'mail.read',
  input: retryMailSchema,
  run: ({ scope, input, now }) => retryMail(scope, input, now),
});
