'use server';

import {
  changeChoreFormSchema,
  choreFormSchema,
  choreIdSchema,
  finishChoreSchema,
  makeChoreSchema,
} from '@/features/chores/chore-schema';
import { finishChore } from '@/features/chores/finish-chore';
import { inspectionSchema } from '@/features/chores/inspection-schema';
import { addChore, changeChore, removeChore, takeChore } from '@/features/chores/save-chore';
import { saveInspection } from '@/features/chores/save-inspection';
import { addWorkDay, cancelWorkDay, changeWorkDay, creditWorkDay, joinWorkDay } from '@/features/chores/save-work-day';
import {
  changeWorkDaySchema,
  creditSchema,
  joinWorkDaySchema,
  workDayIdSchema,
  workDaySchema,
} from '@/features/chores/work-day-schema';
import { formClubOf } from '@/features/ground/form-club';
import { clubAction } from '@/server/doors';

export const addChoreAction = clubAction({
  permission: 'chores.write',
  input: choreFormSchema,
  run: ({ scope, input, now }) => addChore(scope, makeChoreSchema(formClubOf(scope.club)).parse(input), now),
});

export const changeChoreAction = clubAction({
  permission: 'chores.write',
  input: changeChoreFormSchema,
  run: ({ scope, input, now }) => {
    const { id, version, ...typed } = input;
    return changeChore(scope, { id, version }, makeChoreSchema(formClubOf(scope.club)).parse(typed), now);
  },
});

export const removeChoreAction = clubAction({
  permission: 'chores.write',
  input: choreIdSchema,
  run: ({ scope, input, now }) => removeChore(scope, input.id, now),
});

export const takeChoreAction = clubAction({
  permission: 'chores.read',
  input: choreIdSchema,
  run: ({ scope, input, now }) => takeChore(scope, input.id, now),
});

export const finishChoreAction = clubAction({
  permission: 'chores.read',
  input: finishChoreSchema,
  run: ({ scope, input, now }) => finishChore(scope, input, now),
});

export const saveInspectionAction = clubAction({
  permission: 'inspections.write',
  input: inspectionSchema,
  run: ({ scope, input, now }) => saveInspection(scope, input, now),
});

export const addWorkDayAction = clubAction({
  permission: 'chores.write',
  input: workDaySchema,
  run: ({ scope, input, now }) => addWorkDay(scope, input, now),
});

export const changeWorkDayAction = clubAction({
  permission: 'chores.write',
  input: changeWorkDaySchema,
  run: ({ scope, input, now }) => changeWorkDay(scope, input, now),
});

export const cancelWorkDayAction = clubAction({
  permission: 'chores.write',
  input: workDayIdSchema,
  run: ({ scope, input, now }) => cancelWorkDay(scope, input.id, now),
});

export const joinWorkDayAction = clubAction({
  permission: 'chores.read',
  input: joinWorkDaySchema,
  run: ({ scope, input, now }) => joinWorkDay(scope, input, now),
});

export const creditWorkDayAction = clubAction({
  permission: 'chores.write',
  input: creditSchema,
  run: ({ scope, input, now }) => creditWorkDay(scope, input, now),
});
