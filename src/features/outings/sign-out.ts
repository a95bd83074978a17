import { write } from '@/db/client';
import { clockText } from '@/features/bookings/sit-words';
import { notFound } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { auditOuting } from './audit-outing';
import { findOuting, type OutingDetail, updateOpenOuting } from './data';
import type { SignOutSitInput } from './outing-schema';
import { refuseStranger } from './sign-in';
import { queueStandDown } from './stand-down';

/** Closes a time on the ground; only a person does. Whoever was told that they were overdue is told that they are out. */
export async function signOut(scope: ClubScope, input: SignOutSitInput, now: number): Promise<OutingDetail> {
  return write(async (tx) => {
    const outing = await findOuting(scope, input.outingId, tx);
    if (!outing) throw notFound();
    refuseStranger(scope, outing, 'sign out');
    const set = { signedOutAt: now, signedOutBy: scope.member.id };
    if (!(await updateOpenOuting(scope, tx, outing.id, set))) return outing;
    const after = { ...outing, ...set };
    const summary = `Signed out ${outing.memberName} from ${outing.standName} at ${clockText(now, scope.club)}.`;
    await auditOuting(tx, scope, 'signed_out', { id: outing.id, summary, detail: { sitId: outing.sitId } }, now);
    await queueStandDown(tx, scope, 'out', after, now);
    return after;
  });
}
