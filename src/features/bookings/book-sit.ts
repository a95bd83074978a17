import { type Tx, write } from '@/db/client';
import { newId } from '@/lib/ids';
import { audit } from '@/server/audit';
import { AppError } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { checkSit, refuseIfAny } from './check-sit';
import { claimWindows } from './claim-windows';
import { findSit, findSitByRequest, insertSit, type SitDetail } from './data';
import { queueGuestMails } from './guest-mails';
import { queueSitMail } from './sit-mails';
import type { BookSitInput } from './sit-schema';
import { SIT_AUDIT } from './words/audit';
import { SIT_ERRORS } from './words/errors';
import { dayAndWindow, windowsHeld } from './words/sits';

/** Books a sit inside a change of which it is a part, for oneself or, with the permission, for another. */
export async function bookSitIn(tx: Tx, scope: ClubScope, input: BookSitInput, now: number): Promise<SitDetail> {
  const memberId = input.memberId ?? scope.member.id;
  if (memberId !== scope.member.id && !scope.can('sits.book_for_others')) {
    throw new AppError('forbidden', SIT_ERRORS.onlyAdminBooks);
  }
  return placeSitIn(tx, scope, input, now);
}

/** The same for whoever the caller has found may have it: a draw, a swap both have agreed to. */
export async function placeSitIn(tx: Tx, scope: ClubScope, input: BookSitInput, now: number): Promise<SitDetail> {
  const { memberId: forId, requestKey, ...chosen } = input;
  const memberId = forId ?? scope.member.id;
  const before = await findSitByRequest(scope, requestKey, tx);
  if (before) {
    if (before.bookedBy === scope.member.id) return before;
    throw new AppError('conflict', SIT_ERRORS.sentBefore);
  }
  const checked = await checkSit(scope, tx, { ...chosen, memberId }, { now, exceptSitId: null });
  refuseIfAny(checked.refusals);
  const { startAt, endAt, standName, memberName } = checked;
  const row = {
    ...chosen,
    id: newId('sit'),
    clubId: scope.club.id,
    memberId,
    startAt,
    endAt,
    status: 'booked' as const,
    requestKey,
    bookedBy: scope.member.id,
    createdAt: now,
    updatedAt: now,
  };
  await insertSit(tx, row);
  await claimWindows(scope, tx, row, windowsHeld(row.windows));
  await audit(
    tx,
    {
      clubId: scope.club.id,
      actor: scope.actor,
      action: 'sit.booked',
      subjectType: 'sit',
      subjectId: row.id,
      summary: SIT_AUDIT.booked(standName, memberName, dayAndWindow(row.day, row.windows, true)),
      detail: { ...chosen, memberId, startAt, endAt },
    },
    now,
  );
  const sit = await findSit(scope, row.id, tx);
  if (!sit) throw new AppError('internal', SIT_ERRORS.notSaved, { log: `no row for ${row.id}` });
  await queueSitMail(tx, scope, 'booked', sit, now);
  await queueGuestMails(tx, scope, 'booked', sit, null, now);
  return sit;
}

/**
 * Books a sit: rules, claims, audit row and mail in one transaction. The same request key a second time gives the sit the
 * first made.
 */
export async function bookSit(scope: ClubScope, input: BookSitInput, now: number): Promise<SitDetail> {
  return write((tx) => bookSitIn(tx, scope, input, now));
}
