import { and, asc, desc, eq, gt, gte, inArray, lte, ne, or } from 'drizzle-orm';
import type { WindowName } from '@/core/condition-types';
import { type ReadFrom, reader, type Tx } from '@/db/client';
import { approaches, claims, memberships, outings, parkings, sits, stands, users } from '@/db/schema';
import { newId } from '@/lib/ids';
import type { ClubScope } from '@/server/scope';

export type SitRow = typeof sits.$inferSelect;
export type NewSit = typeof sits.$inferInsert;

function selectSits(from: ReadFrom) {
  return from
    .select({
      sit: sits,
      standName: stands.name,
      standLat: stands.lat,
      standLon: stands.lon,
      memberName: users.name,
      memberEmail: users.email,
      /** null: as the club has it. */
      memberUnits: users.units,
      approachName: approaches.name,
      parkingName: parkings.name,
    })
    .from(sits)
    .innerJoin(stands, eq(stands.id, sits.standId))
    .innerJoin(memberships, eq(memberships.id, sits.memberId))
    .innerJoin(users, eq(users.id, memberships.userId))
    .leftJoin(approaches, eq(approaches.id, sits.approachId))
    .leftJoin(parkings, eq(parkings.id, approaches.parkingId));
}

type JoinedSit = Awaited<ReturnType<typeof selectSits>>[number];

/** A sit with the names of what it points at. */
export type SitDetail = SitRow & Omit<JoinedSit, 'sit'>;

const flat = ({ sit, ...names }: JoinedSit): SitDetail => ({ ...sit, ...names });

export async function findSit(scope: ClubScope, sitId: string, from: ReadFrom = reader()): Promise<SitDetail | null> {
  const [row] = await selectSits(from).where(and(eq(sits.clubId, scope.club.id), eq(sits.id, sitId)));
  return row ? flat(row) : null;
}

export async function findSitByRequest(
  scope: ClubScope,
  requestKey: string,
  from: ReadFrom,
): Promise<SitDetail | null> {
  const [row] = await selectSits(from).where(and(eq(sits.clubId, scope.club.id), eq(sits.requestKey, requestKey)));
  return row ? flat(row) : null;
}

/** Sits that stand on the days from one to another, both inside. */
export async function listBookedSits(
  scope: ClubScope,
  days: { fromDay: string; toDay: string },
  from: ReadFrom = reader(),
): Promise<SitDetail[]> {
  const rows = await selectSits(from)
    .where(
      and(
        eq(sits.clubId, scope.club.id),
        eq(sits.status, 'booked'),
        gte(sits.day, days.fromDay),
        lte(sits.day, days.toDay),
      ),
    )
    .orderBy(asc(sits.startAt), asc(stands.name));
  return rows.map(flat);
}

/** A member's sits that stand and have not ended. */
export async function listUpcomingSits(
  scope: ClubScope,
  memberId: string,
  now: number,
  from: ReadFrom = reader(),
): Promise<SitDetail[]> {
  const rows = await selectSits(from)
    .where(
      and(eq(sits.clubId, scope.club.id), eq(sits.memberId, memberId), eq(sits.status, 'booked'), gt(sits.endAt, now)),
    )
    .orderBy(asc(sits.startAt));
  return rows.map(flat);
}

/** A member's sits that have ended, lapsed or were cancelled, the latest first. */
export async function listPastSits(
  scope: ClubScope,
  memberId: string,
  now: number,
  most: number,
  from: ReadFrom = reader(),
): Promise<SitDetail[]> {
  const rows = await selectSits(from)
    .where(
      and(
        eq(sits.clubId, scope.club.id),
        eq(sits.memberId, memberId),
        or(ne(sits.status, 'booked'), lte(sits.endAt, now)),
      ),
    )
    .orderBy(desc(sits.startAt))
    .limit(most);
  return rows.map(flat);
}

/** All sits since a day, cancelled ones too: what a calendar has to know of. */
export async function listSitsSince(
  scope: ClubScope,
  fromDay: string,
  memberId: string | null,
  from: ReadFrom = reader(),
): Promise<SitDetail[]> {
  const rows = await selectSits(from)
    .where(
      and(
        eq(sits.clubId, scope.club.id),
        gte(sits.day, fromDay),
        memberId === null ? undefined : eq(sits.memberId, memberId),
      ),
    )
    .orderBy(asc(sits.startAt), asc(sits.id));
  return rows.map(flat);
}

/** Whether somebody has signed in for the sit, and whether they are still signed in. */
export async function findSigning(scope: ClubScope, sitId: string, from: ReadFrom): Promise<'none' | 'in' | 'out'> {
  const rows = await from
    .select({ signedOutAt: outings.signedOutAt })
    .from(outings)
    .where(and(eq(outings.clubId, scope.club.id), eq(outings.sitId, sitId)));
  if (rows.length === 0) return 'none';
  return rows.some((row) => row.signedOutAt === null) ? 'in' : 'out';
}

export async function insertSit(tx: Tx, row: NewSit): Promise<void> {
  await tx.insert(sits).values(row);
}

export async function updateSit(scope: ClubScope, tx: Tx, sitId: string, set: Partial<NewSit>): Promise<void> {
  await tx
    .update(sits)
    .set(set)
    .where(and(eq(sits.clubId, scope.club.id), eq(sits.id, sitId)));
}

type ClaimedSit = Pick<SitRow, 'id' | 'standId' | 'memberId' | 'day'>;

export async function insertClaims(scope: ClubScope, tx: Tx, sit: ClaimedSit, windows: WindowName[]): Promise<void> {
  const { id: sitId, standId, memberId, day } = sit;
  const clubId = scope.club.id;
  const rows = windows.map((window) => ({ id: newId('claim'), clubId, sitId, standId, memberId, day, window }));
  await tx.insert(claims).values(rows);
}

export async function deleteClaims(scope: ClubScope, tx: Tx, sitId: string): Promise<void> {
  await tx.delete(claims).where(and(eq(claims.clubId, scope.club.id), eq(claims.sitId, sitId)));
}

/** Who holds a claim on the stand, or of the member, in one of the windows. */
export async function listClaimHolders(
  scope: ClubScope,
  tx: Tx,
  sit: ClaimedSit,
  windows: WindowName[],
): Promise<{ standName: string; memberName: string }[]> {
  return tx
    .selectDistinct({ standName: stands.name, memberName: users.name })
    .from(claims)
    .innerJoin(stands, eq(stands.id, claims.standId))
    .innerJoin(memberships, eq(memberships.id, claims.memberId))
    .innerJoin(users, eq(users.id, memberships.userId))
    .where(
      and(
        eq(claims.clubId, scope.club.id),
        eq(claims.day, sit.day),
        inArray(claims.window, windows),
        or(eq(claims.standId, sit.standId), eq(claims.memberId, sit.memberId)),
      ),
    );
}
