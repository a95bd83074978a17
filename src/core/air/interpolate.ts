import { windFromVector, windVector } from '../angles';
import type { AirSettings } from '../settings';

const HOUR = 3_600_000;
const MINUTE = 60_000;
/** No wind on land has been measured above 120 m/s: more is a bad value. */
const MOST_MPS = 120;

export interface WindHour {
  at: number;
  windFromDeg: number | null;
  windSpeedMps: number | null;
}

export interface WindAt {
  kind: 'wind' | 'variable' | 'calm' | 'missing';
  /** null unless kind is 'wind'. */
  fromDeg: number | null;
  /** 10 m wind, m/s; null when missing. */
  speedMps: number | null;
  /** Share of the moment that belongs to an hour of variable direction, 0-1. */
  variableShare: number;
}

export interface Between {
  before: number;
  after: number;
  /** Share of the hour after, 0-1. */
  share: number;
}

const MISSING: WindAt = { kind: 'missing', fromDeg: null, speedMps: null, variableShare: 0 };

/** Starts of the steps that cover [startAt, endAt); none when the window is empty or not finite. At most 200. */
export function stepStarts(startAt: number, endAt: number, stepMinutes: number): number[] {
  const starts: number[] = [];
  if (!Number.isFinite(startAt) || !Number.isFinite(endAt) || !(stepMinutes >= 1)) return starts;
  for (let at = startAt; at < endAt && starts.length < 200; at += stepMinutes * MINUTE) starts.push(at);
  return starts;
}

/** Indices of the hours around an instant, hours sorted by `at`; null when the gap is too long or the instant outside. */
export function hoursAround(hours: { at: number }[], at: number, maxGapHours: number): Between | null {
  let low = 0;
  let high = hours.length - 1;
  while (low <= high) {
    const mid = (low + high) >> 1;
    if ((hours[mid]?.at ?? 0) <= at) low = mid + 1;
    else high = mid - 1;
  }
  const before = hours[high];
  const after = hours[low];
  if (before && after) {
    const gap = after.at - before.at;
    return gap > maxGapHours * HOUR ? null : { before: high, after: low, share: gap > 0 ? (at - before.at) / gap : 0 };
  }
  // The first and last hours also speak for the half hour outside them.
  if (before && at - before.at <= HOUR / 2) return { before: high, after: high, share: 0 };
  if (after && after.at - at <= HOUR / 2) return { before: low, after: low, share: 0 };
  return null;
}

const usable = (h: WindHour | undefined): h is WindHour & { windSpeedMps: number } =>
  h !== undefined && h.windSpeedMps !== null && h.windSpeedMps >= 0 && h.windSpeedMps <= MOST_MPS;

/** Hours whose wind can be used, in order of time. */
export function usableWinds<H extends WindHour>(hours: H[]): H[] {
  return hours.filter((h) => Number.isFinite(h.at) && usable(h)).sort((a, b) => a.at - b.at);
}

/**
 * Wind at an instant between two hours (`hours` from usableWinds): direction from the mean of the two vectors, never of the
 * two angles; speed from the two speeds, since a shifting wind still carries scent. Opposed hours leave it variable.
 */
export function windAt(hours: WindHour[], at: number, s: AirSettings): WindAt {
  const around = hoursAround(hours, at, s.maxGapHours);
  const a = around ? hours[around.before] : undefined;
  const b = around ? hours[around.after] : undefined;
  if (!around || !usable(a) || !usable(b)) return MISSING;
  const parts = [
    { hour: a, share: 1 - around.share },
    { hour: b, share: around.share },
  ];
  let east = 0;
  let north = 0;
  let speedMps = 0;
  let variableShare = 0;
  let directed = 0;
  for (const { hour, share } of parts) {
    speedMps += hour.windSpeedMps * share;
    if (hour.windSpeedMps === 0) continue;
    const deg = hour.windFromDeg;
    if (deg === null || !Number.isFinite(deg)) {
      variableShare += share;
      continue;
    }
    const v = windVector(deg, hour.windSpeedMps * share);
    east += v.east;
    north += v.north;
    directed += hour.windSpeedMps * share;
  }
  if (speedMps < s.calmMps) return { kind: 'calm', fromDeg: null, speedMps, variableShare };
  const mean = windFromVector(east, north);
  const cancelled = mean.speed < s.cancelShare * directed;
  if (mean.fromDeg === null || cancelled || variableShare > 0.5) {
    return { kind: 'variable', fromDeg: null, speedMps, variableShare: 1 };
  }
  return { kind: 'wind', fromDeg: mean.fromDeg, speedMps, variableShare };
}
