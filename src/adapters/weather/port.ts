import type { Forecast } from '@/core/condition-types';

export interface WeatherPlace {
  lat: number;
  lon: number;
}

/** YYYY-MM-DD. */
export interface PastDays {
  fromDay: string;
  toDay: string;
}

export type WeatherFailure = {
  ok: false;
  /** unavailable: no answer; bad_answer: an answer that cannot be used; limit: asked too often. */
  reason: 'unavailable' | 'bad_answer' | 'limit';
  /** Plain words for people; holds no key and no address. */
  message: string;
};

export type WeatherResult = { ok: true; forecast: Forecast } | WeatherFailure;

/** Where forecasts come from. An answer from it was checked; it never throws. */
export interface WeatherPort {
  /** The setting that chose it: fake, hosted or replay:FILE. */
  readonly source: string;
  forecast(place: WeatherPlace, signal?: AbortSignal): Promise<WeatherResult>;
  /** The hours of past days, both inside, UTC: as an answer that is no forecast and has no members. A replay gives its whole file. */
  history(place: WeatherPlace, days: PastDays, signal?: AbortSignal): Promise<WeatherResult>;
}

export function weatherFailure(reason: WeatherFailure['reason'], message: string): WeatherFailure {
  return { ok: false, reason, message };
}
