import type { PressureEvent } from '../condition-types';
import type { Point } from '../ground-types';
import { nearEvents, type PressureSettings, pressureLeft } from '../pressure';

const DAY_MS = 86_400_000;

/**
 * Pressure left at a place at each of some instants (UTC ms, rising), as core/pressure.ts counts it: 0 none, about 1 one sit
 * just over. `events` in any order.
 */
export function pressureSeries(
  place: Point,
  events: PressureEvent[],
  instants: readonly number[],
  settings: PressureSettings,
): number[] {
  const near = nearEvents(place, events, settings).sort((a, b) => a.event.at - b.event.at);
  let first = 0;
  let next = 0;
  return instants.map((at) => {
    while (next < near.length && (near[next]?.event.at ?? 0) <= at) next++;
    while (first < next && (near[first]?.event.at ?? 0) < at - settings.forgetDays * DAY_MS) first++;
    return pressureLeft(near.slice(first, next), at, settings);
  });
}
