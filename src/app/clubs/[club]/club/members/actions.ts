'use server';

import { cancelSitsOf } from '@/features/bookings/cancel-sits-of';
import { changeMember } from '@/features/clubs/change-member';
import { inviteMember } from '@/features/clubs/invite-member';
import {
  changeMemberSchema,
  invitationIdSchema,
  inviteSchema,
  removeMemberSchema,
} from '@/features/clubs/member-schema';
import { removeMember } from '@/features/clubs/remove-member';
import { resendInvitation } from '@/features/clubs/resend-invitation';
import { revokeInvitation } from '@/features/clubs/revoke-invitation';
import { clubAction } from '@/server/doors';

export const inviteAction = clubAction({
  permission: 'members.write',
  input: inviteSchema,
  run: ({ scope, user, input, now }) => inviteMember(scope, user, input, now),
});

export const resendInvitationAction = clubAction({
  permission: 'members.write',
  input: invitationIdSchema,
  run: ({ scope, user, input, now }) => resendInvitation(scope, user, input, now),
});

export const revokeInvitationAction = clubAction({
  permission: 'members.write',
  input: invitationIdSchema,
  run: ({ scope, input, now }) => revokeInvitation(scope, input, now),
});

export const changeMemberAction = clubAction({
  permission: 'members.write',
  input: changeMemberSchema,
  run: ({ scope, input, now }) => changeMember(scope, input, now),
});

export const removeMemberAction = clubAction({
  permission: 'members.write',
  input: removeMemberSchema,
  run: ({ scope, input, now }) => removeMember(scope, input, cancelSitsOf, now),
});
