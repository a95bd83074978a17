import { type AirFrame, frameAir, type SeatFrame } from './air-frame';
import { type Entry, entriesFor } from './approach/entries';
import type { WalkContext } from './approach/try-ways';
import { type CautionInput, cautionsFor } from './cautions';
import type { Forecast, SitWindow } from './condition-types';
import { confidenceFor } from './confidence';
import { formatClock, formatClock12 } from './day-time';
import { type Glare, glareOf } from './glare';
import type { GroundFrame } from './ground-frame';
import type { ScoredStand } from './ground-types';
import { lightShares, type PromiseStep } from './promise/promise-factors';
import type { Detail } from './rank-input';
import type { Units } from './units';
import type { Caution, Confidence } from './verdict-types';
import { frameWindow, type WindowFrame } from './window-frame';

const HOUR = 3_600_000;

/** Everything that the stands of one window share. */
export interface SitFrame {
  ground: GroundFrame;
  window: WindowFrame;
  /** null: no forecast for this window. */
  air: AirFrame | null;
  walks: WalkContext;
  confidence: Confidence;
  light: { day: number; twilight: number };
  /** Times of going in worth trying. */
  entries: Entry[];
  promiseStepsOf: (stand: ScoredStand) => PromiseStep[];
  cautionsOf: (stand: ScoredStand) => Caution[];
  glareOf: (facingDeg: number | null) => Glare;
  clock: (at: number) => string;
  detail: Detail;
  /** UTC ms at which the sit is judged. */
  now: number;
}

/** US units go with a 12-hour clock. */
function clockText(at: number, zone: string, units: Units | undefined): string {
  return (units ?? 'us') === 'us' ? formatClock12(at, zone) : formatClock(at, zone);
}

function cautionInput(
  stand: ScoredStand,
  window: WindowFrame,
  air: AirFrame | null,
  ground: GroundFrame,
  age: number | null,
): CautionInput {
  const { units, orangeRule, settings, place } = ground.input;
  const steps = window.stepAts.map((at, t) => {
    const step = air?.steps[t];
    return {
      at,
      speedMps: step?.speedMps ?? null,
      gustMps: step?.gustMps ?? null,
      tempC: step?.tempC ?? null,
      thunder: step?.thunder ?? false,
    };
  });
  return {
    kind: stand.kind,
    seatHeightM: stand.seatHeightM,
    steps,
    forecastAgeHours: age,
    staleHours: settings.score.staleHours,
    orangeRule: orangeRule ?? null,
    units: units ?? 'us',
    clock: (at) => clockText(at, place.zone, units),
  };
}

function promiseSteps(window: WindowFrame, seat: SeatFrame | null): PromiseStep[] {
  return window.stepAts.map((_, t) => {
    const air = seat?.air[t];
    return {
      times: window.times[t] as number[],
      shares: window.shares[t] as Float64Array,
      seatSpeedMps: air?.seatSpeedMps ?? null,
      precipMm: air?.precipMm ?? null,
      cloudPercent: air?.cloudPercent ?? null,
      fromDeg: air?.seatFromDeg ?? null,
    };
  });
}

/** Lays out what all stands share in one window. `now` (UTC ms) is what the forecast's age is counted to. */
export function frameSits(
  ground: GroundFrame,
  sitWindow: SitWindow,
  forecast: Forecast | null,
  now: number,
  detail: Detail,
): SitFrame {
  const { place, settings, units } = ground.input;
  const window = frameWindow(sitWindow, place, ground.usesIn, settings);
  const entries = entriesFor(sitWindow, window.sun, settings.approach);
  const firstIn = Math.min(sitWindow.startAt, ...entries.map((e) => e.inBy));
  const air = frameAir(sitWindow, firstIn - HOUR, sitWindow.endAt + HOUR, forecast, place, settings);
  const trust = air && forecast ? { issuedAt: forecast.issuedAt, air } : null;
  const confidence = confidenceFor(
    trust && {
      issuedAt: trust.issuedAt,
      leadHours: trust.air.open.leadHours,
      spreadDeg: trust.air.sit.meanFromDeg === null ? null : trust.air.sit.spreadDeg,
      missingShare: trust.air.missingShare,
    },
    now,
    settings.score,
  );
  const cautions = new Map<string, Caution[]>();
  const glares = new Map<number | null, Glare>();
  const kept = new Map<SeatFrame | null, PromiseStep[]>();
  return {
    ground,
    window,
    air,
    now,
    walks: {
      frame: window,
      windAt: (at) => air?.walkWindAt(at) ?? null,
      plumes: ground.plumes,
      settings: settings.approach,
    },
    confidence,
    light: lightShares(promiseSteps(window, null), window.moves),
    entries,
    promiseStepsOf: (stand) => {
      const seat = air?.seatOf(stand) ?? null;
      const known = kept.get(seat) ?? promiseSteps(window, seat);
      kept.set(seat, known);
      return known;
    },
    cautionsOf: (stand) => {
      const key = `${stand.kind}|${stand.seatHeightM > 1}`;
      const known =
        cautions.get(key) ?? cautionsFor(cautionInput(stand, window, air, ground, confidence.forecastAgeHours));
      cautions.set(key, known);
      return known;
    },
    glareOf: (facingDeg) => {
      const known = glares.get(facingDeg) ?? glareOf(facingDeg, window, settings.promise);
      glares.set(facingDeg, known);
      return known;
    },
    clock: (at) => clockText(at, place.zone, units),
    detail,
  };
}
