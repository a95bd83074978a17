import { fromLocal, type LatLon, pointAt } from '@/core/geometry';
import type { ApproachValues } from '@/features/ground/approaches-data';
import type { ParkingValues } from '@/features/ground/parkings-data';
import type { StandValues } from '@/features/ground/stands-data';
import { SAMPLE_WORDS } from './words';

export interface SampleGround {
  parking: ParkingValues;
  stands: { stand: StandValues; approach: Omit<ApproachValues, 'parkingId'> }[];
}

const NOTES = SAMPLE_WORDS.notes;

/** Distance and bearing from the gate, and what sets one sample apart from the next. All of it our own invention. */
const STANDS = [
  {
    name: SAMPLE_WORDS.ridgeLadder,
    bearing: 20,
    metres: 420,
    shelter: 'open_wood',
    arcs: [{ fromDeg: 270, toDeg: 45, window: null }],
    morning: 'prime',
    evening: 'usable',
  },
  {
    name: SAMPLE_WORDS.fieldBox,
    bearing: 95,
    metres: 360,
    shelter: 'open',
    arcs: [{ fromDeg: 225, toDeg: 340, window: null }],
    morning: 'avoid',
    evening: 'prime',
  },
  {
    name: SAMPLE_WORDS.creekClimber,
    bearing: 250,
    metres: 510,
    shelter: 'dense_wood',
    arcs: [{ fromDeg: 10, toDeg: 160, window: null }],
    morning: 'prime',
    evening: 'prime',
  },
] as const;

/** A gate at the club's place and three stands about it, each with its good winds and a way in. */
export function sampleGround(place: LatLon): SampleGround {
  const gate = { eastM: 0, northM: 0 };
  const lonLat = (at: LatLon): [number, number] => [at.lon, at.lat];
  return {
    parking: { name: SAMPLE_WORDS.gate, lat: place.lat, lon: place.lon, notes: NOTES },
    stands: STANDS.map(({ name, bearing, metres, shelter, arcs, morning, evening }) => {
      const at = fromLocal(place, pointAt(gate, bearing, metres));
      // Bowed, as a way in that keeps off the straight line is.
      const bend = fromLocal(place, pointAt(gate, bearing - 25, metres * 0.55));
      return {
        stand: {
          name,
          ...at,
          kind: 'ladder',
          seatHeightM: 5,
          facingDeg: null,
          shotSide: 'either',
          shotRangeM: { bow: 27, rifle: 110 },
          shelter,
          seats: 1,
          arcs: [...arcs],
          morning,
          evening,
          restDays: null,
          mostSitsSeason: null,
          drainBearingDeg: null,
          slopePercent: null,
          allowedMemberIds: null,
          notes: NOTES,
        },
        approach: {
          name: SAMPLE_WORDS.path,
          direction: 'both',
          points: [lonLat(place), lonLat(bend), lonLat(at)],
          vehicleToIndex: 0,
          notes: '',
        },
      };
    }),
  };
}
