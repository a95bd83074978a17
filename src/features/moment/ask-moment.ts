import { z } from 'zod';
import { WINDOW_NAMES } from '@/core/condition-types';
import { isDay } from '@/core/day-time';
import { MOMENT_ERRORS } from './words';

/** A stand, a window and a half hour of it, as an address holds them. */
export const momentQuery = z.object({
  stand: z.string().min(1).max(40),
  day: z.string().refine(isDay, MOMENT_ERRORS.day),
  window: z.enum(WINDOW_NAMES),
  step: z.coerce.number().int().min(0).max(96).default(0),
});
export type MomentAsk = z.output<typeof momentQuery>;
