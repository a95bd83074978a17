import { type Tx, write } from '@/db/client';
import { AppError, notFound } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { removeApproachesOf } from './approaches-data';
import { removeClosuresOf } from './closures-data';
import { noteChange } from './note-change';
import { listBookedSits } from './people-data';
import { changedSince, namedSits } from './refuse';
import { getStand, updateStand } from './stands-data';
import { GROUND_AUDIT } from './words/audit';
import { GROUND_ERRORS } from './words/errors';

/** Takes a stand away with its approaches and closures; past sits keep it. Refused while sits are booked there. */
export async function removeStandIn(
  scope: ClubScope,
  tx: Tx,
  at: { id: string; version: number },
  now: number,
): Promise<{ name: string }> {
  const stand = await getStand(scope, at.id, tx);
  if (!stand) throw notFound();
  const booked = await listBookedSits(scope, { standId: at.id, now }, tx);
  if (booked.length > 0) {
    throw new AppError('conflict', GROUND_ERRORS.standBooked(stand.name, namedSits(booked)));
  }
  if (!(await updateStand(scope, tx, at, { removedAt: now }))) throw await changedSince(scope, stand, tx);
  await removeApproachesOf(scope, tx, at.id, now);
  await removeClosuresOf(scope, tx, at.id, now);
  const summary = GROUND_AUDIT.standRemoved(stand.name);
  await noteChange(scope, tx, { subject: 'stand', verb: 'removed', id: at.id, summary }, now);
  return { name: stand.name };
}

export function removeStand(
  scope: ClubScope,
  at: { id: string; version: number },
  now: number,
): Promise<{ name: string }> {
  return write((tx) => removeStandIn(scope, tx, at, now));
}
