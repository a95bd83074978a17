import { type PromiseFactors, promiseOf, promiseSeated } from './promise/promise-factors';
import { type QuietFactors, quietOf } from './quiet';
import { type ScoreSettings, sitScore } from './score';
import type { Evidence, Reason } from './verdict-types';
import { REASON_WORDS } from './words/reasons';
import { percentText } from './words/sit';

/** Everything a score is made of. */
export interface Factors {
  quiet: QuietFactors;
  promise: PromiseFactors;
  /** Share (0-1) of the window's movement for which the sitter is in the seat. */
  seatedShare: number;
}

/** What is known about a sit beside its factors, for the words of its reasons. */
export interface ReasonFacts {
  arcShare: number | null;
  arcsKnown: boolean;
  forecast: boolean;
  topScent: { name: string } | null;
  windedChance: number | null;
  /** null: no way in is drawn. */
  wayName: string | null;
  outName: string | null;
  unknownWayChance: number;
  inChance: number;
  inWorst: { name: string; chance: number } | null;
  outChance: number;
  outWorst: { name: string; chance: number } | null;
  suitability: string;
  featuresInRange: string[];
  sunSpan: string | null;
  recentEvents: number;
  inByText: string;
  ratePerHour: number;
  clubRatePerHour: number;
}

export function scoreOf(f: Factors, s: ScoreSettings): { quiet: number; promise: number; score: number } {
  const quiet = quietOf(f.quiet);
  const promise = promiseSeated(promiseOf(f.promise), f.seatedShare);
  return { quiet, promise, score: sitScore(quiet, promise, s) };
}

type Draft = Omit<Reason, 'change'> & { without: Factors };

function quietDrafts(f: Factors, x: ReasonFacts): Draft[] {
  const part = 'quiet' as const;
  const swap = (q: Partial<QuietFactors>): Factors => ({ ...f, quiet: { ...f.quiet, ...q } });
  const drafts: Draft[] = [];
  const add = (code: string, text: string, evidence: Evidence, without: Factors) =>
    drafts.push({ code, text, evidence, without, part });
  if (x.arcShare !== null) {
    const share = percentText(x.arcShare);
    const text = x.forecast ? REASON_WORDS.arc(share) : REASON_WORDS.arcNoForecast(share);
    add('arc', text, 'practice', swap({ arc: 1 }));
  }
  if (x.windedChance !== null) {
    const text = REASON_WORDS.seatScent(percentText(x.windedChance), x.topScent?.name ?? null);
    add('seat_scent', text, 'standard', swap({ seat: 1 }));
  }
  if (x.wayName) {
    add(
      'walk_in',
      REASON_WORDS.walkIn(x.wayName, percentText(x.inChance), x.inWorst?.name ?? null),
      'study',
      swap({ walkIn: 1 }),
    );
    const out = REASON_WORDS.walkOut(x.outName ?? x.wayName, percentText(x.outChance), x.outWorst?.name ?? null);
    add('walk_out', out, 'study', swap({ walkOut: 1 }));
  } else {
    const text = REASON_WORDS.noWay(percentText(x.unknownWayChance));
    add('no_way', text, 'our choice', swap({ walkIn: 1, walkOut: 1 }));
  }
  if (f.quiet.pressurePower > 1) {
    const text = REASON_WORDS.disturbed(x.recentEvents);
    add('pressure_quiet', text, 'study', swap({ pressurePower: 1 }));
  }
  if (f.quiet.learned) {
    const points = Math.abs(Math.round(f.quiet.learned * 100));
    add('learned', REASON_WORDS.learned(f.quiet.learned > 0, points), 'club log', swap({ learned: 0 }));
  }
  return drafts;
}

function promiseDrafts(f: Factors, x: ReasonFacts, usableBase: number): Draft[] {
  const part = 'promise' as const;
  const swap = (p: Partial<PromiseFactors>): Factors => ({ ...f, promise: { ...f.promise, ...p } });
  const drafts: Draft[] = [];
  const add = (code: string, text: string, evidence: Evidence, without: Factors) =>
    drafts.push({ code, text, evidence, without, part });
  add('suitability', REASON_WORDS.suitability(x.suitability), 'practice', swap({ base: usableBase }));
  const near = x.featuresInRange.slice(0, 3).join(', ');
  const inRange = f.promise.features >= 1 ? REASON_WORDS.inRange : REASON_WORDS.inRangeLittleUsed;
  add('features', near ? inRange(near) : REASON_WORDS.nothingInRange, 'practice', swap({ features: 1 }));
  add('crosswind', REASON_WORDS.crosswind, 'practice', swap({ crosswind: 1 }));
  add('sun', REASON_WORDS.sun(x.sunSpan), 'practice', swap({ sun: 1 }));
  add('rain', REASON_WORDS.rain, 'our choice', swap({ rain: 1 }));
  add('wind', REASON_WORDS.wind, 'our choice', swap({ wind: 1 }));
  const seen = REASON_WORDS.sightings(x.ratePerHour.toFixed(2), x.clubRatePerHour.toFixed(2));
  add('sightings', seen, 'club log', swap({ sightings: 1 }));
  add('pressure', REASON_WORDS.pressure(x.recentEvents), 'study', swap({ pressure: 1 }));
  add('late_entry', REASON_WORDS.lateEntry(x.inByText), 'study', { ...f, seatedShare: 1 });
  return drafts;
}

/**
 * Why a sit scores what it does, the greatest change first. Each change is the score less the same score with that one
 * part made neutral, by the same sums; changes under half a point are left out.
 */
export function reasonsFor(f: Factors, x: ReasonFacts, usableBase: number, s: ScoreSettings): Reason[] {
  const { score } = scoreOf(f, s);
  return [...quietDrafts(f, x), ...promiseDrafts(f, x, usableBase)]
    .map(({ without, ...draft }) => ({ ...draft, change: score - scoreOf(without, s).score }))
    .filter((r) => Math.abs(r.change) >= 0.5)
    .sort((a, b) => Math.abs(b.change) - Math.abs(a.change) || (a.code < b.code ? -1 : 1));
}
