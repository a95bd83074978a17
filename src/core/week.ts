import type { SitWindow } from './condition-types';
import { frameGround, type GroundFrame } from './ground-frame';
import { compareVerdicts, namesOf } from './rank';
import type { WeekInput } from './rank-input';
import { frameSits } from './sit-frame';
import { judgeSit } from './verdict';
import type { Verdict } from './verdict-types';

export interface WeekColumn {
  window: SitWindow;
  /** Best first, blocked ones last. */
  verdicts: Verdict[];
}

/**
 * All stands in all windows in one call that shares work; the same verdicts as rankSits gives one by one at this detail.
 * Windows the forecast does not reach are ranked without one. Stand by stand, so that a stand's tables stay at hand.
 */
export function rankWeek(input: WeekInput, prepared: GroundFrame = frameGround(input)): WeekColumn[] {
  const compare = compareVerdicts(namesOf(input.stands));
  const columns = input.windows.map((window) => ({
    frame: frameSits(prepared, window, input.forecast, input.now, input.detail ?? 'list'),
    verdicts: [] as Verdict[],
  }));
  for (const stand of prepared.stands) {
    for (const { frame, verdicts } of columns) {
      verdicts.push(judgeSit(frame, stand, input.gatesFor(stand.stand.id, frame.window.window)));
    }
  }
  return columns.map(({ frame, verdicts }) => ({ window: frame.window.window, verdicts: verdicts.sort(compare) }));
}
