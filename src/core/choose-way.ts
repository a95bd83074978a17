import type { TriedWay } from './approach/try-ways';
import type { ScoredFeature } from './ground-types';
import { type Factors, scoreOf } from './reasons';
import type { ScoreSettings } from './score';
import { shareAfter, shareBefore, windedIn } from './seated';
import type { ApproachOption } from './verdict-types';
import type { WindowFrame } from './window-frame';

/** A way in at one time, with everything the sit then scores by. */
export interface WeighedWay {
  tried: TriedWay;
  factors: Factors;
  quiet: number;
  promise: number;
  score: number;
}

/** The sit before a way in is chosen: factors with a silent walk, the whole window seated, and what scent does by step. */
export interface BeforeWay {
  factors: Factors;
  /** How much promise falls in each step. */
  moves: number[];
  /** null: no forecast. */
  scent: { winded: number; exponents: Float64Array } | null;
}

const ENTRY_ORDER: ApproachOption['entry'][] = [
  'before_light',
  'after_daybreak_30',
  'after_daybreak_60',
  'midday',
  'afternoon',
];

function weigh(tried: TriedWay, before: BeforeWay, frame: WindowFrame, s: ScoreSettings): WeighedWay {
  const { endAt } = frame.window;
  const { inBy } = tried.entry;
  const { scent } = before;
  const left = scent ? shareAfter(inBy, frame.stepAts, endAt, scent.exponents) + shareBefore(inBy, frame.window) : 0;
  const seat = scent ? 1 - windedIn(left, scent.winded) : 1;
  const factors: Factors = {
    quiet: { ...before.factors.quiet, seat, walkIn: 1 - tried.in.chance, walkOut: 1 - tried.out.chance },
    promise: before.factors.promise,
    seatedShare: shareAfter(inBy, frame.stepAts, endAt, before.moves),
  };
  return { tried, factors, ...scoreOf(factors, s) };
}

function compare(a: WeighedWay, b: WeighedWay): number {
  if (Math.abs(a.score - b.score) > 1e-9) return b.score - a.score;
  if (Math.abs(a.quiet - b.quiet) > 1e-12) return b.quiet - a.quiet;
  const byEntry = ENTRY_ORDER.indexOf(a.tried.entry.entry) - ENTRY_ORDER.indexOf(b.tried.entry.entry);
  if (byEntry !== 0) return byEntry;
  const [x, y] = [a.tried.way.approach, b.tried.way.approach];
  return x.name === y.name ? (x.id < y.id ? -1 : 1) : x.name < y.name ? -1 : 1;
}

/** Ways in with what the sit scores by each, best first. */
export function weighWays(tried: TriedWay[], before: BeforeWay, frame: WindowFrame, s: ScoreSettings): WeighedWay[] {
  return tried.map((t) => weigh(t, before, frame, s)).sort(compare);
}

export function toOption(w: WeighedWay, features: ScoredFeature[]): ApproachOption {
  const { way, entry } = w.tried;
  const [a, b] = [w.tried.in.worst, w.tried.out.worst];
  const worst = a && (!b || a.chance >= b.chance) ? a : b;
  const feature = worst ? features[worst.feature] : undefined;
  return {
    approachId: way.approach.id,
    approachName: way.approach.name,
    parkingName: way.approach.parkingName,
    entry: entry.entry,
    leaveBy: entry.inBy - way.seconds * 1000,
    inBy: entry.inBy,
    walkSeconds: way.seconds,
    inChance: w.tried.in.chance,
    outChance: w.tried.out.chance,
    quiet: 100 * w.quiet,
    score: w.score,
    worst: worst && feature ? { featureId: feature.id, featureName: feature.name, chance: worst.chance } : null,
  };
}
