import { type Tx, write } from '@/db/client';
import { audit } from '@/server/audit';
import { AppError, notFound } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { deleteClaims, findSigning, findSit, type SitDetail, updateSit } from './data';
import { queueGuestMails } from './guest-mails';
import { queueSitMail } from './sit-mails';
import type { CancelSitInput } from './sit-schema';
import { SIT_AUDIT } from './words/audit';
import { SIT_ERRORS } from './words/errors';
import { clockText, dayAndWindow } from './words/sits';

/** Frees the claims and keeps the record, inside a change of which it is a part (a member removed, a day closed). */
export async function cancelSitIn(
  tx: Tx,
  scope: ClubScope,
  sit: SitDetail,
  reason: string | null,
  now: number,
): Promise<SitDetail> {
  const set = {
    status: 'cancelled' as const,
    cancelReason: reason,
    cancelledAt: now,
    updatedAt: now,
    sequence: sit.sequence + 1,
  };
  await updateSit(scope, tx, sit.id, set);
  await deleteClaims(scope, tx, sit.id);
  await audit(
    tx,
    {
      clubId: scope.club.id,
      actor: scope.actor,
      action: 'sit.cancelled',
      subjectType: 'sit',
      subjectId: sit.id,
      summary: SIT_AUDIT.cancelled(sit.memberName, sit.standName, dayAndWindow(sit.day, sit.windows, true)),
      detail: { reason, standId: sit.standId, memberId: sit.memberId, day: sit.day, windows: sit.windows },
    },
    now,
  );
  const after = { ...sit, ...set };
  await queueSitMail(tx, scope, 'cancelled', after, now);
  await queueGuestMails(tx, scope, 'cancelled', after, null, now);
  return after;
}

/** A sit that somebody has signed in for has happened: it keeps its rest and its place on record. */
export async function refuseIfSigned(scope: ClubScope, sit: SitDetail, tx: Tx): Promise<void> {
  const signing = await findSigning(scope, sit.id, tx);
  if (signing === 'none') return;
  throw new AppError('conflict', SIT_ERRORS[signing === 'in' ? 'signedInThere' : 'hasSatThere'](sit.memberName));
}

/** One's own, or with the permission anybody's and then with a reason. Cancelling twice changes nothing. */
export async function cancelSit(scope: ClubScope, input: CancelSitInput, now: number): Promise<SitDetail> {
  return write(async (tx) => {
    const sit = await findSit(scope, input.sitId, tx);
    if (!sit) throw notFound();
    const own = sit.memberId === scope.member.id;
    if (!own && !scope.can('sits.cancel_any')) {
      throw new AppError('forbidden', SIT_ERRORS.cancelOnlyOwn(sit.memberName));
    }
    if (sit.status !== 'booked') return sit;
    if (sit.endAt <= now) {
      throw new AppError('conflict', SIT_ERRORS.cancelEnded(clockText(sit.endAt, scope.club)));
    }
    await refuseIfSigned(scope, sit, tx);
    if (!own && input.reason === '') {
      const message = SIT_ERRORS.sayWhy(sit.memberName);
      throw new AppError('invalid', message, { fields: { reason: message } });
    }
    return cancelSitIn(tx, scope, sit, input.reason === '' ? null : input.reason, now);
  });
}
