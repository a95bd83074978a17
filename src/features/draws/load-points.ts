import { countPoints, type PointEvent, type PointRules } from '@/core/draw/points';
import { type ReadFrom, reader } from '@/db/client';
import type { ClubScope } from '@/server/scope';
import { listPastResults, listWorkHours } from './points-data';

/** Points of each member from draws and work before a day; a member not named has none. */
export async function loadPoints(
  scope: ClubScope,
  ask: { before: string; rules: PointRules },
  from: ReadFrom = reader(),
): Promise<Map<string, number>> {
  const events = new Map<string, PointEvent[]>();
  const add = (memberId: string, event: PointEvent) => {
    if (event.day >= ask.before) return;
    events.set(memberId, [...(events.get(memberId) ?? []), event]);
  };
  for (const { memberId, day, standId } of await listPastResults(scope, from)) {
    add(memberId, { day, kind: standId === null ? 'missed' : 'given' });
  }
  for (const { memberId, day, hours } of await listWorkHours(scope, from)) {
    if (memberId !== null && day !== null && hours !== null) add(memberId, { day, kind: 'worked', hours });
  }
  return new Map([...events].map(([memberId, all]) => [memberId, countPoints(all, ask.rules)]));
}
