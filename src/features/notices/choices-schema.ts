import { z } from 'zod';
import { isClock } from '@/core/day-time';
import { NOTICE_KINDS, type NoticeChoices, type NoticeKind, WIND_POINTS } from '@/core/notices/notice-kinds';

const clock = z.string().trim().refine(isClock, 'Give a time.');

export const choicesSchema = z.object({
  kinds: z
    .array(z.enum(NOTICE_KINDS, { error: 'Choose from the list.' }))
    .max(NOTICE_KINDS.length)
    .transform((kinds): NoticeKind[] => [...new Set(kinds)]),
  /** A select sends text. */
  windPoints: z
    .string()
    .refine((text) => WIND_POINTS.some((one) => String(one) === text), 'Choose one of the list.')
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

export const KIND_WORDS: Record<NoticeKind, { label: string; note: string }> = {
  wind_turned: {
    label: 'The wind turns on a sit I have booked',
    note: 'Once for each change, with the best free stand in its place.',
  },
  evening_before: {
    label: 'The evening before a sit',
    note: 'At six: when to leave the truck, the way in, the wind, the light.',
  },
  rest_over: { label: 'A stand has had its rest', note: 'In the morning, once for each stand.' },
  rules_changed: { label: "The club's rules change", note: 'What it said before and says now.' },
  draw_changed: {
    label: 'A draw opens, is published or called off',
    note: 'What I drew and why, and when a swap is offered to me.',
  },
  weekly: {
    label: 'A letter each Thursday',
    note: 'My sits, closed stands, my chores and work days of the week ahead.',
  },
};

/** In the middle of a sentence: 'mail about ...'. */
export const KIND_PHRASES: Record<NoticeKind, string> = {
  wind_turned: 'the wind turning on a booked sit',
  evening_before: 'the evening before a sit',
  rest_over: 'stands that have had their rest',
  rules_changed: "changes of the club's rules",
  draw_changed: 'draws of stands',
  weekly: 'the week ahead',
};
