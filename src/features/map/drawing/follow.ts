import type { Position } from 'geojson';
import { distanceM, type LatLon } from '@/core/geometry';
import type { MapThing } from '../thing';
import { localOf } from './measure';

/** An end this near to a stand or a parking place is tied to it. */
const TIED_M = 15;

function placeOf(thing: MapThing): Position | null {
  return thing.geometry.type === 'Point' ? thing.geometry.coordinates : null;
}

/** Approaches whose end moves along when a stand or a parking place is moved from one place to another. */
export function followMove(centre: LatLon, things: readonly MapThing[], before: MapThing, after: MapThing): MapThing[] {
  const [from, to] = [placeOf(before), placeOf(after)];
  if (!from || !to || (before.kind !== 'stand' && before.kind !== 'parking')) return [];
  const tied = (p: Position | undefined) => p && distanceM(localOf(centre, p), localOf(centre, from)) <= TIED_M;
  return things.flatMap((thing): MapThing[] => {
    if (thing.kind !== 'approach' || thing.geometry.type !== 'LineString') return [];
    const own = before.kind === 'stand' ? thing.standId === before.id : thing.parkingId === before.id;
    if (!own) return [];
    const { coordinates } = thing.geometry;
    const at = before.kind === 'stand' ? coordinates.length - 1 : 0;
    if (!tied(coordinates[at])) return [];
    return [{ ...thing, geometry: { type: 'LineString', coordinates: coordinates.with(at, to) } }];
  });
}

/** What a drawn way most likely joins: turned about when it was drawn from the stand, tied to what lies at its ends. */
export function tieDrawn(
  centre: LatLon,
  things: readonly MapThing[],
  line: readonly Position[],
  withinM: number,
): { line: Position[]; standId: string | null; parkingId: string | null } {
  const nearest = (kind: 'stand' | 'parking', p: Position | undefined) => {
    if (!p) return null;
    const at = localOf(centre, p);
    let best: { id: string; d: number } | null = null;
    for (const thing of things) {
      const place = thing.kind === kind ? placeOf(thing) : null;
      if (!place) continue;
      const d = distanceM(at, localOf(centre, place));
      if (d <= withinM && (!best || d < best.d)) best = { id: thing.id, d };
    }
    return best;
  };
  const forward = nearest('stand', line.at(-1));
  const backward = nearest('stand', line[0]);
  const turn =
    backward !== null && (forward === null || backward.d < forward.d) && nearest('parking', line[0]) === null;
  const way = turn ? line.toReversed() : [...line];
  return {
    line: way,
    standId: nearest('stand', way.at(-1))?.id ?? null,
    parkingId: nearest('parking', way[0])?.id ?? null,
  };
}
