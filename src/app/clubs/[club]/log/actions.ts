'use server';

import { z } from 'zod';
import { formClubOf } from '@/features/ground/form-club';
import { addVisit } from '@/features/logs/add-visit';
import { logFormSchema } from '@/features/logs/log-schema';
import { removeVisit } from '@/features/logs/remove-visit';
import { saveLog } from '@/features/logs/save-log';
import { makeVisitSchema, visitFormSchema } from '@/features/logs/visit-schema';
import { clubAction } from '@/server/doors';

export const saveLogAction = clubAction({
  permission: 'log.write',
  input: logFormSchema,
  run: ({ scope, input, now }) => saveLog(scope, input, now),
});

export const addVisitAction = clubAction({
  permission: 'visits.write',
  input: visitFormSchema,
  run: ({ scope, input, now }) =>
    addVisit(scope, makeVisitSchema(formClubOf(scope.club)).parse(input), now, input.sent),
});

export const removeVisitAction = clubAction({
  permission: 'visits.write',
  input: z.object({ id: z.string().min(1).max(40) }),
  run: ({ scope, input, now }) => removeVisit(scope, input.id, now),
});
