import { isDeepStrictEqual } from 'node:util';
import { write } from '@/db/client';
import { audit } from '@/server/audit';
import { AppError, notFound } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { refuseIfSigned } from './cancel-sit';
import { checkSit, refuseIfAny } from './check-sit';
import { claimWindows } from './claim-windows';
import { deleteClaims, findSit, type SitDetail, updateSit } from './data';
import { queueGuestMails } from './guest-mails';
import { queueSitMail } from './sit-mails';
import type { ChangeSitInput } from './sit-schema';
import { SIT_AUDIT } from './words/audit';
import { SIT_ERRORS } from './words/errors';
import { clockText, dayAndWindow, windowsHeld } from './words/sits';

function refuseChange(scope: ClubScope, sit: SitDetail, sequence: number, now: number): void {
  if (sit.memberId !== scope.member.id && !scope.can('sits.book_for_others')) {
    throw new AppError('forbidden', SIT_ERRORS.changeOnlyOwn(sit.memberName));
  }
  if (sit.status === 'cancelled') throw new AppError('conflict', SIT_ERRORS.cancelled);
  if (sit.status === 'lapsed') throw new AppError('conflict', SIT_ERRORS.lapsed);
  if (sit.endAt <= now) {
    throw new AppError('conflict', SIT_ERRORS.changeEnded(clockText(sit.endAt, scope.club)));
  }
  if (sit.sequence !== sequence) {
    throw new AppError('conflict', SIT_ERRORS.changedSince);
  }
}

const HELD = ['standId', 'day', 'windows'] as const;
const WORDS = ['weapon', 'approachId', 'guests', 'note'] as const;

/** Changes stand, day, window, weapon, way in, guests or note; what stays as it was is not checked anew. */
export async function changeSit(scope: ClubScope, input: ChangeSitInput, now: number): Promise<SitDetail> {
  const { sitId, sequence, ...chosen } = input;
  return write(async (tx) => {
    const sit = await findSit(scope, sitId, tx);
    if (!sit) throw notFound();
    refuseChange(scope, sit, sequence, now);
    const changed = [...HELD, ...WORDS].filter((name) => !isDeepStrictEqual(sit[name], chosen[name]));
    if (changed.length === 0) return sit;
    const moved = HELD.some((name) => changed.includes(name));
    if (moved) await refuseIfSigned(scope, sit, tx);
    const checked = await checkSit(scope, tx, { ...chosen, memberId: sit.memberId }, { now, exceptSitId: sit.id });
    const asksAnew = moved || changed.includes('weapon');
    const guests = changed.includes('guests');
    refuseIfAny(checked.refusals.filter(({ about }) => asksAnew || (guests && about === 'guests')));
    const times = moved ? { startAt: checked.startAt, endAt: checked.endAt } : {};
    await updateSit(scope, tx, sit.id, { ...chosen, ...times, sequence: sit.sequence + 1, updatedAt: now });
    if (moved) {
      await deleteClaims(scope, tx, sit.id);
      const claimed = { id: sit.id, memberId: sit.memberId, standId: chosen.standId, day: chosen.day };
      await claimWindows(scope, tx, claimed, windowsHeld(chosen.windows));
    }
    await audit(
      tx,
      {
        clubId: scope.club.id,
        actor: scope.actor,
        action: 'sit.changed',
        subjectType: 'sit',
        subjectId: sit.id,
        summary: SIT_AUDIT.changed(
          sit.memberName,
          sit.standName,
          dayAndWindow(sit.day, sit.windows, true),
          checked.standName,
          dayAndWindow(chosen.day, chosen.windows, true),
        ),
        detail: {
          before: Object.fromEntries(changed.map((name) => [name, sit[name]])),
          after: Object.fromEntries(changed.map((name) => [name, chosen[name]])),
        },
      },
      now,
    );
    const after = await findSit(scope, sit.id, tx);
    if (!after) throw notFound();
    await queueSitMail(tx, scope, 'changed', after, now);
    await queueGuestMails(tx, scope, 'changed', after, sit, now);
    return after;
  });
}
