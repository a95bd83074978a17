import { type Tx, write } from '@/db/client';
import { placeSitIn } from '@/features/bookings/book-sit';
import { cancelSitIn, refuseIfSigned } from '@/features/bookings/cancel-sit';
import { findSit, type SitDetail } from '@/features/bookings/data';
import { newRequestKey } from '@/lib/request-key';
import { AppError, notFound } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { listEntries, updateEntry } from './draws-data';
import { needDraw, noteDraw } from './note-draw';

async function loadHeld(scope: ClubScope, tx: Tx, drawId: string, memberId: string, now: number) {
  const found = (await listEntries(scope, drawId, tx)).find(({ entry }) => entry.memberId === memberId);
  if (!found) throw notFound();
  const sit = found.entry.sitId === null ? null : await findSit(scope, found.entry.sitId, tx);
  if (sit?.status !== 'booked' || sit.endAt <= now) {
    throw new AppError('conflict', `${found.name} has no sit of this draw to swap.`);
  }
  await refuseIfSigned(scope, sit, tx);
  return { entry: found.entry, name: found.name, sit };
}

/** Offers one's own stand to another member of the draw for theirs; a new offer takes the place of the last. */
export async function offerSwap(
  scope: ClubScope,
  input: { drawId: string; memberId: string },
  now: number,
): Promise<{ name: string }> {
  return write(async (tx) => {
    await needDraw(scope, input.drawId, ['published'], tx);
    const own = await loadHeld(scope, tx, input.drawId, scope.member.id, now);
    const other = await loadHeld(scope, tx, input.drawId, input.memberId, now);
    if (own.entry.memberId === other.entry.memberId) throw new AppError('invalid', 'Choose another member.');
    await updateEntry(scope, tx, own.entry, { swapWith: other.entry.memberId });
    const summary = `${own.name} offered ${own.sit.standName} to ${other.name} for ${other.sit.standName}.`;
    await noteDraw(scope, tx, { id: input.drawId, verb: 'swap_offered', summary }, now);
    return { name: other.name };
  });
}

function swapped(sit: SitDetail, memberId: string, weapon: SitDetail['weapon']) {
  const { standId, day, windows } = sit;
  return {
    memberId,
    standId,
    day,
    windows,
    weapon,
    approachId: null,
    guests: [],
    note: '',
    requestKey: newRequestKey(),
  };
}

/** Takes an offer: both sits change hands in one transaction, under every rule. */
export async function acceptSwap(
  scope: ClubScope,
  input: { drawId: string; memberId: string },
  now: number,
): Promise<{ standName: string }> {
  return write(async (tx) => {
    await needDraw(scope, input.drawId, ['published'], tx);
    const own = await loadHeld(scope, tx, input.drawId, scope.member.id, now);
    const other = await loadHeld(scope, tx, input.drawId, input.memberId, now);
    if (other.entry.swapWith !== scope.member.id)
      throw new AppError('conflict', `${other.name} offers no swap to you.`);
    const reason = `${other.name} and ${own.name} swapped stands.`;
    await cancelSitIn(tx, scope, own.sit, reason, now);
    await cancelSitIn(tx, scope, other.sit, reason, now);
    const mine = await placeSitIn(tx, scope, swapped(other.sit, scope.member.id, own.sit.weapon), now);
    const theirs = await placeSitIn(tx, scope, swapped(own.sit, other.entry.memberId, other.sit.weapon), now);
    await updateEntry(scope, tx, own.entry, { sitId: mine.id, standId: mine.standId, swapWith: null });
    await updateEntry(scope, tx, other.entry, { sitId: theirs.id, standId: theirs.standId, swapWith: null });
    await noteDraw(scope, tx, { id: input.drawId, verb: 'swapped', summary: reason }, now);
    return { standName: mine.standName };
  });
}
