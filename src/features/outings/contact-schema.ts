import { z } from 'zod';
import { emailField } from '@/features/accounts/account-schema';

export const saveContactSchema = z.object({
  name: z
    .string()
    .trim()
    .min(1, 'Write the name of the person to tell.')
    .max(60, 'Use at most 60 characters.')
    .refine((name) => !/[\p{Cc}\p{Cf}<>]/u.test(name), 'Use letters, digits and plain signs only.'),
  email: emailField,
});
export type SaveContactInput = z.output<typeof saveContactSchema>;

export const switchContactSchema = z.object({ off: z.boolean() });
export type SwitchContactInput = z.output<typeof switchContactSchema>;

export const answerContactSchema = z.object({
  secret: z.string().regex(/^[\w-]{20,60}$/, 'This link is not whole. Open it from the mail again.'),
  answer: z.enum(['yes', 'no'], { error: 'Answer yes or no.' }),
});
export type AnswerContactInput = z.output<typeof answerContactSchema>;
