import type { SitWindow } from '@/core/condition-types';
import { dayAndWindow, spanText } from '@/features/bookings/words/sits';
import { walkUpWindow } from '@/features/outings/walk-up';
import type { ClubScope } from '@/server/scope';
import type { BoardSit } from './reads';
import { BOARD_READ_WORDS } from './words/reads';

export function windowText(scope: ClubScope, window: SitWindow): string {
  return BOARD_READ_WORDS.walkUp(
    dayAndWindow(window.day, window.window),
    spanText(window.startAt, window.endAt, scope.club),
  );
}

/** The window a free stand may be taken for at the gate; null: none is near, the club has no walk-ups, or the reader has a sit. */
export function walkUpOffer(scope: ClubScope, sits: BoardSit[], now: number): string | null {
  if (!scope.can('sits.book')) return null;
  const window = walkUpWindow(scope, now);
  if (!window || (window.startAt <= now && !scope.club.rules.walkUpSits)) return null;
  const held = sits.some(
    (sit) =>
      sit.mine &&
      (sit.outing !== null ||
        (sit.day === window.day && (sit.windowText === 'all day' || sit.windowText === window.window))),
  );
  return held ? null : windowText(scope, window);
}
