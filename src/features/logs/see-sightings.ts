import { huntingYear } from '@/core/booking/hunting-year';
import type { ClubRules } from '@/core/booking/rules';
import { can, type Role } from '@/core/permissions';

type SightingRules = Pick<ClubRules, 'sightingsSeenBy' | 'seasons'>;

/** Whether the last season of a day's hunting year is over; never while the club has set none for a year that goes on. */
function seasonIsOver(rules: SightingRules, of: string, today: string): boolean {
  const { fromDay, toDay } = huntingYear(of);
  if (toDay < today) return true;
  const seasons = rules.seasons.filter((season) => season.fromDay <= toDay && season.toDay >= fromDay);
  return seasons.length > 0 && seasons.every((season) => season.toDay < today);
}

/**
 * Whether a role may see what others saw in the hunting year of a day, by the club's rule; `today` is the club's day. Kept
 * until after the season nobody sees another's, officers neither: they see only that a log exists.
 */
export function maySeeSightings(role: Role, rules: SightingRules, today: string, of: string = today): boolean {
  if (!can(role, 'log.read')) return false;
  if (rules.sightingsSeenBy === 'all') return true;
  if (rules.sightingsSeenBy === 'officers') return can(role, 'log.read_all');
  return seasonIsOver(rules, of, today);
}
