import { dayOf, daysBetween } from '@/core/day-time';
import { type Hindcast, hindcast } from '@/core/hindcast';
import { DEFAULT_SETTINGS } from '@/core/settings';
import { sitWindow, windowsFrom } from '@/core/windows';
import { loadGround } from '@/features/ground/data';
import { groundToCore } from '@/features/ground/to-core';
import { currentWeather } from '@/features/weather/refresh-forecast';
import { AppError } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { forecastFrom, loadForecast } from './load-forecast';
import { ASK_ERRORS } from './words/reads';

export interface HindcastView {
  source: string;
  fromDay: string;
  toDay: string;
  hindcast: Hindcast;
}

/** The hours a club can look back on: a replay's whole file, else what the kept forecast holds. */
async function loadHours(scope: ClubScope, now: number, weather = currentWeather()) {
  const kept = weather.source.startsWith('replay:')
    ? await forecastFrom(weather, scope)
    : await loadForecast(scope, now);
  if (!kept.forecast || kept.forecast.hours.length === 0) {
    throw new AppError('unavailable', kept.error ?? ASK_ERRORS.noHours);
  }
  return kept.forecast;
}

/** On what share of windows each stand could have been sat, and which winds no stand covers. */
export async function readHindcast(scope: ClubScope, now: number, weather = currentWeather()): Promise<HindcastView> {
  const { club } = scope;
  const { hours, source } = await loadHours(scope, now, weather);
  const days = hours.map((hour) => dayOf(hour.at, club.zone)).sort();
  const [fromDay, toDay] = [days[0] ?? '', days.at(-1) ?? ''];
  const first = sitWindow(fromDay, 'morning', club.rules, club);
  const windows = windowsFrom(first, 2 * (daysBetween(fromDay, toDay) + 1), club.rules, club);
  const { stands } = groundToCore(club, await loadGround(scope));
  const place = { lat: club.lat, lon: club.lon, zone: club.zone };
  return { source, fromDay, toDay, hindcast: hindcast({ place, stands, hours, windows, settings: DEFAULT_SETTINGS }) };
}
