import type { Tx } from '@/db/client';
import { dayAndWindow } from '@/features/bookings/sit-words';
import { audit } from '@/server/audit';
import { AppError, notFound } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { type DrawRow, findDraw } from './draws-data';

export const drawName = (draw: Pick<DrawRow, 'day' | 'windows'>) =>
  `the draw for ${dayAndWindow(draw.day, draw.windows, true)}`;

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
  const how = {
    open: 'has not been made yet',
    drawn: 'has been made',
    published: 'is published',
    cancelled: 'was called off',
  }[draw.state];
  throw new AppError('conflict', `This draw ${how}. Reload the page to see how it stands.`);
}
