import { z } from 'zod';
import { ANSWER_WORDS } from './words/answers';

const key = z.string().min(1).max(200);
const print = z.string().min(1).max(16);

export const acceptFindingSchema = z.object({
  key,
  print,
  /** Which of the finding's ways of mending it. */
  act: z.int().min(0).max(9),
});
export type AcceptFinding = z.output<typeof acceptFindingSchema>;

export const dismissFindingSchema = z.object({
  key,
  print,
  reason: z.string().trim().min(1, ANSWER_WORDS.reasonNeeded).max(300, ANSWER_WORDS.reasonLong),
});
export type DismissFinding = z.output<typeof dismissFindingSchema>;

export const reopenFindingSchema = z.object({ key });
