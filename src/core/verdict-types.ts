import type { WindowName } from './condition-types';

/** What the scoring core says of a sit, for a person to argue with. Instants are UTC milliseconds. */

export type Evidence = 'standard' | 'study' | 'practice' | 'club log' | 'our choice';

/** Something that forbids the sit outright. */
export interface Gate {
  code:
    | 'closed'
    | 'resting'
    | 'breaks_later_rest'
    | 'taken'
    | 'out_of_season'
    | 'closed_day'
    | 'too_far_ahead'
    | 'claim_limit'
    | 'season_limit'
    | 'spacing'
    | 'weapon'
    | 'not_permitted'
    | 'window_over'
    | 'guest_days'
    | 'member_busy'
    | 'pass_through';
  /** The rule and who or what holds it, for people. */
  text: string;
  /** First instant or day on which it no longer holds, when that is known. */
  endsOn: string | null;
}

export type Word = 'Quiet' | 'Touchy' | 'Loud';

export interface Reason {
  code: string;
  text: string;
  /** Change in sit score (points of 0-100) against the same sit without this. */
  change: number;
  part: 'quiet' | 'promise';
  evidence: Evidence;
}

/** A half hour of the sit. Probabilities 0-1. */
export interface TimelineStep {
  at: number;
  /** Share of the wind in a good arc; null: no forecast. */
  arcHold: number | null;
  /** 72 shares of 5 degrees each, from north clockwise, that sum to 1; null: no forecast. */
  directionShares: number[] | null;
  meanFromDeg: number | null;
  windSpeedMps: number | null;
  gustMps: number | null;
  windedChance: number | null;
  /** Feature most reached by scent in this step. */
  windedFeatureId: string | null;
  sunInEyes: boolean;
  precipMm: number | null;
  tempC: number | null;
  note: string | null;
}

export interface ApproachOption {
  approachId: string;
  approachName: string;
  parkingName: string | null;
  entry: 'before_light' | 'after_daybreak_30' | 'after_daybreak_60' | 'midday' | 'afternoon';
  leaveBy: number;
  inBy: number;
  walkSeconds: number;
  /** Chance that somebody's deer are alerted by walking in, and by walking out. */
  inChance: number;
  outChance: number;
  /** Quiet (0-100) of the whole sit by this way and time. */
  quiet: number;
  score: number;
  /** What costs most on the way: a feature's name and its share. */
  worst: { featureId: string; featureName: string; chance: number } | null;
}

export interface Caution {
  code:
    | 'wind_raised'
    | 'wind_stay_down'
    | 'thunder'
    | 'cold'
    | 'harness'
    | 'orange'
    | 'no_forecast'
    | 'stale_forecast'
    | 'quota_met';
  text: string;
  level: 'note' | 'caution' | 'stop';
}

export interface ArcHoldSummary {
  /** Expected share of the sit with the wind in a good arc. */
  shareOfTime: number;
  /** Chance that it never leaves. */
  neverLeaves: number;
  /** Likeliest half hour in which it first leaves; null: it more likely stays. */
  likeliestLeavingAt: number | null;
  worstAt: number;
  worstShare: number;
}

export interface Confidence {
  level: 'high' | 'fair' | 'low' | 'none';
  text: string;
  leadHours: number | null;
  /** Circular standard deviation of direction over the sit, degrees. */
  spreadDeg: number | null;
  forecastAgeHours: number | null;
}

export interface Counterfactual {
  code: string;
  text: string;
}

export interface Verdict {
  standId: string;
  day: string;
  window: WindowName;
  status: 'open' | 'blocked';
  gates: Gate[];
  /** 0-100. */
  quiet: number;
  promise: number;
  score: number;
  word: Word;
  arcHold: ArcHoldSummary | null;
  /** Chance that deer wind the seat at least once; null: no forecast. */
  windedChance: number | null;
  scentByFeature: { featureId: string; featureName: string; chance: number }[];
  approach: ApproachOption | null;
  approachAlternatives: ApproachOption[];
  /** Pressure left near the stand, 0 (none) upwards. */
  pressure: number;
  /** Mean direction of the wind over the sit; null: none, or no forecast. */
  meanFromDeg?: number | null;
  /** 72 shares of the wind over the whole sit, as in TimelineStep; null: no forecast. */
  directionShares?: number[] | null;
  reasons: Reason[];
  counterfactuals: Counterfactual[];
  cautions: Caution[];
  confidence: Confidence;
  timeline: TimelineStep[];
}
