import { z } from 'zod';
import { emailField } from '@/features/accounts/account-schema';
import { CONTACT_ERRORS } from './words/contact';

export const saveContactSchema = z.object({
  name: z
    .string()
    .trim()
    .min(1, CONTACT_ERRORS.name)
    .max(60, CONTACT_ERRORS.nameLong)
    .refine((name) => !/[\p{Cc}\p{Cf}<>]/u.test(name), CONTACT_ERRORS.nameSigns),
  email: emailField,
});
export type SaveContactInput = z.output<typeof saveContactSchema>;

export const switchContactSchema = z.object({ off: z.boolean() });
export type SwitchContactInput = z.output<typeof switchContactSchema>;

export const answerContactSchema = z.object({
  secret: z.string().regex(/^[\w-]{20,60}$/, CONTACT_ERRORS.secret),
  answer: z.enum(['yes', 'no'], { error: CONTACT_ERRORS.answer }),
});
export type AnswerContactInput = z.output<typeof answerContactSchema>;
