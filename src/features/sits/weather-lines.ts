import { meanWind } from '@/core/circular';
import type { Forecast, WeatherHour } from '@/core/condition-types';
import { sectorName } from '@/core/sectors';
import { formatPressure, formatRain, formatSpeed, formatTemp, type Units } from '@/core/units';
import type { WeatherView } from './view-types';
import { WEATHER_WORDS as WORDS } from './words/reads';

const HOUR_MS = 3_600_000;
/** Under this an hour's rain only wets the leaves. */
const TRACE_MM = 0.1;
/** Change over a sit that a barometer is said to rise or fall by, hPa (our choice). */
const STEADY_HPA = 1;

function given(hours: WeatherHour[], pick: (hour: WeatherHour) => number | null): number[] {
  return hours.map(pick).filter((value): value is number => value !== null);
}

/** Two figures of one unit: '6-10 mph', or '6 mph' when they read the same. */
function range(values: number[], format: (value: number) => string): string {
  const [low, high] = [format(Math.min(...values)), format(Math.max(...values))];
  if (low === high) return high;
  return `${low.replace(/ .*$/, '')}${low.startsWith('-') ? WORDS.to : '–'}${high}`;
}

function windLine(hours: WeatherHour[], units: Units): string {
  const speeds = given(hours, (hour) => hour.windSpeedMps);
  if (speeds.length === 0) return WORDS.noWind;
  const speed = range(speeds, (value) => formatSpeed(value, units));
  const winds = hours.flatMap(({ windFromDeg, windSpeedMps }) =>
    windFromDeg === null || !windSpeedMps ? [] : [{ fromDeg: windFromDeg, speed: windSpeedMps }],
  );
  const mean = meanWind(winds);
  const typical = speeds.reduce((sum, value) => sum + value, 0) / speeds.length;
  // Winds that cancel out, or hours without a direction, leave no direction to name.
  const settled = mean.fromDeg !== null && mean.speed * winds.length > 0.4 * typical * hours.length;
  const gust = Math.max(0, ...given(hours, (hour) => hour.gustMps));
  const gusts = gust > Math.max(...speeds) ? WORDS.gusts(formatSpeed(gust, units)) : '';
  if (Math.max(...speeds) < 0.5) return WORDS.calm(gusts);
  return WORDS.wind(settled && mean.fromDeg !== null ? sectorName(mean.fromDeg) : WORDS.variable, speed, gusts);
}

function airLine(hours: WeatherHour[], units: Units): string {
  const temps = given(hours, (hour) => hour.tempC);
  const rain = given(hours, (hour) => hour.precipMm).reduce((sum, mm) => sum + mm, 0);
  const parts = [
    temps.length > 0 ? range(temps, (value) => formatTemp(value, units)) : null,
    rain >= TRACE_MM ? WORDS.rain(formatRain(rain, units)) : WORDS.dry,
    hours.some((hour) => hour.thunder) ? WORDS.thunder : null,
  ];
  return parts.filter((part) => part !== null).join(', ');
}

function barometerLine(hours: WeatherHour[], units: Units): string | null {
  const values = given(hours, (hour) => hour.pressureHpa);
  const [first, last] = [values[0], values.at(-1)];
  if (first === undefined || last === undefined) return null;
  const change = last - first;
  const trend = Math.abs(change) < STEADY_HPA ? WORDS.steady : change > 0 ? WORDS.rising : WORDS.falling;
  return WORDS.barometer(formatPressure(last, units), trend);
}

/** The open weather of a span at the club; null when the forecast holds no hour of it. */
export function weatherLines(
  forecast: Forecast | null,
  span: { startAt: number; endAt: number },
  units: Units,
): WeatherView | null {
  const hours = (forecast?.hours ?? []).filter(
    (hour) => hour.at > span.startAt - HOUR_MS && hour.at < span.endAt && hour.windSpeedMps !== null,
  );
  if (hours.length === 0) return null;
  return { wind: windLine(hours, units), air: airLine(hours, units), barometer: barometerLine(hours, units) };
}
