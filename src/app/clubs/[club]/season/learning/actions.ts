'use server';

import { applyAdjustment, undoAdjustment } from '@/features/learning/apply-adjustment';
import { applyAdjustmentSchema, undoAdjustmentSchema } from '@/features/learning/learning-schema';
import { clubAction } from '@/server/doors';

export const applyAdjustmentAction = clubAction({
  permission: 'rules.write',
  input: applyAdjustmentSchema,
  run: ({ scope, input, now }) => applyAdjustment(scope, input, now),
});

export const undoAdjustmentAction = clubAction({
  permission: 'rules.write',
  input: undoAdjustmentSchema,
  run: ({ scope, input, now }) => undoAdjustment(scope, input.standId, now),
});
