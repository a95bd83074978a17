import { placeAir } from '../../src/core/air/place-air';
import { stabilityIndex } from '../../src/core/air/stability-types';
import { standAir } from '../../src/core/air/stand-air';
import { entriesFor } from '../../src/core/approach/entries';
import { walkSeconds } from '../../src/core/approach/walk-times';
import { arcsFor } from '../../src/core/arcs';
import { wrappedNormalInArcs } from '../../src/core/circular';
import type { Forecast, SitWindow } from '../../src/core/condition-types';
import { glareOf } from '../../src/core/glare';
import type { GroundFrame } from '../../src/core/ground-frame';
import type { ScoredStand } from '../../src/core/ground-types';
import { nearEvents, pressureLeft, pressureOnPromise, pressureOnQuiet } from '../../src/core/pressure';
import { featuresInRange } from '../../src/core/promise/in-range';
import { lightShares, promiseFactors } from '../../src/core/promise/promise-factors';
import { clubRate, sightingsFactor } from '../../src/core/promise/sightings';
import { arcFactor } from '../../src/core/quiet';
import type { WeekInput } from '../../src/core/rank-input';
import { scoreOf } from '../../src/core/reasons';
import type { ScentGround } from '../../src/core/scent/scent-ground';
import { shareAfter, shareBefore, windedExponents, windedIn } from '../../src/core/seated';
import type { ScenarioSet } from '../../src/core/wind/scenario-types';
import { buildScenarios } from '../../src/core/wind/scenarios';
import { scenariosAtStand } from '../../src/core/wind/stand-scenarios';
import { frameWindow, toQuarter } from '../../src/core/window-frame';
import { plainSeatScent } from './scent-plain';
import { plainWalkChance } from './walk-plain';

const MIN = 60_000;
const HOUR = 60 * MIN;

export interface PlainSit {
  shareOfTime: number;
  windedChance: number;
  inChance: number;
  outChance: number;
  /** Pressure and promise of the whole window: no table is used in them. */
  pressure: number;
  promise: number;
  quiet: number;
  score: number;
}

function plainHold(set: ScenarioSet, stand: ScoredStand, window: SitWindow): number {
  const arcs = arcsFor(stand.arcs, window.window);
  let sum = 0;
  set.at.forEach((_, t) => {
    const sigma = Math.hypot(set.scatterDeg[t] ?? 0, set.bundleDeg[t] ?? 0);
    for (const { weight, steps } of set.scenarios) {
      const from = steps[t]?.fromDeg ?? null;
      sum += weight * (from === null ? wrappedNormalInArcs(0, 1e6, arcs) : wrappedNormalInArcs(from, sigma, arcs));
    }
  });
  return sum / set.at.length;
}

/** One sit, everything worked out anew and straight from the formulas. Samples of features are the only thing made before. */
export function plainSit(
  world: WeekInput,
  stand: ScoredStand,
  window: SitWindow,
  forecast: Forecast,
  scent: ScentGround,
  usesIn: GroundFrame['usesIn'],
): PlainSit {
  const { settings, place, features } = world;
  const frame = frameWindow(window, place, usesIn, settings);
  const entries = entriesFor(window, frame.sun, settings.approach);
  const stepMs = settings.air.stepMinutes * MIN;
  const firstIn = Math.min(window.startAt, ...entries.map((e) => e.inBy)) - HOUR;
  const startAt = window.startAt - Math.ceil((window.startAt - firstIn) / stepMs) * stepMs;
  const wideAir = placeAir({ ...place, startAt, endAt: window.endAt + HOUR, forecast }, settings.air);
  const wide = buildScenarios(wideAir, forecast, settings);
  const inWindow = (at: number) => at >= window.startAt && at < window.endAt;
  const steps = wideAir.filter((s) => inWindow(s.at));
  const from = wideAir.findIndex((s) => inWindow(s.at));
  const cut = <T>(list: T[]) => list.slice(from, from + steps.length);
  const open: ScenarioSet = {
    ...wide,
    at: cut(wide.at),
    known: cut(wide.known),
    scatterDeg: cut(wide.scatterDeg),
    bundleDeg: cut(wide.bundleDeg),
    scenarios: wide.scenarios.map((s) => ({ weight: s.weight, steps: cut(s.steps) })),
  };
  const air = standAir(stand, steps, settings.air);
  const seat = scenariosAtStand(open, air);
  const question = {
    ground: scent,
    at: stand.at,
    heightM: stand.seatHeightM,
    set: seat,
    stability: air.map((a) => a.stability),
    deer: frame.deer,
    minutes: settings.air.stepMinutes,
  };
  const { windedChance, byStep } = plainSeatScent(question);
  const promiseSteps = frame.stepAts.map((_, t) => ({
    times: frame.times[t] ?? [],
    shares: frame.shares[t] ?? new Float64Array(0),
    seatSpeedMps: air[t]?.seatSpeedMps ?? null,
    precipMm: air[t]?.precipMm ?? null,
    cloudPercent: air[t]?.cloudPercent ?? null,
    fromDeg: air[t]?.seatFromDeg ?? null,
  }));
  const near = nearEvents(stand.at, world.events, settings.pressure);
  const pressure = pressureLeft(near, window.startAt, settings.pressure);
  const light = lightShares(promiseSteps, frame.moves);
  const log = world.sightings.find((s) => s.standId === stand.id) ?? null;
  const inRange = featuresInRange(stand, features, world.weapon, settings.promise);
  const glare = glareOf(stand.facingDeg, frame, settings.promise).byStep;
  const rating = stand.suitability[window.window];
  const promise = {
    ...promiseFactors(promiseSteps, frame.moves, rating, inRange, glare, settings.promise),
    sightings: sightingsFactor(log, clubRate(world.sightings, settings.promise), settings.promise),
    pressure: pressureOnPromise(pressure, light.day, light.twilight, settings.pressure),
  };
  const way = world.approaches.find((a) => a.standId === stand.id);
  if (!way) throw new Error('every stand of this world has a way in');
  const seconds = walkSeconds(way, settings.approach);
  const walkAt = (at: number) => {
    const quarter = toQuarter(at);
    const step = Math.min(wideAir.length - 1, Math.max(0, Math.floor((quarter - startAt) / stepMs)));
    const moment = frame.momentAt(at);
    const place = wideAir[step];
    const stability = stabilityIndex(place?.stability ?? 'D');
    const openSpeedMps = place?.speedMps ?? 0;
    return plainWalkChance({ approach: way, features, ...moment, set: wide, step, stability, openSpeedMps, settings });
  };
  const shareOfTime = plainHold(seat, stand, window);
  const outChance = walkAt(window.endAt + seconds * 500);
  const exponents = windedExponents(byStep);
  const tried = entries.map((entry) => {
    const inChance = walkAt(entry.inBy - seconds * 500);
    const left = shareAfter(entry.inBy, frame.stepAts, window.endAt, exponents) + shareBefore(entry.inBy, window);
    const quiet = {
      seat: 1 - windedIn(left, windedChance),
      arc: arcFactor(shareOfTime, settings.score),
      walkIn: 1 - inChance,
      walkOut: 1 - outChance,
      pressurePower: pressureOnQuiet(pressure, settings.pressure),
    };
    const seatedShare = shareAfter(entry.inBy, frame.stepAts, window.endAt, frame.moves);
    return { inChance, ...scoreOf({ quiet, promise, seatedShare }, settings.score) };
  });
  const best = tried.reduce((a, b) => (b.score > a.score ? b : a));
  return { shareOfTime, windedChance, outChance, pressure, ...best };
}
