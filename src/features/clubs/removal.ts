import { formatDay } from '@/core/day-time';
import { SIT_WINDOW_WORDS } from '@/core/words/windows';
import { type ReadFrom, reader, type Tx } from '@/db/client';
import { composeMail } from '@/features/mail/compose';
import { AppError } from '@/server/errors';
import { queueMail } from '@/server/outbox';
import type { ClubScope } from '@/server/scope';
import { auditClub } from './audit-club';
import { countAdmins, findMember, listMembers, type MemberRow, revokeFeedsOf, updateMember } from './data';
import { listInvitations, revokeInvitationsBy } from './invitations-data';
import { type FutureSit, listFutureSits } from './member-sits-data';
import { CLUB_AUDIT } from './words/audit';
import { CLUB_ERRORS } from './words/errors';
import { REMOVED_MAIL } from './words/mails';

/** Cancels the sits of a member in the same transaction, frees their claims and tells the member; gives how many. */
export type CancelSitsOf = (tx: Tx, scope: ClubScope, memberId: string, reason: string, now: number) => Promise<number>;

/** 'Creek Ladder, Sat 7 Nov 2026, morning'. */
export function sitText({ standName, day, windows }: FutureSit): string {
  return `${standName}, ${formatDay(day, true)}, ${SIT_WINDOW_WORDS[windows]}`;
}

/** What goes when a person goes; said before, and done. */
export interface RemovalPlan {
  name: string;
  /** The club would be left without an admin, so it cannot be done. */
  lastAdmin: boolean;
  sits: string[];
  /** Guests the person answers for go too. */
  guests: { name: string; sits: string[] }[];
  /** Names on invitations of guests that are revoked. */
  invitations: string[];
}

const guestsOf = (members: MemberRow[], sponsorId: string) =>
  members.filter((one) => one.role === 'guest' && one.sponsorId === sponsorId);

/** null: nobody of that id is in the club. */
export async function planRemoval(scope: ClubScope, memberId: string, now: number): Promise<RemovalPlan | null> {
  const from = reader();
  const member = await findMember(scope, memberId, from);
  if (!member) return null;
  const guests = guestsOf(await listMembers(scope, from), member.id);
  const sits = await listFutureSits(scope, [member.id, ...guests.map((guest) => guest.id)], now, from);
  const textsOf = (id: string) => sits.filter((sit) => sit.memberId === id).map(sitText);
  const invitations = await listInvitations(scope, from);
  return {
    name: member.name,
    lastAdmin: await isLastAdmin(scope, member, from),
    sits: textsOf(member.id),
    guests: guests.map((guest) => ({ name: guest.name, sits: textsOf(guest.id) })),
    invitations: invitations.filter((one) => one.sponsorId === member.id).map((one) => one.name),
  };
}

export async function isLastAdmin(scope: ClubScope, member: MemberRow, from: ReadFrom): Promise<boolean> {
  return member.role === 'admin' && (await countAdmins(scope, from)) < 2;
}

export interface Removed {
  name: string;
  cancelledSits: number;
  guests: string[];
}

async function mailRemoved(tx: Tx, scope: ClubScope, member: MemberRow, why: string, now: number): Promise<void> {
  const { text, html } = composeMail({
    clubName: scope.club.name,
    paragraphs: [REMOVED_MAIL.hello(member.name), REMOVED_MAIL.opening(scope.club.name, why), REMOVED_MAIL.goes],
  });
  await queueMail(
    tx,
    {
      clubId: scope.club.id,
      kind: 'club.removed',
      dedupeKey: `club.removed:${member.id}:${now}`,
      to: { email: member.email, name: member.name },
      subject: REMOVED_MAIL.subject(scope.club.name),
      text,
      html,
    },
    now,
  );
}

interface Going {
  action: 'member.removed' | 'member.left';
  /** Of the member's own sits and of the guests'. */
  reason: string;
  guestReason: string;
}

/** Takes a member out with the guests the member answers for; everything in the transaction given. */
export async function takeOut(
  tx: Tx,
  scope: ClubScope,
  member: MemberRow,
  going: Going,
  cancelSitsOf: CancelSitsOf,
  now: number,
): Promise<Removed> {
  if (await isLastAdmin(scope, member, tx)) {
    throw new AppError('conflict', CLUB_ERRORS.onlyAdmin(member.name));
  }
  const guests = guestsOf(await listMembers(scope, tx), member.id);
  const revoked = await revokeInvitationsBy(scope, tx, member.id, now);
  let cancelledSits = 0;
  for (const one of [member, ...guests]) {
    const itself = one.id === member.id;
    const reason = itself ? going.reason : going.guestReason;
    const cancelled = await cancelSitsOf(tx, scope, one.id, reason, now);
    cancelledSits += cancelled;
    await updateMember(scope, tx, one.id, { removedAt: now });
    await revokeFeedsOf(scope, tx, one.id, now);
    const left = going.action === 'member.left' && itself;
    await auditClub(
      tx,
      scope,
      {
        action: left ? 'member.left' : 'member.removed',
        subjectType: 'member',
        subjectId: one.id,
        summary: left
          ? CLUB_AUDIT.left(one.name, cancelled)
          : CLUB_AUDIT.removed(scope.actor.name, one.name, cancelled),
        detail: {
          role: one.role,
          cancelledSits: cancelled,
          ...(itself ? { revokedInvitations: revoked } : { reason }),
        },
      },
      now,
    );
    if (one.id !== scope.member.id) await mailRemoved(tx, scope, one, reason, now);
  }
  return { name: member.name, cancelledSits, guests: guests.map((guest) => guest.name) };
}
