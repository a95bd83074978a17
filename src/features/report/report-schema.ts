import { z } from 'zod';
import { isDay } from '@/core/day-time';
import { PERIOD_WORDS } from './words/period';

/** A day that any sum of days can follow. */
const day = z
  .string()
  .refine((text) => isDay(text) && text >= '2000-01-02' && text <= '2099-12-30', PERIOD_WORDS.noDay);

/** `season`: a hunting year by the year in which it begins, or the id of one of the club's seasons. */
export const reportAskSchema = z.object({
  season: z.string().min(1).max(60).optional(),
  from: day.optional(),
  to: day.optional(),
});
export type ReportAsk = z.output<typeof reportAskSchema>;

export const REPORT_PARTS = [
  'use',
  'pressure',
  'rests',
  'unused',
  'members',
  'bumps',
  'deer',
  'harvest',
  'hours',
] as const;
export type ReportPart = (typeof REPORT_PARTS)[number];

export const reportFileSchema = reportAskSchema.extend({ part: z.enum(REPORT_PARTS) });

/** An address typed by hand asks for what it can: anything else, and a field left empty, is left out. */
export function readReportAsk(search: Record<string, string | string[] | undefined>): ReportAsk {
  const { season, from, to } = reportAskSchema.shape;
  return {
    season: season.catch(undefined).parse(search.season),
    from: from.catch(undefined).parse(search.from),
    to: to.catch(undefined).parse(search.to),
  };
}
