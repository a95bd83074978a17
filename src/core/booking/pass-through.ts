import type { WindowName } from '../condition-types';
import { distanceToShapeM } from '../geometry';
import type { Point } from '../ground-types';
import { formatExactDistance, type Units } from '../units';
import type { Gate } from '../verdict-types';
import { GATE_WORDS } from '../words/gates';
import type { BookingStand, OtherSit } from './booking-types';
import { sitsBeside } from './spacing';

const SAME_M = 0.001;

/** Distance from an occupied stand to a way in; Infinity for a way with no points. */
function distanceToWayM(at: Point, way: readonly Point[]): number {
  return way.length === 0 ? Number.POSITIVE_INFINITY : distanceToShapeM(at, { type: 'line', points: [...way] });
}

/** For each approach, whether it keeps the distance from every occupied stand. */
export function clearApproaches(
  approaches: readonly (readonly Point[])[],
  occupied: readonly Point[],
  passThroughM: number,
): boolean[] {
  return approaches.map((way) => occupied.every((at) => distanceToWayM(at, way) >= passThroughM - SAME_M));
}

/**
 * No walking through within so far of an occupied stand. One clear way to the stand is enough; where none is clear, every
 * holder who stands in a way is named. A stand without recorded approaches cannot be judged and is let through.
 */
export function passThroughGates(input: {
  passThroughM: number;
  stand: Pick<BookingStand, 'id' | 'name' | 'approaches'>;
  day: string;
  windows: readonly WindowName[];
  sits: readonly OtherSit[];
  units: Units;
}): Gate[] {
  const { passThroughM, stand } = input;
  const beside = sitsBeside(stand.id, input.day, input.windows, input.sits);
  if (passThroughM <= 0 || stand.approaches.length === 0 || beside.length === 0) return [];
  const occupied = beside.map((sit) => sit.standAt);
  if (clearApproaches(stand.approaches, occupied, passThroughM).some(Boolean)) return [];
  const holders = beside.filter((sit) =>
    stand.approaches.some((way) => distanceToWayM(sit.standAt, way) < passThroughM - SAME_M),
  );
  const least = formatExactDistance(passThroughM, input.units);
  const names = holders.map((sit) => `${sit.standName} (${sit.memberName})`).join(', ');
  const text = GATE_WORDS.passThrough(stand.name, least, names);
  return [{ code: 'pass_through', text, endsOn: null }];
}
