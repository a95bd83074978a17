'use server';

import { unsubscribeSchema } from '@/features/notices/choices-schema';
import { unsubscribe } from '@/features/notices/unsubscribe';
import { publicAction } from '@/server/doors';

/** The secret in the mailed link is the permission. */
export const unsubscribeAction = publicAction({
  input: unsubscribeSchema,
  run: ({ input, now }) => unsubscribe(input.secret, now),
});
