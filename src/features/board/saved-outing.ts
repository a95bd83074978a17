import type { OutingDetail } from '@/features/outings/data';
import { clockBeside } from '@/features/outings/words/outing';
import type { ClubScope } from '@/server/scope';

/** What an action answers: enough to say what was done. */
export function savedOuting(scope: ClubScope, outing: OutingDetail, now: number) {
  const { id, standName, memberName, backBy } = outing;
  return { outingId: id, standName, memberName, backByText: clockBeside(backBy, now, scope.club) };
}
export type SavedOuting = ReturnType<typeof savedOuting>;
