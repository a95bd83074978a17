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
    if (!found) throw new AppError('conflict', `${stand.name} has too few sits with a log to learn from.`);
    if (wholePoints(found) !== input.points || found.sits !== input.sits) {
      throw new AppError('conflict', 'More sits were logged since you opened this page. Look at the proposal again.');
    }
    if (input.points === 0)
      throw new AppError('conflict', `${stand.name} goes as the sums say: there is nothing to apply.`);
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
    const summary = `${stand.name} counts ${input.points} points of quiet from its log of ${found.sits} sits.`;
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
    if (ended.length === 0) throw new AppError('conflict', `Nothing is applied to ${stand.name}.`);
    const summary = `${stand.name} counts by the sums alone again.`;
    await note(scope, tx, { standId, verb: 'undone', summary }, now);
    return { standId };
  });
}
