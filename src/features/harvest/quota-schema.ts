import { z } from 'zod';
import { isDay } from '@/core/day-time';
import { QUOTA_ERRORS } from './words/season';

/** Whose quotas, as of what day; without a member the reader's. */
export const quotaQuery = z.object({
  day: z.string().refine(isDay, QUOTA_ERRORS.day),
  member: z.string().min(1).max(40).optional(),
});
