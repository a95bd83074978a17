'use server';

import { answerContact } from '@/features/outings/answer-contact';
import { answerContactSchema } from '@/features/outings/contact-schema';
import { publicAction } from '@/server/doors';

/** The secret in the mailed link is the permission. */
export const answerContactAction = publicAction({
  input: answerContactSchema,
  run: ({ input, now }) => answerContact(input, now),
});
