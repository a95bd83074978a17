import { type Tx, write } from '@/db/client';
import { clockText } from '@/features/bookings/words/sits';
import { AppError, notFound } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { foundSent, noteSent, pressedAt } from '@/server/sent-requests';
import { auditOuting } from './audit-outing';
import { findOuting, listOutingsOf, type OutingDetail, updateOpenOuting } from './data';
import type { SignOutSitInput } from './outing-schema';
import { refuseStranger, sentLater } from './sign-in';
import { queueStandDown } from './stand-down';
import { OUTING_AUDIT, SIGN_IN_ERRORS, STRANGER_ERRORS } from './words/sign';

async function outingOf(scope: ClubScope, { outingId, sitId }: SignOutSitInput, tx: Tx): Promise<OutingDetail> {
  const outing = outingId
    ? await findOuting(scope, outingId, tx)
    : sitId && (await listOutingsOf(scope, [sitId], tx))[0];
  if (outing) return outing;
  if (outingId) throw notFound();
  throw new AppError('conflict', SIGN_IN_ERRORS.nobodyIn);
}

/** Closes a time on the ground; only a person does. Whoever was told that they were overdue is told that they are out. */
export async function signOut(scope: ClubScope, input: SignOutSitInput, now: number): Promise<OutingDetail> {
  return write(async (tx) => {
    const outing = await outingOf(scope, input, tx);
    refuseStranger(scope, outing, STRANGER_ERRORS.signOut);
    if ((await foundSent(tx, scope, input.sent, 'sign_out')) === outing.id) return outing;
    const at = Math.max(pressedAt(input.sent, now), outing.signedInAt);
    const set = { signedOutAt: at, signedOutBy: scope.member.id };
    if (!(await updateOpenOuting(scope, tx, outing.id, set))) return outing;
    await noteSent(tx, scope, input.sent, { kind: 'sign_out', subjectId: outing.id }, now);
    const after = { ...outing, ...set };
    const summary = OUTING_AUDIT.signedOut({
      member: outing.memberName,
      stand: outing.standName,
      at: clockText(at, scope.club),
      later: sentLater(scope, at, now),
    });
    await auditOuting(tx, scope, 'signed_out', { id: outing.id, summary, detail: { sitId: outing.sitId } }, now);
    await queueStandDown(tx, scope, 'out', after, now);
    return after;
  });
}
