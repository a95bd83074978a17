import type { ReadFrom } from '@/db/client';
import { type GroundRows, listMapItems, loadGround, type MapItemRow } from '@/features/ground/data';
import type { ClubScope } from '@/server/scope';

/** Everything that a drawing may touch, as it is stored. */
export type DrawnRows = Omit<GroundRows, 'closures'> & { items: MapItemRow[] };

export async function loadDrawn(scope: ClubScope, from: ReadFrom): Promise<DrawnRows> {
  const { stands, parkings, approaches, features } = await loadGround(scope, from);
  return { stands, parkings, approaches, features, items: await listMapItems(scope, from) };
}
