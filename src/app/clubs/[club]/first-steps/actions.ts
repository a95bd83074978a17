'use server';

import { z } from 'zod';
import { hideFirstSteps } from '@/features/onboarding/hide-first-steps';
import { laySamples } from '@/features/onboarding/lay-samples';
import { removeSamples } from '@/features/onboarding/remove-samples';
import { clubAction } from '@/server/doors';

export const laySamplesAction = clubAction({
  permission: 'rules.write',
  input: z.object({}),
  run: ({ scope, now }) => laySamples(scope, now),
});

export const removeSamplesAction = clubAction({
  permission: 'rules.write',
  input: z.object({}),
  run: ({ scope, now }) => removeSamples(scope, now),
});

export const hideFirstStepsAction = clubAction({
  permission: 'rules.write',
  input: z.object({}),
  run: ({ scope, now }) => hideFirstSteps(scope, now),
});
