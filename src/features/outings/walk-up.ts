import type { SitWindow } from '@/core/condition-types';
import { nextWindow } from '@/core/windows';
import { write } from '@/db/client';
import { bookSitIn } from '@/features/bookings/book-sit';
import { clockText } from '@/features/bookings/words/sits';
import { AppError } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import type { OutingDetail } from './data';
import type { WalkUpInput } from './outing-schema';
import { OPENS_BEFORE_MS, signInIn } from './sign-in';
import { SIGN_IN_ERRORS } from './words/sign';

/** The window a member at the gate would sit in: the one going on, or the next when it is near; null: none is near. */
export function walkUpWindow(scope: ClubScope, now: number): SitWindow | null {
  const window = nextWindow(now, scope.club.rules, scope.club);
  return window.startAt - now > OPENS_BEFORE_MS ? null : window;
}

/** Books a free stand for the window at hand and signs in, in one change: every rule of booking is checked. */
export async function walkUp(scope: ClubScope, input: WalkUpInput, now: number): Promise<OutingDetail> {
  const { standId, weapon, requestKey, ...given } = input;
  const window = walkUpWindow(scope, now);
  if (!window) {
    const next = nextWindow(now, scope.club.rules, scope.club);
    const opens = clockText(next.startAt - OPENS_BEFORE_MS, scope.club);
    throw new AppError('conflict', SIGN_IN_ERRORS.noWindow(opens));
  }
  return write(async (tx) => {
    const sit = await bookSitIn(
      tx,
      scope,
      {
        standId,
        weapon,
        requestKey,
        day: window.day,
        windows: window.window,
        approachId: given.approachId,
        guests: [],
        note: '',
        memberId: null,
      },
      now,
    );
    return signInIn(tx, scope, sit, given, now);
  });
}
