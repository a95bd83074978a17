import { write } from '@/db/client';
import { insertApproach } from '@/features/ground/approaches-data';
import { noteChange } from '@/features/ground/note-change';
import { insertParking, listParkings } from '@/features/ground/parkings-data';
import { refuseTakenName } from '@/features/ground/refuse';
import { insertStand, listStands } from '@/features/ground/stands-data';
import { newId } from '@/lib/ids';
import { AppError } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { insertSamples, listSamples } from './data';
import { sampleGround } from './sample-ground';

/** Lays a sample gate and three sample stands at the club's place, so that a list can be seen at once. */
export async function laySamples(scope: ClubScope, now: number): Promise<{ stands: number }> {
  const ground = sampleGround(scope.club);
  return write(async (tx) => {
    if ((await listSamples(scope, tx)).length > 0) {
      throw new AppError('conflict', 'The samples are there already: look at the list, or take them away.');
    }
    refuseTakenName(await listParkings(scope, tx), ground.parking.name, 'a parking place');
    const standing = await listStands(scope, tx);
    const parkingId = newId('parking');
    await insertParking(scope, tx, { ...ground.parking, id: parkingId });
    const note = { verb: 'added', summary: `Added sample parking place ${ground.parking.name}.` };
    await noteChange(scope, tx, { subject: 'parking', id: parkingId, ...note }, now);
    const ids: string[] = [];
    for (const { stand, approach } of ground.stands) {
      refuseTakenName(standing, stand.name, 'a stand');
      const id = newId('stand');
      await insertStand(scope, tx, { ...stand, id, createdAt: now });
      await insertApproach(scope, tx, { ...approach, id: newId('approach'), standId: id, parkingId });
      const summary = `Added sample stand ${stand.name}.`;
      await noteChange(scope, tx, { subject: 'stand', verb: 'added', id, summary }, now);
      ids.push(id);
    }
    const stands = ids.map((id) => ({ id, kind: 'stand' as const }));
    await insertSamples(scope, tx, [...stands, { id: parkingId, kind: 'parking' }]);
    return { stands: ids.length };
  });
}
