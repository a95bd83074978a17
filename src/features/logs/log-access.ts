import { dayOf } from '@/core/day-time';
import type { ClubScope } from '@/server/scope';
import type { LoggableSit } from './logs-data';
import { maySeeSightings } from './see-sightings';

type Whose = Pick<LoggableSit, 'memberId' | 'memberRole' | 'sponsorId' | 'day' | 'log'>;

/** One's own sit, or that of a guest one answers for. */
export function isOwnSit(scope: ClubScope, sit: Omit<Whose, 'log'>): boolean {
  const { id } = scope.member;
  return sit.memberId === id || (sit.memberRole === 'guest' && sit.sponsorId === id);
}

/** Whether the person may read what was seen in a sit. */
export function maySeeLog(scope: ClubScope, sit: Omit<Whose, 'log'>, now: number): boolean {
  const { club, member } = scope;
  return isOwnSit(scope, sit) || maySeeSightings(member.role, club.rules, dayOf(now, club.zone), sit.day);
}

/** One's own; an officer writes a missing one for anybody, and changes what the club's rule lets them see. */
export function mayWriteLog(scope: ClubScope, sit: Whose, now: number): boolean {
  if (isOwnSit(scope, sit)) return true;
  return scope.can('log.write_any') && (sit.log === null || maySeeLog(scope, sit, now));
}
