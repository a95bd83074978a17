'use server';

import { choicesSchema } from '@/features/notices/choices-schema';
import { saveChoices } from '@/features/notices/save-choices';
import { clubAction } from '@/server/doors';

export const saveChoicesAction = clubAction({
  permission: 'notices.own',
  input: choicesSchema,
  run: ({ scope, input, now }) => saveChoices(scope, input, now),
});
