import { write } from '@/db/client';
import { notFound } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { type ApproachForm, makeApproachSchema } from './approach-schema';
import { getApproach, listApproachesOf, updateApproach } from './approaches-data';
import { noteChange } from './note-change';
import { listParkings } from './parkings-data';
import { changedSince, changes, refuseTakenName } from './refuse';
import { getStand } from './stands-data';
import { GROUND_AUDIT } from './words/audit';
import { TAKEN_NAMES } from './words/errors';

export function changeApproach(
  scope: ClubScope,
  at: { id: string; version: number },
  typed: ApproachForm,
  now: number,
): Promise<{ id: string; name: string }> {
  return write(async (tx) => {
    const before = await getApproach(scope, at.id, tx);
    const stand = before && (await getStand(scope, before.standId, tx));
    if (!stand) throw notFound();
    const values = makeApproachSchema(scope.club, { stand, parkings: await listParkings(scope, tx) }).parse(typed);
    refuseTakenName(await listApproachesOf(scope, stand.id, tx), values.name, TAKEN_NAMES.approach, at.id);
    if (!(await updateApproach(scope, tx, at, values))) throw await changedSince(scope, before, tx);
    const detail = changes(before, values);
    const summary = GROUND_AUDIT.approachChanged(values.name, stand.name);
    await noteChange(scope, tx, { subject: 'approach', verb: 'changed', id: at.id, summary, detail }, now);
    return { id: at.id, name: values.name };
  });
}
