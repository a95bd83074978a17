'use server';

import { closeDays } from '@/features/bookings/close-days';
import { openAgainInput } from '@/features/ground/action-inputs';
import { closureFormSchema, closureSchema } from '@/features/ground/closure-schema';
import { openAgain } from '@/features/ground/open-again';
import { clubAction } from '@/server/doors';

export const closeAction = clubAction({
  permission: 'closed_days.write',
  input: closureFormSchema,
  run: ({ scope, input, now }) => closeDays(scope, closureSchema.parse(input), now),
});

export const openAgainAction = clubAction({
  permission: 'closed_days.write',
  input: openAgainInput,
  run: ({ scope, input, now }) => openAgain(scope, input.id, now),
});
