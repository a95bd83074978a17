import { z } from 'zod';
import { nameField, newPasswordField } from '@/features/accounts/account-schema';
import { CLUB_FIELD_ERRORS } from './words/field-errors';

/** The shape of an invitation's secret; anything else is no link of ours. */
export const invitationSecret = z.string().regex(/^[\w-]{20,60}$/, CLUB_FIELD_ERRORS.link);

export const joinSchema = z.object({ token: invitationSecret });
export type JoinInput = z.output<typeof joinSchema>;

/** The password's other rules need the address of the invitation, which the server knows. */
export const joinNewSchema = z.object({ token: invitationSecret, name: nameField, password: newPasswordField });
export type JoinNewInput = z.output<typeof joinNewSchema>;
