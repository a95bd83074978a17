import { write } from '@/db/client';
import { newId } from '@/lib/ids';
import type { ClubScope } from '@/server/scope';
import { noteChange } from './note-change';
import { insertParking, listParkings, type ParkingValues } from './parkings-data';
import { refuseTakenName } from './refuse';
import { GROUND_AUDIT } from './words/audit';
import { TAKEN_NAMES } from './words/errors';

export function addParking(
  scope: ClubScope,
  values: ParkingValues,
  now: number,
): Promise<{ id: string; name: string }> {
  const id = newId('parking');
  return write(async (tx) => {
    refuseTakenName(await listParkings(scope, tx), values.name, TAKEN_NAMES.parking);
    await insertParking(scope, tx, { ...values, id });
    const summary = GROUND_AUDIT.parkingAdded(values.name);
    await noteChange(scope, tx, { subject: 'parking', verb: 'added', id, summary }, now);
    return { id, name: values.name };
  });
}
