import { z } from 'zod';
import { isClock } from '@/core/day-time';
import { NOTICE_KINDS, type NoticeChoices, type NoticeKind, WIND_POINTS } from '@/core/notices/notice-kinds';
import { CHOICES_ERRORS } from './words/choices';

const clock = z.string().trim().refine(isClock, CHOICES_ERRORS.time);

export const choicesSchema = z.object({
  kinds: z
    .array(z.enum(NOTICE_KINDS, { error: CHOICES_ERRORS.kind }))
    .max(NOTICE_KINDS.length)
    .transform((kinds): NoticeKind[] => [...new Set(kinds)]),
  /** A select sends text. */
  windPoints: z
    .string()
    .refine((text) => WIND_POINTS.some((one) => String(one) === text), CHOICES_ERRORS.points)
    .transform(Number),
  quietFrom: clock,
  quietTo: clock,
});
export type ChoicesInput = z.output<typeof choicesSchema>;
export interface ChoicesForm {
  kinds: NoticeKind[];
  windPoints: string;
  quietFrom: string;
  quietTo: string;
}

export function choicesForm({ kinds, windPoints, quietFrom, quietTo }: NoticeChoices): ChoicesForm {
  return { kinds, windPoints: String(windPoints), quietFrom, quietTo };
}

export const unsubscribeSchema = z.object({ secret: z.string().min(16).max(64) });
