import { arcsFor } from '@/core/arcs';
import type { SitWindow } from '@/core/condition-types';
import { bearingDeg, distanceM } from '@/core/geometry';
import type { ScoredApproach, ScoredStand } from '@/core/ground-types';
import type { ApproachOption, Reason, TimelineStep, Verdict } from '@/core/verdict-types';
import { cautionView, orNull, round1, round3 } from './view';
import type { ReasonView, SitDetailView, TimelineView, WayView } from './view-types';
import { REASON_WORDS } from './words/detail';
import { ENTRY_WORDS } from './words/terms';

const wholeDeg = (deg: number) => ((Math.round(deg) % 360) + 360) % 360;

/** Ways in that are worth telling beside the best. */
const MOST_WAYS = 6;

function walkOf(
  approach: ScoredApproach | undefined,
  declinationDeg: number | null,
): Pick<WayView, 'walkM' | 'bearingDeg' | 'magneticDeg'> {
  const points = approach?.points.slice(approach.vehicleToIndex) ?? [];
  const [first, last] = [points[0], points.at(-1)];
  if (!first || !last) return { walkM: 0, bearingDeg: null, magneticDeg: null };
  const walkM = points.slice(1).reduce((sum, point, i) => sum + distanceM(points[i] ?? point, point), 0);
  const toward = distanceM(first, last) < 1 ? null : bearingDeg(first, last);
  return {
    walkM: Math.round(walkM),
    bearingDeg: orNull(toward, wholeDeg),
    magneticDeg: toward === null || declinationDeg === null ? null : wholeDeg(toward - declinationDeg),
  };
}

function wayView(way: ApproachOption, best: ApproachOption, ask: DetailAsk): WayView {
  return {
    approachId: way.approachId,
    name: way.approachName,
    parkingName: way.parkingName,
    entry: ENTRY_WORDS[way.entry],
    leaveBy: way.leaveBy,
    inBy: way.inBy,
    walkSeconds: Math.round(way.walkSeconds),
    passed: way.leaveBy < ask.now && ask.window.endAt > ask.now,
    ...walkOf(
      ask.approaches.find((approach) => approach.id === way.approachId),
      ask.declinationDeg,
    ),
    inChance: round3(way.inChance),
    outChance: round3(way.outChance),
    quiet: round1(way.quiet),
    score: round1(way.score),
    cost: round1(way.score - best.score),
    worst: way.worst ? { name: way.worst.featureName, chance: round3(way.worst.chance) } : null,
  };
}

function timelineView(step: TimelineStep): TimelineView {
  return {
    at: step.at,
    arcHold: orNull(step.arcHold, round3),
    shares: step.directionShares?.map(round3) ?? null,
    meanFromDeg: orNull(step.meanFromDeg, Math.round),
    windSpeedMps: orNull(step.windSpeedMps, round1),
    gustMps: orNull(step.gustMps, round1),
    windedChance: orNull(step.windedChance, round3),
    sunInEyes: step.sunInEyes,
    precipMm: orNull(step.precipMm, round1),
    tempC: orNull(step.tempC, round1),
    note: step.note,
  };
}

/** A log's figures are told only to those who may see what others saw. */
function reasonView({ code, text, change, part, evidence }: Reason, seeSightings: boolean): ReasonView {
  const told = code === 'sightings' && !seeSightings ? REASON_WORDS.hiddenSightings : text;
  return { code, text: told, change: round1(change), part, evidence };
}

export interface DetailAsk {
  stand: ScoredStand;
  window: SitWindow;
  approaches: ScoredApproach[];
  /** The reader may see what others saw. */
  seeSightings: boolean;
  /** Degrees that magnetic north lies east of true north; null: not known. */
  declinationDeg: number | null;
  now: number;
}

/** Everything there is to say of one sit. */
export function shapeDetail(verdict: Verdict, ask: DetailAsk): Omit<SitDetailView, 'mayMap'> {
  const { stand, window } = ask;
  const best = verdict.approach;
  const hold = verdict.arcHold;
  return {
    standId: stand.id,
    name: stand.name,
    window,
    quiet: round1(verdict.quiet),
    promise: round1(verdict.promise),
    score: round1(verdict.score),
    word: verdict.word,
    arcs: arcsFor(stand.arcs, window.window),
    hold: hold && {
      share: round3(hold.shareOfTime),
      neverLeaves: round3(hold.neverLeaves),
      leavesAt: hold.likeliestLeavingAt,
      worstAt: hold.worstAt,
      worstShare: round3(hold.worstShare),
    },
    windedChance: orNull(verdict.windedChance, round3),
    scent: verdict.scentByFeature.map(({ featureName, chance }) => ({ name: featureName, chance: round3(chance) })),
    timeline: verdict.timeline.map(timelineView),
    reasons: verdict.reasons.map((reason) => reasonView(reason, ask.seeSightings)),
    ways: best ? [best, ...verdict.approachAlternatives].slice(0, MOST_WAYS).map((way) => wayView(way, best, ask)) : [],
    counterfactuals: verdict.counterfactuals.map((one) => one.text),
    cautions: verdict.cautions.map(cautionView),
    confidence: verdict.confidence,
  };
}
