'use server';

import { addApproachInput, atVersion, changeApproachInput } from '@/features/ground/action-inputs';
import { addApproach } from '@/features/ground/add-approach';
import { changeApproach } from '@/features/ground/change-approach';
import { removeApproach } from '@/features/ground/remove-approach';
import { clubAction } from '@/server/doors';

export const addApproachAction = clubAction({
  permission: 'approaches.write',
  input: addApproachInput,
  run: ({ scope, input, now }) => addApproach(scope, input.standId, input, now),
});

export const changeApproachAction = clubAction({
  permission: 'approaches.write',
  input: changeApproachInput,
  run: ({ scope, input, now }) => changeApproach(scope, input, input, now),
});

export const removeApproachAction = clubAction({
  permission: 'approaches.write',
  input: atVersion,
  run: ({ scope, input, now }) => removeApproach(scope, input, now),
});
