import type { PlaceStep } from '../air/place-air';
import type { StabilityClass } from '../air/stability-types';
import { normalizeDeg } from '../angles';
import { arcContains } from '../arcs';
import type { Forecast, WeatherHour } from '../condition-types';
import type { Arc } from '../ground-types';
import type { ScoringSettings, SpeedPoint } from '../settings';
import { arcHold } from './arc-hold';
import { buildScenarios } from './scenarios';

const HOUR = 3_600_000;

/** An observation k hours old taken as the forecast of now, and what the wind did. */
export interface ForecastPair {
  at: number;
  leadHours: number;
  /** null: variable or calm. */
  forecastDeg: number | null;
  forecastMps: number;
  observedDeg: number;
}

export interface Pairs {
  pairs: ForecastPair[];
  /** Hours left out: no observation k hours before, or no direction now. */
  noForecast: number;
  noDirection: number;
}

/** Pairs each hour in [from, to) with the observation `leadHours` before. Hours without a direction cannot be scored. */
export function pairHours(hours: WeatherHour[], leadHours: number, from: number, to: number): Pairs {
  const byAt = new Map(hours.map((h) => [h.at, h]));
  const out: Pairs = { pairs: [], noForecast: 0, noDirection: 0 };
  for (const hour of hours) {
    if (hour.at < from || hour.at >= to) continue;
    const before = byAt.get(hour.at - leadHours * HOUR);
    if (!before || before.windSpeedMps === null) {
      out.noForecast++;
      continue;
    }
    if (hour.windFromDeg === null || !hour.windSpeedMps) {
      out.noDirection++;
      continue;
    }
    const calm = before.windSpeedMps === 0;
    out.pairs.push({
      at: hour.at,
      leadHours,
      forecastDeg: calm ? null : before.windFromDeg,
      forecastMps: before.windSpeedMps,
      observedDeg: hour.windFromDeg,
    });
  }
  return out;
}

export interface ReliabilityBin {
  from: number;
  to: number;
  count: number;
  /** Mean chance given, and share of times it came true. */
  given: number;
  came: number;
}

export interface Calibration {
  questions: number;
  bins: ReliabilityBin[];
  /** Mean squared error of the chances, and of always giving the arc's own share of all hours. */
  brier: number;
  climateBrier: number;
  /** Largest |given - came| over bins that hold at least 2 % of the questions, and the mean weighted by count. */
  worstGap: number;
  meanGap: number;
}

const STABILITY: StabilityClass = 'D';

function oneStep(pair: ForecastPair): PlaceStep {
  return {
    at: pair.at,
    kind: pair.forecastDeg === null ? (pair.forecastMps > 0 ? 'variable' : 'calm') : 'wind',
    fromDeg: pair.forecastDeg,
    speedMps: pair.forecastMps,
    variableShare: pair.forecastDeg === null ? 1 : 0,
    isNight: false,
    sunAltitudeDeg: 0,
    sunAzimuthDeg: 0,
    stability: STABILITY,
    gustMps: null,
    precipMm: null,
    tempC: null,
    cloudPercent: null,
    thunder: false,
  };
}

/** The 16 arcs of a width (degrees) centred on the compass points. */
export function sectorArcs(widthDeg: number): Arc[] {
  return Array.from({ length: 16 }, (_, i) => ({
    fromDeg: normalizeDeg(22.5 * i - widthDeg / 2),
    toDeg: normalizeDeg(22.5 * i + widthDeg / 2),
  }));
}

/**
 * Arc hold as the product computes it, for every pair and each of 16 sectors of a width, against what the wind did. Air is
 * taken as neutral, since the observations hold no cloud.
 */
export function calibrate(pairs: ForecastPair[], widthDeg: number, settings: ScoringSettings): Calibration {
  const arcs = sectorArcs(widthDeg);
  const climate = arcs.map(
    (arc) => pairs.filter((p) => arcContains(arc, p.observedDeg)).length / Math.max(1, pairs.length),
  );
  const bins = Array.from({ length: 10 }, () => ({ count: 0, given: 0, came: 0 }));
  let brier = 0;
  let climateBrier = 0;
  for (const pair of pairs) {
    const forecast: Forecast = {
      issuedAt: pair.at - pair.leadHours * HOUR,
      fetchedAt: 0,
      source: '',
      hours: [],
      members: [],
    };
    const set = buildScenarios([oneStep(pair)], forecast, settings);
    arcs.forEach((arc, i) => {
      const p = arcHold(set, [arc]).byStep[0] ?? 0;
      const came = arcContains(arc, pair.observedDeg) ? 1 : 0;
      const bin = bins[Math.min(9, Math.floor(p * 10))];
      if (bin) {
        bin.count++;
        bin.given += p;
        bin.came += came;
      }
      brier += (p - came) ** 2;
      climateBrier += ((climate[i] ?? 0) - came) ** 2;
    });
  }
  return summarize(bins, brier, climateBrier);
}

function summarize(
  raw: { count: number; given: number; came: number }[],
  brier: number,
  climateBrier: number,
): Calibration {
  const questions = raw.reduce((n, b) => n + b.count, 0);
  const bins = raw.map((b, i) => ({
    from: i / 10,
    to: (i + 1) / 10,
    count: b.count,
    given: b.count > 0 ? b.given / b.count : 0,
    came: b.count > 0 ? b.came / b.count : 0,
  }));
  const n = Math.max(1, questions);
  const gap = (b: ReliabilityBin): number => Math.abs(b.given - b.came);
  return {
    questions,
    bins,
    brier: brier / n,
    climateBrier: climateBrier / n,
    worstGap: Math.max(0, ...bins.filter((b) => b.count >= 0.02 * n).map(gap)),
    meanGap: bins.reduce((sum, b) => sum + (gap(b) * b.count) / n, 0),
  };
}

export interface Tuned {
  settings: ScoringSettings;
  /** What the spread by speed was multiplied by (180 at most), and the share of forecasts wrong altogether. */
  scale: number;
  strayShare: number;
  brier: number;
}

const SCALES = [0.6, 0.8, 1, 1.2, 1.4, 1.6, 1.8, 2, 2.3, 2.6];
const STRAYS = [0, 0.05, 0.1, 0.15, 0.2, 0.3, 0.4, 0.5, 0.6];

/** The error model with its spread scaled and a share of stray forecasts. */
export function withErrorModel(base: ScoringSettings, scale: number, strayShare: number): ScoringSettings {
  const errorBySpeed: SpeedPoint[] = base.wind.errorBySpeed.map(({ speedMps, deg }) => ({
    speedMps,
    deg: Math.min(180, deg * scale),
  }));
  return { ...base, wind: { ...base.wind, errorBySpeed, errorCapDeg: 180, strayShare } };
}

/** Least Brier score over a grid of scale and stray share, summed over the widths. */
export function tuneErrorModel(pairs: ForecastPair[], widths: number[], base: ScoringSettings): Tuned {
  let best: Tuned | null = null;
  for (const scale of SCALES) {
    for (const strayShare of STRAYS) {
      const settings = withErrorModel(base, scale, strayShare);
      const brier =
        widths.reduce((sum, w) => sum + calibrate(pairs, w, settings).brier, 0) / Math.max(1, widths.length);
      if (best === null || brier < best.brier) best = { settings, scale, strayShare, brier };
    }
  }
  return best ?? { settings: base, scale: 1, strayShare: base.wind.strayShare, brier: 0 };
}
