import { and, asc, eq, isNull, lt } from 'drizzle-orm';
import type { NoticeChoices, NoticeKind } from '@/core/notices/notice-kinds';
import { DEFAULT_NOTICE_CHOICES } from '@/core/notices/notice-kinds';
import type { Role } from '@/core/permissions';
import { type ReadFrom, reader, type Tx } from '@/db/client';
import { clubs, memberships, noticeChoices, noticeLinks, users } from '@/db/schema';
import type { ClubScope } from '@/server/scope';

export interface NoticePerson {
  memberId: string;
  userId: string;
  name: string;
  email: string;
  role: Role;
  joinedAt: number;
  guestTo: string | null;
  choices: NoticeChoices;
}

const choicesOf = (row: typeof noticeChoices.$inferSelect | null): NoticeChoices => {
  if (!row) return DEFAULT_NOTICE_CHOICES;
  const { kinds, windPoints, quietFrom, quietTo } = row;
  return { kinds, windPoints, quietFrom, quietTo };
};

/** Everyone in the club with what they want to be told. */
export async function listNoticePeople(scope: ClubScope, from: ReadFrom = reader()): Promise<NoticePerson[]> {
  const rows = await from
    .select({ membership: memberships, name: users.name, email: users.email, chosen: noticeChoices })
    .from(memberships)
    .innerJoin(users, eq(users.id, memberships.userId))
    .leftJoin(noticeChoices, eq(noticeChoices.memberId, memberships.id))
    .where(and(eq(memberships.clubId, scope.club.id), isNull(memberships.removedAt)))
    .orderBy(asc(memberships.id));
  return rows.map(({ membership, name, email, chosen }) => ({
    memberId: membership.id,
    userId: membership.userId,
    name,
    email,
    role: membership.role,
    joinedAt: membership.joinedAt,
    guestTo: membership.guestTo,
    choices: choicesOf(chosen),
  }));
}

export async function findChoices(
  scope: ClubScope,
  memberId: string,
  from: ReadFrom = reader(),
): Promise<NoticeChoices> {
  const [row] = await from
    .select()
    .from(noticeChoices)
    .where(and(eq(noticeChoices.clubId, scope.club.id), eq(noticeChoices.memberId, memberId)));
  return choicesOf(row ?? null);
}

export async function putChoices(
  tx: Tx,
  at: { clubId: string; memberId: string; now: number },
  choices: NoticeChoices,
): Promise<void> {
  const set = { ...choices, updatedAt: at.now };
  await tx
    .insert(noticeChoices)
    .values({ ...set, clubId: at.clubId, memberId: at.memberId })
    .onConflictDoUpdate({ target: noticeChoices.memberId, set });
}

export async function insertNoticeLink(tx: Tx, row: typeof noticeLinks.$inferInsert): Promise<void> {
  await tx.insert(noticeLinks).values(row);
}

/** By the secret in a mail, which stands in for a scope. */
export async function findNoticeLink(secretHash: string, from: ReadFrom = reader()) {
  const [row] = await from
    .select({ link: noticeLinks, clubName: clubs.name, slug: clubs.slug, chosen: noticeChoices })
    .from(noticeLinks)
    .innerJoin(clubs, eq(clubs.id, noticeLinks.clubId))
    .leftJoin(noticeChoices, eq(noticeChoices.memberId, noticeLinks.memberId))
    .where(eq(noticeLinks.secretHash, secretHash));
  if (!row) return null;
  const kind: NoticeKind = row.link.kind;
  return { ...row.link, kind, clubName: row.clubName, slug: row.slug, choices: choicesOf(row.chosen) };
}

/** Links of mails older than an instant. */
export async function deleteOldNoticeLinks(tx: Tx, before: number): Promise<void> {
  await tx.delete(noticeLinks).where(lt(noticeLinks.createdAt, before));
}
