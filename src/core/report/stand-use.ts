import type { WindowName } from '../condition-types';
import type { Suitability } from '../ground-types';
import type { Week } from './weeks';

/** A sit that has ended. */
export interface UsedSit {
  standId: string;
  /** YYYY-MM-DD. */
  day: string;
  /** One window, or both of an all-day sit. */
  windows: readonly WindowName[];
}

export interface StandUse {
  /** An all-day sit is one sit, and counts in both windows. */
  sits: number;
  mornings: number;
  evenings: number;
  /** Days sat, each once, in order. */
  days: string[];
  /** Sits in each of the weeks given. */
  byWeek: number[];
}

/** How one stand was used; `sits` are its own, in any order, and those outside the weeks are in no week. */
export function useOfStand(sits: readonly UsedSit[], weeks: readonly Week[]): StandUse {
  const holding = (window: WindowName) => sits.filter((sit) => sit.windows.includes(window)).length;
  return {
    sits: sits.length,
    mornings: holding('morning'),
    evenings: holding('evening'),
    days: [...new Set(sits.map((sit) => sit.day))].sort(),
    byWeek: weeks.map(({ fromDay, toDay }) => sits.filter(({ day }) => day >= fromDay && day <= toDay).length),
  };
}

export type Unused = 'never' | 'mornings_only' | 'evenings_only';

/** What of a stand lay unused; null: nothing. A window the steward rates 'avoid' is not missed. */
export function unusedOf(
  use: Pick<StandUse, 'sits' | 'mornings' | 'evenings'>,
  rated: Record<WindowName, Suitability>,
): Unused | null {
  if (use.sits === 0) return 'never';
  if (use.evenings === 0 && rated.evening !== 'avoid') return 'mornings_only';
  if (use.mornings === 0 && rated.morning !== 'avoid') return 'evenings_only';
  return null;
}
