import type { SitWindow, WindowName } from '@/core/condition-types';
import { type Coverage, coverWinds, windShares } from '@/core/coverage/cover-winds';
import { daysBetween } from '@/core/day-time';
import { sitWindow, windowsFrom } from '@/core/windows';
import type { ScopeClub } from '@/server/scope';
import type { SeasonHours } from './load-season-hours';

/** Both windows of every day that some hours are of. */
export function windowsOf(season: Pick<SeasonHours, 'fromDay' | 'toDay'>, club: ScopeClub): SitWindow[] {
  const { fromDay, toDay } = season;
  if (!fromDay || !toDay) return [];
  const first = sitWindow(fromDay, 'morning', club.rules, club);
  return windowsFrom(first, 2 * (daysBetween(fromDay, toDay) + 1), club.rules, club);
}

export function sharesOf({ cells }: Coverage): Record<WindowName, number[]> {
  const season = (window: WindowName) => cells.find((cell) => cell.month === null && cell.window === window);
  return { morning: windShares(season('morning')), evening: windShares(season('evening')) };
}

/** How usual each wind is in each window of a season; null: no hours are known. */
export function usualWinds(season: SeasonHours, club: ScopeClub): Record<WindowName, number[]> | null {
  if (season.hours.length === 0) return null;
  return sharesOf(coverWinds({ stands: [], hours: season.hours, windows: windowsOf(season, club) }));
}
