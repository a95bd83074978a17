import { localToUtc } from '@/core/day-time';
import { type LogInput, logFormSchema } from '@/features/logs/log-schema';
import { saveLog } from '@/features/logs/save-log';
import { book, SATURDAY } from './book';
import { TEST_NOW, TEST_PLACE, type TestMember } from './make-club';

/** An hour of the Saturday on which the tests sit, by the club's clock. */
export const onSaturday = (clock: string) => localToUtc(SATURDAY, clock, TEST_PLACE.zone);

/** What a log form holds for a sit in which nothing was seen. */
export function logOf(sitId: string, more: Partial<LogInput> = {}): LogInput {
  return logFormSchema.parse({
    sitId,
    version: 0,
    startClock: '07:00',
    endClock: '10:30',
    antleredBucks: 0,
    does: 0,
    fawns: 0,
    unknown: 0,
    bumpedIn: 0,
    bumpedSitting: 0,
    bumpedOut: 0,
    bumpedWhere: '',
    shot: 'none',
    shotClock: '',
    hitPlace: '',
    followUp: '',
    followUpNotes: '',
    notes: '',
    ...more,
  });
}

/** Books the Saturday morning for somebody and writes its log that noon. */
export async function sitAndLog(who: TestMember, standId: string, more: Partial<LogInput> = {}) {
  const sit = await book(who, standId, {}, TEST_NOW);
  await saveLog(who.scope, logOf(sit.id, more), onSaturday('12:00'));
  return sit;
}
