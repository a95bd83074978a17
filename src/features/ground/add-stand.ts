import { write } from '@/db/client';
import { newId } from '@/lib/ids';
import type { ClubScope } from '@/server/scope';
import { refuseUnknownMembers } from './known-members';
import { noteChange } from './note-change';
import { refuseTakenName } from './refuse';
import { insertStand, listStands, type StandValues } from './stands-data';
import { GROUND_AUDIT } from './words/audit';
import { TAKEN_NAMES } from './words/errors';

export function addStand(scope: ClubScope, values: StandValues, now: number): Promise<{ id: string; name: string }> {
  const id = newId('stand');
  return write(async (tx) => {
    refuseTakenName(await listStands(scope, tx), values.name, TAKEN_NAMES.stand);
    await refuseUnknownMembers(scope, values.allowedMemberIds, tx);
    await insertStand(scope, tx, { ...values, id, createdAt: now });
    await noteChange(
      scope,
      tx,
      { subject: 'stand', verb: 'added', id, summary: GROUND_AUDIT.standAdded(values.name) },
      now,
    );
    return { id, name: values.name };
  });
}
