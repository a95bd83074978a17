import { write } from '@/db/client';
import { notFound } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { refuseUnknownMembers } from './known-members';
import { noteChange } from './note-change';
import { changedSince, changes, refuseTakenName } from './refuse';
import { getStand, listStands, type StandValues, updateStand } from './stands-data';
import { GROUND_AUDIT } from './words/audit';
import { TAKEN_NAMES } from './words/errors';

export function changeStand(
  scope: ClubScope,
  at: { id: string; version: number },
  values: StandValues,
  now: number,
): Promise<{ id: string; name: string }> {
  return write(async (tx) => {
    const before = await getStand(scope, at.id, tx);
    if (!before) throw notFound();
    refuseTakenName(await listStands(scope, tx), values.name, TAKEN_NAMES.stand, at.id);
    await refuseUnknownMembers(scope, values.allowedMemberIds, tx);
    if (!(await updateStand(scope, tx, at, values))) throw await changedSince(scope, before, tx);
    const detail = changes(before, values);
    const summary = GROUND_AUDIT.standChanged(values.name);
    await noteChange(scope, tx, { subject: 'stand', verb: 'changed', id: at.id, summary, detail }, now);
    return { id: at.id, name: values.name };
  });
}
