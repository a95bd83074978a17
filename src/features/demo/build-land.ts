import { cropYearOf } from '@/core/map-layers';
import type { MadeClub } from './build-club';
import type { DemoDay } from './demo-day';
import type { DemoRows } from './demo-rows';
import { drawnOf } from './features';
import { LAND } from './land';

/** The land on the map of the first club. */
export function buildLand(day: DemoDay, club: MadeClub): DemoRows['mapItems'] {
  return LAND.map(({ layer, name, shape, props, cutYearsAgo, notes }) => ({
    id: day.dice.id('mapItem'),
    clubId: club.row.id,
    layer,
    name,
    geometry: drawnOf(shape),
    props: cutYearsAgo === undefined ? (props ?? {}) : { ...props, cutYear: cropYearOf(day.today) - cutYearsAgo },
    notes: notes ?? '',
  }));
}
