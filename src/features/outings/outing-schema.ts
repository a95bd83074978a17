import { z } from 'zod';
import { isClock } from '@/core/day-time';
import { WEAPONS } from '@/core/ground-types';
import { sentSchema } from '@/lib/sent-schema';
import { OUTING_FIELD_ERRORS as ERRORS } from './words/sign';

const id = z.string().trim().min(1, ERRORS.missing).max(60, ERRORS.unknown);
const optionalId = z
  .string()
  .trim()
  .max(60, ERRORS.unknown)
  .nullish()
  .transform((value) => value || null);

const onTheGround = {
  approachId: optionalId,
  parkingId: optionalId,
  vehicle: z.string().trim().max(80, ERRORS.vehicle).default(''),
  /** A time of the club's clock: the next time it comes. */
  backBy: z.string().trim().refine(isClock, ERRORS.backBy),
  contactOff: z.boolean().default(false),
};

export const signInSitSchema = z.object({ sitId: id, ...onTheGround, sent: sentSchema.optional() });
export type SignInSitInput = z.output<typeof signInSitSchema>;
export type SignInSitValues = z.input<typeof signInSitSchema>;

export const walkUpSchema = z.object({
  standId: id,
  weapon: z.enum(WEAPONS, { error: ERRORS.weapon }),
  /** One for each form opened, so that a second press cannot book twice. */
  requestKey: z.guid(ERRORS.reload),
  ...onTheGround,
});
export type WalkUpInput = z.output<typeof walkUpSchema>;
export type WalkUpValues = z.input<typeof walkUpSchema>;

/** By the time on the ground, or by its sit where the signing in has not been sent yet. */
export const signOutSitSchema = z
  .object({ outingId: id.optional(), sitId: id.optional(), sent: sentSchema.optional() })
  .refine((of) => of.outingId !== undefined || of.sitId !== undefined, ERRORS.reload);
export type SignOutSitInput = z.output<typeof signOutSitSchema>;

/** Minutes by which a back-by time may be moved at once. */
export const MOVE_CHOICES = ['30', '60', '120', '240'] as const;

export const moveBackBySchema = z.object({
  outingId: id,
  minutes: z.enum(MOVE_CHOICES, { error: ERRORS.minutes }),
  tracking: z.boolean().default(false),
});
export type MoveBackByInput = z.output<typeof moveBackBySchema>;
export type MoveBackByValues = z.input<typeof moveBackBySchema>;

export const sitLinkSchema = z.object({ outingId: id });
export type SitLinkInput = z.output<typeof sitLinkSchema>;
