import { loadGround } from '@/features/ground/data';
import { getForecast } from '@/features/weather/get-forecast';
import type { ClubScope } from '@/server/scope';
import { loadEvents, loadSightings } from './load-scoring';
import { windowToPick } from './reads';

/** The rows that the ranked list of the next window is made from, and nothing made of them: the bench's yardstick. */
export async function readBareRows(scope: ClubScope, now: number) {
  const { club } = scope;
  const window = windowToPick(now, club);
  const ground = await loadGround(scope);
  const events = await loadEvents(scope, window.startAt, now);
  const sightings = await loadSightings(scope, window.day, now);
  const kept = await getForecast(club, now);
  return { ground, events, sightings, hours: kept.forecast?.hours.length ?? 0 };
}
