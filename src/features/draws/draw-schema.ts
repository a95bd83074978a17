import { z } from 'zod';
import { isClock, isDay } from '@/core/day-time';
import { WEAPONS } from '@/core/ground-types';
import { SIT_WINDOWS } from '@/features/bookings/words/sits';
import { DRAW_FIELD_ERRORS as ERRORS } from './words/forms';

const id = z.string().min(1).max(40);
const day = z.string().refine((value) => isDay(value) && value >= '2000-01-01' && value <= '2099-12-31', ERRORS.day);

/** Most choices a member may rank: three is the posted custom (practice), six leaves room. */
export const MOST_CHOICES = 6;

/** Most windows of one draw: three days of mornings and evenings. */
export const MOST_SLOTS = 6;

export const openDrawSchema = z.object({
  slots: z
    .array(z.object({ day, windows: z.enum(SIT_WINDOWS, { error: ERRORS.windows }) }))
    .min(1, ERRORS.someSlot)
    .max(MOST_SLOTS, ERRORS.mostSlots(MOST_SLOTS)),
  standIds: z.array(id).min(1, ERRORS.stands).max(200),
  closesDay: day,
  closesClock: z.string().refine(isClock, ERRORS.clock),
  pointsPerMiss: z.coerce
    .number<string | number>()
    .int(ERRORS.wholeNumber)
    .min(0, ERRORS.upTo(10))
    .max(10, ERRORS.upTo(10)),
  resetOnGiven: z.boolean(),
  /** 0: work earns nothing. */
  workHoursPerPoint: z.coerce.number<string | number>().min(0, ERRORS.upTo(100)).max(100, ERRORS.upTo(100)),
  note: z.string().trim().max(500, ERRORS.note),
});
export type OpenDrawValues = z.input<typeof openDrawSchema>;
export type OpenDrawInput = z.output<typeof openDrawSchema>;

const guest = z.object({
  name: z.string().trim().min(1, ERRORS.guestName).max(60, ERRORS.guestNameLong),
  memberId: z
    .string()
    .trim()
    .max(60)
    .nullish()
    .transform((value) => value || null),
});

export const enterDrawSchema = z.object({
  drawId: id,
  weapon: z.enum(WEAPONS, { error: ERRORS.weapon }),
  /** Numbers of the slots wanted, from 0, as the form's boxes send them. */
  slots: z
    .array(
      z.coerce
        .number<string | number>()
        .int()
        .min(0)
        .max(MOST_SLOTS - 1),
    )
    .min(1, ERRORS.wantedSlots)
    .max(MOST_SLOTS)
    .transform((all) => [...new Set(all)].sort((a, b) => a - b)),
  /** In order; '' is a choice left open. */
  choices: z
    .array(z.string().max(40))
    .max(MOST_CHOICES)
    .superRefine((all, ctx) => {
      all.forEach((one, at) => {
        if (one === '' || all.indexOf(one) === at) return;
        ctx.addIssue({ code: 'custom', path: [at], message: ERRORS.chosenTwice });
      });
    })
    .transform((all) => all.filter((one) => one !== '')),
  anyByScore: z.boolean(),
  guests: z.array(guest).max(10, ERRORS.mostGuests).default([]),
});
export type EnterDrawValues = z.input<typeof enterDrawSchema>;
export type EnterDrawInput = z.output<typeof enterDrawSchema>;

export const drawIdSchema = z.object({ drawId: id });
export const swapSchema = z.object({
  drawId: id,
  memberId: id,
  slot: z
    .number()
    .int()
    .min(0)
    .max(MOST_SLOTS - 1),
});
