import { z } from 'zod';
import { isDay } from '@/core/day-time';
import { WEAPONS } from '@/core/ground-types';
import { SIT_FIELD_ERRORS } from './words/errors';
import { SIT_WINDOWS } from './words/sits';

/** Ids are told apart by the database; this only keeps nonsense out of it. */
const id = z.string().trim().min(1, SIT_FIELD_ERRORS.chooseOne).max(60, SIT_FIELD_ERRORS.notListed);

/** A choice that may be left open: an empty select sends ''. */
const optionalId = z
  .string()
  .trim()
  .max(60, SIT_FIELD_ERRORS.notListed)
  .nullish()
  .transform((value) => value || null);

const guest = z.object({
  name: z.string().trim().min(1, SIT_FIELD_ERRORS.guestName).max(60, SIT_FIELD_ERRORS.nameLong),
  memberId: optionalId,
});

const chosen = {
  standId: id,
  day: z
    .string()
    .refine(isDay, SIT_FIELD_ERRORS.day)
    .refine((day) => !isDay(day) || (day >= '2000-01-01' && day <= '2099-12-31'), SIT_FIELD_ERRORS.dayFar),
  windows: z.enum(SIT_WINDOWS, { error: SIT_FIELD_ERRORS.windows }),
  weapon: z.enum(WEAPONS, { error: SIT_FIELD_ERRORS.weapon }),
  /** null: no way in is named. */
  approachId: optionalId,
  guests: z.array(guest).max(10, SIT_FIELD_ERRORS.guests).default([]),
  note: z.string().trim().max(500, SIT_FIELD_ERRORS.noteLong).default(''),
};

export const bookSitSchema = z.object({
  ...chosen,
  /** Left out: for oneself. */
  memberId: optionalId,
  /** One for each form opened, so that a second press cannot book twice. */
  requestKey: z.guid(SIT_FIELD_ERRORS.reload),
});
export type BookSitInput = z.output<typeof bookSitSchema>;
export type BookSitValues = z.input<typeof bookSitSchema>;

export const changeSitSchema = z.object({
  ...chosen,
  sitId: id,
  /** The sit's sequence when the form was opened. */
  sequence: z.int(SIT_FIELD_ERRORS.reload).min(0),
});
export type ChangeSitInput = z.output<typeof changeSitSchema>;
export type ChangeSitValues = z.input<typeof changeSitSchema>;

export const cancelSitSchema = z.object({
  sitId: id,
  reason: z.string().trim().max(200, SIT_FIELD_ERRORS.reasonLong).default(''),
});
export type CancelSitInput = z.output<typeof cancelSitSchema>;
export type CancelSitValues = z.input<typeof cancelSitSchema>;
