import { dayOf } from '@/core/day-time';
import { cropYearOf } from '@/core/map-layers';
import { env } from '@/env';
import { listMapItems, loadGround } from '@/features/ground/data';
import type { ClubScope } from '@/server/scope';
import { declinationDeg } from './magnetic';
import { shapeThings } from './shape-things';
import type { MapView } from './thing';

/** All that a club has drawn. */
export async function readMap(scope: ClubScope, now: number): Promise<MapView> {
  const { slug, name, lat, lon, units, zone } = scope.club;
  const today = dayOf(now, zone);
  const cropYear = cropYearOf(today);
  const [rows, items] = await Promise.all([loadGround(scope), listMapItems(scope)]);
  return {
    club: { slug, name, lat, lon, units },
    things: shapeThings(rows, items, { today, cropYear }),
    declinationDeg: declinationDeg(scope.club, now),
    year: cropYear,
    imagery: env.imagery,
    may: {
      stands: scope.can('stands.write'),
      features: scope.can('features.write'),
      approaches: scope.can('approaches.write'),
    },
    madeAt: now,
  };
}
