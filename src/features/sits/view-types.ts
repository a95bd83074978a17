import type { WindowName } from '@/core/condition-types';
import type { Arc, StandKind, Weapon } from '@/core/ground-types';
import type { Caution, Confidence, Evidence, Word } from '@/core/verdict-types';
import type { SitGuest } from '@/db/schema';

/** What the Sit and Week screens are drawn from: plain data, no positions. Scores 0-100, chances and shares 0-1. */

export interface ClubView {
  slug: string;
  name: string;
  zone: string;
  units: 'us' | 'metric';
}

export interface ForecastView {
  /** beyond: kept, but it does not reach this window. */
  state: 'fresh' | 'stale' | 'beyond' | 'none';
  source: string | null;
  issuedAt: number | null;
  fetchedAt: number | null;
  /** Why the last request failed. */
  error: string | null;
}

export type CautionView = Pick<Caution, 'code' | 'text' | 'level'>;

export interface WayBrief {
  approachId: string;
  name: string;
  parkingName: string | null;
  leaveBy: number;
  inBy: number;
  walkSeconds: number;
}

export interface SitRow {
  standId: string;
  name: string;
  kind: StandKind;
  word: Word;
  score: number;
  quiet: number;
  promise: number;
  /** Good-wind arcs of the window. */
  arcs: Arc[];
  /** 72 shares of the sit's wind; null: no forecast. */
  shares: number[] | null;
  hold: number | null;
  sentence: string;
  confidence: Confidence['level'];
  /** What the head of the list does not say already. */
  cautions: CautionView[];
  weapons: Weapon[];
  seats: number;
  way: WayBrief | null;
  waysIn: { id: string; name: string }[];
}

export interface OpenRow extends SitRow {
  rank: number;
  /** The reader's own sit. */
  mine: boolean;
}

export interface GateView {
  code: string;
  text: string;
  ends: string | null;
}

export interface BlockedRow extends SitRow {
  gates: GateView[];
}

export interface OwnSit {
  sitId: string;
  sequence: number;
  standId: string;
  standName: string;
  windows: WindowName | 'all_day';
  weapon: Weapon;
  approachId: string | null;
  guests: SitGuest[];
  note: string;
}

export interface WindowView {
  day: string;
  window: WindowName;
  startAt: number;
  endAt: number;
}

export interface LightView {
  startAt: number;
  endAt: number;
  text: string;
}

export interface SkyView {
  rise: number | null;
  set: number | null;
  civilDawn: number | null;
  civilDusk: number | null;
  polar: 'none' | 'up_all_day' | 'down_all_day';
  moon: string;
}

/** The window's weather at the club in short lines; null: no forecast reaches it. */
export interface WeatherView {
  wind: string;
  air: string;
  barometer: string | null;
}

export interface SitsView {
  club: ClubView;
  window: WindowView;
  /** The window has ended. */
  over: boolean;
  weapon: Weapon | null;
  /** Weapons some stand is set up for. */
  weapons: Weapon[];
  sky: SkyView;
  light: LightView | null;
  forecast: ForecastView;
  weather: WeatherView | null;
  /** What holds for every stand. */
  cautions: CautionView[];
  open: OpenRow[];
  blocked: BlockedRow[];
  mine: OwnSit | null;
  standCount: number;
  madeAt: number;
}

/** The list as a page shows it. */
export interface KeptSitsView extends SitsView {
  /** Changes when anything a reader sees does. */
  mark: string;
}

export type RowBrief = Pick<OpenRow, 'standId' | 'name' | 'sentence' | 'weapons' | 'way' | 'waysIn' | 'cautions'>;

/** What opened rows and the booking form need of the list. */
export interface SitsBrief extends Pick<SitsView, 'club' | 'window' | 'weapon' | 'cautions' | 'mine'> {
  sky: Pick<SkyView, 'rise' | 'set'>;
  open: RowBrief[];
  blocked: { standId: string; name: string; gate: string | null }[];
}

export interface TimelineView {
  at: number;
  arcHold: number | null;
  shares: number[] | null;
  meanFromDeg: number | null;
  windSpeedMps: number | null;
  gustMps: number | null;
  windedChance: number | null;
  sunInEyes: boolean;
  precipMm: number | null;
  tempC: number | null;
  note: string | null;
}

export interface ReasonView {
  code: string;
  text: string;
  change: number;
  part: 'quiet' | 'promise';
  evidence: Evidence;
}

export interface WayView extends WayBrief {
  /** 'in before light' */
  entry: string;
  walkM: number;
  /** Straight from where the walk begins to the stand, degrees true; null where the way has no length. */
  bearingDeg: number | null;
  /** The same by compass. */
  magneticDeg: number | null;
  /** Too late to leave for it, though the window goes on. */
  passed: boolean;
  inChance: number;
  outChance: number;
  quiet: number;
  score: number;
  /** Points of sit score against the best way, 0 or below. */
  cost: number;
  worst: { name: string; chance: number } | null;
}

/** All of one sit, read when its row is opened. */
export interface SitDetailView {
  standId: string;
  name: string;
  window: WindowView;
  quiet: number;
  promise: number;
  score: number;
  word: Word;
  arcs: Arc[];
  hold: { share: number; neverLeaves: number; leavesAt: number | null; worstAt: number; worstShare: number } | null;
  windedChance: number | null;
  scent: { name: string; chance: number }[];
  timeline: TimelineView[];
  reasons: ReasonView[];
  /** The best first. */
  ways: WayView[];
  counterfactuals: string[];
  cautions: CautionView[];
  confidence: Confidence;
  /** The reader may know what lies where: a map may be opened. */
  mayMap: boolean;
}

/** One tone of a wind strip 72 wide. */
export interface StripShade {
  opacity: number;
  /** Path of an SVG. */
  d: string;
}

/** A good arc on it. */
export interface StripBar {
  x: number;
  width: number;
}

export interface WeekCell {
  standId: string;
  open: boolean;
  mine: boolean;
  word: Word;
  score: number;
  quiet: number;
  hold: number | null;
  /** Index into the week's strips; null: no forecast. */
  strip: number | null;
  /** Why not, in the rule's own words. */
  gate: string | null;
}

export interface WeekColumnView {
  window: WindowView;
  /** 'Sat 14 Nov' */
  dayText: string;
  /** In the order of the stands. */
  cells: WeekCell[];
  /** Stand ids, the best first; those not open last. */
  order: string[];
}

export interface WeekView {
  club: ClubView;
  weapon: Weapon | null;
  weapons: Weapon[];
  forecast: ForecastView;
  stands: { standId: string; name: string; bars: Record<WindowName, StripBar[]> }[];
  /** Winds of sits as they are drawn; many stands share one. */
  strips: StripShade[][];
  /** Quotas that are met, before anybody books. */
  cautions: CautionView[];
  columns: WeekColumnView[];
  madeAt: number;
}

export interface KeptWeekView extends WeekView {
  mark: string;
}
