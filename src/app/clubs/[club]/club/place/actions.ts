'use server';

import { changePlaceSchema } from '@/features/clubs/club-schema';
import { savePlace } from '@/features/clubs/save-club';
import { clubAction } from '@/server/doors';

export const savePlaceAction = clubAction({
  permission: 'rules.write',
  input: changePlaceSchema,
  run: ({ scope, input, now }) => savePlace(scope, input, now),
});
