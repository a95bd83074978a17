'use server';

import { createClubSchema } from '@/features/clubs/club-schema';
import { createClub } from '@/features/clubs/create-club';
import { accountAction } from '@/server/doors';

export const createClubAction = accountAction({
  input: createClubSchema,
  run: ({ user, input, now }) => createClub(user, input, now),
});
