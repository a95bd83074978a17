import { and, asc, desc, eq, gt, inArray, isNull, lte, ne, notExists } from 'drizzle-orm';
import { type ReadFrom, reader, type Tx } from '@/db/client';
import { approaches, memberships, outings, parkings, sits, stands, users } from '@/db/schema';
import type { ClubScope } from '@/server/scope';

export type OutingRow = typeof outings.$inferSelect;

function selectOutings(from: ReadFrom) {
  return from
    .select({
      outing: outings,
      sit: {
        day: sits.day,
        windows: sits.windows,
        startAt: sits.startAt,
        endAt: sits.endAt,
        weapon: sits.weapon,
        guests: sits.guests,
        standId: sits.standId,
      },
      standName: stands.name,
      standLat: stands.lat,
      standLon: stands.lon,
      userId: users.id,
      memberName: users.name,
      memberEmail: users.email,
      approachName: approaches.name,
      parkingName: parkings.name,
    })
    .from(outings)
    .innerJoin(sits, eq(sits.id, outings.sitId))
    .innerJoin(stands, eq(stands.id, sits.standId))
    .innerJoin(memberships, eq(memberships.id, outings.memberId))
    .innerJoin(users, eq(users.id, memberships.userId))
    .leftJoin(approaches, eq(approaches.id, outings.approachId))
    .leftJoin(parkings, eq(parkings.id, outings.parkingId));
}

type JoinedOuting = Awaited<ReturnType<typeof selectOutings>>[number];

/** A time on the ground with its sit and the names of what it points at. */
export type OutingDetail = OutingRow & JoinedOuting['sit'] & Omit<JoinedOuting, 'outing' | 'sit'>;

const flat = ({ outing, sit, ...names }: JoinedOuting): OutingDetail => ({ ...sit, ...outing, ...names });
const ofClub = (scope: ClubScope) => eq(outings.clubId, scope.club.id);
const open = isNull(outings.signedOutAt);

export async function findOuting(
  scope: ClubScope,
  outingId: string,
  from: ReadFrom = reader(),
): Promise<OutingDetail | null> {
  const [row] = await selectOutings(from).where(and(ofClub(scope), eq(outings.id, outingId)));
  return row ? flat(row) : null;
}

/** The open outing of a member, whatever the sit: there is one at most. */
export async function findOpenOuting(scope: ClubScope, memberId: string, from: ReadFrom): Promise<OutingDetail | null> {
  const [row] = await selectOutings(from).where(and(ofClub(scope), eq(outings.memberId, memberId), open));
  return row ? flat(row) : null;
}

/** Everybody on the ground, whatever has become of the sit. */
export async function listOpenOutings(scope: ClubScope, from: ReadFrom = reader()): Promise<OutingDetail[]> {
  const rows = await selectOutings(from)
    .where(and(ofClub(scope), open))
    .orderBy(asc(outings.backBy), asc(outings.id));
  return rows.map(flat);
}

/** The outings of some sits, the latest first. */
export async function listOutingsOf(
  scope: ClubScope,
  sitIds: string[],
  from: ReadFrom = reader(),
): Promise<OutingDetail[]> {
  if (sitIds.length === 0) return [];
  const rows = await selectOutings(from)
    .where(and(ofClub(scope), inArray(outings.sitId, sitIds)))
    .orderBy(desc(outings.signedInAt), desc(outings.id));
  return rows.map(flat);
}

export async function insertOuting(tx: Tx, row: typeof outings.$inferInsert): Promise<void> {
  await tx.insert(outings).values(row);
}

/** Changes an outing that is still open; false when somebody signed it out before. */
export async function updateOpenOuting(
  scope: ClubScope,
  tx: Tx,
  outingId: string,
  set: Partial<typeof outings.$inferInsert>,
): Promise<boolean> {
  const rows = await tx
    .update(outings)
    .set(set)
    .where(and(ofClub(scope), eq(outings.id, outingId), open))
    .returning({ id: outings.id });
  return rows.length > 0;
}

/** The vehicle each member named last. */
export async function listLastVehicles(
  scope: ClubScope,
  memberIds: string[],
  from: ReadFrom = reader(),
): Promise<Map<string, string>> {
  if (memberIds.length === 0) return new Map();
  const rows = await from
    .select({ memberId: outings.memberId, vehicle: outings.vehicle })
    .from(outings)
    .where(and(ofClub(scope), inArray(outings.memberId, memberIds), ne(outings.vehicle, '')))
    .orderBy(asc(outings.signedInAt))
    .limit(2000);
  return new Map(rows.map((row) => [row.memberId, row.vehicle]));
}

/** Open outings of all clubs that are past their back-by time. */
export function listPastBackBy(now: number, from: ReadFrom = reader()) {
  return from
    .select({ id: outings.id, clubId: outings.clubId, backBy: outings.backBy, moves: outings.moves })
    .from(outings)
    .where(and(open, lte(outings.backBy, now)))
    .orderBy(asc(outings.backBy), asc(outings.id));
}

/** Booked sits that have begun and not ended, and for which nobody ever signed in. */
export function listUnsignedSits(scope: ClubScope, now: number, from: ReadFrom = reader()) {
  const signed = from.select({ id: outings.id }).from(outings).where(eq(outings.sitId, sits.id));
  return from
    .select({ id: sits.id, startAt: sits.startAt, updatedAt: sits.updatedAt })
    .from(sits)
    .where(
      and(
        eq(sits.clubId, scope.club.id),
        eq(sits.status, 'booked'),
        lte(sits.startAt, now),
        gt(sits.endAt, now),
        notExists(signed),
      ),
    )
    .orderBy(asc(sits.startAt), asc(sits.id));
}
