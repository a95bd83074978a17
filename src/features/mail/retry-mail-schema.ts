import { z } from 'zod';

export const retryMailSchema = z.object({ id: z.string().min(1).max(60) });
export type RetryMailInput = z.output<typeof retryMailSchema>;
