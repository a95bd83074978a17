import type { Forecast, WeatherHour } from '../condition-types';
import type { AirSettings } from '../settings';
import { sunPosition } from '../sun';
import { hoursAround, stepStarts, usableWinds, type WindAt, windAt } from './interpolate';
import { isStabilityNight } from './night-rule';
import { stabilityOf } from './stability';
import type { StabilityClass } from './stability-types';

/** One step of the window at the club's place, before any stand: 10 m wind over open ground. */
export interface PlaceStep extends WindAt {
  /** Start of the step. Everything is taken at its middle. */
  at: number;
  /** By the stability night rule: an hour before sunset to an hour after sunrise. */
  isNight: boolean;
  sunAltitudeDeg: number;
  sunAzimuthDeg: number;
  stability: StabilityClass;
  gustMps: number | null;
  /** Of the hour, mm. */
  precipMm: number | null;
  tempC: number | null;
  cloudPercent: number | null;
  thunder: boolean;
}

export interface PlaceAirInput {
  lat: number;
  lon: number;
  startAt: number;
  endAt: number;
  forecast: Forecast | null;
}

const finite = (x: number | null | undefined): number | null =>
  typeof x === 'number' && Number.isFinite(x) ? x : null;

function mixed(a: number | null, b: number | null, share: number): number | null {
  const [from, to] = [finite(a), finite(b)];
  if (from === null || to === null) return from ?? to;
  return from + (to - from) * share;
}

const NO_WEATHER = {
  gustMps: null,
  precipMm: null,
  tempC: null,
  cloudPercent: null,
  radiationWm2: null,
  thunder: false,
};

function weatherAt(hours: WeatherHour[], at: number, s: AirSettings) {
  const around = hoursAround(hours, at, s.maxGapHours);
  const a = around ? hours[around.before] : undefined;
  const b = around ? hours[around.after] : undefined;
  if (!around || !a || !b) return NO_WEATHER;
  const near = around.share < 0.5 ? a : b;
  return {
    gustMps: mixed(a.gustMps, b.gustMps, around.share),
    precipMm: finite(near.precipMm) ?? finite(around.share < 0.5 ? b.precipMm : a.precipMm),
    tempC: mixed(a.tempC, b.tempC, around.share),
    cloudPercent: mixed(a.cloudPercent, b.cloudPercent, around.share),
    radiationWm2: mixed(a.radiationWm2, b.radiationWm2, around.share),
    thunder: a.thunder || b.thunder,
  };
}

/**
 * Steps that cover [startAt, endAt) at the club's place, shared by all stands: wind interpolated as vectors, sun, night rule
 * and stability. Hours may be out of order or missing; a step with no usable wind near it has kind 'missing'.
 */
export function placeAir({ lat, lon, startAt, endAt, forecast }: PlaceAirInput, s: AirSettings): PlaceStep[] {
  const hours = (forecast?.hours ?? []).filter((h) => Number.isFinite(h.at)).sort((a, b) => a.at - b.at);
  const winds = usableWinds(hours);
  const altitudeAt = (at: number): number => sunPosition(at, lat, lon).altitudeDeg;
  return stepStarts(startAt, endAt, s.stepMinutes).map((at) => {
    const middle = at + s.stepMinutes * 30_000;
    const wind = windAt(winds, middle, s);
    const { radiationWm2, ...weather } = weatherAt(hours, middle, s);
    const sun = sunPosition(middle, lat, lon);
    const isNight = isStabilityNight(middle, altitudeAt);
    const stability = stabilityOf({
      isNight,
      sunAltitudeDeg: sun.altitudeDeg,
      speedMps: wind.speedMps ?? 3,
      cloudPercent: weather.cloudPercent ?? s.cloudWhenUnknownPercent,
      radiationWm2,
    });
    return {
      ...wind,
      ...weather,
      at,
      isNight,
      sunAltitudeDeg: sun.altitudeDeg,
      sunAzimuthDeg: sun.azimuthDeg,
      stability,
    };
  });
}
