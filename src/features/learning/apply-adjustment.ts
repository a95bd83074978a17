import { proposeAdjustments } from '@/core/learning/propose-adjustments';
import { type Tx, write } from '@/db/client';
import { getStand } from '@/features/ground/data';
import { newId } from '@/lib/ids';
import { audit } from '@/server/audit';
import { AppError, notFound } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { endAdjustments, insertAdjustment } from './learning-data';
import type { ApplyAdjustment } from './learning-schema';
import { loadOutcomes, wholePoints } from './reads';
import { ADJUSTMENT_AUDIT, ADJUSTMENT_ERRORS } from './words';

function note(scope: ClubScope, tx: Tx, at: { standId: string; verb: string; summary: string }, now: number) {
  const entry = { clubId: scope.club.id, actor: scope.actor, subjectType: 'stand', subjectId: at.standId };
  return audit(tx, { ...entry, action: `adjustment.${at.verb}`, summary: at.summary }, now);
}

/** Lets what a stand's log asks for count from now on, in place of what held before. */
export async function applyAdjustment(scope: ClubScope, input: ApplyAdjustment, now: number): Promise<{ id: string }> {
  return write(async (tx) => {
    const stand = await getStand(scope, input.standId, tx);
    if (!stand) throw notFound();
    const outcomes = await loadOutcomes(scope, tx);
    const found = proposeAdjustments(outcomes).find(({ standId }) => standId === stand.id);
    if (!found) throw new AppError('conflict', ADJUSTMENT_ERRORS.fewSits(stand.name));
    if (wholePoints(found) !== input.points || found.sits !== input.sits) {
      throw new AppError('conflict', ADJUSTMENT_ERRORS.moreSits);
    }
    if (input.points === 0) throw new AppError('conflict', ADJUSTMENT_ERRORS.nothing(stand.name));
    await endAdjustments(scope, tx, stand.id, { by: scope.member.id, at: now });
    const id = newId('adjustment');
    await insertAdjustment(tx, {
      id,
      clubId: scope.club.id,
      standId: stand.id,
      points: input.points,
      sits: found.sits,
      lowPoints: found.lowPoints,
      highPoints: found.highPoints,
      appliedBy: scope.member.id,
      appliedAt: now,
    });
    const summary = ADJUSTMENT_AUDIT.applied(stand.name, input.points, found.sits);
    await note(scope, tx, { standId: stand.id, verb: 'applied', summary }, now);
    return { id };
  });
}

/** Takes a stand back to what the sums say. */
export async function undoAdjustment(scope: ClubScope, standId: string, now: number): Promise<{ standId: string }> {
  return write(async (tx) => {
    const stand = await getStand(scope, standId, tx);
    if (!stand) throw notFound();
    const ended = await endAdjustments(scope, tx, standId, { by: scope.member.id, at: now });
    if (ended.length === 0) throw new AppError('conflict', ADJUSTMENT_ERRORS.notApplied(stand.name));
    const summary = ADJUSTMENT_AUDIT.undone(stand.name);
    await note(scope, tx, { standId, verb: 'undone', summary }, now);
    return { standId };
  });
}
