import { cropYearOf } from '@/core/map-layers';
import { ftToM } from '@/core/units';
import { APPROACHES } from './approaches';
import type { MadeClub } from './build-club';
import { type DemoDay, momentOf } from './demo-day';
import { latLonOf, positionOf } from './demo-place';
import type { DemoRows } from './demo-rows';
import { ALL_YEAR, drawnOf, FEATURES } from './features';
import { PARKINGS } from './parkings';
import type { DemoStand } from './stand-types';
import { STANDS } from './stands';

export type StandRow = DemoRows['stands'][number];

export interface MadeGround extends Pick<DemoRows, 'parkings' | 'stands' | 'approaches' | 'features'> {
  /** By the stand's key. */
  standIds: Map<string, string>;
}

const STANDS_DAYS_OLD = 820;

export function standRow(
  day: DemoDay,
  club: MadeClub,
  stand: DemoStand,
  at: { lat: number; lon: number },
  createdAt: number,
): StandRow {
  const kept = stand.keptFor?.map((key) => club.members.find((m) => m.key === key)?.id ?? '') ?? null;
  return {
    id: day.dice.id('stand'),
    clubId: club.row.id,
    name: stand.name,
    kind: stand.kind,
    ...at,
    seatHeightM: ftToM(stand.seatHeightFt),
    facingDeg: stand.facingDeg,
    shotSide: stand.shotSide,
    shotRangeM: stand.shotRangeM,
    shelter: stand.shelter,
    seats: stand.seats,
    arcs: stand.arcs,
    morning: stand.morning,
    evening: stand.evening,
    restDays: stand.restDays ?? null,
    mostSitsSeason: stand.mostSitsSeason ?? null,
    drainBearingDeg: stand.drain?.bearingDeg ?? null,
    slopePercent: stand.drain?.slopePercent ?? null,
    allowedMemberIds: kept,
    notes: stand.notes,
    createdAt,
  };
}

export function buildGround(day: DemoDay, club: MadeClub): MadeGround {
  const clubId = club.row.id;
  const parkings = PARKINGS.map(({ name, at, notes }) => ({
    id: day.dice.id('parking'),
    clubId,
    name,
    ...latLonOf(at),
    notes,
  }));
  const createdAt = momentOf(day, -STANDS_DAYS_OLD, '13:00');
  const stands = STANDS.map((stand) => standRow(day, club, stand, latLonOf(stand.at), createdAt));
  const approaches = APPROACHES.map((way) => {
    const standAt = STANDS.findIndex(({ key }) => key === way.stand);
    const parkingAt = PARKINGS.findIndex(({ key }) => key === way.from);
    const [stand, standMade] = [STANDS[standAt], stands[standAt]];
    const [parking, parkingMade] = [PARKINGS[parkingAt], parkings[parkingAt]];
    if (!stand || !standMade || !parking || !parkingMade) throw new Error(`The way "${way.name}" has no ends.`);
    return {
      id: day.dice.id('approach'),
      clubId,
      standId: standMade.id,
      parkingId: parkingMade.id,
      name: way.name,
      direction: way.direction,
      points: [parking.at, ...way.by, stand.at].map((spot) => positionOf(spot)),
      vehicleToIndex: way.driven ?? 0,
      notes: way.notes ?? '',
    };
  });
  const features = FEATURES.map((feature) => ({
    id: day.dice.id('feature'),
    clubId,
    name: feature.name,
    kind: feature.kind,
    geometry: drawnOf(feature.shape),
    months: feature.months ?? ALL_YEAR,
    rotation: (feature.rotation ?? []).map(({ yearsAgo, ...crop }) => ({
      ...crop,
      year: cropYearOf(day.today) - yearsAgo,
    })),
    use: feature.use ?? null,
    notes: feature.notes ?? '',
  }));
  const standIds = new Map(STANDS.map((stand, i) => [stand.key, stands[i]?.id ?? '']));
  return { parkings, stands, approaches, features, standIds };
}
