import { stepStarts } from './air/interpolate';
import { type PlaceStep, placeAir } from './air/place-air';
import { type StabilityClass, stabilityIndex } from './air/stability-types';
import { type AirStep, standAir } from './air/stand-air';
import { WALK_BINS, type WalkWind } from './approach/walk-chance';
import type { Forecast, SitWindow } from './condition-types';
import type { ScoredStand } from './ground-types';
import type { ScoringSettings } from './settings';
import type { Place } from './sun';
import { type DirectionSummary, directionSummary, sitDirectionShares } from './wind/histogram';
import type { ScenarioSet } from './wind/scenario-types';
import { buildScenarios } from './wind/scenarios';
import { scenariosAtStand } from './wind/stand-scenarios';
import { toQuarter } from './window-frame';

const MIN = 60_000;

/** Air and wind at one stand's seat, shared by stands of the same height, shelter and slope. */
export interface SeatFrame {
  air: AirStep[];
  set: ScenarioSet;
  stability: StabilityClass[];
  /** Directions over the whole sit and by step; speeds in them are at the seat only where slope drift plays. */
  sit: DirectionSummary;
  readonly steps: DirectionSummary[];
  shares: number[] | null;
}

/** The air of one window, shared by all stands. */
export interface AirFrame {
  steps: PlaceStep[];
  open: ScenarioSet;
  missingShare: number;
  sit: DirectionSummary;
  seatOf: (stand: ScoredStand) => SeatFrame;
  /** Wind met by a walk at an instant; null outside the forecast. */
  walkWindAt: (at: number) => WalkWind | null;
}

function sliceSet(set: ScenarioSet, from: number, count: number, issuedAt: number): ScenarioSet {
  const cut = <T>(list: T[]) => list.slice(from, from + count);
  const at = cut(set.at);
  return {
    ...set,
    at,
    known: cut(set.known),
    scatterDeg: cut(set.scatterDeg),
    bundleDeg: cut(set.bundleDeg),
    scenarios: set.scenarios.map((s) => ({ weight: s.weight, steps: cut(s.steps) })),
    leadHours: Math.max(0, ((at[0] ?? 0) - issuedAt) / (60 * MIN)),
  };
}

function walkWind(
  set: ScenarioSet,
  steps: PlaceStep[],
  t: number,
  groundShare: number,
  least: number,
): WalkWind | null {
  const step = steps[t];
  if (!step || !set.known[t]) return null;
  const bins: number[] = [];
  const weights: number[] = [];
  const perSpeed: number[] = [];
  let anyWeight = 0;
  let anySpeed = 0;
  for (const { weight, steps: course } of set.scenarios) {
    const wind = course[t];
    if (!wind) continue;
    const speed = Math.max(least, wind.speedMps * groundShare);
    if (wind.fromDeg === null) {
      anyWeight += weight;
      anySpeed += weight * speed;
    } else {
      bins.push((wind.fromDeg / 360) * WALK_BINS);
      weights.push(weight);
      perSpeed.push(1 / speed);
    }
  }
  return {
    low: Int32Array.from(bins, (bin) => Math.floor(bin) % WALK_BINS),
    high: Int32Array.from(bins, (bin) => (Math.floor(bin) + 1) % WALK_BINS),
    part: Float64Array.from(bins, (bin) => bin - Math.floor(bin)),
    weights: Float64Array.from(weights),
    perSpeed: Float64Array.from(perSpeed),
    anyWeight,
    anyPerSpeed: anyWeight > 0 ? anyWeight / anySpeed : 1,
    speedMps: step.speedMps ?? 0,
    stability: stabilityIndex(step.stability),
  };
}

type Directions = Pick<SeatFrame, 'sit' | 'steps' | 'shares'>;

function directionsOf(set: ScenarioSet): Directions {
  let steps: DirectionSummary[] | null = null;
  return {
    sit: directionSummary(set),
    get steps() {
      steps ??= set.at.map((_, t) => directionSummary(set, t));
      return steps;
    },
    shares: sitDirectionShares(set),
  };
}

/** Without slope drift the wind at every seat comes from where the open wind does: its directions are summed up once. */
function seatFrame(
  stand: ScoredStand,
  steps: PlaceStep[],
  open: ScenarioSet,
  directions: () => Directions,
  settings: ScoringSettings,
): SeatFrame {
  const air = standAir(stand, steps, settings.air);
  const set = scenariosAtStand(open, air);
  const drifts = air.some((step) => step.driftWeight > 0);
  const stability = air.map((step) => step.stability);
  const own = drifts ? directionsOf(set) : directions();
  return {
    air,
    set,
    stability,
    sit: own.sit,
    shares: own.shares,
    // Worked out when first read: a ranked list has no use for it.
    get steps() {
      return own.steps;
    },
  };
}

/**
 * The air of a window and of the walks round it (from `walkFrom` to `walkUntil`), as one run of steps aligned to the window;
 * null when the forecast reaches no step of the window.
 */
export function frameAir(
  window: SitWindow,
  walkFrom: number,
  walkUntil: number,
  forecast: Forecast | null,
  place: Place,
  settings: ScoringSettings,
): AirFrame | null {
  if (forecast === null) return null;
  const stepMs = settings.air.stepMinutes * MIN;
  const before = Math.min(48, Math.max(0, Math.ceil((window.startAt - walkFrom) / stepMs)));
  const count = stepStarts(window.startAt, window.endAt, settings.air.stepMinutes).length;
  const startAt = window.startAt - before * stepMs;
  const span = { lat: place.lat, lon: place.lon, startAt, endAt: Math.max(walkUntil, window.endAt), forecast };
  const wideSteps = placeAir(span, settings.air);
  const wide = buildScenarios(wideSteps, forecast, settings);
  const open = sliceSet(wide, before, count, forecast.issuedAt);
  if (wide.source === 'none' || !open.known.includes(true)) return null;
  const steps = wideSteps.slice(before, before + count);
  let openDirections: Directions | null = null;
  const directions = () => {
    openDirections ??= directionsOf(open);
    return openDirections;
  };
  const seats = new Map<string, SeatFrame>();
  const winds = new Map<number, WalkWind | null>();
  return {
    steps,
    open,
    missingShare: open.known.filter((k) => !k).length / Math.max(1, count),
    sit: directions().sit,
    seatOf: (stand) => {
      const key = `${stand.seatHeightM}|${stand.shelter}|${stand.drainBearingDeg}|${stand.slopePercent}`;
      const frame = seats.get(key) ?? seatFrame(stand, steps, open, directions, settings);
      seats.set(key, frame);
      return frame;
    },
    walkWindAt: (at) => {
      const t = Math.floor((toQuarter(at) - startAt) / stepMs);
      const index = Math.min(wideSteps.length - 1, Math.max(0, t));
      const known = winds.get(index);
      if (known !== undefined) return known;
      const { groundWindShare } = settings.approach;
      const wind = walkWind(wide, wideSteps, index, groundWindShare, settings.scent.leastSpeedMps);
      winds.set(index, wind);
      return wind;
    },
  };
}
