import { z } from 'zod';
import { isDay } from '@/core/day-time';

/** A day the sums can handle; an empty field of the form asks for nothing. */
const day = z
  .string()
  .optional()
  .transform((text) => (text && isDay(text) && text >= '2000-01-02' && text <= '2099-12-30' ? text : undefined));

/** `season`: a hunting year by the year in which it begins, or the id of one of the club's seasons. */
export const reportAskSchema = z.object({ season: z.string().max(60).optional(), from: day, to: day });
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

/** An address typed by hand asks for what it can: anything else is left out. */
export function readReportAsk(search: Record<string, string | string[] | undefined>): ReportAsk {
  const asked = reportAskSchema.safeParse(search);
  return asked.success ? asked.data : { from: undefined, to: undefined };
}
