import { write } from '@/db/client';
import { newId } from '@/lib/ids';
import { notFound } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { type ApproachForm, makeApproachSchema } from './approach-schema';
import { insertApproach, listApproachesOf } from './approaches-data';
import { noteChange } from './note-change';
import { listParkings } from './parkings-data';
import { refuseTakenName } from './refuse';
import { getStand } from './stands-data';
import { GROUND_AUDIT } from './words/audit';
import { TAKEN_NAMES } from './words/errors';

/** Read here and not before: the line is tied to the stand and the parking place as they are now. */
export function addApproach(
  scope: ClubScope,
  standId: string,
  typed: ApproachForm,
  now: number,
): Promise<{ id: string; name: string }> {
  const id = newId('approach');
  return write(async (tx) => {
    const stand = await getStand(scope, standId, tx);
    if (!stand) throw notFound();
    const values = makeApproachSchema(scope.club, { stand, parkings: await listParkings(scope, tx) }).parse(typed);
    refuseTakenName(await listApproachesOf(scope, standId, tx), values.name, TAKEN_NAMES.approach);
    await insertApproach(scope, tx, { ...values, id, standId });
    const summary = GROUND_AUDIT.approachAdded(values.name, stand.name);
    await noteChange(scope, tx, { subject: 'approach', verb: 'added', id, summary }, now);
    return { id, name: values.name };
  });
}
