import { type PromiseFactors, promiseOf, promiseSeated } from './promise/promise-factors';
import { type QuietFactors, quietOf } from './quiet';
import { type ScoreSettings, sitScore } from './score';
import type { Evidence, Reason } from './types';

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

const percent = (share: number) => `${Math.round(share * 100)} %`;
const named = (worst: { name: string; chance: number } | null) => (worst ? `, most of it at ${worst.name}` : '');

type Draft = Omit<Reason, 'change'> & { without: Factors };

function quietDrafts(f: Factors, x: ReasonFacts): Draft[] {
  const part = 'quiet' as const;
  const swap = (q: Partial<QuietFactors>): Factors => ({ ...f, quiet: { ...f.quiet, ...q } });
  const drafts: Draft[] = [];
  const add = (code: string, text: string, evidence: Evidence, without: Factors) =>
    drafts.push({ code, text, evidence, without, part });
  if (x.arcShare !== null) {
    const text = x.forecast
      ? `Wind in a good arc for ${percent(x.arcShare)} of the sit`
      : `No forecast: its good arcs take ${percent(x.arcShare)} of the compass`;
    add('arc', text, 'practice', swap({ arc: 1 }));
  }
  if (x.windedChance !== null) {
    const most = x.topScent ? `, most of it at ${x.topScent.name}` : '';
    const text = `Scent from the seat may reach deer: ${percent(x.windedChance)}${most}`;
    add('seat_scent', text, 'standard', swap({ seat: 1 }));
  }
  if (x.wayName) {
    add(
      'walk_in',
      `Walking in by ${x.wayName}: ${percent(x.inChance)}${named(x.inWorst)}`,
      'study',
      swap({ walkIn: 1 }),
    );
    const out = `Walking out by ${x.outName ?? x.wayName}: ${percent(x.outChance)}${named(x.outWorst)}`;
    add('walk_out', out, 'study', swap({ walkOut: 1 }));
  } else {
    const text = `No way in is drawn: ${percent(x.unknownWayChance)} assumed each way`;
    add('no_way', text, 'our choice', swap({ walkIn: 1, walkOut: 1 }));
  }
  if (f.quiet.pressurePower > 1) {
    const text = `Deer near here were disturbed lately (${x.recentEvents} ${x.recentEvents === 1 ? 'time' : 'times'}): they are alerted sooner`;
    add('pressure_quiet', text, 'study', swap({ pressurePower: 1 }));
  }
  if (f.quiet.learned) {
    const way = f.quiet.learned > 0 ? 'quieter' : 'louder';
    const points = Math.abs(Math.round(f.quiet.learned * 100));
    add('learned', `Sits here have gone ${way} than the sums say: ${points} points`, 'club log', swap({ learned: 0 }));
  }
  return drafts;
}

function promiseDrafts(f: Factors, x: ReasonFacts, usableBase: number): Draft[] {
  const part = 'promise' as const;
  const swap = (p: Partial<PromiseFactors>): Factors => ({ ...f, promise: { ...f.promise, ...p } });
  const drafts: Draft[] = [];
  const add = (code: string, text: string, evidence: Evidence, without: Factors) =>
    drafts.push({ code, text, evidence, without, part });
  add('suitability', `The steward rates it ${x.suitability} for this window`, 'practice', swap({ base: usableBase }));
  const near = x.featuresInRange.slice(0, 3).join(', ');
  const lead = f.promise.features >= 1 ? 'In range' : 'In range, little in use then';
  add('features', near ? `${lead}: ${near}` : 'Nothing deer use is in range', 'practice', swap({ features: 1 }));
  add('crosswind', 'How the wind lies to the travel line in range', 'practice', swap({ crosswind: 1 }));
  add('sun', `Low sun in the eyes${x.sunSpan ? ` ${x.sunSpan}` : ''}`, 'practice', swap({ sun: 1 }));
  add('rain', 'Rain during the sit', 'our choice', swap({ rain: 1 }));
  add('wind', 'Strong wind at the seat', 'our choice', swap({ wind: 1 }));
  const rates = `${x.ratePerHour.toFixed(2)} deer an hour here, ${x.clubRatePerHour.toFixed(2)} in the club`;
  add('sightings', `Seen from it: ${rates}`, 'club log', swap({ sightings: 1 }));
  const lately = `Pressure near it in the last days (${x.recentEvents} ${x.recentEvents === 1 ? 'visit' : 'visits'})`;
  add('pressure', lately, 'study', swap({ pressure: 1 }));
  add('late_entry', `In the seat from ${x.inByText} only`, 'study', { ...f, seatedShare: 1 });
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
