import type { Tx } from '@/db/client';
import { audit } from '@/server/audit';
import { AppError, notFound } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { type DrawRow, findDraw } from './draws-data';
import { slotsTitle } from './slots';
import { DRAW_AUDIT, DRAW_ERRORS } from './words/errors';

export const drawName = (draw: Pick<DrawRow, 'slots'>) => DRAW_AUDIT.name(slotsTitle(draw.slots));

/** The audit row of a draw. */
export function noteDraw(
  scope: ClubScope,
  tx: Tx,
  note: { id: string; verb: string; summary: string; detail?: Record<string, unknown> },
  now: number,
): Promise<void> {
  const { id, verb, summary, detail } = note;
  const entry = { clubId: scope.club.id, actor: scope.actor, action: `draw.${verb}`, subjectType: 'draw' };
  return audit(tx, { ...entry, subjectId: id, summary, ...(detail ? { detail } : {}) }, now);
}

/** A draw in one of the states asked for; else a refusal that says how it stands. */
export async function needDraw(
  scope: ClubScope,
  id: string,
  states: readonly DrawRow['state'][],
  from?: Tx,
): Promise<DrawRow> {
  const draw = await findDraw(scope, id, from);
  if (!draw) throw notFound();
  if (states.includes(draw.state)) return draw;
  throw new AppError('conflict', DRAW_ERRORS.states[draw.state]);
}
