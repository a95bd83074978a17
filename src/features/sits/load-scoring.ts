import { huntingYear } from '@/core/booking/hunting-year';
import type { PressureEvent, StandSightings } from '@/core/condition-types';
import { addDays } from '@/core/day-time';
import { toLocal } from '@/core/geometry';
import type { Weapon } from '@/core/ground-types';
import { cropYearOf } from '@/core/map-layers';
import type { GroundInput } from '@/core/rank-input';
import { DEFAULT_SETTINGS } from '@/core/settings';
import { type ReadFrom, reader } from '@/db/client';
import { type GroundRows, loadGround } from '@/features/ground/data';
import { featuresInYear } from '@/features/ground/features-in-year';
import { groundToCore } from '@/features/ground/to-core';
import type { ClubScope } from '@/server/scope';
import { listQuietShifts, listSitEvents, listVisitEvents, sumSightings } from './data';
import { hideFeatures } from './hide-features';

const DAY_MS = 86_400_000;
/** Older pressure is forgotten by the core in any case. */
const PRESSURE_DAYS = 21;

/** What people have done near the stands in the last three weeks, and what they have booked up to an instant. */
export async function loadEvents(
  scope: ClubScope,
  until: number,
  now: number,
  from: ReadFrom = reader(),
): Promise<PressureEvent[]> {
  const span = { from: Math.min(now, until) - PRESSURE_DAYS * DAY_MS, until };
  const sits = await listSitEvents(scope, span, from);
  const visits = await listVisitEvents(scope, span, from);
  return [
    ...sits.map(({ standId, endAt, bumped, ...at }) => ({
      at: endAt,
      kind: 'sit' as const,
      place: toLocal(scope.club, at),
      standId,
      bumped,
    })),
    ...visits.map(({ at, kind, standId, bumped, ...place }) => ({
      at,
      kind,
      place: toLocal(scope.club, place),
      standId,
      bumped,
    })),
  ];
}

/** Deer seen from each stand this season and last, as known at `now`. */
export function loadSightings(
  scope: ClubScope,
  day: string,
  now: number,
  from: ReadFrom = reader(),
): Promise<StandSightings[]> {
  const { fromDay, toDay } = huntingYear(day);
  return sumSightings(scope, { fromDay: huntingYear(addDays(fromDay, -1)).fromDay, toDay }, now, from);
}

export interface Scoring {
  input: GroundInput;
  rows: GroundRows;
}

/** A club's ground and past as the core takes them. Those who may not know the features get them without their names. */
export async function loadScoring(
  scope: ClubScope,
  ask: { day: string; until: number; weapon: Weapon | null },
  now: number,
  from: ReadFrom = reader(),
): Promise<Scoring> {
  const { club } = scope;
  const rows = await loadGround(scope, from);
  const features = featuresInYear(rows.features, cropYearOf(ask.day));
  const ground = groundToCore(club, { ...rows, features });
  const shifts = await listQuietShifts(scope, from);
  return {
    rows,
    input: {
      place: { lat: club.lat, lon: club.lon, zone: club.zone },
      stands: ground.stands.map((stand) => {
        const quietShift = shifts.get(stand.id);
        return quietShift === undefined ? stand : { ...stand, quietShift };
      }),
      approaches: ground.approaches,
      features: scope.can('features.read') ? ground.features : hideFeatures(ground.features),
      events: await loadEvents(scope, ask.until, now, from),
      sightings: await loadSightings(scope, ask.day, now, from),
      settings: DEFAULT_SETTINGS,
      weapon: ask.weapon,
      orangeRule: club.rules.orangeRule?.text ?? null,
      units: club.units,
    },
  };
}
