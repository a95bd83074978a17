import { write } from '@/db/client';
import { getParking } from '@/features/ground/parkings-data';
import { removeParkingIn } from '@/features/ground/remove-parking';
import { removeStandIn } from '@/features/ground/remove-stand';
import { getStand } from '@/features/ground/stands-data';
import type { ClubScope } from '@/server/scope';
import { deleteSamples, listSamples } from './data';

/** Takes the samples away together; what was already removed by hand is passed over. Refused while one is booked or in use. */
export async function removeSamples(scope: ClubScope, now: number): Promise<{ removed: number }> {
  return write(async (tx) => {
    const samples = await listSamples(scope, tx);
    let removed = 0;
    for (const { id } of samples.filter(({ kind }) => kind === 'stand')) {
      const stand = await getStand(scope, id, tx);
      if (!stand) continue;
      await removeStandIn(scope, tx, { id, version: stand.version }, now);
      removed += 1;
    }
    for (const { id } of samples.filter(({ kind }) => kind === 'parking')) {
      const parking = await getParking(scope, id, tx);
      if (parking) await removeParkingIn(scope, tx, { id, version: parking.version }, now);
    }
    await deleteSamples(scope, tx);
    return { removed };
  });
}
