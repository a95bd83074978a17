import { type Tx, write } from '@/db/client';
import { AppError, notFound } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { listApproaches } from './approaches-data';
import { noteChange } from './note-change';
import { getParking, updateParking } from './parkings-data';
import { changedSince } from './refuse';
import { GROUND_AUDIT } from './words/audit';
import { GROUND_ERRORS, namesAndMore } from './words/errors';

/** Refused while an approach begins there. */
export async function removeParkingIn(
  scope: ClubScope,
  tx: Tx,
  at: { id: string; version: number },
  now: number,
): Promise<{ name: string }> {
  const parking = await getParking(scope, at.id, tx);
  if (!parking) throw notFound();
  const begun = (await listApproaches(scope, tx)).filter((a) => a.parkingId === at.id).map((a) => a.name);
  if (begun.length > 0) {
    const names = namesAndMore(begun.slice(0, 5), begun.length - 5);
    throw new AppError('conflict', GROUND_ERRORS.parkingUsed(parking.name, names));
  }
  if (!(await updateParking(scope, tx, at, { removedAt: now }))) throw await changedSince(scope, parking, tx);
  const summary = GROUND_AUDIT.parkingRemoved(parking.name);
  await noteChange(scope, tx, { subject: 'parking', verb: 'removed', id: at.id, summary }, now);
  return { name: parking.name };
}

export function removeParking(
  scope: ClubScope,
  at: { id: string; version: number },
  now: number,
): Promise<{ name: string }> {
  return write((tx) => removeParkingIn(scope, tx, at, now));
}
