import { z } from 'zod';

const standId = z.string().min(1).max(40);

/** The points as they were read: an admin applies what he saw, not what came since. */
export const applyAdjustmentSchema = z.object({ standId, points: z.number().min(-100).max(100), sits: z.int().min(0) });
export type ApplyAdjustment = z.output<typeof applyAdjustmentSchema>;

export const undoAdjustmentSchema = z.object({ standId });
