import { and, asc, count, eq, inArray, isNull } from 'drizzle-orm';
import { type ReadFrom, reader, type Tx } from '@/db/client';
import { features, memberships, photos, stands, users } from '@/db/schema';
import type { ClubScope } from '@/server/scope';
import type { PhotoSubject } from './photo-schema';

export type PhotoRow = typeof photos.$inferSelect;

export interface Subject {
  subject: PhotoSubject;
  id: string;
}

const kept = (scope: ClubScope) => and(eq(photos.clubId, scope.club.id), isNull(photos.removedAt));
const of = ({ subject, id }: Subject) => and(eq(photos.subjectType, subject), eq(photos.subjectId, id));

export function listPhotos(scope: ClubScope, subject: Subject, from: ReadFrom = reader()) {
  return from
    .select({ photo: photos, byName: users.name })
    .from(photos)
    .innerJoin(memberships, eq(memberships.id, photos.byMemberId))
    .innerJoin(users, eq(users.id, memberships.userId))
    .where(and(kept(scope), of(subject)))
    .orderBy(asc(photos.createdAt), asc(photos.id));
}

export async function countPhotos(scope: ClubScope, subject: Subject, from: ReadFrom): Promise<number> {
  const [row] = await from
    .select({ n: count() })
    .from(photos)
    .where(and(kept(scope), of(subject)));
  return row?.n ?? 0;
}

export async function getPhoto(scope: ClubScope, id: string, from: ReadFrom = reader()): Promise<PhotoRow | null> {
  const [row] = await from
    .select()
    .from(photos)
    .where(and(kept(scope), eq(photos.id, id)));
  return row ?? null;
}

export async function insertPhoto(
  scope: ClubScope,
  tx: Tx,
  row: Omit<PhotoRow, 'clubId' | 'removedAt'>,
): Promise<void> {
  await tx.insert(photos).values({ ...row, clubId: scope.club.id });
}

export async function updatePhoto(
  scope: ClubScope,
  tx: Tx,
  id: string,
  set: Partial<Pick<PhotoRow, 'caption' | 'removedAt'>>,
): Promise<void> {
  await tx
    .update(photos)
    .set(set)
    .where(and(kept(scope), eq(photos.id, id)));
}

/** Takes off, in all clubs, the photos of stands and features that are gone; gives how many. */
export async function removePhotosOfRemoved(tx: Tx, now: number): Promise<number> {
  const live = await tx
    .select({ id: photos.id, type: photos.subjectType, subjectId: photos.subjectId })
    .from(photos)
    .where(and(isNull(photos.removedAt), inArray(photos.subjectType, ['stand', 'feature'])));
  const there = new Set([
    ...(await tx.select({ id: stands.id }).from(stands).where(isNull(stands.removedAt))).map(({ id }) => id),
    ...(await tx.select({ id: features.id }).from(features).where(isNull(features.removedAt))).map(({ id }) => id),
  ]);
  const gone = live.filter(({ subjectId }) => !there.has(subjectId));
  for (const { id } of gone) await tx.update(photos).set({ removedAt: now }).where(eq(photos.id, id));
  return gone.length;
}

/** Which of these photos are still kept, in any club. */
export async function findKept(ids: string[], from: ReadFrom = reader()): Promise<Set<string>> {
  const rows = await from
    .select({ id: photos.id })
    .from(photos)
    .where(and(isNull(photos.removedAt), inArray(photos.id, ids)));
  return new Set(rows.map(({ id }) => id));
}
