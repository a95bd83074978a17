import { formatDay } from '@/core/day-time';
import { can } from '@/core/permissions';
import { type Tx, write } from '@/db/client';
import { AppError, notFound } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { auditClub } from './audit-club';
import { maySponsor, requireStanding } from './check-standing';
import { findMember, listMembers, type MemberRow, updateMember } from './data';
import { listInvitations } from './invitations-data';
import type { ChangeMemberInput } from './member-schema';
import { listFutureSits } from './member-sits-data';
import { isLastAdmin, sitText } from './removal';
import { CLUB_AUDIT } from './words/audit';
import { CLUB_ERRORS } from './words/errors';
import { aRole } from './words/roles';

/** Sits already booked that the new role or days would not allow are named: whoever changes it cancels them first. */
async function refuseLostSits(scope: ClubScope, tx: Tx, member: MemberRow, input: ChangeMemberInput, now: number) {
  const { role, guestFrom, guestTo } = input;
  const sits = await listFutureSits(scope, [member.id], now, tx);
  const lost = sits.filter(({ day }) => {
    if (!can(role, 'sits.book')) return true;
    return guestFrom !== null && guestTo !== null && (day < guestFrom || day > guestTo);
  });
  if (lost.length === 0) return;
  const list = lost.map(sitText).join('; ');
  throw new AppError('conflict', CLUB_ERRORS.lostSits(member.name, list));
}

async function refuseLostGuests(scope: ClubScope, tx: Tx, member: MemberRow, input: ChangeMemberInput) {
  if (maySponsor(input.role)) return;
  const guests = [...(await listMembers(scope, tx)), ...(await listInvitations(scope, tx))]
    .filter((one) => one.sponsorId === member.id)
    .map((one) => one.name);
  if (guests.length === 0) return;
  throw new AppError('conflict', CLUB_ERRORS.answersFor(member.name, guests.join(', ')));
}

function changeText(scope: ClubScope, member: MemberRow, input: ChangeMemberInput, sponsorName: string | null): string {
  const { role, guestFrom, guestTo } = input;
  const days =
    guestFrom !== null && guestTo !== null
      ? CLUB_AUDIT.guestDays(formatDay(guestFrom, true), formatDay(guestTo, true), sponsorName ?? '')
      : '';
  if (role === member.role) return CLUB_AUDIT.staySet(scope.actor.name, member.name, days);
  return CLUB_AUDIT.roleChanged(scope.actor.name, member.name, aRole(role), days, aRole(member.role));
}

/** Gives a member another role, or a guest another sponsor or other days. */
export async function changeMember(
  scope: ClubScope,
  input: ChangeMemberInput,
  now: number,
): Promise<{ name: string; changed: boolean }> {
  return write(async (tx) => {
    const member = await findMember(scope, input.memberId, tx);
    if (!member) throw notFound();
    const { role, sponsorId, guestFrom, guestTo } = input;
    const before = {
      role: member.role,
      sponsorId: member.sponsorId,
      guestFrom: member.guestFrom,
      guestTo: member.guestTo,
    };
    const after = { role, sponsorId, guestFrom, guestTo };
    if (JSON.stringify(before) === JSON.stringify(after)) return { name: member.name, changed: false };
    if (role !== 'admin' && (await isLastAdmin(scope, member, tx))) {
      throw new AppError('conflict', CLUB_ERRORS.onlyAdmin(member.name));
    }
    if (sponsorId === member.id) {
      const message = CLUB_ERRORS.ownSponsor;
      throw new AppError('invalid', message, { fields: { sponsorId: message } });
    }
    const { sponsorName } = await requireStanding(scope, tx, input, now);
    await refuseLostGuests(scope, tx, member, input);
    await refuseLostSits(scope, tx, member, input, now);
    await updateMember(scope, tx, member.id, after);
    await auditClub(
      tx,
      scope,
      {
        action: 'member.changed',
        subjectType: 'member',
        subjectId: member.id,
        summary: changeText(scope, member, input, sponsorName),
        detail: { before, after },
      },
      now,
    );
    return { name: member.name, changed: true };
  });
}
