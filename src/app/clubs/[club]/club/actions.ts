'use server';

import { cancelSitsOf } from '@/features/bookings/cancel-sits-of';
import { leaveSchema } from '@/features/clubs/member-schema';
import { leaveClub } from '@/features/clubs/remove-member';
import { clubAction } from '@/server/doors';

export const leaveAction = clubAction({
  permission: 'club.read',
  input: leaveSchema,
  run: ({ scope, now }) => leaveClub(scope, cancelSitsOf, now),
});
