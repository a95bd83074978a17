import type { Forecast } from '@/core/condition-types';
import { sectorName } from '@/core/sectors';
import { formatRain, formatSpeed, formatTemp, type Units } from '@/core/units';
import { GATE_WIND_WORDS } from '../words/gate-sheet';

export interface HourWind {
  at: number;
  fromDeg: number | null;
  speedMps: number;
  /** 'NW 8 mph', 'calm', 'variable 4 mph' */
  wind: string;
  gust: string;
  temp: string;
  rain: string;
}

/** Under this the air counts as still: the lowest force of the WMO scale. */
const CALM_MPS = 0.3;
const TRACE_MM = 0.1;

function windWords(fromDeg: number | null, speedMps: number, units: Units): string {
  if (speedMps < CALM_MPS) return GATE_WIND_WORDS.calm;
  return GATE_WIND_WORDS.windOf(
    fromDeg === null ? GATE_WIND_WORDS.variable : sectorName(fromDeg),
    formatSpeed(speedMps, units),
  );
}

/** The forecast's hours of a span that give a wind, in words. */
export function hourWinds(
  forecast: Forecast | null,
  span: { startAt: number; endAt: number },
  units: Units,
): HourWind[] {
  return (forecast?.hours ?? []).flatMap((hour) => {
    const { at, windFromDeg: fromDeg, windSpeedMps: speedMps, gustMps, tempC, precipMm } = hour;
    if (at < span.startAt || at > span.endAt || speedMps === null) return [];
    return [
      {
        at,
        fromDeg: speedMps < CALM_MPS ? null : fromDeg,
        speedMps: speedMps < CALM_MPS ? 0 : speedMps,
        wind: windWords(fromDeg, speedMps, units),
        gust: gustMps === null ? '' : formatSpeed(gustMps, units),
        temp: tempC === null ? '' : formatTemp(tempC, units),
        rain: precipMm !== null && precipMm >= TRACE_MM ? formatRain(precipMm, units) : '–',
      },
    ];
  });
}
