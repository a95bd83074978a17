import type { ShelterClass, StandKind } from '@/core/ground-types';
import { ftToM, ydToM } from '@/core/units';
import type { StandValues } from '@/features/ground/stands-data';

/** Common seat heights, feet: where a drawn stand begins until its own is typed. Common practice. */
const SEAT_FT: Record<StandKind, number> = {
  ladder: 15,
  hang_on: 18,
  climber: 20,
  tripod: 10,
  box_blind: 8,
  ground_blind: 2,
  natural_cover: 1,
};

const SHELTER: Partial<Record<StandKind, ShelterClass>> = { box_blind: 'edge', tripod: 'open', ground_blind: 'edge' };

/** All of a stand that a drawing does not say. */
export function drawnStandDefaults(kind: StandKind): Omit<StandValues, 'name' | 'kind' | 'lat' | 'lon' | 'arcs'> {
  return {
    seatHeightM: ftToM(SEAT_FT[kind]),
    facingDeg: null,
    shotSide: 'either',
    shotRangeM: {
      bow: ydToM(30),
      crossbow: ydToM(40),
      muzzleloader: ydToM(100),
      shotgun: ydToM(75),
      rifle: ydToM(150),
    },
    shelter: SHELTER[kind] ?? 'open_wood',
    seats: 1,
    morning: 'usable',
    evening: 'usable',
    restDays: null,
    mostSitsSeason: null,
    drainBearingDeg: null,
    slopePercent: null,
    allowedMemberIds: null,
    notes: '',
  };
}
