import { z } from 'zod';
import { isDay } from '@/core/day-time';
import { WEAPONS } from '@/core/types';
import { SIT_WINDOWS } from './sit-words';

/** Ids are told apart by the database; this only keeps nonsense out of it. */
const id = z.string().trim().min(1, 'Choose one.').max(60, 'Choose one of the list.');

/** A choice that may be left open: an empty select sends ''. */
const optionalId = z
  .string()
  .trim()
  .max(60, 'Choose one of the list.')
  .nullish()
  .transform((value) => value || null);

const guest = z.object({
  name: z.string().trim().min(1, "Write the guest's name.").max(60, 'A name has 60 characters at most.'),
  memberId: optionalId,
});

const chosen = {
  standId: id,
  day: z
    .string()
    .refine(isDay, 'Write a day as YYYY-MM-DD.')
    .refine((day) => !isDay(day) || (day >= '2000-01-01' && day <= '2099-12-31'), 'Choose a day of this century.'),
  windows: z.enum(SIT_WINDOWS, { error: 'Choose morning, evening or all day.' }),
  weapon: z.enum(WEAPONS, { error: 'Choose a weapon.' }),
  /** null: no way in is named. */
  approachId: optionalId,
  guests: z.array(guest).max(10, 'Name ten guests at most.').default([]),
  note: z.string().trim().max(500, 'A note has 500 characters at most.').default(''),
};

export const bookSitSchema = z.object({
  ...chosen,
  /** Left out: for oneself. */
  memberId: optionalId,
  /** One for each form opened, so that a second press cannot book twice. */
  requestKey: z.guid('Reload the page and try again.'),
});
export type BookSitInput = z.output<typeof bookSitSchema>;
export type BookSitValues = z.input<typeof bookSitSchema>;

export const changeSitSchema = z.object({
  ...chosen,
  sitId: id,
  /** The sit's sequence when the form was opened. */
  sequence: z.int('Reload the page and try again.').min(0),
});
export type ChangeSitInput = z.output<typeof changeSitSchema>;
export type ChangeSitValues = z.input<typeof changeSitSchema>;

export const cancelSitSchema = z.object({
  sitId: id,
  reason: z.string().trim().max(200, 'A reason has 200 characters at most.').default(''),
});
export type CancelSitInput = z.output<typeof cancelSitSchema>;
export type CancelSitValues = z.input<typeof cancelSitSchema>;
