'use server';

import { atVersion, changeStandInput } from '@/features/ground/action-inputs';
import { addStand } from '@/features/ground/add-stand';
import { changeStand } from '@/features/ground/change-stand';
import { removeStand } from '@/features/ground/remove-stand';
import { makeStandSchema, standFormSchema } from '@/features/ground/stand-schema';
import { clubAction } from '@/server/doors';

export const addStandAction = clubAction({
  permission: 'stands.write',
  input: standFormSchema,
  run: ({ scope, input, now }) => addStand(scope, makeStandSchema(scope.club).parse(input), now),
});

export const changeStandAction = clubAction({
  permission: 'stands.write',
  input: changeStandInput,
  run: ({ scope, input, now }) => changeStand(scope, input, makeStandSchema(scope.club).parse(input), now),
});

export const removeStandAction = clubAction({
  permission: 'stands.write',
  input: atVersion,
  run: ({ scope, input, now }) => removeStand(scope, input, now),
});
