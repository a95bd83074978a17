import { arcsFor } from '@/core/arcs';
import { dayOf } from '@/core/day-time';
import { WEAPONS } from '@/core/ground-types';
import { notFound } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import type { ApproachPlaces } from './approach-schema';
import { listApproaches, listApproachesOf } from './approaches-data';
import { listClosuresFrom } from './closures-data';
import { listFeatures } from './features-data';
import { geometryText } from './geometry-text';
import { listParkings } from './parkings-data';
import { type BookedSit, listBookedSits, listHunters } from './people-data';
import { degreesText } from './place-text';
import { namedSits } from './refuse';
import { getStand, listStands } from './stands-data';
import type { ClosureLine, FeatureLine, ParkingLine, StandLine } from './view';
import { formatClosed, formatDays, formatSize, formatWinds, holdsOn } from './view';
import { FEATURE_KIND_WORDS, formatMonths, SHAPE_WORDS, STAND_KIND_WORDS, WEAPON_WORDS } from './words/kinds';

export async function readStandList(scope: ClubScope, now: number): Promise<StandLine[]> {
  const today = dayOf(now, scope.club.zone);
  const [stands, approaches, closures] = await Promise.all([
    listStands(scope),
    listApproaches(scope),
    listClosuresFrom(scope, today),
  ]);
  return stands.map((stand) => ({
    id: stand.id,
    name: stand.name,
    kind: STAND_KIND_WORDS[stand.kind],
    morningArcs: arcsFor(stand.arcs, 'morning'),
    eveningArcs: arcsFor(stand.arcs, 'evening'),
    morningWinds: formatWinds(arcsFor(stand.arcs, 'morning')),
    eveningWinds: formatWinds(arcsFor(stand.arcs, 'evening')),
    morning: stand.morning,
    evening: stand.evening,
    restDays: stand.restDays ?? scope.club.rules.restDaysDefault,
    weapons: WEAPONS.filter((w) => stand.shotRangeM[w] !== undefined)
      .map((w) => WEAPON_WORDS[w])
      .join(', '),
    approaches: approaches.filter((a) => a.standId === stand.id).length,
    closed: formatClosed(
      closures.filter((c) => c.standId === stand.id),
      today,
    ),
    closedNow: closures.some((c) => c.standId === stand.id && holdsOn(c, today)),
  }));
}

/** Everything one stand's page shows. */
export async function readStand(scope: ClubScope, id: string, now: number) {
  const stand = await getStand(scope, id);
  if (!stand) throw notFound();
  const today = dayOf(now, scope.club.zone);
  const [approaches, parkings, closures, hunters, sits] = await Promise.all([
    listApproachesOf(scope, id),
    listParkings(scope),
    listClosuresFrom(scope, today),
    listHunters(scope),
    listBookedSits(scope, { standId: id, now }),
  ]);
  const allowed = stand.allowedMemberIds;
  return {
    stand,
    approaches,
    parkings,
    closures: closures
      .filter((c) => c.standId === id)
      .map((c) => ({ id: c.id, days: formatDays(c), reason: c.reason })),
    today,
    /** null: every member. */
    allowedNames: allowed === null ? null : hunters.filter((h) => allowed.includes(h.id)).map((h) => h.name),
    sits,
  };
}

export async function readGround(scope: ClubScope): Promise<{ features: FeatureLine[]; parkings: ParkingLine[] }> {
  const [features, parkings, approaches] = await Promise.all([
    listFeatures(scope),
    listParkings(scope),
    listApproaches(scope),
  ]);
  return {
    features: features.map((f) => ({
      id: f.id,
      name: f.name,
      kind: FEATURE_KIND_WORDS[f.kind],
      shape: SHAPE_WORDS[geometryText(f.geometry).shape],
      size: formatSize(f.geometry, scope.club, scope.club.units),
      months: formatMonths(f.months),
    })),
    parkings: parkings.map((p) => ({
      id: p.id,
      name: p.name,
      place: `${degreesText(p.lat)}, ${degreesText(p.lon)}`,
      approaches: approaches.filter((a) => a.parkingId === p.id).length,
      notes: p.notes,
    })),
  };
}

/** Closures of today and later. Who may not read stands sees those of the whole ground only. */
export async function readClosures(scope: ClubScope, now: number) {
  const today = dayOf(now, scope.club.zone);
  const stands = scope.can('stands.read') ? await listStands(scope) : [];
  const names = new Map(stands.map((s) => [s.id, s.name]));
  const [closures, sits] = await Promise.all([
    listClosuresFrom(scope, today),
    listBookedSits(scope, { standId: null, fromDay: today, now }),
  ]);
  const lines = closures.flatMap((c): ClosureLine[] => {
    const standName = c.standId === null ? null : names.get(c.standId);
    if (standName === undefined) return [];
    const touched = sits.filter(
      (s) =>
        (c.standId === null || c.standId === s.standId) && c.fromDay <= s.day && (c.toDay === null || s.day <= c.toDay),
    );
    const { id, fromDay, reason } = c;
    return [
      { id, standName, fromDay, days: formatDays(c), reason, now: fromDay <= today, touched: namedSits(touched) },
    ];
  });
  return { today, lines, stands: stands.map(({ id, name }) => ({ id, name })) };
}

/** Booked sits that a closure would fall on: they stay booked until somebody cancels them. */
export async function sitsTouchedByClosure(
  scope: ClubScope,
  closure: { standId: string | null; fromDay: string; toDay: string | null },
  now: number,
): Promise<BookedSit[]> {
  if (closure.standId !== null && !(scope.can('stands.read') && (await getStand(scope, closure.standId))))
    throw notFound();
  return listBookedSits(scope, { ...closure, now });
}

/** The places an approach to a stand is tied to; only what its form needs. */
export async function readApproachPlaces(scope: ClubScope, standId: string): Promise<ApproachPlaces> {
  const [stand, parkings] = await Promise.all([getStand(scope, standId), listParkings(scope)]);
  if (!stand) throw notFound();
  return {
    stand: { name: stand.name, lat: stand.lat, lon: stand.lon },
    parkings: parkings.map(({ id, name, lat, lon }) => ({ id, name, lat, lon })),
  };
}
