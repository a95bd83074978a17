import { getPosition } from 'suncalc';
import { normalizeDeg, toRad } from '@/core/angles';
import { cellOf, synopticAt } from './fronts';
import { noise, smoothStep } from './noise';

const HOUR = 3_600_000;
const DAY = 24 * HOUR;

export interface MadeWeather {
  windFromDeg: number;
  windSpeedMps: number;
  gustMps: number;
  tempC: number;
  pressureHpa: number;
  precipMm: number;
  cloudPercent: number;
  radiationWm2: number;
  /** WMO code table 4677, as weather services give it: 95 and above is thunder. */
  weatherCode: number;
}

/**
 * Invented weather at an instant: a function of the place and the instant alone, so any two requests agree where they
 * overlap. Fronts every 3-6 days, a wind that goes round with them, calm clear dawns between, rain and some thunder.
 * `lateH` lets a forecast have its fronts late (above 0) or early; the sun keeps its own time.
 */
export function makeWeather(place: { lat: number; lon: number }, at: number, lateH = 0): MadeWeather {
  const cell = cellOf(place);
  const air = synopticAt(cell, at - lateH * HOUR);
  const hours = at / HOUR;
  const sunDeg = getPosition(new Date(at), place.lat, place.lon).altitude;

  const nearFront = Math.max(
    smoothStep(1 - air.untilH / 20) * (0.6 + 0.4 * air.next.wetness),
    smoothStep(1 - air.sinceH / 9) * (0.6 + 0.4 * air.last.wetness),
  );
  const cloud = clamp(
    0.08 + 0.95 * nearFront + 0.35 * noise(hours / 7, cell, 21) + 0.15 * noise(hours / 2, cell, 22),
    0,
    1,
  );

  // By day the sun mixes the wind down; on a clear night under a weak gradient the ground air lies still.
  const mixing = smoothStep((sunDeg + 2) / 22);
  const stillness = (1 - mixing) * (1 - 0.75 * cloud) * smoothStep((6.5 - air.gradientMps) / 4);
  const swing = 0.22 * noise(hours / 3, cell, 23);
  const speed = Math.max(0, air.gradientMps * (0.72 + 0.28 * mixing) * (1 - 0.97 * stillness) * (1 + swing) - 0.12);

  const unsteady = 8 + 40 / (1 + speed);
  const windFromDeg = normalizeDeg(
    air.turnedDeg + unsteady * noise(hours / 4, cell, 24) + 0.4 * unsteady * noise(hours / 1.5, cell, 25),
  );

  const atFront = Math.max(smoothStep(1 - air.untilH / 3), smoothStep(1 - air.sinceH / 4));
  const gust = speed * (1.3 + 0.35 * mixing + 0.3 * atFront + 0.12 * noise(hours / 2, cell, 26));

  const rainShape = Math.max(
    smoothStep(1 - air.untilH / 6) * air.next.wetness,
    smoothStep(1 - air.sinceH / 3) * air.last.wetness,
  );
  const rain = Math.max(0, 7 * rainShape * (0.8 + 0.6 * noise(hours / 1.5, cell, 27)) - 0.4);
  const tempC = temperature(place, at, cell, cloud, air.sinceH, air.untilH);
  const stormy = (air.untilH < 2.5 && air.next.stormy) || (air.sinceH < 1.5 && air.last.stormy);
  const clearSky = sunDeg > 0 ? 910 * Math.sin(toRad(sunDeg)) - 30 : 0;

  return {
    windFromDeg,
    windSpeedMps: speed,
    gustMps: Math.max(speed, gust),
    tempC,
    pressureHpa:
      1012 +
      11 * Math.sin(Math.PI * air.phase) -
      7 * smoothStep(1 - Math.min(air.sinceH, air.untilH) / 14) +
      2 * noise(hours / 30, cell, 28),
    precipMm: rain,
    cloudPercent: 100 * cloud,
    // Kasten and Czeplak (1980): clear-sky radiation and its loss by cloud.
    radiationWm2: Math.max(0, clearSky * (1 - 0.75 * cloud ** 3.4)),
    weatherCode: codeFor(cloud, rain, tempC, stormy && rain > 0.3 && tempC > 8),
  };
}

function temperature(
  place: { lat: number; lon: number },
  at: number,
  cell: number,
  cloud: number,
  sinceH: number,
  untilH: number,
): number {
  const ofYear = 2 * Math.PI * ((at / DAY - 19) / 365.2425);
  const north = place.lat >= 0 ? 1 : -1;
  const distance = Math.abs(place.lat);
  const season = 27 - 0.45 * distance - north * (distance / 40) * 12 * Math.cos(ofYear);
  const solarHour = (at % DAY) / HOUR + place.lon / 15;
  const daily = 6 * (1 - 0.65 * cloud) * Math.cos((2 * Math.PI * (solarHour - 15)) / 24);
  const masses = 4 * smoothStep(1 - untilH / 40) - 5 * smoothStep(1 - (sinceH - 3) / 40) * smoothStep(sinceH / 4);
  return season + daily + masses + 1.2 * noise(at / HOUR / 16, cell, 31);
}

function codeFor(cloud: number, rainMm: number, tempC: number, thunder: boolean): number {
  if (thunder) return 95;
  if (rainMm >= 0.1) {
    const strength = rainMm < 2.5 ? 0 : rainMm < 7.6 ? 1 : 2;
    return (tempC < 0.5 ? 71 : 61) + 2 * strength;
  }
  return cloud < 0.15 ? 0 : cloud < 0.4 ? 1 : cloud < 0.8 ? 2 : 3;
}

function clamp(value: number, least: number, most: number): number {
  return Math.min(most, Math.max(least, value));
}
