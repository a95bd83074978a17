import { addDays, dayOf } from './day-time';
import { daylight, type Place, sunPosition } from './sun';

/** Whether there is daylight from an instant (UTC ms) on. */
export interface LightChange {
  at: number;
  light: 'day' | 'dark';
}

/**
 * Day and dark by the sun at a place: how it is at `now` (UTC ms), then every sunrise and sunset of that club day's rest and
 * the two after it, in order. Where the sun neither rises nor sets only the first entry is left.
 */
export function lightBySun(now: number, place: Place): LightChange[] {
  const today = dayOf(now, place.zone);
  const changes = [-1, 0, 1, 2].flatMap((days): LightChange[] => {
    const sun = daylight(addDays(today, days), place);
    return sun
      ? [
          { at: sun.rise, light: 'day' },
          { at: sun.set, light: 'dark' },
        ]
      : [];
  });
  const last = changes.findLast((change) => change.at <= now);
  const up = sunPosition(now, place.lat, place.lon).altitudeDeg > 0;
  const first: LightChange = { at: now, light: last?.light ?? (up ? 'day' : 'dark') };
  return [first, ...changes.filter((change) => change.at > now)];
}
