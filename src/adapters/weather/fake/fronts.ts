import { hashSigned, hashUnit, noise, smoothStep } from './noise';

const HOUR = 3_600_000;
/** Fronts pass once in each slot, so 3 to 6 days apart: a usual autumn in the middle latitudes. */
export const FRONT_SLOT_H = 108;
const FRONT_JITTER_H = 18;
/** Half the time in which the wind goes round at a front. */
const FRONT_HALF_WIDTH_H = 1.5;

export interface Front {
  index: number;
  at: number;
  /** 0 (dry) to 1 (soaking). */
  wetness: number;
  /** Thunder comes with it when the air is warm enough. */
  stormy: boolean;
  /** Wind before and after it. */
  fromBeforeDeg: number;
  fromAfterDeg: number;
  strength: number;
}

export interface Synoptic {
  /** Not wrapped: grows for ever, by one turn of the compass a front. */
  turnedDeg: number;
  /** Wind that the pressure field alone would give at 10 m, m/s. */
  gradientMps: number;
  /** Hours since the last front and until the next. */
  sinceH: number;
  untilH: number;
  /** 0 just after a front to 1 at the next. */
  phase: number;
  last: Front;
  next: Front;
}

/** The weather cell a place lies in: neighbours 25 km apart share their weather. */
export function cellOf(place: { lat: number; lon: number }): number {
  return Math.round(place.lat * 4) * 4000 + Math.round(place.lon * 4);
}

export function frontAt(cell: number, index: number): Front {
  return {
    index,
    at: (index * FRONT_SLOT_H + FRONT_JITTER_H * hashSigned(cell, index, 1)) * HOUR,
    wetness: smoothStep(hashUnit(cell, index, 2) * 1.3),
    stormy: hashUnit(cell, index, 3) < 0.4,
    fromBeforeDeg: 210 + 20 * hashSigned(cell, index, 4),
    fromAfterDeg: 315 + 20 * hashSigned(cell, index, 5),
    strength: 0.75 + 0.5 * hashUnit(cell, index, 6),
  };
}

/** Large-scale weather: the wind backs and veers a little but over a front's cycle goes once round with the sun. */
export function synopticAt(cell: number, at: number): Synoptic {
  let index = Math.floor(at / HOUR / FRONT_SLOT_H) - 1;
  while (frontAt(cell, index + 1).at <= at) index++;
  const last = frontAt(cell, index);
  const next = frontAt(cell, index + 1);
  const sinceH = (at - last.at) / HOUR;
  const untilH = (next.at - at) / HOUR;
  const phase = sinceH / (sinceH + untilH);

  // North-west after the front, through north and east under the high, to south-west before the next.
  const start = 360 * last.index + last.fromAfterDeg;
  const end = 360 * next.index + next.fromBeforeDeg;
  const slow = start + (end - start) * (0.35 * phase + 0.65 * smoothStep((phase - 0.1) / 0.8));
  const startGap = last.fromAfterDeg - last.fromBeforeDeg;
  const endGap = next.fromAfterDeg - next.fromBeforeDeg;
  const turnAtLast = startGap * (0.5 - 0.5 * smoothStep(sinceH / FRONT_HALF_WIDTH_H));
  const turnAtNext = endGap * (0.5 - 0.5 * smoothStep(untilH / FRONT_HALF_WIDTH_H));

  const behind = last.strength * 6.5 * Math.exp(-sinceH / 26);
  const ahead = next.strength * 7 * Math.exp(-untilH / 20);
  const breathing = 0.7 * noise(at / HOUR / 9, cell, 11);
  return {
    turnedDeg: slow - turnAtLast + turnAtNext,
    gradientMps: Math.max(0.4, 1.8 + behind + ahead + breathing),
    sinceH,
    untilH,
    phase,
    last,
    next,
  };
}
