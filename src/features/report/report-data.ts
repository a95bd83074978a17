import { and, eq, gte, isNotNull, isNull, lt, lte, max, min, sql } from 'drizzle-orm';
import { type ReadFrom, reader } from '@/db/client';
import {
  chores,
  memberships,
  outings,
  sitPredictions,
  sits,
  stands,
  users,
  workDayMembers,
  workDays,
} from '@/db/schema';
import type { ClubScope } from '@/server/scope';

export interface Days {
  fromDay: string;
  toDay: string;
}

const ended = (scope: ClubScope, now: number) =>
  and(eq(sits.clubId, scope.club.id), eq(sits.status, 'booked'), lte(sits.endAt, now));

const within = ({ fromDay, toDay }: Days) => and(gte(sits.day, fromDay), lte(sits.day, toDay));

/** First and last day on which a sit of the club has ended. */
export async function findSitDays(scope: ClubScope, now: number, from: ReadFrom = reader()) {
  const [row] = await from
    .select({ firstDay: min(sits.day), lastDay: max(sits.day) })
    .from(sits)
    .where(ended(scope, now));
  return { firstDay: row?.firstDay ?? null, lastDay: row?.lastDay ?? null };
}

/** What else is on record of sits that have ended on some days: who booked them, who signed in, what was thought of them. */
export function listSitFacts(scope: ClubScope, days: Days, now: number, from: ReadFrom = reader()) {
  return from
    .select({
      id: sits.id,
      bookedBy: sits.bookedBy,
      bookedAt: sits.createdAt,
      signedIn: sql<number>`exists (select 1 from ${outings} where ${outings.sitId} = ${sits.id})`,
      score: sitPredictions.score,
      windFromDeg: sitPredictions.windFromDeg,
    })
    .from(sits)
    .leftJoin(sitPredictions, eq(sitPredictions.sitId, sits.id))
    .where(and(ended(scope, now), within(days)));
}
export type SitFacts = Awaited<ReturnType<typeof listSitFacts>>[number];

/** The last day each stand was sat before a day. */
export async function lastSatBefore(
  scope: ClubScope,
  day: string,
  now: number,
  from: ReadFrom = reader(),
): Promise<Map<string, string>> {
  const rows = await from
    .select({ standId: sits.standId, day: max(sits.day) })
    .from(sits)
    .where(and(ended(scope, now), lt(sits.day, day)))
    .groupBy(sits.standId);
  return new Map(rows.flatMap(({ standId, day: last }) => (last === null ? [] : [[standId, last] as const])));
}

/** Every stand, those taken out of use too, by name. */
export function listEveryStand(scope: ClubScope, from: ReadFrom = reader()) {
  return from
    .select()
    .from(stands)
    .where(eq(stands.clubId, scope.club.id))
    .orderBy(sql`lower(${stands.name})`, stands.id);
}

/** Everybody who is or was in the club. */
export function listEverybody(scope: ClubScope, from: ReadFrom = reader()) {
  return from
    .select({ id: memberships.id, name: users.name, role: memberships.role, removedAt: memberships.removedAt })
    .from(memberships)
    .innerJoin(users, eq(users.id, memberships.userId))
    .where(eq(memberships.clubId, scope.club.id));
}

/** Hours credited on some days, by member and kind of work. */
export async function sumHoursByKind(scope: ClubScope, days: Days, from: ReadFrom = reader()) {
  const onDays = await from
    .select({ memberId: workDayMembers.memberId, hours: sql<number>`sum(${workDayMembers.hours})` })
    .from(workDayMembers)
    .innerJoin(workDays, eq(workDays.id, workDayMembers.workDayId))
    .where(
      and(
        eq(workDayMembers.clubId, scope.club.id),
        isNotNull(workDayMembers.hours),
        isNull(workDays.cancelledAt),
        gte(workDays.day, days.fromDay),
        lte(workDays.day, days.toDay),
      ),
    )
    .groupBy(workDayMembers.memberId);
  const forChores = await from
    .select({ memberId: chores.doneBy, hours: sql<number>`sum(${chores.hours})` })
    .from(chores)
    .where(
      and(
        eq(chores.clubId, scope.club.id),
        isNull(chores.removedAt),
        isNotNull(chores.doneBy),
        isNotNull(chores.hours),
        gte(chores.doneOn, days.fromDay),
        lte(chores.doneOn, days.toDay),
      ),
    )
    .groupBy(chores.doneBy);
  return { onDays, forChores };
}
