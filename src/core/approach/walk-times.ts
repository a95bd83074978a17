import { distanceM, lengthM } from '../geometry';
import type { ScoredApproach } from '../ground-types';
import type { ApproachSettings } from './approach-settings';

/** Metres driven and walked from the parking place to the stand. */
export function routeLengths(approach: ScoredApproach): { drivenM: number; walkedM: number } {
  let drivenM = 0;
  for (let i = 1; i < approach.points.length && i <= approach.vehicleToIndex; i++) {
    const a = approach.points[i - 1];
    const b = approach.points[i];
    if (a && b) drivenM += distanceM(a, b);
  }
  return { drivenM, walkedM: Math.max(0, lengthM(approach.points) - drivenM) };
}

/** Seconds from the parking place to the seat, up to the next whole minute. */
export function walkSeconds(approach: ScoredApproach, s: ApproachSettings): number {
  const { drivenM, walkedM } = routeLengths(approach);
  return Math.ceil((drivenM / s.vehicleSpeedMps + walkedM / s.walkingSpeedMps) / 60) * 60;
}
