import { completeRules } from '@/core/booking/rules';
import { lapsesAt } from '@/core/outing/board-state';
import { write } from '@/db/client';
import { listClubs } from '@/db/queries/memberships';
import { deleteClaims, findSit, updateSit } from '@/features/bookings/data';
import { queueGuestMails } from '@/features/bookings/guest-mails';
import { queueSitMail } from '@/features/bookings/sit-mails';
import { dayAndWindow } from '@/features/bookings/words/sits';
import { audit } from '@/server/audit';
import { type ClubScope, systemScopeById } from '@/server/scope';
import { listOutingsOf, listUnsignedSits } from './data';
import { OUTING_AUDIT } from './words/sign';

/** Lapses a sit if it still stands unsigned past its hold: claims freed, record kept, member told, in one change. */
async function lapseSit(scope: ClubScope, sitId: string, now: number): Promise<boolean> {
  return write(async (tx) => {
    const sit = await findSit(scope, sitId, tx);
    if (sit?.status !== 'booked') return false;
    const at = lapsesAt(sit, scope.club.rules.holdMinutes);
    if (at === null || at > now || (await listOutingsOf(scope, [sitId], tx)).length > 0) return false;
    const set = { status: 'lapsed' as const, cancelledAt: now, updatedAt: now, sequence: sit.sequence + 1 };
    await updateSit(scope, tx, sit.id, set);
    await deleteClaims(scope, tx, sit.id);
    await audit(
      tx,
      {
        clubId: scope.club.id,
        actor: scope.actor,
        action: 'sit.lapsed',
        subjectType: 'sit',
        subjectId: sit.id,
        summary: OUTING_AUDIT.lapsed(sit.memberName, sit.standName, dayAndWindow(sit.day, sit.windows, true)),
        detail: { standId: sit.standId, memberId: sit.memberId, holdMinutes: scope.club.rules.holdMinutes },
      },
      now,
    );
    await queueSitMail(tx, scope, 'lapsed', { ...sit, ...set }, now);
    await queueGuestMails(tx, scope, 'lapsed', { ...sit, ...set }, null, now);
    return true;
  });
}

/** Frees stands whose booked sits nobody has signed in for, where the club's rule says so. Sits already over stay as they are. */
export async function lapseUnsigned(now: number): Promise<{ lapsed: number }> {
  let lapsed = 0;
  for (const club of await listClubs()) {
    const { holdMinutes } = completeRules(club.rules);
    if (holdMinutes === null) continue;
    const scope = await systemScopeById(club.id);
    for (const sit of await listUnsignedSits(scope, now)) {
      const at = lapsesAt(sit, holdMinutes);
      if (at !== null && at <= now && (await lapseSit(scope, sit.id, now))) lapsed += 1;
    }
  }
  return { lapsed };
}
