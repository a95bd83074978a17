import { z } from 'zod';
import { isClock, isDay } from '@/core/day-time';
import { WEAPONS } from '@/core/types';
import { SIT_WINDOWS } from '@/features/bookings/sit-words';

const id = z.string().min(1).max(40);
const day = z
  .string()
  .refine((value) => isDay(value) && value >= '2000-01-01' && value <= '2099-12-31', 'Choose a day.');

/** Most choices a member may rank: three is the posted custom (practice), six leaves room. */
export const MOST_CHOICES = 6;

export const openDrawSchema = z.object({
  day,
  windows: z.enum(SIT_WINDOWS, { error: 'Choose morning, evening or all day.' }),
  standIds: z.array(id).min(1, 'Choose the stands that are drawn for.').max(200),
  closesDay: day,
  closesClock: z.string().refine(isClock, 'Give a time as 19:00.'),
  pointsPerMiss: z.coerce
    .number<string | number>()
    .int('A whole number.')
    .min(0, 'From 0 to 10.')
    .max(10, 'From 0 to 10.'),
  resetOnGiven: z.boolean(),
  /** 0: work earns nothing. */
  workHoursPerPoint: z.coerce.number<string | number>().min(0, 'From 0 to 100.').max(100, 'From 0 to 100.'),
  note: z.string().trim().max(500, 'A note has 500 characters at most.'),
});
export type OpenDrawValues = z.input<typeof openDrawSchema>;
export type OpenDrawInput = z.output<typeof openDrawSchema>;

export const enterDrawSchema = z.object({
  drawId: id,
  weapon: z.enum(WEAPONS, { error: 'Choose a weapon.' }),
  /** In order; '' is a choice left open. */
  choices: z
    .array(z.string().max(40))
    .max(MOST_CHOICES)
    .superRefine((all, ctx) => {
      all.forEach((one, at) => {
        if (one === '' || all.indexOf(one) === at) return;
        ctx.addIssue({ code: 'custom', path: [at], message: 'This stand is chosen twice.' });
      });
    })
    .transform((all) => all.filter((one) => one !== '')),
  anyByScore: z.boolean(),
});
export type EnterDrawValues = z.input<typeof enterDrawSchema>;
export type EnterDrawInput = z.output<typeof enterDrawSchema>;

export const drawIdSchema = z.object({ drawId: id });
export const swapSchema = z.object({ drawId: id, memberId: id });
