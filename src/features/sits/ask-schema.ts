import { z } from 'zod';
import { WINDOW_NAMES } from '@/core/condition-types';
import { isDay } from '@/core/day-time';
import { WEAPONS } from '@/core/ground-types';
import { inAskedYears } from './asked-years';
import { ASK_ERRORS } from './words/reads';

const day = z.string().refine(isDay, ASK_ERRORS.day).refine(inAskedYears, ASK_ERRORS.years);
const window = z.enum(WINDOW_NAMES, { error: ASK_ERRORS.window });
const weapon = z.enum(WEAPONS, { error: ASK_ERRORS.weapon });

/** The query string of the ranked list; what is left out is the next window, any weapon. */
export const sitsAskSchema = z.object({ day: day.optional(), window: window.optional(), weapon: weapon.optional() });
export type SitsAskText = z.output<typeof sitsAskSchema>;

export const weekAskSchema = z.object({ weapon: weapon.optional() });
export type WeekAskText = z.output<typeof weekAskSchema>;

/** A page's address may be typed by hand: what cannot be read in it is left out, part by part. */
const lenient = z.object({
  day: day.optional().catch(undefined),
  window: window.optional().catch(undefined),
  weapon: weapon.optional().catch(undefined),
});

export function readAsk(search: Record<string, string | string[] | undefined>): SitsAskText {
  return lenient.parse(search);
}
