import { type ReadFrom, reader } from '@/db/client';
import type { ClubScope } from '@/server/scope';
import { type ApproachRow, listApproaches } from './approaches-data';
import { type ClosureRow, listClosures } from './closures-data';
import { type FeatureRow, listFeatures } from './features-data';
import { listParkings, type ParkingRow } from './parkings-data';
import { listStands, type StandRow } from './stands-data';

export * from './approaches-data';
export * from './closures-data';
export * from './features-data';
export * from './map-items-data';
export * from './parkings-data';
export * from './people-data';
export * from './stands-data';

/** A club's ground without what was removed. */
export interface GroundRows {
  stands: StandRow[];
  approaches: ApproachRow[];
  features: FeatureRow[];
  parkings: ParkingRow[];
  closures: ClosureRow[];
}

export async function loadGround(scope: ClubScope, from: ReadFrom = reader()): Promise<GroundRows> {
  return {
    stands: await listStands(scope, from),
    approaches: await listApproaches(scope, from),
    features: await listFeatures(scope, from),
    parkings: await listParkings(scope, from),
    closures: await listClosures(scope, from),
  };
}
