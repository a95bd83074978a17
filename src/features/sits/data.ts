import { and, eq, gte, inArray, isNull, lte, sql } from 'drizzle-orm';
import { type ReadFrom, reader } from '@/db/client';
import { sitLogs, sits, standAdjustments, stands, visits } from '@/db/schema';
import type { ClubScope } from '@/server/scope';

/** Sits that stand between two instants, with the place of their stand and the deer bumped where a log says so. */
export function listSitEvents(scope: ClubScope, span: { from: number; until: number }, from: ReadFrom = reader()) {
  return from
    .select({
      standId: sits.standId,
      lat: stands.lat,
      lon: stands.lon,
      endAt: sits.endAt,
      bumped: sql<number>`coalesce(${sitLogs.bumpedIn} + ${sitLogs.bumpedSitting} + ${sitLogs.bumpedOut}, 0)`,
    })
    .from(sits)
    .innerJoin(stands, eq(stands.id, sits.standId))
    .leftJoin(sitLogs, eq(sitLogs.sitId, sits.id))
    .where(
      and(
        eq(sits.clubId, scope.club.id),
        eq(sits.status, 'booked'),
        gte(sits.endAt, span.from),
        lte(sits.endAt, span.until),
      ),
    );
}
export type SitEventRow = Awaited<ReturnType<typeof listSitEvents>>[number];

export function listVisitEvents(scope: ClubScope, span: { from: number; until: number }, from: ReadFrom = reader()) {
  return from
    .select({
      kind: visits.kind,
      at: visits.at,
      lat: visits.lat,
      lon: visits.lon,
      standId: visits.standId,
      bumped: visits.bumped,
    })
    .from(visits)
    .where(
      and(
        eq(visits.clubId, scope.club.id),
        isNull(visits.removedAt),
        gte(visits.at, span.from),
        lte(visits.at, span.until),
      ),
    );
}
export type VisitEventRow = Awaited<ReturnType<typeof listVisitEvents>>[number];

/** Hours sat and deer seen by stand, of sits on the days given that had ended by an instant. */
export function sumSightings(
  scope: ClubScope,
  days: { fromDay: string; toDay: string },
  until: number,
  from: ReadFrom = reader(),
) {
  const seen = sql`${sitLogs.antleredBucks} + ${sitLogs.does} + ${sitLogs.fawns} + ${sitLogs.unknown}`;
  return from
    .select({
      standId: sits.standId,
      sits: sql<number>`count(*)`,
      hours: sql<number>`sum(max(0, ${sitLogs.endAt} - ${sitLogs.startAt})) / 3600000.0`,
      deer: sql<number>`sum(${seen})`,
    })
    .from(sitLogs)
    .innerJoin(sits, eq(sits.id, sitLogs.sitId))
    .where(
      and(
        eq(sits.clubId, scope.club.id),
        eq(sits.status, 'booked'),
        gte(sits.day, days.fromDay),
        lte(sits.day, days.toDay),
        lte(sits.endAt, until),
      ),
    )
    .groupBy(sits.standId);
}

/** A member's own sit on a day, in one of the windows. */
export async function findOwnSit(
  scope: ClubScope,
  ask: { memberId: string; day: string; windows: (typeof sits.$inferSelect)['windows'][] },
  from: ReadFrom = reader(),
) {
  const [row] = await from
    .select({
      sitId: sits.id,
      sequence: sits.sequence,
      standId: sits.standId,
      standName: stands.name,
      windows: sits.windows,
      weapon: sits.weapon,
      approachId: sits.approachId,
      guests: sits.guests,
      note: sits.note,
      endAt: sits.endAt,
    })
    .from(sits)
    .innerJoin(stands, eq(stands.id, sits.standId))
    .where(
      and(
        eq(sits.clubId, scope.club.id),
        eq(sits.status, 'booked'),
        eq(sits.memberId, ask.memberId),
        eq(sits.day, ask.day),
        inArray(sits.windows, ask.windows),
      ),
    )
    .orderBy(sits.startAt);
  return row ?? null;
}
export type OwnSitRow = NonNullable<Awaited<ReturnType<typeof findOwnSit>>>;

/** Points of quiet that hold for a stand by what the club's log has taught. */
export async function listQuietShifts(scope: ClubScope, from: ReadFrom = reader()): Promise<Map<string, number>> {
  const rows = await from
    .select({ standId: standAdjustments.standId, points: standAdjustments.points })
    .from(standAdjustments)
    .where(and(eq(standAdjustments.clubId, scope.club.id), isNull(standAdjustments.endedAt)));
  return new Map(rows.map(({ standId, points }) => [standId, points]));
}
