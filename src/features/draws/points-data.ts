import { and, eq, isNotNull, isNull } from 'drizzle-orm';
import { type ReadFrom, reader } from '@/db/client';
import { chores, drawEntries, drawResults, draws, workDayMembers, workDays } from '@/db/schema';
import type { ClubScope } from '@/server/scope';

/** Entries of the draws published so far, a row for each stand given and one for an entry that was given none. */
export function listPastResults(scope: ClubScope, from: ReadFrom = reader()) {
  return from
    .select({ memberId: drawEntries.memberId, day: draws.day, standId: drawResults.standId })
    .from(drawEntries)
    .innerJoin(draws, eq(draws.id, drawEntries.drawId))
    .leftJoin(
      drawResults,
      and(
        eq(drawResults.drawId, drawEntries.drawId),
        eq(drawResults.memberId, drawEntries.memberId),
        isNotNull(drawResults.standId),
      ),
    )
    .where(and(eq(drawEntries.clubId, scope.club.id), eq(draws.state, 'published')));
}

/** Hours credited to members on work days and for chores. */
export async function listWorkHours(
  scope: ClubScope,
  from: ReadFrom = reader(),
): Promise<{ memberId: string | null; day: string | null; hours: number | null }[]> {
  const onDays = await from
    .select({ memberId: workDayMembers.memberId, day: workDays.day, hours: workDayMembers.hours })
    .from(workDayMembers)
    .innerJoin(workDays, eq(workDays.id, workDayMembers.workDayId))
    .where(
      and(eq(workDayMembers.clubId, scope.club.id), isNotNull(workDayMembers.hours), isNull(workDays.cancelledAt)),
    );
  const forChores = await from
    .select({ memberId: chores.doneBy, day: chores.doneOn, hours: chores.hours })
    .from(chores)
    .where(and(eq(chores.clubId, scope.club.id), isNotNull(chores.doneOn), isNull(chores.removedAt)));
  return [...onDays, ...forChores];
}
