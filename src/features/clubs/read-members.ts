import { dayOf, formatDay } from '@/core/day-time';
import type { Role } from '@/core/permissions';
import { reader } from '@/db/client';
import type { ClubScope } from '@/server/scope';
import { maySponsor } from './check-standing';
import { findMember, listMembers, type MemberRow } from './data';
import { listInvitations } from './invitations-data';
import { MEMBER_WORDS } from './words/members';
import { ROLE_WORDS } from './words/roles';

export interface MemberView {
  id: string;
  name: string;
  /** For those who may change members only. */
  email: string | null;
  role: Role;
  roleWord: string;
  joinedDay: string;
  joinedText: string;
  guestFrom: string | null;
  guestTo: string | null;
  /** 'Sat 7 Nov 2026 to Mon 9 Nov 2026', and whether it is over. */
  guestText: string | null;
  sponsorId: string | null;
  sponsorName: string | null;
  isYou: boolean;
}

function guestText(from: string | null, to: string | null, today: string): string | null {
  if (from === null || to === null) return null;
  return MEMBER_WORDS.guestDays(formatDay(from, true), formatDay(to, true), to < today);
}

function viewOf(scope: ClubScope, row: MemberRow, names: Map<string, string>, now: number): MemberView {
  const { zone } = scope.club;
  const joinedDay = dayOf(row.joinedAt, zone);
  return {
    id: row.id,
    name: row.name,
    email: scope.can('members.write') ? row.email : null,
    role: row.role,
    roleWord: ROLE_WORDS[row.role],
    joinedDay,
    joinedText: formatDay(joinedDay, true),
    guestFrom: row.guestFrom,
    guestTo: row.guestTo,
    guestText: guestText(row.guestFrom, row.guestTo, dayOf(now, zone)),
    sponsorId: row.sponsorId,
    sponsorName: row.sponsorId === null ? null : (names.get(row.sponsorId) ?? null),
    isYou: row.id === scope.member.id,
  };
}

const namesOf = (rows: MemberRow[]) => new Map(rows.map((row) => [row.id, row.name]));

export async function readMembers(scope: ClubScope, now: number): Promise<MemberView[]> {
  const rows = await listMembers(scope);
  const names = namesOf(rows);
  return rows.map((row) => viewOf(scope, row, names, now));
}

export async function readMember(scope: ClubScope, id: string, now: number): Promise<MemberView | null> {
  const row = await findMember(scope, id, reader());
  return row && viewOf(scope, row, namesOf(await listMembers(scope)), now);
}

export interface SponsorChoice {
  id: string;
  name: string;
}

/** Who may answer for a guest. */
export async function readSponsors(scope: ClubScope): Promise<SponsorChoice[]> {
  const rows = await listMembers(scope);
  return rows.filter((row) => maySponsor(row.role)).map(({ id, name }) => ({ id, name }));
}

export interface InvitationRowView {
  id: string;
  name: string;
  email: string;
  roleWord: string;
  sponsorName: string | null;
  guestText: string | null;
  sentText: string;
  /** The link's last day; null: it is too old. */
  untilText: string | null;
}

/** Invitations not accepted and not revoked. */
export async function readInvitations(scope: ClubScope, now: number): Promise<InvitationRowView[]> {
  const { zone } = scope.club;
  const names = namesOf(await listMembers(scope));
  const rows = await listInvitations(scope);
  return rows.map((row) => ({
    id: row.id,
    name: row.name,
    email: row.email,
    roleWord: ROLE_WORDS[row.role],
    sponsorName: row.sponsorId === null ? null : (names.get(row.sponsorId) ?? null),
    guestText: guestText(row.guestFrom, row.guestTo, dayOf(now, zone)),
    sentText: formatDay(dayOf(row.sentAt, zone), true),
    untilText: row.expiresAt > now ? formatDay(dayOf(row.expiresAt, zone), true) : null,
  }));
}
