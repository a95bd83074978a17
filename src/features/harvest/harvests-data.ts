import { and, asc, desc, eq, gte, isNull, lte, min } from 'drizzle-orm';
import { can } from '@/core/permissions';
import { type ReadFrom, reader, type Tx } from '@/db/client';
import { harvests, memberships, stands, users } from '@/db/schema';
import type { ClubScope } from '@/server/scope';

export type HarvestRow = typeof harvests.$inferSelect;

interface Days {
  fromDay: string;
  toDay: string;
}

const kept = (scope: ClubScope) => and(eq(harvests.clubId, scope.club.id), isNull(harvests.removedAt));

function selectSheets(from: ReadFrom) {
  return from
    .select({
      sheet: harvests,
      memberName: users.name,
      standName: stands.name,
    })
    .from(harvests)
    .innerJoin(memberships, eq(memberships.id, harvests.memberId))
    .innerJoin(users, eq(users.id, memberships.userId))
    .leftJoin(stands, eq(stands.id, harvests.standId));
}

/** A sheet with the names of what it points at. */
export type Sheet = Awaited<ReturnType<typeof selectSheets>>[number];

/** Deer taken on the days given, the latest first. */
export function listSheets(scope: ClubScope, days: Days, from: ReadFrom = reader()): Promise<Sheet[]> {
  return selectSheets(from)
    .where(and(kept(scope), gte(harvests.day, days.fromDay), lte(harvests.day, days.toDay)))
    .orderBy(desc(harvests.takenAt), desc(harvests.id));
}

export async function findSheet(scope: ClubScope, id: string, from: ReadFrom = reader()): Promise<Sheet | null> {
  const [row] = await selectSheets(from).where(and(kept(scope), eq(harvests.id, id)));
  return row ?? null;
}

export async function findSheetByRequest(scope: ClubScope, requestKey: string, from: ReadFrom): Promise<Sheet | null> {
  const [row] = await selectSheets(from).where(
    and(eq(harvests.clubId, scope.club.id), eq(harvests.requestKey, requestKey)),
  );
  return row ?? null;
}

/** What quotas count of the days given. */
export async function listCounted(scope: ClubScope, days: Days, from: ReadFrom = reader()) {
  const rows = await from
    .select({ memberId: harvests.memberId, guestName: harvests.guestName, antlered: harvests.antlered })
    .from(harvests)
    .where(and(kept(scope), gte(harvests.day, days.fromDay), lte(harvests.day, days.toDay)));
  return rows.map(({ guestName, ...deer }) => ({ ...deer, byGuest: guestName !== '' }));
}

export async function findFirstHarvestDay(scope: ClubScope, from: ReadFrom = reader()): Promise<string | null> {
  const [row] = await from
    .select({ day: min(harvests.day) })
    .from(harvests)
    .where(kept(scope));
  return row?.day ?? null;
}

function selectHunters(from: ReadFrom) {
  return from
    .select({ id: memberships.id, name: users.name, role: memberships.role, sponsorId: memberships.sponsorId })
    .from(memberships)
    .innerJoin(users, eq(users.id, memberships.userId));
}
export type HunterRow = Awaited<ReturnType<typeof selectHunters>>[number];

/** Somebody who is or was in the club, with the sponsor of a guest. */
export async function findHunter(scope: ClubScope, id: string, from: ReadFrom): Promise<HunterRow | null> {
  const [row] = await selectHunters(from).where(and(eq(memberships.clubId, scope.club.id), eq(memberships.id, id)));
  return row ?? null;
}

/** Everyone in the club who may hunt, by name. */
export async function listHunters(scope: ClubScope, from: ReadFrom = reader()): Promise<HunterRow[]> {
  const rows = await selectHunters(from)
    .where(and(eq(memberships.clubId, scope.club.id), isNull(memberships.removedAt)))
    .orderBy(asc(users.name));
  return rows.filter((row) => can(row.role, 'sits.book'));
}

export async function insertSheet(tx: Tx, row: typeof harvests.$inferInsert): Promise<void> {
  await tx.insert(harvests).values(row);
}

/** Of a version; false when another was saved in between. */
export async function updateSheet(
  scope: ClubScope,
  tx: Tx,
  at: { id: string; version: number },
  set: Partial<typeof harvests.$inferInsert>,
): Promise<boolean> {
  const rows = await tx
    .update(harvests)
    .set({ ...set, version: at.version + 1 })
    .where(and(kept(scope), eq(harvests.id, at.id), eq(harvests.version, at.version)))
    .returning({ id: harvests.id });
  return rows.length > 0;
}
