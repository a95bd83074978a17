import { DEFAULT_APPROACH } from '@/core/approach/approach-settings';
import { walkSeconds } from '@/core/approach/walk-times';
import { type LatLon, toLocal } from '@/core/geometry';
import { defaultBackBy } from '@/core/outing/back-by';
import type { SitRow } from '@/features/bookings/data';
import { windowsHeld } from '@/features/bookings/words/sits';
import type { ApproachRow } from '@/features/ground/approaches-data';
import type { ScopeClub } from '@/server/scope';

/** Where no way out is drawn. Our choice. */
const UNKNOWN_WAY_SECONDS = 20 * 60;

function secondsOf(centre: LatLon, way: ApproachRow): number {
  const points = way.points.map(([lon = 0, lat = 0]) => toLocal(centre, { lat, lon }));
  return walkSeconds({ ...way, parkingName: null, points }, DEFAULT_APPROACH);
}

/** The walk out by the way that was named, else by the longest there is: better expected late than missed early. */
export function walkOutSeconds(
  centre: LatLon,
  ways: ApproachRow[],
  sit: Pick<SitRow, 'standId' | 'approachId'>,
): number {
  const named = ways.find((way) => way.id === sit.approachId);
  if (named) return secondsOf(centre, named);
  const out = ways.filter((way) => way.standId === sit.standId && way.direction !== 'in');
  return out.length === 0 ? UNKNOWN_WAY_SECONDS : Math.max(...out.map((way) => secondsOf(centre, way)));
}

type BackBySit = Pick<SitRow, 'standId' | 'approachId' | 'day' | 'windows' | 'endAt' | 'weapon'>;

/** When a sit's member may be expected back, before anybody has said so. */
export function expectedBackBy(club: ScopeClub, ways: ApproachRow[], sit: BackBySit): number {
  return defaultBackBy({
    day: sit.day,
    windows: windowsHeld(sit.windows),
    endAt: sit.endAt,
    weapon: sit.weapon,
    walkOutSeconds: walkOutSeconds(club, ways, sit),
    rules: club.rules,
    place: club,
  });
}
