import { z } from 'zod';
import { isDay } from '@/core/day-time';
import { ROLES } from '@/core/permissions';
import { emailField, nameField } from '@/features/accounts/account-schema';
import { CLUB_FIELD_ERRORS } from './words/field-errors';

const id = z.string().min(1).max(60);

/** Guests have a sponsor and two days; of other roles these fields are left aside. */
const standing = {
  role: z.enum(ROLES),
  sponsorId: z.string().max(60),
  guestFrom: z.string().max(20),
  guestTo: z.string().max(20),
};

interface Standing {
  role: (typeof ROLES)[number];
  sponsorId: string;
  guestFrom: string;
  guestTo: string;
}

/** What is kept of a standing: nulls for whoever is no guest. */
function keepStanding<T extends Standing>(typed: T, ctx: z.RefinementCtx) {
  if (typed.role !== 'guest') return { ...typed, sponsorId: null, guestFrom: null, guestTo: null };
  const { sponsorId, guestFrom, guestTo } = typed;
  const fail = (path: keyof Standing, message: string) => ctx.addIssue({ code: 'custom', path: [path], message });
  if (sponsorId === '') fail('sponsorId', CLUB_FIELD_ERRORS.sponsor);
  if (!isDay(guestFrom)) fail('guestFrom', CLUB_FIELD_ERRORS.guestFrom);
  if (!isDay(guestTo)) fail('guestTo', CLUB_FIELD_ERRORS.guestTo);
  else if (isDay(guestFrom) && guestTo < guestFrom) fail('guestTo', CLUB_FIELD_ERRORS.daysOrder);
  return { ...typed, sponsorId, guestFrom, guestTo };
}

const invitedName = z.string().trim().min(1, CLUB_FIELD_ERRORS.invitedName).pipe(nameField);

export const inviteSchema = z.object({ name: invitedName, email: emailField, ...standing }).transform(keepStanding);
export type InviteForm = z.input<typeof inviteSchema>;
export type InviteInput = z.output<typeof inviteSchema>;

export const changeMemberSchema = z.object({ memberId: id, ...standing }).transform(keepStanding);
export type ChangeMemberForm = z.input<typeof changeMemberSchema>;
export type ChangeMemberInput = z.output<typeof changeMemberSchema>;

export const removeMemberSchema = z.object({ memberId: id });
export const invitationIdSchema = z.object({ id });
export const leaveSchema = z.object({});
