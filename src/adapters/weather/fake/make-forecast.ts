import { normalizeDeg } from '@/core/angles';
import { cellOf } from './fronts';
import { type MadeWeather, makeWeather } from './make-weather';
import { noise2 } from './noise';

const HOUR = 3_600_000;
/** Model runs start at 00, 06, 12 and 18 UTC. */
const RUN_MS = 6 * HOUR;
export const MEMBER_COUNT = 20;

/** The last run that a service would have out. */
export function latestRun(now: number): number {
  return Math.floor(now / RUN_MS) * RUN_MS;
}

/**
 * What a forecast made at `issuedAt` says of an instant: the made weather with fronts early or late and the wind turned,
 * by errors that are nothing at lead zero, grow with lead, are larger in light wind, and drift slowly from run to run.
 * Member 0 is the forecast itself; members 1 and up scatter about it.
 */
export function makeForecast(
  place: { lat: number; lon: number },
  issuedAt: number,
  at: number,
  member = 0,
): MadeWeather {
  const leadH = Math.max(0, (at - issuedAt) / HOUR);
  if (leadH === 0) return makeWeather(place, at);
  const cell = cellOf(place);
  const run = issuedAt / HOUR / 24;
  const valid = at / HOUR;
  const error = (everyH: number, salt: number) => {
    const shared = noise2(valid / everyH, run, cell, salt, 0);
    return member === 0 ? shared : shared + 1.3 * noise2(valid / everyH, run, cell, salt, member);
  };
  const days = leadH / 24;
  const lateH = 1.6 * days * error(36, 41);
  const made = makeWeather(place, at, lateH);
  const light = 1 + 2.2 * Math.exp(-made.windSpeedMps / 2);
  const turned = (6 * Math.sqrt(days) + 4 * days) * light * error(14, 42);
  const factor = Math.exp(Math.min(0.5, 0.1 * Math.sqrt(days)) * error(14, 43));
  return {
    ...made,
    windFromDeg: normalizeDeg(made.windFromDeg + turned),
    windSpeedMps: made.windSpeedMps * factor,
    gustMps: made.gustMps * factor,
    tempC: made.tempC + 0.5 * days * error(24, 44),
  };
}
