import { dayOf } from '@/core/day-time';
import { toLocal } from '@/core/geometry';
import { cropYearOf } from '@/core/map-layers';
import type { GroundInput } from '@/core/rank-input';
import { DEFAULT_SETTINGS } from '@/core/settings';
import { DEFAULT_SETUP } from '@/core/setup-check/setup-settings';
import type { SetupInput } from '@/core/setup-check/setup-types';
import { allDayWindows } from '@/core/windows';
import { loadSeasonHours } from '@/features/coverage/load-season-hours';
import { usualWinds } from '@/features/coverage/usual-winds';
import { listMapItems, loadGround } from '@/features/ground/data';
import { featuresInYear } from '@/features/ground/features-in-year';
import { groundToCore } from '@/features/ground/to-core';
import type { ClubScope } from '@/server/scope';
import { seasonDays } from './season-days';

export interface LoadedSetup {
  input: SetupInput;
  ground: GroundInput;
  /** Whose hours the usual winds are; null: every wind counts the same. */
  windsFrom: string | null;
}

/** A club's ground and usual winds as the check takes them. */
export async function loadSetup(scope: ClubScope, now: number): Promise<LoadedSetup> {
  const { club } = scope;
  const today = dayOf(now, club.zone);
  const [rows, items, season] = await Promise.all([
    loadGround(scope),
    listMapItems(scope),
    loadSeasonHours(scope, now),
  ]);
  const features = featuresInYear(rows.features, cropYearOf(today));
  const core = groundToCore(club, { ...rows, features });
  const place = { lat: club.lat, lon: club.lon, zone: club.zone };
  const days = seasonDays(today);
  const cameras = items.flatMap((item) => {
    if (item.layer !== 'camera' || item.geometry.type !== 'Point') return [];
    const [lon = 0, lat = 0] = item.geometry.coordinates;
    return [{ id: item.id, name: item.name, at: toLocal(club, { lat, lon }), facingDeg: item.props.facingDeg ?? null }];
  });
  const winds = usualWinds(season, club);
  return {
    input: {
      place,
      ...core,
      cameras,
      days,
      windows: days.flatMap((day) => allDayWindows(day, club.rules, place)),
      winds,
      settings: DEFAULT_SETUP,
      scoring: DEFAULT_SETTINGS,
      units: club.units,
    },
    ground: { place, ...core, events: [], sightings: [], settings: DEFAULT_SETTINGS, weapon: null, units: club.units },
    windsFrom: winds ? `${season.source}, ${season.fromDay} to ${season.toDay}` : null,
  };
}
