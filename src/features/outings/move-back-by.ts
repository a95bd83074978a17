import { write } from '@/db/client';
import { clockText } from '@/features/bookings/words/sits';
import { AppError, notFound } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { auditOuting } from './audit-outing';
import { findOuting, type OutingDetail, updateOpenOuting } from './data';
import type { MoveBackByInput } from './outing-schema';
import { refuseStranger } from './sign-in';
import { queueStandDown } from './stand-down';
import { OUTING_AUDIT, SIGN_IN_ERRORS, STRANGER_ERRORS } from './words/sign';

const ROUND_MS = 5 * 60_000;

/** The later of now and the back-by time, moved on and rounded up to five minutes. */
export function laterBackBy(backBy: number, minutes: number, now: number): number {
  return Math.ceil((Math.max(backBy, now) + minutes * 60_000) / ROUND_MS) * ROUND_MS;
}

/** Moves the back-by time on, as when a deer is tracked. The first value stays on record; the overdue clock starts anew. */
export async function moveBackBy(scope: ClubScope, input: MoveBackByInput, now: number): Promise<OutingDetail> {
  return write(async (tx) => {
    const outing = await findOuting(scope, input.outingId, tx);
    if (!outing) throw notFound();
    refuseStranger(scope, outing, STRANGER_ERRORS.move);
    if (outing.signedOutAt !== null) {
      const at = clockText(outing.signedOutAt, scope.club);
      throw new AppError('conflict', SIGN_IN_ERRORS.signedOut(outing.memberName, at));
    }
    const backBy = laterBackBy(outing.backBy, Number(input.minutes), now);
    const set = { backBy, tracking: input.tracking, moves: outing.moves + 1, lastSignAt: now };
    await updateOpenOuting(scope, tx, outing.id, set);
    const after = { ...outing, ...set };
    const from = clockText(outing.backBy, scope.club);
    const to = clockText(backBy, scope.club);
    const { memberName: member, standName: stand } = outing;
    const summary = OUTING_AUDIT.moved({ member, stand, from, to, tracking: input.tracking });
    await auditOuting(
      tx,
      scope,
      'moved',
      { id: outing.id, summary, detail: { before: outing.backBy, after: backBy, tracking: input.tracking } },
      now,
    );
    await queueStandDown(tx, scope, 'moved', after, now);
    return after;
  });
}
