import type { Role } from './permissions';

/** Both ends are days (YYYY-MM-DD) and both are inside; null: not dated. */
export interface DatedMembership {
  role: Role;
  fromDay: string | null;
  toDay: string | null;
}

/** Whether a membership holds on a club day. A guest needs both dates; an end left open bounds nobody else. */
export function guestActive(membership: DatedMembership, day: string): boolean {
  const { role, fromDay, toDay } = membership;
  if (role === 'guest' && (fromDay === null || toDay === null)) return false;
  return (fromDay === null || fromDay <= day) && (toDay === null || day <= toDay);
}
