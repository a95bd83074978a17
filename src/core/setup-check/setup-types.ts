import type { SitWindow, WindowName } from '../condition-types';
import type { Point, ScoredApproach, ScoredFeature, ScoredStand } from '../ground-types';
import type { GroundWork } from '../ground-work';
import type { ScoringSettings } from '../settings';
import type { Place } from '../sun';
import type { Units } from '../units';
import type { Evidence } from '../verdict-types';
import type { SetupSettings } from './setup-settings';

export const FINDING_CODES = [
  'off_shot',
  'beside_approach',
  'unhuntable',
  'crowded_scrapes',
  'off_lines',
  'approach_crosses',
  'approach_upwind',
  'seat_sun',
  'camera_sun',
] as const;
export type FindingCode = (typeof FINDING_CODES)[number];

export interface SetupCamera {
  id: string;
  name: string;
  at: Point;
  /** Direction it looks; null: not written down, it is not checked. */
  facingDeg: number | null;
}

/** Shares of the wind by compass point, 16 from N clockwise, that sum to 1. */
export type UsualWinds = Record<WindowName, number[]>;

export interface SetupInput {
  place: Place;
  stands: ScoredStand[];
  features: ScoredFeature[];
  approaches: ScoredApproach[];
  cameras: SetupCamera[];
  /** One day of each month hunted, YYYY-MM-DD. */
  days: string[];
  /** Both windows of each of those days. */
  windows: SitWindow[];
  /** null: no season of hours to go by; every wind counts the same. */
  winds: UsualWinds | null;
  settings: SetupSettings;
  scoring: ScoringSettings;
  units: Units;
}

export const SETUP_ACTS = [
  'take_away',
  'move',
  'block',
  'trim',
  'keep_one',
  'turn',
  'move_seat',
  'new_way',
  'other_time',
  'draw_line',
] as const;
export type SetupAct = (typeof SETUP_ACTS)[number];

/** What may be changed to see what a finding costs. */
export type SetupTrial =
  | { change: 'without_features'; standId: string; featureIds: string[]; window: WindowName | null }
  | { change: 'without_approach'; standId: string; approachId: string; window: WindowName | null }
  | { change: 'facing'; standId: string; facingDeg: number; window: WindowName };

export interface Finding {
  /** The same for the same fault of the same things, however they are moved. */
  key: string;
  code: FindingCode;
  /** Changes when anything the finding rests on does. */
  print: string;
  /** The thing at fault. */
  subject: { of: 'stand' | 'approach' | 'feature' | 'camera'; id: string; name: string };
  stand: { id: string; name: string } | null;
  /** Other stands it touches. */
  also: { id: string; name: string }[];
  at: Point;
  /** From the seat (of a camera or a stand itself: null), metres and degrees true. */
  distanceM: number | null;
  bearingDeg: number | null;
  text: string;
  why: string;
  evidence: Evidence;
  /** `work` is the kind of work it takes that may be limited; null: none of them. */
  acts: { act: SetupAct; text: string; work: GroundWork | null }[];
  trial: SetupTrial | null;
}

/** What changes on a usual wind when a finding is mended, by the scoring core. */
export interface SetupEffect {
  window: WindowName;
  windFromDeg: number;
  measure: 'quiet' | 'promise';
  before: number;
  after: number;
}
