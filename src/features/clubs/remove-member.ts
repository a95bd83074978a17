import { write } from '@/db/client';
import { notFound } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { findMember } from './data';
import { type CancelSitsOf, type Removed, takeOut } from './removal';
import { REMOVED_MAIL } from './words/mails';

/** Takes a member out of the club, with the sits and the guests that go too. The record of past sits stays. */
export async function removeMember(
  scope: ClubScope,
  input: { memberId: string },
  cancelSitsOf: CancelSitsOf,
  now: number,
): Promise<Removed> {
  return write(async (tx) => {
    const member = await findMember(scope, input.memberId, tx);
    if (!member) throw notFound();
    const going = {
      action: 'member.removed' as const,
      reason: REMOVED_MAIL.takenOut(scope.actor.name),
      guestReason: REMOVED_MAIL.sponsorGone(member.name),
    };
    return takeOut(tx, scope, member, going, cancelSitsOf, now);
  });
}

/** A member goes of his own accord. */
export async function leaveClub(scope: ClubScope, cancelSitsOf: CancelSitsOf, now: number): Promise<Removed> {
  return write(async (tx) => {
    const member = await findMember(scope, scope.member.id, tx);
    if (!member) throw notFound();
    const going = {
      action: 'member.left' as const,
      reason: REMOVED_MAIL.left,
      guestReason: REMOVED_MAIL.sponsorLeft(member.name),
    };
    return takeOut(tx, scope, member, going, cancelSitsOf, now);
  });
}
