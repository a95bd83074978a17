import { apartDeg, normalizeDeg } from './angles';
import { anyArcContains, arcsFor } from './arcs';
import type { WeighedWay } from './choose-way';
import { pressureOnPromise, pressureOnQuiet } from './pressure';
import { scoreOf } from './reasons';
import { seatScent } from './scent/seat-scent';
import { sectorName, sectorOf } from './sectors';
import type { SitFrame } from './sit-frame';
import type { SitSums } from './verdict';
import type { Counterfactual } from './verdict-types';
import { directionShares } from './wind/histogram';
import { WHAT_IF_WORDS } from './words/sit';

/** Turns tried from the mean wind: backing is against the clock, veering with it. */
const TURNS = [-45, 45, -90, 90];
/** A turn less likely than this in every half hour is not worth a sentence. */
const LEAST_LIKELY = 0.05;

interface Turned {
  text: string;
  code: string;
  weight: number;
}

/** Chance of being winded, and the place most reached, were the wind to blow from one direction from step k on. */
function scentIf(frame: SitFrame, sums: SitSums, fromDeg: number, k: number) {
  const seat = frame.air?.seatOf(sums.stand.stand);
  if (!seat) return null;
  const steps = seat.steps.map((s, t) => ({
    fromDeg: t < k ? s.meanFromDeg : fromDeg,
    speedMps: seat.air[t]?.seatSpeedMps ?? 0,
  }));
  const scent = seatScent({
    source: sums.stand.seat,
    set: { ...seat.set, scenarios: [{ weight: 1, steps }] },
    stability: seat.stability,
    deer: frame.window.deer,
    minutes: frame.ground.input.settings.air.stepMinutes,
    detail: 'list',
  });
  let top = 0;
  scent.byFeature.forEach((p, i) => {
    if (p > (scent.byFeature[top] as number)) top = i;
  });
  return { chance: scent.windedChance ?? 0, top, topChance: scent.byFeature[top] ?? 0 };
}

/** The likeliest turn of the wind that brings scent to a place, or takes the sit out of its good winds. */
function whatIfWind(frame: SitFrame, sums: SitSums): Counterfactual[] {
  const seat = frame.air?.seatOf(sums.stand.stand);
  const mean = seat?.sit.meanFromDeg ?? null;
  if (!seat || mean === null) return [];
  const asItIs = scentIf(frame, sums, mean, 0)?.chance ?? 0;
  const shares = seat.set.at.map((_, t) => directionShares(seat.set, t));
  const arcs = arcsFor(sums.stand.stand.arcs, frame.window.window.window);
  const { features } = frame.ground.input;
  const found: Turned[] = [];
  for (const turn of TURNS) {
    const to = sectorOf(normalizeDeg(mean + turn)) * 22.5;
    let k = -1;
    let likely = LEAST_LIKELY;
    shares.forEach((bins, t) => {
      const p = bins?.reduce((sum, share, i) => sum + (apartDeg(i * 5 + 2.5, to) <= 22.5 ? share : 0), 0) ?? 0;
      if (p > likely + 1e-9) {
        likely = p;
        k = t;
      }
    });
    if (k < 0) continue;
    const turned = {
      backs: turn < 0,
      to: sectorName(to),
      after: k === 0 ? null : frame.clock(seat.set.at[k] as number),
    };
    const then = scentIf(frame, sums, to, k);
    const reached = then ? features[then.top] : undefined;
    if (then && reached && then.topChance >= 0.08 && then.chance >= asItIs + 0.05) {
      found.push({ code: 'wind_scent', text: WHAT_IF_WORDS.scent(turned, reached.name), weight: likely * then.chance });
    } else if (arcs.length > 0 && anyArcContains(arcs, mean) && !anyArcContains(arcs, to)) {
      found.push({ code: 'wind_arc', text: WHAT_IF_WORDS.leavesArcs(turned), weight: likely * 0.1 });
    }
  }
  const best = found.sort((a, b) => b.weight - a.weight).slice(0, 2);
  return best.map(({ code, text }) => ({ code, text }));
}

const whole = (share: number) => Math.round(100 * share);

function whatIfWay(frame: SitFrame, ways: WeighedWay[]): Counterfactual[] {
  const best = ways[0];
  if (!best) return [];
  const found: Counterfactual[] = [];
  const bestId = best.tried.way.approach.id;
  const other = ways.find((w) => w.tried.way.approach.id !== bestId);
  if (other && whole(other.quiet) !== whole(best.quiet)) {
    const name = other.tried.way.approach.name;
    found.push({
      code: 'other_way',
      text: WHAT_IF_WORDS.otherWay(name, whole(other.quiet), whole(best.quiet)),
    });
  }
  const same = ways.find((w) => w.tried.way.approach.id === bestId && w !== best);
  if (same && whole(same.quiet) !== whole(best.quiet)) {
    const at = frame.clock(same.tried.entry.inBy);
    const [quiet, promise] = [whole(same.quiet), whole(same.promise)];
    const text = WHAT_IF_WORDS.otherTime(
      at,
      { quiet, promise },
      { quiet: whole(best.quiet), promise: whole(best.promise) },
    );
    found.push({ code: 'other_time', text });
  }
  return found;
}

/** What two more days with nobody near it would bring, by the same sums. */
function whatIfRested(frame: SitFrame, sums: SitSums): Counterfactual[] {
  const { settings } = frame.ground.input;
  const rested = sums.pressure * 0.5 ** (2 / settings.pressure.halfLifeDays);
  const { factors } = sums.best;
  const then = scoreOf(
    {
      ...factors,
      quiet: { ...factors.quiet, pressurePower: pressureOnQuiet(rested, settings.pressure) },
      promise: {
        ...factors.promise,
        pressure: pressureOnPromise(rested, frame.light.day, frame.light.twilight, settings.pressure),
      },
    },
    settings.score,
  );
  if (Math.round(then.score) <= Math.round(sums.best.score)) return [];
  const text = WHAT_IF_WORDS.rested(Math.round(then.score), Math.round(sums.best.score));
  return [{ code: 'rested', text }];
}

/** What would change the verdict, each worked out by the real sums. */
export function counterfactualsFor(frame: SitFrame, sums: SitSums): Counterfactual[] {
  return [...whatIfWind(frame, sums), ...whatIfWay(frame, sums.ways), ...whatIfRested(frame, sums)];
}
