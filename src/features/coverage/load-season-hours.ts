import type { WeatherPort } from '@/adapters/weather/port';
import { huntingYear } from '@/core/booking/hunting-year';
import type { WeatherHour } from '@/core/condition-types';
import { addDays, dayOf } from '@/core/day-time';
import { getForecast } from '@/features/weather/get-forecast';
import { currentWeather, refreshForecast } from '@/features/weather/refresh-forecast';
import type { ClubScope } from '@/server/scope';
import { COVERAGE_WORDS } from './words';

export interface SeasonHours {
  hours: WeatherHour[];
  source: string;
  /** Days the hours are of, by the club's clock; null: there are none. */
  fromDay: string | null;
  toDay: string | null;
  /** Why there are none, for people. */
  error: string | null;
}

/** The months hunted, of the last season that is wholly past. */
const FIRST = '-09-01';
const LAST = '-01-31';

/** The last season that lies wholly before a day: 1 September to 31 January. */
export function pastSeason(today: string): { fromDay: string; toDay: string } {
  const year = Number(huntingYear(addDays(huntingYear(today).fromDay, -1)).fromDay.slice(0, 4));
  return { fromDay: `${year}${FIRST}`, toDay: `${year + 1}${LAST}` };
}

/**
 * A season of past hours at the club: a replay's whole file, else the weather archive's, which is asked once and kept as
 * forecasts are, with the same leases and waits.
 */
export async function loadSeasonHours(
  scope: ClubScope,
  now: number,
  weather: WeatherPort = currentWeather(),
): Promise<SeasonHours> {
  const { lat, lon, zone } = scope.club;
  const days = pastSeason(dayOf(now, zone));
  const source = COVERAGE_WORDS.past(weather.source, days.fromDay);
  const port: WeatherPort = {
    ...weather,
    source,
    // A day more: the club's last day ends after the day of UTC does.
    forecast: (place, signal) => weather.history(place, { ...days, toDay: addDays(days.toDay, 1) }, signal),
  };
  let kept = await getForecast({ lat, lon }, now, source);
  if (!kept.forecast) {
    await refreshForecast({ lat, lon }, now, port);
    kept = await getForecast({ lat, lon }, now, source);
  }
  const whole = weather.source.startsWith('replay:');
  const hours = (kept.forecast?.hours ?? []).filter((hour) => {
    const day = dayOf(hour.at, zone);
    return whole || (day >= days.fromDay && day <= days.toDay);
  });
  const dated = hours.map((hour) => hour.at).sort((a, b) => a - b);
  const [first, last] = [dated[0], dated.at(-1)];
  return {
    hours,
    source: kept.forecast?.source ?? weather.source,
    fromDay: first === undefined ? null : dayOf(first, zone),
    toDay: last === undefined ? null : dayOf(last, zone),
    error: hours.length > 0 ? null : (kept.error ?? COVERAGE_WORDS.fetching),
  };
}
