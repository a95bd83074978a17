import { chooseElevation } from '@/adapters/elevation/choose';
import type { ElevationPort } from '@/adapters/elevation/port';
import { distanceM, type LatLon, toLocal } from '@/core/geometry';
import { env } from '@/env';
import { AppError } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { loadHeights } from './load-heights';
import { boundsAround } from './read-slope';
import { type Contours, traceContours } from './trace-contours';

/** Contours reach this far past what is drawn; things farther than this from the club are left out of it. */
const PAD_M = 250;
const FARTHEST_M = 2600;

export interface ContoursView extends Contours {
  unit: 'ft' | 'm';
  source: string;
}

/** Lines of equal height over what a club has drawn. */
export async function readContours(
  scope: ClubScope,
  places: LatLon[],
  now: number,
  port: ElevationPort = chooseElevation(env),
): Promise<ContoursView> {
  const { club } = scope;
  const near = places.filter((at) => distanceM({ eastM: 0, northM: 0 }, toLocal(club, at)) <= FARTHEST_M);
  const loaded = await loadHeights(port, boundsAround([club, ...near], PAD_M), now);
  if (!loaded.ok) throw new AppError('unavailable', loaded.message);
  return { ...traceContours(loaded.grid, club.units), unit: club.units === 'us' ? 'ft' : 'm', source: loaded.label };
}
