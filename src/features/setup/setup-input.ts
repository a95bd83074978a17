import { toLocal } from '@/core/geometry';
import { cropYearOf } from '@/core/map-layers';
import type { GroundInput } from '@/core/rank-input';
import { DEFAULT_SETTINGS } from '@/core/settings';
import type { SetupSettings } from '@/core/setup-check/setup-settings';
import type { SetupInput, UsualWinds } from '@/core/setup-check/setup-types';
import { allDayWindows } from '@/core/windows';
import type { GroundRows, MapItemRow } from '@/features/ground/data';
import { featuresInYear } from '@/features/ground/features-in-year';
import { groundToCore } from '@/features/ground/to-core';
import type { ScopeClub } from '@/server/scope';
import { seasonDays } from './season-days';

export interface SetupRows {
  ground: Pick<GroundRows, 'stands' | 'approaches' | 'features' | 'parkings'>;
  items: Pick<MapItemRow, 'id' | 'name' | 'layer' | 'geometry' | 'props'>[];
}

type SetupClub = Pick<ScopeClub, 'lat' | 'lon' | 'zone' | 'rules' | 'units'>;

/** A club's rows as the check and its weighing take them, for the season a day lies in. */
export function setupInput(
  club: SetupClub,
  { ground, items }: SetupRows,
  { today, winds, settings }: { today: string; winds: UsualWinds | null; settings: SetupSettings },
): { input: SetupInput; ground: GroundInput } {
  const features = featuresInYear(ground.features, cropYearOf(today));
  const core = groundToCore(club, { ...ground, features });
  const { lat, lon, zone, units } = club;
  const place = { lat, lon, zone };
  const days = seasonDays(today);
  const cameras = items.flatMap((item) => {
    if (item.layer !== 'camera' || item.geometry.type !== 'Point') return [];
    const [east = 0, north = 0] = item.geometry.coordinates;
    const at = toLocal(club, { lat: north, lon: east });
    return [{ id: item.id, name: item.name, at, facingDeg: item.props.facingDeg ?? null }];
  });
  const windows = days.flatMap((day) => allDayWindows(day, club.rules, place));
  const scoring = DEFAULT_SETTINGS;
  return {
    input: { place, ...core, cameras, days, windows, winds, settings, scoring, units },
    ground: { place, ...core, events: [], sightings: [], settings: scoring, weapon: null, units },
  };
}
