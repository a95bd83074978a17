import { type Tx, write } from '@/db/client';
import { AppError, notFound } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { listApproaches } from './approaches-data';
import { noteChange } from './note-change';
import { getParking, updateParking } from './parkings-data';
import { changedSince } from './refuse';

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
    const names = begun.slice(0, 5).join(', ') + (begun.length > 5 ? ` and ${begun.length - 5} more` : '');
    throw new AppError('conflict', `Approaches begin at ${parking.name}: ${names}. Give them another place first.`);
  }
  if (!(await updateParking(scope, tx, at, { removedAt: now }))) throw await changedSince(scope, parking, tx);
  const summary = `Removed parking place ${parking.name}.`;
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
