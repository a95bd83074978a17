'use server';

import { acceptFinding, dismissFinding, reopenFinding } from '@/features/setup/answer-finding';
import { acceptFindingSchema, dismissFindingSchema, reopenFindingSchema } from '@/features/setup/setup-schema';
import { clubAction } from '@/server/doors';

export const acceptFindingAction = clubAction({
  permission: 'features.write',
  input: acceptFindingSchema,
  run: ({ scope, input, now }) => acceptFinding(scope, input, now),
});

export const dismissFindingAction = clubAction({
  permission: 'features.write',
  input: dismissFindingSchema,
  run: ({ scope, input, now }) => dismissFinding(scope, input, now),
});

export const reopenFindingAction = clubAction({
  permission: 'features.write',
  input: reopenFindingSchema,
  run: ({ scope, input, now }) => reopenFinding(scope, input.key, now),
});
