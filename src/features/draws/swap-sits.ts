import { type Tx, write } from '@/db/client';
import { placeSitIn } from '@/features/bookings/book-sit';
import { cancelSitIn, refuseIfSigned } from '@/features/bookings/cancel-sit';
import { findSit, type SitDetail } from '@/features/bookings/data';
import { newRequestKey } from '@/lib/request-key';
import { AppError, notFound } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { needDraw, noteDraw } from './note-draw';
import { listResults, type ResultRow, updateResult } from './results-data';
import { DRAW_AUDIT, DRAW_ERRORS } from './words/errors';
import { RESULT_WORDS } from './words/results';

interface SwapInput {
  drawId: string;
  memberId: string;
  slot: number;
}

async function loadHeld(scope: ClubScope, tx: Tx, at: SwapInput, now: number) {
  const found = (await listResults(scope, at.drawId, tx)).find(
    ({ result }) => result.memberId === at.memberId && result.slot === at.slot,
  );
  if (!found) throw notFound();
  const { result, name } = found;
  const sit = result.sitId === null ? null : await findSit(scope, result.sitId, tx);
  if (sit?.status !== 'booked' || sit.endAt <= now) throw new AppError('conflict', DRAW_ERRORS.noSitToSwap(name));
  await refuseIfSigned(scope, sit, tx);
  return { result, name, sit };
}

/** Offers one's own stand of a window to another member of the draw for theirs; a new offer takes the place of the last. */
export async function offerSwap(scope: ClubScope, input: SwapInput, now: number): Promise<{ name: string }> {
  return write(async (tx) => {
    await needDraw(scope, input.drawId, ['published'], tx);
    if (input.memberId === scope.member.id) throw new AppError('invalid', DRAW_ERRORS.otherMember);
    const own = await loadHeld(scope, tx, { ...input, memberId: scope.member.id }, now);
    const other = await loadHeld(scope, tx, input, now);
    await updateResult(scope, tx, own.result, { swapWith: other.result.memberId });
    const summary = DRAW_AUDIT.offered(own.name, own.sit.standName, other.name, other.sit.standName);
    const detail = { slot: input.slot, memberId: input.memberId };
    await noteDraw(scope, tx, { id: input.drawId, verb: 'swap_offered', summary, detail }, now);
    return { name: other.name };
  });
}

/** The stand of one sit for the people of another: weapon and guests come along. */
function swapped({ standId, day, windows }: SitDetail, { memberId, weapon, guests }: SitDetail) {
  return { standId, day, windows, memberId, weapon, guests, approachId: null, note: '', requestKey: newRequestKey() };
}

async function keepSwap(scope: ClubScope, tx: Tx, result: ResultRow, sit: SitDetail, told: string): Promise<void> {
  const reasons = [...result.reasons, told];
  await updateResult(scope, tx, result, { sitId: sit.id, standId: sit.standId, reasons, swapWith: null });
}

/** Takes an offer: both sits change hands in one transaction, under every rule. */
export async function acceptSwap(scope: ClubScope, input: SwapInput, now: number): Promise<{ standName: string }> {
  return write(async (tx) => {
    await needDraw(scope, input.drawId, ['published'], tx);
    const own = await loadHeld(scope, tx, { ...input, memberId: scope.member.id }, now);
    const other = await loadHeld(scope, tx, input, now);
    if (other.result.swapWith !== scope.member.id) throw new AppError('conflict', DRAW_ERRORS.noOffer(other.name));
    const reason = DRAW_AUDIT.swapped(other.name, own.name);
    await cancelSitIn(tx, scope, own.sit, reason, now);
    await cancelSitIn(tx, scope, other.sit, reason, now);
    const mine = await placeSitIn(tx, scope, swapped(other.sit, own.sit), now);
    const theirs = await placeSitIn(tx, scope, swapped(own.sit, other.sit), now);
    await keepSwap(scope, tx, own.result, mine, RESULT_WORDS.swapped(other.name, own.sit.standName));
    await keepSwap(scope, tx, other.result, theirs, RESULT_WORDS.swapped(own.name, other.sit.standName));
    await noteDraw(scope, tx, { id: input.drawId, verb: 'swapped', summary: reason }, now);
    return { standName: mine.standName };
  });
}
