import { write } from '@/db/client';
import { insertApproach } from '@/features/ground/approaches-data';
import { noteChange } from '@/features/ground/note-change';
import { insertParking, listParkings } from '@/features/ground/parkings-data';
import { refuseTakenName } from '@/features/ground/refuse';
import { insertStand, listStands } from '@/features/ground/stands-data';
import { TAKEN_NAMES } from '@/features/ground/words/errors';
import { newId } from '@/lib/ids';
import { AppError } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { insertSamples, listSamples } from './data';
import { sampleGround } from './sample-ground';
import { ONBOARDING_AUDIT, ONBOARDING_ERRORS } from './words';

/** Lays a sample gate and three sample stands at the club's place, so that a list can be seen at once. */
export async function laySamples(scope: ClubScope, now: number): Promise<{ stands: number }> {
  const ground = sampleGround(scope.club);
  return write(async (tx) => {
    if ((await listSamples(scope, tx)).length > 0) {
      throw new AppError('conflict', ONBOARDING_ERRORS.samplesThere);
    }
    refuseTakenName(await listParkings(scope, tx), ground.parking.name, TAKEN_NAMES.parking);
    const standing = await listStands(scope, tx);
    const parkingId = newId('parking');
    await insertParking(scope, tx, { ...ground.parking, id: parkingId });
    const note = { verb: 'added', summary: ONBOARDING_AUDIT.parkingAdded(ground.parking.name) };
    await noteChange(scope, tx, { subject: 'parking', id: parkingId, ...note }, now);
    const ids: string[] = [];
    for (const { stand, approach } of ground.stands) {
      refuseTakenName(standing, stand.name, TAKEN_NAMES.stand);
      const id = newId('stand');
      await insertStand(scope, tx, { ...stand, id, createdAt: now });
      await insertApproach(scope, tx, { ...approach, id: newId('approach'), standId: id, parkingId });
      const summary = ONBOARDING_AUDIT.standAdded(stand.name);
      await noteChange(scope, tx, { subject: 'stand', verb: 'added', id, summary }, now);
      ids.push(id);
    }
    const stands = ids.map((id) => ({ id, kind: 'stand' as const }));
    await insertSamples(scope, tx, [...stands, { id: parkingId, kind: 'parking' }]);
    return { stands: ids.length };
  });
}
