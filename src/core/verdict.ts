import { type TriedWay, tryWays } from './approach/try-ways';
import { arcsFor, coveredDeg } from './arcs';
import { type BeforeWay, toOption, type WeighedWay, weighWays } from './choose-way';
import { frameGround, type StandFrame } from './ground-frame';
import { pressureLeft, pressureOnPromise, pressureOnQuiet } from './pressure';
import { type PromiseStep, promiseFactors } from './promise/promise-factors';
import { arcFactor } from './quiet';
import type { SitInput } from './rank-input';
import { scoreOf } from './reasons';
import { type SeatScent, seatScent } from './scent/seat-scent';
import { windedExponents } from './seated';
import type { SitFrame } from './sit-frame';
import { frameSits } from './sit-frame';
import { tellVerdict } from './tell-verdict';
import type { ArcHoldSummary, Gate, Verdict } from './verdict-types';
import { type ArcHold, arcHold } from './wind/arc-hold';
import { wordFor } from './word';

/** What the sums say of one stand in one window, before it is put in words. */
export interface SitSums {
  stand: StandFrame;
  arcs: { known: boolean; share: number | null; hold: ArcHold | null };
  scent: SeatScent | null;
  steps: PromiseStep[];
  glare: ReturnType<SitFrame['glareOf']>;
  pressure: number;
  before: BeforeWay;
  ways: WeighedWay[];
  /** The sit by the best way in, or as it is where none is drawn. */
  best: Omit<WeighedWay, 'tried'>;
}

function arcSums(frame: SitFrame, stand: StandFrame): SitSums['arcs'] {
  const arcs = arcsFor(stand.stand.arcs, frame.window.window.window);
  if (arcs.length === 0) return { known: false, share: null, hold: null };
  const seat = frame.air?.seatOf(stand.stand) ?? null;
  const hold = seat ? arcHold(seat.set, arcs) : null;
  // Without a forecast any wind is as likely as another.
  return { known: true, share: hold?.summary?.shareOfTime ?? coveredDeg(arcs) / 360, hold };
}

function scentSums(frame: SitFrame, stand: StandFrame): SeatScent | null {
  const seat = frame.air?.seatOf(stand.stand) ?? null;
  if (!seat) return null;
  const scent = seatScent({
    source: stand.seat,
    set: seat.set,
    stability: seat.stability,
    deer: frame.window.deer,
    minutes: frame.ground.input.settings.air.stepMinutes,
    detail: frame.detail,
  });
  return scent.windedChance === null ? null : scent;
}

/** Ways in that can still be walked: once it is too late for all of them, or the window is over, all of them as they were. */
function waysLeft(tried: TriedWay[], endAt: number, now: number): TriedWay[] {
  if (endAt <= now) return tried;
  const left = tried.filter(({ way, entry }) => entry.inBy - way.seconds * 1000 >= now);
  return left.length > 0 ? left : tried;
}

/** The sums for one stand in one window. */
export function sumSit(frame: SitFrame, stand: StandFrame): SitSums {
  const { settings } = frame.ground.input;
  const { window } = frame.window;
  const arcs = arcSums(frame, stand);
  const scent = scentSums(frame, stand);
  const steps = frame.promiseStepsOf(stand.stand);
  const glare = frame.glareOf(stand.stand.facingDeg);
  const suitability = stand.stand.suitability[window.window];
  const { moves } = frame.window;
  const pressure = pressureLeft(stand.near, window.startAt, settings.pressure);
  const { light } = frame;
  const unknownWay = 1 - settings.approach.unknownWayChance;
  const before: BeforeWay = {
    factors: {
      quiet: {
        seat: 1 - (scent?.windedChance ?? 0),
        arc: arcFactor(arcs.share, settings.score),
        walkIn: unknownWay,
        walkOut: unknownWay,
        pressurePower: pressureOnQuiet(pressure, settings.pressure),
        ...(stand.stand.quietShift ? { learned: stand.stand.quietShift / 100 } : {}),
      },
      promise: {
        ...promiseFactors(steps, moves, suitability, stand.inRange, glare.byStep, settings.promise),
        sightings: stand.sightings.factor,
        pressure: pressureOnPromise(pressure, light.day, light.twilight, settings.pressure),
      },
      seatedShare: 1,
    },
    moves,
    scent: scent ? { winded: scent.windedChance ?? 0, exponents: windedExponents(scent.stepChance) } : null,
  };
  const tried = tryWays(stand.waysIn, stand.waysOut, frame.entries, window.endAt, frame.walks);
  const ways = weighWays(waysLeft(tried, window.endAt, frame.now), before, frame.window, settings.score);
  const best = ways[0] ?? { factors: before.factors, ...scoreOf(before.factors, settings.score) };
  return { stand, arcs, scent, steps, glare, pressure, before, ways, best };
}

function holdSummary(sums: SitSums): ArcHoldSummary | null {
  return sums.arcs.hold?.summary ?? null;
}

/** The verdict on one stand in one window of a frame: sums, then words when `detail` is full. */
export function judgeSit(frame: SitFrame, stand: StandFrame, gates: Gate[]): Verdict {
  const sums = sumSit(frame, stand);
  const { features } = frame.ground.input;
  const { best } = sums;
  const full = frame.detail === 'full';
  const first = sums.ways[0];
  const verdict: Verdict = {
    standId: stand.stand.id,
    day: frame.window.window.day,
    window: frame.window.window.window,
    status: gates.length > 0 ? 'blocked' : 'open',
    gates,
    quiet: 100 * best.quiet,
    promise: 100 * best.promise,
    score: best.score,
    word: wordFor(100 * best.quiet),
    arcHold: holdSummary(sums),
    windedChance: sums.scent?.windedChance ?? null,
    scentByFeature: [],
    approach: first ? toOption(first, features) : null,
    approachAlternatives: full ? sums.ways.slice(1).map((w) => toOption(w, features)) : [],
    pressure: sums.pressure,
    meanFromDeg: frame.air?.seatOf(stand.stand).sit.meanFromDeg ?? null,
    directionShares: frame.air?.seatOf(stand.stand).shares ?? null,
    reasons: [],
    counterfactuals: [],
    cautions: frame.cautionsOf(stand.stand),
    confidence: frame.confidence,
    timeline: [],
  };
  return full ? tellVerdict(frame, sums, verdict) : verdict;
}

/**
 * The verdict on one sit: quiet, promise and sit score (0-100), the best way in and why. Gates make it 'blocked' and change
 * no score. Without a forecast it stands on arcs, rest and the way in, with confidence 'none'. Never throws, never NaN.
 */
export function scoreSit(input: SitInput): Verdict {
  const ground = frameGround({ ...input, stands: [input.stand] });
  const frame = frameSits(ground, input.window, input.forecast, input.now, input.detail ?? 'full');
  return judgeSit(frame, ground.stands[0] as StandFrame, input.gates);
}
