import { write } from '@/db/client';
import { notFound } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { noteChange } from './note-change';
import { getParking, listParkings, type ParkingValues, updateParking } from './parkings-data';
import { changedSince, changes, refuseTakenName } from './refuse';
import { GROUND_AUDIT } from './words/audit';
import { TAKEN_NAMES } from './words/errors';

export function changeParking(
  scope: ClubScope,
  at: { id: string; version: number },
  values: ParkingValues,
  now: number,
): Promise<{ id: string; name: string }> {
  return write(async (tx) => {
    const before = await getParking(scope, at.id, tx);
    if (!before) throw notFound();
    refuseTakenName(await listParkings(scope, tx), values.name, TAKEN_NAMES.parking, at.id);
    if (!(await updateParking(scope, tx, at, values))) throw await changedSince(scope, before, tx);
    const detail = changes(before, values);
    const summary = GROUND_AUDIT.parkingChanged(values.name);
    await noteChange(scope, tx, { subject: 'parking', verb: 'changed', id: at.id, summary, detail }, now);
    return { id: at.id, name: values.name };
  });
}
