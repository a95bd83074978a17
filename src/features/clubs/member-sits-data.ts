import { and, asc, eq, gt, inArray } from 'drizzle-orm';
import type { ReadFrom } from '@/db/client';
import { sits, stands } from '@/db/schema';
import type { ClubScope } from '@/server/scope';

export interface FutureSit {
  id: string;
  memberId: string;
  standName: string;
  day: string;
  windows: 'morning' | 'evening' | 'all_day';
}

/** Sits of these members that stand and have not ended. */
export async function listFutureSits(
  scope: ClubScope,
  memberIds: string[],
  now: number,
  from: ReadFrom,
): Promise<FutureSit[]> {
  return from
    .select({ id: sits.id, memberId: sits.memberId, standName: stands.name, day: sits.day, windows: sits.windows })
    .from(sits)
    .innerJoin(stands, eq(stands.id, sits.standId))
    .where(
      and(
        eq(sits.clubId, scope.club.id),
        inArray(sits.memberId, memberIds),
        eq(sits.status, 'booked'),
        gt(sits.endAt, now),
      ),
    )
    .orderBy(asc(sits.startAt), asc(sits.id));
}
