import { z } from 'zod';
import { UNIT_SYSTEMS } from '@/core/units';
import { LONGEST_PASSWORD, passwordProblem } from './password-rules';
import { FIELD_ERRORS } from './words/errors';

export const nameField = z
  .string()
  .trim()
  .min(1, FIELD_ERRORS.name)
  .max(60, FIELD_ERRORS.nameLong)
  .refine((name) => !/[\p{Cc}\p{Cf}<>]/u.test(name), FIELD_ERRORS.nameSigns);

export const emailField = z
  .string()
  .trim()
  .toLowerCase()
  .max(254, FIELD_ERRORS.emailLong)
  .pipe(z.email(FIELD_ERRORS.email));

/** A password as it is asked for, whatever it was when it was set. */
const givenPassword = z.string().min(1, FIELD_ERRORS.password).max(1000, FIELD_ERRORS.passwordLong);

/** A new password; its rules need its owner's name and address too. */
export const newPasswordField = z.string().max(1000, FIELD_ERRORS.newPasswordLong(LONGEST_PASSWORD));

const secretField = z.string().regex(/^[\w-]{20,60}$/, FIELD_ERRORS.link);

type Check = (value: { name: string; email: string; password: string }, ctx: z.RefinementCtx) => void;

/** For `superRefine` on any schema with a name, an e-mail address and a new password. */
export const checkNewPassword: Check = (value, ctx) => {
  const message = passwordProblem(value.password, value);
  if (message) ctx.addIssue({ code: 'custom', path: ['password'], message });
};

export const signUpSchema = z
  .object({ name: nameField, email: emailField, password: newPasswordField })
  .superRefine(checkNewPassword);
export type SignUpInput = z.output<typeof signUpSchema>;

export const signInSchema = z.object({
  email: emailField,
  password: givenPassword,
  next: z.string().max(2000).optional(),
});
export type SignInInput = z.output<typeof signInSchema>;

export const forgotSchema = z.object({ email: emailField });
export type ForgotInput = z.output<typeof forgotSchema>;

export const resetSchema = z.object({ token: secretField, password: newPasswordField });
export type ResetInput = z.output<typeof resetSchema>;

export const verifySchema = z.object({ token: secretField, password: givenPassword });
export type VerifyInput = z.output<typeof verifySchema>;

export const changeNameSchema = z.object({ name: nameField });
export type ChangeNameInput = z.output<typeof changeNameSchema>;

export const changePasswordSchema = z.object({ current: givenPassword, password: newPasswordField });
export type ChangePasswordInput = z.output<typeof changePasswordSchema>;

export const endSessionSchema = z.object({ id: z.string().min(1).max(100) });

/** club: as each club has it. */
export const changeUnitsSchema = z.object({
  units: z.enum([...UNIT_SYSTEMS, 'club'], { error: FIELD_ERRORS.units }),
});
export type ChangeUnitsInput = z.output<typeof changeUnitsSchema>;

export const nothingSchema = z.object({});
