import { huntingYear } from '@/core/booking/hunting-year';
import type { ClubRules } from '@/core/booking/rules';
import { can, type Role } from '@/core/permissions';

/** Whether a role may see what others saw on a day, by the club's rule; `today` is the club's day. */
export function maySeeSightings(
  role: Role,
  rules: Pick<ClubRules, 'sightingsSeenBy' | 'seasons'>,
  today: string,
): boolean {
  if (!can(role, 'log.read')) return false;
  if (role === 'admin' || role === 'steward' || rules.sightingsSeenBy === 'all') return true;
  if (rules.sightingsSeenBy === 'officers') return false;
  const { fromDay, toDay } = huntingYear(today);
  const seasons = rules.seasons.filter((season) => season.fromDay <= toDay && season.toDay >= fromDay);
  return seasons.length > 0 && seasons.every((season) => season.toDay < today);
}
