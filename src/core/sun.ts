import { getPosition, getTimes } from 'suncalc';
import { addDays, localToUtc, roundToMinute } from './day-time';

/** A club's place: degrees north and east, and its IANA zone. */
export interface Place {
  lat: number;
  lon: number;
  zone: string;
}

/** Instants of the sun's events on one club day; null when there is none that day. */
export interface SunTimes {
  rise: number | null;
  set: number | null;
  civilDawn: number | null;
  civilDusk: number | null;
  /** What the sun does all day when it neither rises nor sets. */
  polar: 'none' | 'up_all_day' | 'down_all_day';
}

/**
 * The sun's events that fall on a club day, from midnight to midnight by the club's clock. Rise and set are for the sun's
 * upper edge at a level horizon (centre 50 arcminutes under it, as the US Naval Observatory defines them); civil twilight
 * is 6 degrees. Within a minute of printed tables below 66 degrees of latitude.
 */
export function sunTimes(day: string, zone: string, lat: number, lon: number): SunTimes {
  const from = localToUtc(day, '00:00', zone);
  const until = localToUtc(addDays(day, 1), '00:00', zone);
  const noon = localToUtc(day, '12:00', zone);
  const solarDays = [-1, 0, 1].map((n) => getTimes(new Date(noon + n * 86_400_000), lat, lon));
  const first = (name: 'sunrise' | 'sunset' | 'dawn' | 'dusk'): number | null => {
    const within = solarDays
      .map((times) => times[name]?.getTime())
      .filter((at): at is number => at !== undefined && at >= from && at < until);
    return within.length > 0 ? Math.min(...within) : null;
  };
  const rise = first('sunrise');
  const set = first('sunset');
  let polar: SunTimes['polar'] = 'none';
  if (rise === null && set === null)
    polar = sunPosition(noon, lat, lon).altitudeDeg > 0 ? 'up_all_day' : 'down_all_day';
  return { rise, set, civilDawn: first('dawn'), civilDusk: first('dusk'), polar };
}

/**
 * Sunrise and the sunset that follows it, of the daylight about the club's noon, to the whole minute as printed tables
 * give them. Both null where the sun does not rise or does not set. Near the poles the set may fall after midnight.
 */
export function daylight(day: string, place: Place): { rise: number; set: number } | null {
  const noon = localToUtc(day, '12:00', place.zone);
  const { sunrise, sunset } = getTimes(new Date(noon), place.lat, place.lon);
  if (!sunrise || !sunset) return null;
  return { rise: roundToMinute(sunrise.getTime()), set: roundToMinute(sunset.getTime()) };
}

/**
 * Where the sun stands at an instant: altitude in degrees as seen (refraction by a standard air added above the horizon),
 * azimuth in degrees clockwise from true north, [0, 360).
 */
export function sunPosition(at: number, lat: number, lon: number): { altitudeDeg: number; azimuthDeg: number } {
  const { altitude, azimuth } = getPosition(new Date(at), lat, lon);
  return { altitudeDeg: altitude, azimuthDeg: azimuth };
}
