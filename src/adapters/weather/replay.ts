import { readFile } from 'node:fs/promises';
import type { Forecast, WeatherHour } from '@/core/condition-types';
import { type WeatherPort, weatherFailure } from './port';
import { parseReplayCsv } from './replay-csv';
import { REPLAY_FAULTS, WEATHER_LABELS } from './words';

export interface ReplayOptions {
  file: string;
  /** The instant at which the hours count as having been forecast; the lead of each hour is taken from it. */
  issuedAt: () => number;
  /** Hours kept, both ends included; none given keeps all. */
  fromAt?: number | undefined;
  toAt?: number | undefined;
}

/** Observed hours played as the forecast that somebody might have had at `issuedAt`. No members: it is one course of the wind. */
export function replayForecast(
  hours: WeatherHour[],
  play: { issuedAt: number; label: string; fromAt?: number | undefined; toAt?: number | undefined },
): Forecast {
  const fromAt = play.fromAt ?? Number.NEGATIVE_INFINITY;
  const toAt = play.toAt ?? Number.POSITIVE_INFINITY;
  return {
    issuedAt: play.issuedAt,
    fetchedAt: play.issuedAt,
    source: play.label,
    hours: hours.filter((hour) => hour.at >= fromAt && hour.at <= toAt),
    members: [],
  };
}

/** A file of hourly observations in place of a weather service: the same hours at every place. */
export function makeReplayWeather(options: ReplayOptions): WeatherPort {
  const play: WeatherPort['forecast'] = async (_place, signal) => {
    let text: string;
    try {
      text = await readFile(options.file, { encoding: 'utf8', ...(signal ? { signal } : {}) });
    } catch {
      return weatherFailure('unavailable', REPLAY_FAULTS.unreadable(options.file));
    }
    const { hours, problems } = parseReplayCsv(text);
    if (hours.length === 0) {
      return weatherFailure('bad_answer', REPLAY_FAULTS.noHours(options.file, problems[0]));
    }
    const { fromAt, toAt } = options;
    const label = WEATHER_LABELS.replay(options.file.split(/[\\/]/).at(-1) ?? '');
    return { ok: true, forecast: replayForecast(hours, { issuedAt: options.issuedAt(), label, fromAt, toAt }) };
  };
  return {
    source: `replay:${options.file}`,
    forecast: play,
    history: (place, _days, signal) => play(place, signal),
  };
}
